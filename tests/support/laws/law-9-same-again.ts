import type { Draft, DraftOrder } from '@/drafting/contract'
import { garmentOf, offers, styleOf } from './formulas'
import { attempt, drafted, withMeasurement, withStyle } from './redraft'
import { Findings, type OrderLaw } from './violation'

/** The same order gives the same bytes, whatever was drafted in between; the unit changes wording only. */
export const sameAgain: OrderLaw = (order, engine) => {
  const found = new Findings(9)
  const first = drafted(order, engine)
  if (!first) return found.all
  attempt(withMeasurement(order, 'waist', (order.measurements.waist ?? 800) + 7), engine)
  const again = drafted(JSON.parse(JSON.stringify(order)) as DraftOrder, engine)
  if (JSON.stringify(first) !== JSON.stringify(again)) found.add('draft', 'differs the second time')
  const other = drafted({ ...order, unit: order.unit === 'in' ? 'cm' : 'in' }, engine)
  if (!other) found.add('unit', 'makes the order impossible')
  else if (wordless(first) !== wordless(other))
    found.add('unit', `changes more than words: ${firstDifference(first, other)}`)
  const silent = drafted({ ...order, explain: false }, engine)
  if (!silent || JSON.stringify(silent.pieces) !== JSON.stringify(first.pieces))
    found.add('explain', 'changes the pieces')
  return found.all
}

const words = new Set(['text', 'arithmetic', 'message', 'name', 'label'])

function wordless(draft: Draft): string {
  return JSON.stringify(draft, (key, value: unknown) => (words.has(key) ? undefined : value))
}

function firstDifference(a: Draft, b: Draft): string {
  const [one, other] = [wordless(a), wordless(b)]
  let at = 0
  while (one[at] === other[at]) at += 1
  return `…${one.slice(Math.max(0, at - 60), at + 30)}…`
}

/** A name whose value is changed a little, and how. */
interface Nudge {
  readonly name: string
  readonly order: DraftOrder
  /** What every step that takes its length from the name must move by, mm. */
  readonly by?: number
}

const bump = 1.25

function nudges(order: DraftOrder, engine: Parameters<OrderLaw>[1], draft: Draft): Nudge[] {
  const garment = garmentOf(order, engine.garments)
  const all: Nudge[] = []
  for (const rule of garment.rules) {
    const formula = order.rules?.[rule.id] ?? rule.formula
    const more = { length: `${bump} mm`, angle: '0.2°', number: '0.003' }[rule.kind]
    all.push({
      name: rule.id,
      order: { ...order, rules: { ...order.rules, [rule.id]: `(${formula}) + ${more}` } },
      ...(rule.kind === 'length' ? { by: bump } : {}),
    })
  }
  for (const id of [...garment.needs, ...garment.estimates]) {
    const mm = order.measurements[id] ?? draft.used[id]?.mm
    // One that was estimated becomes measured: its caution goes, everything else moves as its value does.
    if (mm !== undefined && order.measurements[id] !== undefined) {
      all.push({ name: id, order: withMeasurement(order, id, mm + bump) })
    }
  }
  for (const value of garment.design) {
    const now = styleOf(order, garment, value.id)
    if (typeof now !== 'number' || value.kind === 'count' || !offers(order, garment, value.id)) continue
    const { min = -Infinity, max = Infinity } = value
    const step = value.kind === 'share' ? 0.003 : bump
    const next = now + step <= max ? now + step : now - step
    if (next >= min) all.push({ name: value.id, order: withStyle(order, value.id, next), by: next - now })
  }
  return all
}

/** A rule, measurement or style value raised a little moves every step that names it and nothing that does not use it. */
export const onlyWhatUsesIt: OrderLaw = (given, engine) => {
  const found = new Findings(9)
  const order: DraftOrder = { ...given, explain: false }
  const before = drafted(order, engine)
  if (!before) return found.all
  const parts = partsOf(before)
  for (const nudge of nudges(order, engine, before)) {
    const after = drafted(nudge.order, engine)
    if (!after) continue
    const moved = partsOf(after)
    for (const step of before.steps) {
      const now = moved.get(step.id)
      const then = parts.get(step.id)
      // A step that is there for some values only says so by naming them elsewhere.
      if (!now || !then) continue
      if (!step.uses.includes(nudge.name) && now !== then)
        found.add(step.id, `moves with ${nudge.name}, which it does not list`)
      if (step.rule !== nudge.name) continue
      const length = after.steps.find((one) => one.id === step.id)?.length
      if (now === then) found.add(step.id, `names ${nudge.name} and does not move with it`)
      else if (nudge.by !== undefined && !order.tape && step.length !== undefined && length !== undefined) {
        found.atMost(
          step.id,
          `length does not follow ${nudge.name}`,
          Math.abs(length - step.length - nudge.by),
          1e-6,
        )
      }
    }
  }
  return found.all
}

/** What each step made, as text: marks where they stand, the edge, the lines drawn, the length. */
function partsOf(draft: Draft): Map<string, string> {
  const parts = new Map<string, string>()
  for (const step of draft.steps) {
    const piece = draft.pieces.find((one) => one.id === step.piece)
    const marks = step.marks.map((id) => piece?.marks.find((mark) => mark.id === id)?.at)
    const edge = step.edge ? piece?.edges.find((one) => one.id === step.edge)?.path : undefined
    const rounded = (_: string, value: unknown): unknown =>
      typeof value === 'number' ? Math.round(value * 1e6) / 1e6 + 0 : value
    parts.set(step.id, JSON.stringify([marks, edge, step.length, step.draws], rounded))
  }
  return parts
}
