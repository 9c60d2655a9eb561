import type { Point } from '@/drafting/contract'
import { chordsOf, endOfPath, far, lengthOfPath, startOfPath } from './curves'
import { garmentOf, numberOf, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** Waist and hem of a circle skirt are true arcs of the lengths that geometry gives. */
export const circles: DraftLaw = (draft, order, engine) => {
  const found = new Findings(8)
  if (order.garment !== 'circle-skirt') return found.all
  const garment = garmentOf(order, engine.garments)
  const number = (name: string): number => numberOf(name, order, garment, draft.used) ?? NaN
  const [whole = 0, part] = String(styleOf(order, garment, 'share')).split(' ')
  const fraction = (text: string | number): number => {
    const [over = '0', under = '1'] = String(text).split('/')
    return Number(over) / Number(under)
  }
  const share = fraction(whole) + (part ? fraction(part) : 0)
  const onTape = (mm: number): number => (order.tape ? Math.round(mm / order.tape) * order.tape : mm)
  const girth = number('waist') + number('waistEase')
  const inner = onTape(girth / (2 * Math.PI * share))
  const outer = order.tape
    ? onTape(girth / (2 * Math.PI * share) + number('length'))
    : inner + number('length')
  const panels = draft.pieces.filter((piece) => piece.id.startsWith('panel'))
  let [waist, hem, turn] = [0, 0, 0]
  for (const piece of panels) {
    const apex = piece.marks.find((mark) => mark.id === 'apex')?.at
    const count = piece.cut.find((one) => one.cloth === 'main')?.count ?? 0
    for (const [id, radius] of [
      ['waist', inner],
      ['hem', outer],
    ] as const) {
      const edge = piece.edges.find((one) => one.id === id)
      if (!apex || !edge) {
        found.add(`${piece.id}.${id}`, 'cannot be measured')
        continue
      }
      const long = lengthOfPath(edge.path)
      if (id === 'waist') waist += count * long
      else hem += count * long
      const off = Math.max(...chordsOf(edge.path, 0.0005).map((point) => Math.abs(far(point, apex) - radius)))
      found.atMost(`${piece.id}.${id}`, 'off its circle', off, 0.05)
      const span = spanOf(startOfPath(edge.path), endOfPath(edge.path), apex)
      found.atMost(`${piece.id}.${id}`, 'spans more than half a circle', span, 180.001)
      if (id === 'waist') turn += count * span
    }
  }
  if (order.rules) return found.all
  found.atMost('waist', 'off waist and ease', Math.abs(waist - 2 * Math.PI * share * inner), 0.1)
  found.atMost('hem', 'off the arc of the hem', Math.abs(hem - 2 * Math.PI * share * outer), 0.1)
  if (!order.tape) {
    found.atMost('waist', 'off waist and ease', Math.abs(waist - girth), 0.1)
    const sweep = girth + 2 * Math.PI * share * number('length')
    found.atMost('hem', 'off waist, ease and 2π·share·length', Math.abs(hem - sweep), 0.1)
  }
  found.atMost('panels', 'span in all, off the share of a circle', Math.abs(turn - 360 * share), 0.01)
  return found.all
}

/** Degrees between two places of a panel seen from the point of the circle; panels hang below it. */
function spanOf(a: Point, b: Point, apex: Point): number {
  const one = Math.atan2(a.y - apex.y, a.x - apex.x)
  const other = Math.atan2(b.y - apex.y, b.x - apex.x)
  return (Math.abs(one - other) * 180) / Math.PI
}
