import { describe } from 'vitest'
import { holdsForDrafts, holdsForOrders } from '../support/laws/hold'
import { darts, movedDartsKeepTheirAngle } from '../support/laws/law-16-darts'

describe('Law 16: darts close', () => {
  holdsForDrafts(darts)

  describe('a bust dart keeps its angle wherever it is moved', () =>
    holdsForOrders(movedDartsKeepTheirAngle, { by: 4, garments: ['bodice', 'shift-dress'] }))
})
