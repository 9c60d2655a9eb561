import type { DesignValue, RuleDefinition } from '../../contract'
import { choice, length } from '../../pen/design'
import { lengthRule, type Garment } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import type { Armhole } from './armhole'
import { bell } from './bell'
import { bishop } from './bishop'
import { cap } from './cap'
import { flared } from './flared'
import { plain } from './plain'
import { puff } from './puff'
import { short } from './short'
import type { Sleeve } from './sleeve-kind'
import { threeQuarter } from './three-quarter'

export { wholeArmhole, type Armhole } from './armhole'

/** The sleeves by their names in the style. */
const sleeves = {
  plain,
  short,
  'three-quarter': threeQuarter,
  flared,
  bell,
  puff,
  bishop,
  cap,
} satisfies Readonly<Record<string, Sleeve>>

type Name = keyof typeof sleeves

/** Every sleeve that is set into an armhole. */
export const allSleeves = Object.keys(sleeves) as readonly Name[]

/** Measurements that sleeves follow from, beside what the armhole needs; all can be estimated. */
export const sleeveEstimates: readonly string[] = ['upperArm', 'armLength', 'wrist']

/** What drawing a sleeve finds. */
export const sleeveFound: Garment['found'] = {
  headHeight: 'length',
  frontGirth: 'length',
  backGirth: 'length',
  underarmLength: 'length',
  taperMost: 'length',
  capBelow: 'length',
  capBinding: 'length',
}

/** What may stand among the sleeves of a garment: one that is set in, none, or one in one with the body. */
type Choice = Name | 'none' | 'kimono'

const isSetIn = (name: Choice): name is Name => name !== 'none' && name !== 'kimono'

/**
 * The choice of a sleeve and the style values of each that is set in.
 *
 * @param names those that the garment offers, the default first; 'none' leaves the armhole bare, and a 'kimono' is
 *   drawn by the garment with its body.
 */
export function sleeveDesign(...names: readonly [Choice, ...Choice[]]): DesignValue[] {
  const worn = names.filter(isSetIn)
  const is = (...some: readonly Name[]) => ({ id: 'sleeve', is: some.filter((name) => worn.includes(name)) })
  const all = is(...worn)
  const turnedUp = is(...worn.filter((name) => sleeves[name].turnedUp))
  const free = is('plain', 'flared')
  return [
    choice('sleeve', 'Sleeve', 'sleeve', [...names] as [string, ...string[]]),
    length('sleeveLength', 'Sleeve length', 'sleeve', { default: 350, min: 250, max: 700 }, free),
    length('sleeveEase', 'Ease round the arm', 'sleeve', { default: 50, min: 40, max: 120 }, all),
    length('sleeveHeadEase', 'Ease of the sleeve head', 'sleeve', { default: 10, min: 0, max: 40 }, all),
    ...worn.flatMap((name) => sleeves[name].design),
    length('sleeveAllowance', 'Sleeve seam allowance', 'allowances', { default: 12.7, min: 0, max: 40 }, all),
    length('sleeveHemAllowance', 'Sleeve hem', 'allowances', { default: 20, min: 0, max: 50 }, turnedUp),
  ]
}

/**
 * The rules of the sleeves that a garment offers. Common practice, no published source, but the level of the elbow, which
 * is from memory.
 */
export function sleeveRules(...names: readonly Choice[]): RuleDefinition[] {
  return [
    lengthRule('biceps', 'Sleeve girth at the underarm', 'upperArm + sleeveEase'),
    lengthRule('leastArmhole', 'Least armhole for the arm', '(upperArm + sleeveEase) * 1.1'),
    lengthRule('frontHeadEase', 'Ease in the front of the head', 'sleeveHeadEase * 0.45'),
    lengthRule('backHeadEase', 'Ease in the back of the head', 'sleeveHeadEase * 0.55'),
    lengthRule('elbowLevel', 'Elbow below the crown', 'armLength / 2 + 2.5cm', 'from memory'),
    ...names.filter(isSetIn).flatMap((name) => sleeves[name].rules),
  ]
}

/**
 * Draws the sleeve of the style into a front and a back armhole.
 *
 * @returns whether the armholes stay bare because the style has no sleeve.
 */
export function sleeveInto(pen: Pen, front: Armhole, back: Armhole): { readonly bare: boolean } {
  const name = pen.chosen('sleeve')
  if (name === 'none') return { bare: true }
  const sleeve: Sleeve | undefined = sleeves[name as Name]
  if (!sleeve) throw new Error('Every sleeve offered has its kind.')
  sleeve.draw(pen, front, back)
  return { bare: false }
}
