import type { Draft, DraftOrder, GarmentDefinition, Piece, Step } from '@/drafting/contract'
import { sumOf } from './sums'
import { far } from './curves'
import { garmentOf, namesIn, numberOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** Every edge and mark has its one step, and every step says what it did: the distance, the sum and what it follows from. */
export const steps: DraftLaw = (draft, order, engine) => {
  const found = new Findings(12)
  const garment = garmentOf(order, engine.garments)
  const byId = new Map(draft.steps.map((step) => [step.id, step]))
  if (byId.size !== draft.steps.length) found.add('steps', 'two steps have one id')
  for (const piece of draft.pieces) {
    madeOnce(found, draft, piece, byId)
  }
  const seen = new Set<string>()
  for (const step of draft.steps) {
    const piece = draft.pieces.find((one) => one.id === step.piece)
    if (!piece) {
      found.add(step.id, `draws on ${step.piece}, which is not there`)
      continue
    }
    if (order.explain !== false && step.text.trim() === '') found.add(step.id, 'says nothing')
    if (step.from && !seen.has(`${step.piece}/${step.from}`))
      found.add(step.id, `is measured from ${step.from}, which is not yet made`)
    for (const mark of step.marks) seen.add(`${step.piece}/${mark}`)
    distance(found, step, piece)
    if (step.rule) bySum(found, step, order, garment, draft)
  }
  return found.all
}

function madeOnce(found: Findings, draft: Draft, piece: Piece, byId: ReadonlyMap<string, Step>): void {
  for (const edge of piece.edges) {
    const step = byId.get(edge.madeBy)
    if (!step) found.add(`${piece.id}.${edge.id}`, 'names a step that is not there')
    else if (step.edge !== edge.id || step.piece !== piece.id)
      found.add(`${piece.id}.${edge.id}`, `names the step ${step.id}, which draws something else`)
  }
  const drawn = draft.steps.filter((step) => step.piece === piece.id && step.edge !== undefined)
  for (const step of drawn) {
    if (piece.edges.filter((edge) => edge.madeBy === step.id).length !== 1)
      found.add(step.id, 'does not draw exactly one edge')
  }
  for (const mark of piece.marks) {
    const makers = draft.steps.filter((step) => step.piece === piece.id && step.marks.includes(mark.id))
    if (makers.length !== 1) found.add(`${piece.id}.${mark.id}`, `is made by ${makers.length} steps`)
  }
  for (const step of draft.steps) {
    if (step.piece !== piece.id) continue
    for (const mark of step.marks) {
      if (!piece.marks.some((one) => one.id === mark))
        found.add(step.id, `makes ${mark}, which is not on the piece`)
    }
  }
}

function distance(found: Findings, step: Step, piece: Piece): void {
  if (step.length === undefined) return
  const from = piece.marks.find((mark) => mark.id === step.from)?.at
  const to = piece.marks.find((mark) => mark.id === step.marks[0])?.at
  if (!from || !to) return found.add(step.id, 'has a length but not two marks')
  found.atMost(
    step.id,
    'length against the distance of its marks',
    Math.abs(far(from, to) - step.length),
    1e-6,
  )
  if (!step.direction || step.length < 1e-6) return
  const long = Math.hypot(step.direction.x, step.direction.y)
  const off = Math.abs((to.x - from.x) * step.direction.y - (to.y - from.y) * step.direction.x) / long
  const along = (to.x - from.x) * step.direction.x + (to.y - from.y) * step.direction.y
  if (!(along > 0)) found.add(step.id, 'goes against its direction')
  found.atMost(step.id, 'leaves its direction by', off, 1e-6)
}

function bySum(
  found: Findings,
  step: Step,
  order: DraftOrder,
  garment: GarmentDefinition,
  draft: Draft,
): void {
  const rule = garment.rules.find((one) => one.id === step.rule)
  const style = garment.design.find((one) => one.id === step.rule)
  const uses = new Set(step.uses)
  if (step.rule && !uses.has(step.rule))
    found.add(step.id, `does not list its own rule ${step.rule} among what it uses`)
  const worth = step.rule ? numberOf(step.rule, order, garment, draft.used) : undefined
  if (worth !== undefined && step.length !== undefined) {
    // On a tape it is one of the two marks beside it: some lengths may only be rounded up.
    const allowed = order.tape ? order.tape - 1e-6 : 1e-6
    const off = Math.abs(step.length - worth)
    found.atMost(step.id, `length against ${step.rule} worked out again`, off, allowed)
  }
  if (!rule) {
    if (!style && step.kind !== 'solve' && step.kind !== 'turn')
      found.add(step.id, `names the rule ${step.rule}, which nobody states`)
    return
  }
  const formula = order.rules?.[rule.id] ?? rule.formula
  if (step.formula !== formula) found.add(step.id, `shows the formula “${step.formula}” for “${formula}”`)
  for (const name of follow(formula, garment, order)) {
    if (!uses.has(name)) found.add(step.id, `follows from ${name} without listing it`)
  }
  if (order.explain === false || step.length === undefined) return
  if (step.arithmetic === undefined) return found.add(step.id, 'has a formula but no sum')
  const unit = order.unit === 'in' ? 25.4 : 10
  const rounding = order.unit === 'in' ? 25.4 / 16 : 0.5
  const { left, right, sign } = sumOf(step.arithmetic)
  // On a tape the sum ends in the mark of the tape.
  const exact = order.tape ? (worth ?? step.length) : step.length
  found.atMost(
    step.id,
    `left side of “${step.arithmetic}” against the length`,
    Math.abs(left * unit - exact),
    order.tape ? rounding + order.tape : rounding,
  )
  found.atMost(
    step.id,
    `right side of “${step.arithmetic}” against the length`,
    Math.abs(right * unit - step.length),
    rounding + 1e-6,
  )
  if (sign === '=' && Math.abs(left - right) > 1e-6) found.add(step.id, `“${step.arithmetic}” is not equal`)
}

/** All names behind a formula, rules within rules included. */
function follow(
  formula: string,
  garment: GarmentDefinition,
  order: DraftOrder,
  into = new Set<string>(),
): Set<string> {
  for (const name of namesIn(formula)) {
    if (into.has(name)) continue
    into.add(name)
    const rule = garment.rules.find((one) => one.id === name)
    if (rule) follow(order.rules?.[name] ?? rule.formula, garment, order, into)
  }
  return into
}
