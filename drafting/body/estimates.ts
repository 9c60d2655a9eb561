import type { Card } from './card'
import { sumAsFormula, sumOn, type LinearSum } from './linear-sum'
import { measurementById } from './measurements'

/** A named rule that stands in for a measurement nobody took. */
export interface Estimate {
  /** 'neckBase-from-bust' */
  readonly id: string
  /** The measurement it stands in for. */
  readonly measurement: string
  /** 'Neck base from bust' */
  readonly name: string
  readonly source: string
  readonly uses: readonly string[]
  /** In words a formula is written in: 'bust × 0.1561 + 22.332 cm'. */
  readonly formula: string
  /**
   * mm, kept within the range in which the measurement is accepted.
   * @param card must hold every measurement in `uses`; NaN otherwise
   */
  readonly estimate: (card: Card) => number
}

function listed(ids: readonly string[]): string {
  return ids.map((id) => measurementById(id)?.name.toLowerCase() ?? id).join(' and ')
}

function estimate(measurement: string, sum: LinearSum, source: string): Estimate {
  const uses = Object.keys(sum.times)
  const { name = measurement, min = 0, max = Infinity } = measurementById(measurement) ?? {}
  return {
    id: uses.length === 0 ? `${measurement}-usual` : `${measurement}-from-${uses.join('-and-')}`,
    measurement,
    name: uses.length === 0 ? `Usual ${name.toLowerCase()}` : `${name} from ${listed(uses)}`,
    source,
    uses,
    formula: sumAsFormula(sum),
    estimate: (card) => Math.min(Math.max(sumOn(card, sum) ?? NaN, min), max),
  }
}

const ansur = 'ANSUR II, 1,986 women, 2012, regression'
const practice = 'common practice, no published source'
const memory = 'from memory'
const d5585 = 'fitted to the girths of ASTM D5585-11e1, within 2 cm of every size'

const girths: readonly Estimate[] = [
  estimate('neckBase', { start: 22.332, times: { bust: 0.1561 } }, ansur),
  estimate('upperBust', { start: 10.8, times: { bust: 0.87 } }, d5585),
  estimate('underBust', { start: -8, times: { bust: 0.92 } }, d5585),
  estimate('waist', { start: -16, times: { bust: 1 } }, 'EN 13402-3 women, from memory'),
  estimate('hip', { start: 37.573, times: { bust: 0.6818 } }, ansur),
  estimate('highHip', { start: 0, times: { waist: 0.4, hip: 0.6 } }, practice),
  estimate('upperArm', { start: -1.3, times: { hip: 0.312 } }, 'NHANES 2017–2020, women from 18, regression'),
  estimate(
    'wrist',
    { start: 10.962, times: { upperArm: 0.1528 } },
    `${ansur}; the survey's flexed arm taken as 1 cm more`,
  ),
  estimate('hand', { start: 3, times: { wrist: 1 } }, practice),
  estimate('elbow', { start: 4, times: { upperArm: 0.5, wrist: 0.5 } }, memory),
  estimate('head', { start: 40.666, times: { height: 0.0948 } }, ansur),
]

const widths: readonly Estimate[] = [
  estimate('acrossShoulders', { start: 0, times: { shoulderLength: 2, neckBase: 0.385 } }, practice),
  estimate(
    'acrossBack',
    { start: 21.304, times: { bust: 0.156 } },
    `${ansur}, less 3.5 cm for arms held forward`,
  ),
  estimate('acrossFront', { start: -2.5, times: { acrossBack: 1 } }, practice),
  estimate('bustSpan', { start: 5.2, times: { bust: 0.15 } }, practice),
]

const lengths: readonly Estimate[] = [
  estimate('height', { start: 162.9, times: {} }, 'ANSUR II, 1,986 women, 2012, mean'),
  estimate('shoulderLength', { start: 3.229, times: { height: 0.0633 } }, ansur),
  estimate(
    'napeToWaist',
    { start: 5.323, times: { height: 0.207 } },
    `${ansur}, less 3.5 cm from navel to natural waist`,
  ),
  estimate('frontWaistLength', { start: -5.9, times: { napeToWaist: 1, bust: 0.1 } }, practice),
  estimate('centreFrontToWaist', { start: -0.2, times: { frontWaistLength: 1, neckBase: -0.2 } }, practice),
  estimate('bustHeight', { start: 11.2, times: { bust: 1 / 6 } }, practice),
  estimate(
    'scyeDepth',
    { start: 7.3, times: { bust: 1 / 8 } },
    `${practice}: bust / 8 + 9.5 cm from the side neck, less the 2.2 cm to the nape`,
  ),
  estimate('armLength', { start: -4.955, times: { height: 0.3642 } }, ansur),
  estimate('shoulderToElbow', { start: 1.951, times: { armLength: 0.5366 } }, ansur),
  estimate('waistToHip', { start: 0, times: { height: 0.125 } }, memory),
  estimate('waistToKnee', { start: 0, times: { height: 0.355 } }, practice),
  estimate(
    'waistToFloor',
    { start: -12.809, times: { height: 0.7082 } },
    `${ansur}, and 4.5 cm from navel to natural waist`,
  ),
  estimate('napeToFloor', { start: -9.041, times: { height: 0.9126 } }, ansur),
]

/**
 * The estimate of each measurement that can stand in for a missing one, by measurement id. The bust is always measured, and
 * the armscye is never estimated: it is there to check an armhole that was itself drafted from the bust.
 */
export const estimates: Readonly<Record<string, Estimate>> = Object.fromEntries(
  [...girths, ...widths, ...lengths].map((one) => [one.measurement, one]),
)
