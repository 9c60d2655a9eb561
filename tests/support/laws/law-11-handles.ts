import type { DraftOrder, Handle, Point } from '@/drafting/contract'
import { garmentOf, styleOf } from './formulas'
import { drafted, withStyle } from './redraft'
import { Findings, type Engine, type OrderLaw } from './violation'

function markAt(
  order: DraftOrder,
  engine: Engine,
  handle: Pick<Handle, 'piece' | 'mark'>,
): Point | undefined {
  const draft = drafted({ ...order, explain: false }, engine)
  return draft?.pieces.find((one) => one.id === handle.piece)?.marks.find((one) => one.id === handle.mark)?.at
}

/** What a handle says of a value is what redrafting with that value half a millimetre of movement up and down shows. */
export const handlesTrue: OrderLaw = (order, engine) => {
  const found = new Findings(11)
  if (!drafted({ ...order, explain: false }, engine)) return found.all
  const garment = garmentOf(order, engine.garments)
  const all = engine.handles(order)
  if (all.length === 0) found.add('handles', 'there are none')
  for (const handle of all) {
    const at = markAt(order, engine, handle)
    if (!at || Math.hypot(at.x - handle.at.x, at.y - handle.at.y) > 1e-9)
      found.add(handle.id, 'does not stand on its mark')
    if (handle.moves.length < 1 || handle.moves.length > 2)
      found.add(handle.id, `has ${handle.moves.length} moves`)
    for (const move of handle.moves) {
      const style = garment.design.find((one) => one.id === move.value)
      const now = styleOf(order, garment, move.value)
      if (!style || typeof now !== 'number') {
        found.add(handle.id, `moves “${move.value}”, which is no number of the style`)
        continue
      }
      const step = style.kind === 'length' ? 0.5 : Math.abs(0.5 * move.perMm)
      const less = markAt(withStyle(order, move.value, now - step), engine, handle)
      const more = markAt(withStyle(order, move.value, now + step), engine, handle)
      if (!less || !more) continue
      const seen = { x: (more.x - less.x) / (2 * step), y: (more.y - less.y) / (2 * step) }
      const said = { x: move.along.x / move.perMm, y: move.along.y / move.perMm }
      const off = Math.hypot(seen.x - said.x, seen.y - said.y) / Math.hypot(seen.x, seen.y)
      found.atMost(`${handle.id} by ${move.value}`, 'off the central difference, share', off, 0.02)
      found.atMost(
        `${handle.id} by ${move.value}`,
        'its direction is no unit vector by',
        Math.abs(Math.hypot(move.along.x, move.along.y) - 1),
        1e-6,
      )
    }
  }
  return found.all
}

const reach = 100

/** A drag of up to 100 mm that solves again as it goes ends on its target, for targets that some values reach. */
export const dragsArrive: OrderLaw = (order, engine) => {
  const found = new Findings(11)
  if (!drafted({ ...order, explain: false }, engine)) return found.all
  const garment = garmentOf(order, engine.garments)
  for (const handle of engine.handles(order)) {
    for (const way of [1, -1]) {
      let there = order
      for (const move of handle.moves) {
        const style = garment.design.find((one) => one.id === move.value)
        const now = Number(styleOf(order, garment, move.value))
        const wanted = now + (way * move.perMm * reach) / handle.moves.length
        const value = Math.min(Math.max(wanted, style?.min ?? wanted), style?.max ?? wanted)
        there = withStyle(there, move.value, value)
      }
      const target = markAt(there, engine, handle)
      if (!target || heldBack(there, engine)) continue
      const gap = drag(order, engine, handle, target)
      if (gap !== undefined)
        found.atMost(
          handle.id,
          `a drag to ${target.x.toFixed(1)}, ${target.y.toFixed(1)} ends off by`,
          gap,
          0.1,
        )
    }
  }
  return found.all
}

/** Whether the draft says that a point stays short of what was asked: it cannot be dragged any farther there. */
function heldBack(order: DraftOrder, engine: Engine): boolean {
  return drafted(order, engine)?.cautions.some((caution) => caution.code === 'neck-narrowed') ?? false
}

/** Drags step by step, asking for the handle anew each time. @returns how far from the target it ends; undefined when refused on the way */
function drag(order: DraftOrder, engine: Engine, handle: Handle, target: Point): number | undefined {
  const garment = garmentOf(order, engine.garments)
  let now = order
  let gap = Infinity
  for (let round = 0; round < 12; round += 1) {
    if (!drafted({ ...now, explain: false }, engine)) return undefined
    const current = engine.handles(now).find((one) => one.id === handle.id)
    if (!current) return Infinity
    const away = { x: target.x - current.at.x, y: target.y - current.at.y }
    gap = Math.hypot(away.x, away.y)
    if (gap <= 0.01) return gap
    for (const [value, by] of shares(current, away)) {
      const style = garment.design.find((one) => one.id === value)
      const wanted = Number(styleOf(now, garment, value)) + by
      now = withStyle(now, value, Math.min(Math.max(wanted, style?.min ?? wanted), style?.max ?? wanted))
    }
  }
  return gap
}

/** How much each value changes so that the mark moves by `away`, as nearly as its moves can. */
function shares(handle: Handle, away: Point): (readonly [value: string, by: number])[] {
  const [a, b] = handle.moves
  if (!a) return []
  const dot = (p: Point, q: Point): number => p.x * q.x + p.y * q.y
  if (!b) return [[a.value, dot(a.along, away) * a.perMm]]
  const cross = a.along.x * b.along.y - a.along.y * b.along.x
  if (Math.abs(cross) < 0.05) return [[a.value, dot(a.along, away) * a.perMm]]
  return [
    [a.value, ((away.x * b.along.y - away.y * b.along.x) / cross) * a.perMm],
    [b.value, ((a.along.x * away.y - a.along.y * away.x) / cross) * b.perMm],
  ]
}
