import { nothing } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { solveBetween } from '../../pen/solve'
import { kimonoLayout, type KimonoLayout } from './layout'

/** Whether a style has a gusset: a sleeve on a slope binds when the arm is lifted. Common practice, no published source. */
export function hasGusset(pen: Pen): boolean {
  const asked = pen.chosen('gusset')
  return asked === 'always' || (asked === 'when it binds' && pen.value('overarmSlope') > 15)
}

/** How far from the corner under the arm the rounding or the gusset reaches. */
export const cornerReach = (pen: Pen): string => (hasGusset(pen) ? 'gussetSide' : 'underarmRound')

/**
 * The steepest that the underside of a sleeve may fall away from the body, degrees: steeper, the allowances overlap, and
 * there would be no room to sew a gusset in.
 *
 * @param drop from the underarm down to the hem, mm.
 */
export function steepestSleeve(pen: Pen, drop: number): number {
  return 90 - 50 - (Math.atan2(pen.value('sideFlare'), drop) * 180) / Math.PI
}

/** What the place of sleeve and underarm follows from. */
export const kimonoNames: readonly string[] = [
  'neckWidth',
  'halfShoulder',
  'overarmSlope',
  'armLength',
  'sleeveReach',
  'mouthWidth',
  'kimonoQuarter',
  'armholeDepth',
  'underarmLower',
  'kimonoBiceps',
  'gussetSide',
  'underarmRound',
  'sideFlare',
  'length',
]

/**
 * Finds how much longer the sleeve must be to clear the body, and how much deeper the underarm to leave room for the arm.
 * Both are nothing for most; what is not is said.
 */
export function makeRoom(pen: Pen): void {
  const slope = pen.value('overarmSlope')
  const wide = pen.value('halfShoulder') - pen.value('neckWidth')
  const uses = pen.usesOf(['halfShoulder', 'neckWidth', 'overarmSlope'])
  pen.find('shoulderAlong', wide / Math.cos((slope * Math.PI) / 180), uses)
  const along = pen.value('shoulderAlong')
  const asked = pen.value('armLength') * pen.value('sleeveReach')
  const level = pen.value('armholeDepth') + pen.value('underarmLower')
  const at = (longer: number, deeper: number): KimonoLayout =>
    kimonoLayout({
      neckWidth: pen.value('neckWidth'),
      slope,
      overarm: along + asked + longer,
      mouth: pen.value('mouthWidth'),
      quarter: pen.value('kimonoQuarter'),
      underarm: level + deeper,
      corner: pen.value(cornerReach(pen)),
      steepest: steepestSleeve(pen, Math.max(300, pen.value('length') - level - deeper)),
    })
  const longerFor = (deeper: number): number =>
    at(0, deeper).clear >= 0 ? 0 : (solveBetween((more) => at(more, deeper).clear, 0, 1500, 1e-7) ?? 1500)
  const spare = (deeper: number): number =>
    at(longerFor(deeper), deeper).girth - pen.value('kimonoBiceps') - 2 * (pen.tape ?? 0)
  const deeper = spare(0) >= 0 ? 0 : solveBetween(spare, 0, 400, 1e-7)
  if (deeper === undefined) {
    pen.refuse({
      field: 'kimonoEase',
      code: 'impossible-shape',
      message: 'The sleeve cannot be made wide enough for this arm. Give it less ease, or a wider opening.',
      max: Math.max(0, pen.value('kimonoEase') + spare(400)),
    })
  }
  const longer = longerFor(deeper)
  const names = pen.usesOf(kimonoNames)
  pen.find('underarmDeepening', deeper, deeper > 0 ? names : nothing)
  pen.find('sleeveLengthening', longer, longer > 0 ? names : nothing)
  if (deeper > 0.05) {
    pen.caution(
      'underarm-deepened',
      `The underarm is ${pen.say(deeper)} lower than its rule, so that there is room for the arm.`,
      'upperArm',
      'underarmLower',
    )
  }
  if (longer > 0.05) {
    pen.caution(
      'sleeve-lengthened',
      `So short a sleeve would end inside the body; it is drawn ${pen.say(longer)} longer.`,
      'sleeveReach',
    )
  }
}
