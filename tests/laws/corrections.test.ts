import { describe } from 'vitest'
import { holdsForOrders } from '../support/laws/hold'
import { switchedOff } from '../support/laws/law-18-corrections'
import { correctedOrder } from '../support/laws/orders'

describe('Law 18: corrections switched off leave no trace', () =>
  holdsForOrders(switchedOff, { by: 2, orders: correctedOrder }))
