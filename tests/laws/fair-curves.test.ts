import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { fairCurves } from '../support/laws/law-14-fair-curves'

describe('Law 14: curves are fair', () =>
  holdsForDrafts(fairCurves, {
    garments: ['flared-dress', 'circle-skirt', 'straight-skirt', 'gathered-skirt'],
  }))
