import { both, either, line, more, share, upTo, type Bounds } from './bounds'

/** What is usual of one measurement against others. Outside it a measurement is possible but odd. */
export interface Relation {
  /** 'neckBase-for-bust': the caution's code. */
  readonly id: string
  readonly judged: string
  /** The measurements it is judged by; none for a usual range of its own. */
  readonly by: readonly string[]
  readonly bounds: Bounds
  readonly source: string
}

function relation(judged: string, by: readonly string[], bounds: Bounds, source: string): Relation {
  return { id: by.length === 0 ? judged : `${judged}-for-${by.join('-and-')}`, judged, by, bounds, source }
}

const ansur = 'ANSUR II, 1,986 women, 2012: within 3 standard deviations of the regression'
const d5585 = 'ASTM D5585-11e1 girths, widened'
const practice = 'common practice, no published source'
/** cm: the largest bust in ANSUR II. Its ratios say nothing beyond. */
const largestBust = 126.6

const girths: readonly Relation[] = [
  relation('neckBase', ['bust'], line(22.332, 0.1561, 4.5), ansur),
  relation('upperBust', ['bust'], more(-20, 2), d5585),
  relation('underBust', ['bust'], more(-30, -8), d5585),
  // A natural waist: the surveys took theirs at the navel, 9–12 cm larger, so only these wide shares hold.
  relation('waist', ['bust'], share(0.62, 1.15), 'ANSUR II and ASTM D5585-11e1 together, widened'),
  relation('hip', ['bust'], both(share(0.84, 1.33), line(37.573, 0.6818, 15.3)), ansur),
  relation(
    'hip',
    ['waist'],
    more(-6, 37),
    'NHANES 2017–2020, ANSUR II and a Spanish sample, 1st to 99th percentiles',
  ),
  relation(
    'highHip',
    ['waist', 'hip'],
    (waist = 0, hip = 0) => [Math.min(waist, hip) - 10, Math.max(waist, hip) + 10],
    practice,
  ),
  relation('armscye', ['bust'], upTo(largestBust, share(0.4, 0.52)), practice),
  relation('upperArm', ['hip'], line(-1.3, 0.312, 8.3), 'NHANES 2017–2020, women from 18'),
  // The survey's arm was flexed, which adds about 1.5 cm.
  relation('upperArm', ['bust'], line(4.28, 0.2775, 6.2 + 1.5, 6.2), ansur),
  relation('wrist', ['upperArm'], either(share(0.38, 0.64), line(10.809, 0.1528, 1.9)), ansur),
  relation('hand', ['wrist'], more(1, 6), practice),
  relation('elbow', ['wrist', 'upperArm'], (wrist = 0, upperArm = 0) => [wrist, upperArm + 40], practice),
  relation('head', ['height'], line(40.666, 0.0948, 5.6), ansur),
]

const widths: readonly Relation[] = [
  relation(
    'acrossShoulders',
    ['shoulderLength'],
    (shoulder = 0) => [2 * shoulder + 90, 2 * shoulder + 185],
    practice,
  ),
  // The survey's arms were held forward, which widens the back by some 3.5 cm: its least share of 0.33 is 0.3 here.
  relation(
    'acrossBack',
    ['bust'],
    both(upTo(largestBust, share(0.3, 0.52)), line(24.804, 0.156, 6.7 + 3.5, 6.7)),
    ansur,
  ),
  relation('acrossFront', ['acrossBack'], more(-4, 1), practice),
  relation('bustSpan', ['bust'], share(0.17, 0.25), practice),
]

const lengths: readonly Relation[] = [
  relation('shoulderLength', ['height'], both(share(0.0655, 0.106), line(3.229, 0.0633, 2.9)), ansur),
  // To the navel in the survey; a natural waist lies 2–5 cm higher.
  relation('napeToWaist', ['height'], line(8.823, 0.207, 6.9 + 5, 6.9 - 2), ansur),
  // 0–10 cm longer than the back counted from the side neck, which lies 1.7–2.5 cm above the nape.
  relation('frontWaistLength', ['napeToWaist'], more(0.7, 12.5), practice),
  relation('centreFrontToWaist', ['napeToWaist'], more(-14, 0), 'ANSUR II, 1,986 women, 2012'),
  relation('bustHeight', ['frontWaistLength'], more(-22, -10), practice),
  relation(
    'scyeDepth',
    ['bust'],
    (bust = 0) => [153, Math.max(249, bust / 8 + 93)],
    'ANSUR II nape to armpit, and the 3–6 cm a garment adds',
  ),
  relation('armLength', ['height'], both(share(0.284, 0.37), line(-4.955, 0.3642, 5.4)), ansur),
  relation('shoulderToElbow', ['armLength'], line(1.951, 0.5366, 2.1), ansur),
  relation('waistToHip', [], () => [146, 305], 'ANSUR II, tenth rib to hip level'),
  relation('waistToKnee', ['height'], share(0.33, 0.38), practice),
  // To the navel in the survey; a natural waist lies up to 6 cm higher.
  relation(
    'waistToFloor',
    ['height'],
    (height = 0) => [0.552 * height, 0.651 * height + 60],
    'ANSUR II, 1,986 women, 2012',
  ),
  relation('napeToFloor', ['height'], both(share(0.835, 0.88), line(-9.041, 0.9126, 3.2)), ansur),
]

/** Everything measurements are judged by, each once. */
export const relations: readonly Relation[] = [...girths, ...widths, ...lengths]
