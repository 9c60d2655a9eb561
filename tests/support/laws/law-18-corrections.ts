import { drafted } from './redraft'
import { Findings, type OrderLaw } from './violation'

/** Corrections switched off leave the draft as it was, to the byte; switched on, they change it. */
export const switchedOff: OrderLaw = (order, engine) => {
  const found = new Findings(18)
  const { corrections = [], ...bare } = order
  const plain = drafted(bare, engine)
  if (!plain || corrections.length === 0) return found.all
  const off = drafted({ ...bare, corrections: corrections.map((one) => ({ ...one, off: true })) }, engine)
  if (JSON.stringify(off) !== JSON.stringify(plain))
    found.add('corrections', 'switched off still change the draft')
  const moving = corrections.some(
    ({ by, off: without }) => !without && (typeof by === 'number' ? by : by.x || by.y) !== 0,
  )
  const on = moving ? drafted(order, engine) : undefined
  if (on && JSON.stringify(on.pieces) === JSON.stringify(plain.pieces))
    found.add('corrections', 'change nothing')
  return found.all
}
