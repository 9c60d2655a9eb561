import type { Point } from '../contract'
import { pathLength, rotate, towards, unit } from '../geometry'
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
    'frontHollowIn',
    'backHollowIn',
    'flareAngle',
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

/**
 * The same for a fitted bodice with a sleeve: its halves end at the underarm of the block, the front's swung up by the bust
 * dart. Close enough to the drawn armholes, which lean a little with their side seams.
 */
export function deepenFitted(pen: Pen): void {
  pen.find('armholeDeepening', 0, 0n)
  for (const side of ['back', 'front'] as const) {
    const out = Math.cos((pen.value(`${side}Slope`) * Math.PI) / 180) * pen.value(`${side}Shoulder`)
    pen.find(
      `${side}Tip`,
      pen.value(`${side}NeckWidth`) + out,
      pen.usesOf([`${side}Slope`, `${side}Shoulder`, `${side}NeckWidth`]),
    )
  }
  if (pen.chosen('sleeve') === 'none') return
  const down = { x: 0, y: 1 }
  const half = (neck: number, slope: number, long: number, across: number, underarm: Point): number => {
    const shoulder = towards(slope)
    const tip = { x: neck + shoulder.x * long, y: shoulder.y * long }
    return pathLength(armholeCurve(tip, { x: across, y: (tip.y + underarm.y) / 2 }, underarm, shoulder, down))
  }
  const levels = { back: pen.value('scyeLine') + pen.value('napeDepth'), front: pen.value('frontScye') }
  const bust = { x: pen.value('bustPointOut'), y: pen.value('bustHeight') }
  const spare = (more: number): number => {
    const swung = rotate(
      { x: pen.value('frontQuarter'), y: levels.front + more },
      -pen.value('bustDartAngle'),
      bust,
    )
    return (
      half(
        pen.value('backNeckWidth'),
        pen.value('backSlope'),
        pen.value('backShoulder'),
        pen.value('backHalf'),
        {
          x: pen.value('backQuarter'),
          y: levels.back + more,
        },
      ) +
      half(
        pen.value('frontNeckWidth'),
        pen.value('frontSlope'),
        pen.value('frontShoulder'),
        pen.value('frontHalf'),
        swung,
      ) -
      pen.value('leastArmhole') -
      6
    )
  }
  if (spare(0) >= 0) return
  const more = solveBetween(spare, 0, deepest, 1e-7)
  if (more === undefined) {
    pen.refuse({
      field: 'upperArm',
      code: 'impossible-shape',
      message:
        'The arm is too large for an armhole on this body. Check the upper arm and the bust, or leave the sleeve out.',
    })
  }
  const uses = [
    'leastArmhole',
    'frontScye',
    'backQuarter',
    'frontQuarter',
    'backHalf',
    'frontHalf',
    'bustDartAngle',
    'bustPointOut',
    'bustHeight',
    'backSlope',
    'frontSlope',
    'backShoulder',
    'frontShoulder',
  ]
  pen.refind('armholeDeepening', pen.tape ? Math.ceil(more / pen.tape) * pen.tape : more, pen.usesOf(uses))
  pen.caution(
    'armhole-deepened',
    `The armhole is ${pen.say(more)} deeper than its rule, so that there is room for the arm.`,
    'upperArm',
    'sleeveEase',
  )
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
