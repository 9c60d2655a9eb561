import { describe } from 'vitest'
import { holdsForOrders } from '../support/laws/hold'
import { dragsArrive, handlesTrue } from '../support/laws/law-11-handles'

describe('Law 11: a point moves as its handle says', () => {
  describe('central differences', () => holdsForOrders(handlesTrue, { by: 10 }))
  describe('a drag of 100 mm that solves again as it goes', () => holdsForOrders(dragsArrive, { by: 40 }))
})
