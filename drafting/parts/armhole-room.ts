import type { Point } from '../contract'
import { pathLength, rotate, towards, unit } from '../geometry'
import { nothing } from '../pen/masks'
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
    half(level + more, 'frontHollowIn') + half(level + more, 'backHollowIn') - wanted
  checkShoulder(pen, tip, across, neck)
  const uses = pen.usesOf([
    rule,
    lowering,
    'neckWidth',
    'halfShoulder',
    'shoulderSlope',
    'armholeDepth',
    'quarterBust',
    'frontHollowIn',
    'backHollowIn',
    'flareAngle',
  ])
  // What makes it deep enough counts as well when nothing need be added.
  if (spare(0) >= 0) {
    pen.find('armholeDeepening', 0, uses)
    return
  }
  const more = solveBetween(spare, 0, deepest, 1e-7)
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

/**
 * The same for a fitted bodice with a sleeve: its halves end at the underarm of the block, the front's swung up by the bust
 * dart. Close enough to the drawn armholes, which lean a little with their side seams.
 */
export function deepenFitted(pen: Pen): void {
  for (const side of ['back', 'front'] as const) {
    const tip = pen.follow(() => {
      const out = Math.cos((pen.value(`${side}Slope`) * Math.PI) / 180) * pen.value(`${side}Shoulder`)
      return pen.value(`${side}NeckWidth`) + out
    })
    pen.find(`${side}Tip`, tip.made, tip.uses)
  }
  if (pen.chosen('sleeve') === 'none') {
    pen.find('armholeDeepening', 0, nothing)
    return
  }
  const { made: more, uses } = pen.follow(() => fittedDeepening(pen))
  if (more === undefined) {
    pen.refuse({
      field: 'upperArm',
      code: 'impossible-shape',
      message:
        'The arm is too large for an armhole on this body. Check the upper arm and the bust, or leave the sleeve out.',
    })
  }
  pen.find('armholeDeepening', pen.tape ? Math.ceil(more / pen.tape) * pen.tape : more, uses)
  if (more === 0) return
  pen.caution(
    'armhole-deepened',
    `The armhole is ${pen.say(more)} deeper than its rule, so that there is room for the arm.`,
    'upperArm',
    'sleeveEase',
  )
}

/** How much deeper than by rule both halves must be, mm; undefined when no depth would do. */
function fittedDeepening(pen: Pen): number | undefined {
  const down = { x: 0, y: 1 }
  const half = (side: 'front' | 'back', underarm: Point): number => {
    const shoulder = towards(pen.value(`${side}Slope`))
    const long = pen.value(`${side}Shoulder`)
    const tip = { x: pen.value(`${side}NeckWidth`) + shoulder.x * long, y: shoulder.y * long }
    const hollow = { x: pen.value(`${side}Half`), y: (tip.y + underarm.y) / 2 }
    return pathLength(armholeCurve(tip, hollow, underarm, shoulder, down))
  }
  const bust = { x: pen.value('bustPointOut'), y: pen.value('bustHeight') }
  const level = pen.value('scyeLine') + pen.value('napeDepth')
  const wanted = pen.value('leastArmhole') + 12
  const spare = (more: number): number => {
    const closed = { x: pen.value('frontQuarter'), y: pen.value('frontScye') + more }
    const front = half('front', rotate(closed, -pen.value('bustDartAngle'), bust))
    return front + half('back', { x: pen.value('backQuarter'), y: level + more }) - wanted
  }
  return spare(0) >= 0 ? 0 : solveBetween(spare, 0, deepest, 1e-7)
}

/** The shoulders must be wider than the neck and not much wider than the quarter, or the armhole would turn outwards. */
function checkShoulder(pen: Pen, tip: Point, across: number, neck: Point): void {
  if (tip.x - neck.x < 40) {
    pen.refuse({
      field: 'acrossShoulders',
      code: 'impossible-shape',
      message: `The shoulders are hardly wider than the neck. Measure across the shoulders again: at least ${pen.say(2 * neck.x + 80)} would do.`,
      min: 2 * neck.x + 80,
    })
  }
  const beyond = tip.x - across
  if (beyond > 35) {
    pen.refuse({
      field: 'acrossShoulders',
      code: 'impossible-shape',
      message: `The shoulders are too wide for this bust: the armhole would turn outwards. Give at least ${pen.say(pen.value('bustEase') + 4 * (beyond - 35))} bust ease, or measure across the shoulders again.`,
      max: 2 * (across + 35),
    })
  }
  if (
    pen.value('backHollowIn') > pen.value('backHollow') ||
    pen.value('frontHollowIn') > pen.value('frontHollow')
  ) {
    pen.caution(
      'hollow-deepened',
      'The shoulders are wide for this bust, so the armhole is hollowed more than the style says to end inside the underarm. Check the measurement across the shoulders, or give more bust ease.',
      'acrossShoulders',
      'bustEase',
    )
  }
}
