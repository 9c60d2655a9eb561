import type { Draft, DraftOrder, GarmentDefinition, Problem } from '@/drafting/contract'
import type { DraftingError } from '@/drafting/drafting-error'
import { far, headingAtStart, lengthOfPath } from './curves'
import { garmentOf, numberOf, offers, styleOf } from './formulas'
import { attempt, withMeasurement, withStyle } from './redraft'
import { Findings, type DraftLaw, type Engine, type OrderLaw } from './violation'

const codes = new Set([
  'unknown-garment',
  'unknown-field',
  'missing-measurement',
  'out-of-range',
  'bad-length',
  'bad-formula',
  'impossible-shape',
])

/** Fields that a refusal may name for this garment. */
function knownField(field: string, order: DraftOrder, garment: GarmentDefinition | undefined): boolean {
  if (field === '') return Object.hasOwn(order.design ?? {}, '')
  if (
    [
      'garment',
      'measurements',
      'design',
      'corrections',
      'unit',
      'tape',
      'explain',
      'rules',
      'rules.',
    ].includes(field)
  )
    return true
  if (/^(?:rules|corrections|method|ownMeasurements|remedies)(?:\.|$)/.test(field)) return true
  if (!garment) return false
  return (
    garment.needs.includes(field) ||
    garment.estimates.includes(field) ||
    garment.design.some((value) => value.id === field) ||
    garment.rules.some((rule) => rule.id === field) ||
    Object.keys(order.design ?? {}).includes(field) ||
    Object.keys(order.design ?? {}).some((id) => id.startsWith(field))
  )
}

