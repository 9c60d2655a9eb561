import type { Point } from '../contract'
import { pathLength, unit } from '../geometry'
import type { Pen } from '../pen/pen'
import { solveBetween } from '../pen/solve'
import { armholeCurve } from './armhole'

/** How much deeper than its rule an armhole may be made for a large arm, mm. */
const deepest = 160

/**
 * Finds how much the armhole must be deepened so that the arm, or the sleeve round it, has room. It stays 0 for most bodies;
 * a deepening is said in a caution. Measured on the halves as the rules draw them, before any correction.
 */
export function deepenArmhole(pen: Pen, side: Point): void {
  const sleeved = pen.chosen('sleeve') !== 'none'
  const rule = sleeved ? 'leastArmhole' : 'leastBareArmhole'
  const lowering = sleeved ? 'sleevedLowering' : 'armholeDrop'
  const wanted = pen.value(rule)
  const neck = { x: pen.length('neckWidth'), y: 0 }
  const tip = { x: pen.length('halfShoulder'), y: pen.length('shoulderSlope') }
  const shoulder = unit({ x: tip.x - neck.x, y: tip.y })
  const level = pen.length('armholeDepth') + pen.length(lowering)
  const across = pen.length('quarterBust')
  const half = (depth: number, hollow: string): number => {
    const underarm = { x: across, y: depth }
    const middle = { x: tip.x - pen.length(hollow), y: (tip.y + depth) / 2 }
    return pathLength(armholeCurve(tip, middle, underarm, shoulder, side))
  }
  const spare = (more: number): number =>
    half(level + more, 'frontHollow') + half(level + more, 'backHollow') - wanted
  checkShoulder(pen, tip, across, neck)
  if (spare(0) >= 0) {
    pen.find('armholeDeepening', 0, 0n)
    return
  }
  const more = solveBetween(spare, 0, deepest, 1e-7)
  const uses = pen.usesOf([
    rule,
    lowering,
    'neckWidth',
    'halfShoulder',
    'shoulderSlope',
    'armholeDepth',
    'quarterBust',
  ])
  if (more === undefined) {
    pen.refuse({
      field: 'upperArm',
      code: 'impossible-shape',
      message: `The arm is too large for an armhole on this body: it would have to be more than ${pen.say(deepest)} deeper than its rule. Check the upper arm and the bust.`,
    })
  }
  pen.find('armholeDeepening', pen.tape ? Math.ceil(more / pen.tape) * pen.tape : more, uses)
  pen.caution(
    'armhole-deepened',
    `The armhole is ${pen.say(more)} deeper than its rule, so that there is room for the arm.`,
    'upperArm',
    'armholeDrop',
  )
}

/** The hollow must lie inside the quarter, and the shoulder must not reach past it, or the armhole would turn outwards. */
function checkShoulder(pen: Pen, tip: Point, across: number, neck: Point): void {
  if (tip.x - neck.x < 40) {
    pen.refuse({
      field: 'acrossShoulders',
      code: 'impossible-shape',
      message: `The shoulders are hardly wider than the neck. Measure across the shoulders again: at least ${pen.say(2 * neck.x + 80)} would do.`,
      min: 2 * neck.x + 80,
    })
  }
  const inside = tip.x - pen.length('backHollow')
  if (across - inside < 15) {
    pen.refuse({
      field: 'acrossShoulders',
      code: 'impossible-shape',
      message: `The shoulders are too wide for this bust: the armhole would turn outwards. Give more bust ease, or measure across the shoulders again.`,
      max: 2 * (across - 15 + pen.length('backHollow')),
    })
  }
}
