import { describe } from 'vitest'
import { holdsForOrders } from '../support/laws/hold'
import { continuity } from '../support/laws/law-13-continuity'

describe('Law 13: a tenth of a millimetre moves nothing by more than 5 mm', () =>
  holdsForOrders(continuity, { by: 8 }))