/** A refusal names every field at fault, in words, with finite bounds. */
export function refusalFaults(error: DraftingError, order: DraftOrder, engine: Engine): string[] {
  const faults: string[] = []
  const garment = engine.garments.find((one) => one.id === order.garment)
  if (!codes.has(error.code)) faults.push(`its code is ${error.code}`)
  if (error.problems.length === 0) faults.push('it names no problem')
  const fields = error.problems.map((problem) => problem.field)
  if (fields.some((field) => !error.fields.includes(field))) faults.push('its fields leave out a problem')
  for (const problem of error.problems) {
    if (!knownField(problem.field, order, garment))
      faults.push(`it names the field “${problem.field}”, which nobody can fill in`)
    if (problem.message.trim().length < 10 || /undefined|NaN|Infinity|\[object/.test(problem.message)) {
      faults.push(`${problem.field}: its words are “${problem.message}”`)
    }
    for (const bound of [problem.min, problem.max]) {
      if (bound !== undefined && !Number.isFinite(bound))
        faults.push(`${problem.field}: its bound is ${bound}`)
    }
    if (problem.min !== undefined && problem.max !== undefined && problem.min > problem.max) {
      faults.push(`${problem.field}: its range ${problem.min}…${problem.max} is empty`)
    }
  }
  return faults
}

/** An order that is refused is refused well: the range it names would work. */
export const refusesWell: OrderLaw = (order, engine) => {
  const found = new Findings(10)
  const result = attempt(order, engine)
  if (!(result instanceof Error)) return found.all
  for (const fault of refusalFaults(result, order, engine)) found.add(result.fields.join(', '), fault)
  if (result.problems.length !== 1) return found.all
  for (const problem of result.problems) {
    const tried = withinRange(problem, order, engine)
    if (!tried) continue
    const again = attempt(tried.order, engine)
    const same =
      again instanceof Error &&
      again.problems.some(
        (one) => one.field === problem.field && one.message.slice(0, 24) === problem.message.slice(0, 24),
      )
    if (same) found.add(problem.field, `“${problem.message}” – but ${tried.value} is refused too`)
  }
  return found.all
}

/** The order with the field moved just into the range that the refusal names. */
function withinRange(
  problem: Problem,
  order: DraftOrder,
  engine: Engine,
): { readonly order: DraftOrder; readonly value: number } | undefined {
  const garment = garmentOf(order, engine.garments)
  const style = garment.design.find((value) => value.id === problem.field)
  const measured = garment.needs.includes(problem.field) || garment.estimates.includes(problem.field)
  if (!style && !measured) return undefined
  const { min, max } = problem
  if (min === undefined && max === undefined) return undefined
  const now = style ? styleOf(order, garment, problem.field) : (order.measurements[problem.field] ?? NaN)
  if (typeof now !== 'number') return undefined
  const whole = style?.kind === 'count'
  const inside = whole ? 0 : 0.01
  let value = now
  if (min !== undefined && !(value >= min)) value = min + inside
  if (max !== undefined && !(value <= max)) value = max - inside
  if (value === now) return undefined
  // A bound beyond what may be chosen at all says that this field alone cannot help.
  if (style && (value < (style.min ?? -Infinity) || value > (style.max ?? Infinity))) return undefined
  return {
    order: style ? withStyle(order, problem.field, value) : withMeasurement(order, problem.field, value),
    value,
  }
}

/** What is asked is what is drawn: where it is not, a caution names the field. */
export const nothingClamped: DraftLaw = (draft, order, engine) => {
  const found = new Findings(10)
  const garment = garmentOf(order, engine.garments)
  const said = (...fields: readonly string[]): boolean =>
    draft.cautions.some((caution) => caution.fields.some((field) => fields.includes(field)))
  const tolerance = 1e-6 + (order.tape ?? 0) / 2
  const corrected = order.corrections?.some((one) => !one.off) ?? false
  for (const dimension of draft.dimensions) {
    found.atMost(
      dimension.id,
      'tag against the distance of its ends',
      Math.abs(far(dimension.from, dimension.to) - dimension.length),
      1e-6,
    )
    if (dimension.shows !== 'value' || !dimension.value) continue
    const style = garment.design.find((one) => one.id === dimension.value)
    const asked = styleOf(order, garment, dimension.value)
    if (!style || typeof asked !== 'number') found.add(dimension.id, `is no input for “${dimension.value}”`)
    // A corrected point stands where the correction put it, and its tag with it.
    else if (!corrected && !said(dimension.value)) {
      found.atMost(
        dimension.id,
        `is not the ${dimension.value} that was asked`,
        Math.abs(dimension.length - (dimension.over ?? 0) - asked),
        2 * tolerance,
      )
    }
  }
  if (order.tape) return found.all
  const number = (id: string): number => numberOf(id, order, garment, draft.used) ?? NaN
  const offered = (id: string): boolean =>
    garment.design.some((one) => one.id === id) && offers(order, garment, id)
  const bag = draft.pieces.find((one) => one.id === 'pocket-bag')
  if (bag && !said('pocketDepth')) {
    const depth = Math.max(...bag.marks.map((mark) => mark.at.y))
    found.atMost('pocket-bag', 'depth off what was asked', Math.abs(depth - number('pocketDepth')), 0.01)
  }
  const arm = draft.fits.find((fit) => fit.id === 'biceps')
  if (arm && offered('sleeveTaper') && !said('sleeveEase')) {
    found.atMost(
      'biceps',
      'girth off what was asked',
      Math.abs(arm.length - number('upperArm') - number('sleeveEase')),
      0.01,
    )
  }
  facingDepth(found, draft, number('facingDepth'), said('facingDepth'))
  depthOfArmhole(found, draft, order, garment, number)
  return found.all
}

/** A neck facing is as deep as was asked along the shoulder, which it leaves square. */
function facingDepth(found: Findings, draft: Draft, asked: number, said: boolean): void {
  const facing = draft.pieces.find((one) => one.id === 'front-neck-facing')
  if (!facing || said) return
  const shoulder = facing.edges.find((one) => one.id === 'shoulder')
  const neckline = facing.edges.find((one) => one.id === 'neckline')
  // A princess seam parts the shoulder in two.
  const whole = draft.pieces
    .filter((one) => one.id === 'front' || one.id === 'front-side')
    .flatMap((one) => one.edges.filter((edge) => edge.id.startsWith('shoulder')))
  if (!shoulder || !neckline || whole.length === 0) return
  // One facing for neck and armhole covers the whole shoulder.
  const long = whole.reduce((sum, edge) => sum + lengthOfPath(edge.path), 0)
  if (Math.abs(lengthOfPath(shoulder.path) - long) < 1e-6) return
  const away = headingAtStart(shoulder.path)
  if (Number.isFinite(away.x))
    found.atMost(
      'front-neck-facing',
      'shallower than was asked by',
      asked - 1 - lengthOfPath(shoulder.path),
      0,
    )
}

/** The armhole lies where its rules put it; deeper only with a caution. */
function depthOfArmhole(
  found: Findings,
  draft: Draft,
  order: DraftOrder,
  garment: GarmentDefinition,
  number: (id: string) => number,
): void {
  if (order.garment !== 'flared-dress' || order.corrections?.some((one) => !one.off)) return
  const underarm = draft.pieces
    .find((one) => one.id === 'front')
    ?.marks.find((mark) => mark.id === 'underarm')
  if (!underarm) return found.add('front', 'has no underarm')
  const bare = styleOf(order, garment, 'sleeve') === 'none'
  const level = number('armholeDepth') + number(bare ? 'armholeDrop' : 'sleevedLowering')
  const deeper = underarm.at.y - level
  const said = draft.cautions.some((caution) => caution.code === 'armhole-deepened')
  if (Math.abs(deeper) > 0.01 && !said)
    found.add('armhole', `lies ${deeper.toFixed(2)} mm below its rule and no caution says so`)
  if (deeper < -0.01) found.add('armhole', 'lies above its rule')
  if (Math.abs(underarm.at.x - number('quarterBust')) > 1e-6)
    found.add('underarm', 'is not a quarter of bust and ease from the centre')
}

/** Every measurement and style value beyond its range is refused by its name, with the range. */
export const outOfRange: OrderLaw = (order, engine) => {
  const found = new Findings(10)
  const garment = garmentOf(order, engine.garments)
  const refuses = (field: string, tried: DraftOrder): void => {
    const result = attempt(tried, engine)
    const named =
      result instanceof Error &&
      result.problems.some((one) => one.field === field && one.code === 'out-of-range')
    if (!named) found.add(field, 'is drafted beyond its range')
  }
  for (const value of garment.design) {
    if (!offers(order, garment, value.id)) continue
    if (value.min !== undefined) refuses(value.id, withStyle(order, value.id, value.min - 1))
    if (value.max !== undefined) refuses(value.id, withStyle(order, value.id, value.max + 1))
    if (value.kind === 'choice') refuses(value.id, withStyle(order, value.id, 'another'))
  }
  for (const id of [...garment.needs, ...garment.estimates]) {
    for (const mm of [1, 5000]) refuses(id, withMeasurement(order, id, mm))
  }
  return found.all
}
