import { sumOf } from './sums'
import { Findings, type DraftLaw } from './violation'

/** On a tape every distance is one of its marks, and the sums end in those distances. */
export const tape: DraftLaw = (draft, order) => {
  const found = new Findings(19)
  const { tape: mark } = order
  if (!mark) return found.all
  for (const step of draft.steps) {
    if (step.length === undefined) continue
    const marks = step.length / mark
    found.atMost(step.id, 'off a mark of the tape by', Math.abs(marks - Math.round(marks)) * mark, 1e-6)
    if (step.arithmetic === undefined) continue
    const unit = order.unit === 'in' ? 25.4 : 10
    const { right } = sumOf(step.arithmetic)
    const rounding = order.unit === 'in' ? 25.4 / 16 : 0.5
    found.atMost(
      step.id,
      `“${step.arithmetic}” does not end in the distance`,
      Math.abs(right * unit - step.length),
      rounding + 1e-6,
    )
  }
  return found.all
}
