import fc from 'fast-check'
import {
  completeCard,
  estimates,
  measurementById,
  relations,
  reviewMeasurements,
  sizeTables,
  type Card,
} from '@/drafting/body'

/** Two invented bodies, mm: an average one and a full one. Check figures of the trade are given for these. */
export const sanityBodies = {
  one: {
    bust: 920,
    waist: 740,
    hip: 980,
    neckBase: 370,
    shoulderLength: 125,
    acrossShoulders: 390,
    acrossBack: 350,
    acrossFront: 325,
    napeToWaist: 405,
    frontWaistLength: 438,
    bustHeight: 265,
    bustSpan: 190,
    upperArm: 285,
    armLength: 580,
    waistToHip: 205,
  },
  two: {
    bust: 1220,
    waist: 1080,
    hip: 1280,
    neckBase: 415,
    shoulderLength: 132,
    acrossShoulders: 425,
    acrossBack: 410,
    acrossFront: 385,
    napeToWaist: 420,
    frontWaistLength: 485,
    bustHeight: 315,
    bustSpan: 245,
    upperArm: 385,
    armLength: 585,
    waistToHip: 210,
  },
} as const satisfies Record<string, Card>

export interface NamedBody {
  readonly name: string
  readonly card: Card
}

/** Every published size, filled in by the named estimates. */
export const sizeBodies: readonly NamedBody[] = sizeTables
  .flatMap(({ sizes }) => sizes)
  .map(({ id, card }) => ({ name: id, card: completeCard(card).card }))

function built(name: string, card: Card): NamedBody {
  return { name, card: completeCard(card).card }
}

/**
 * Bodies at the edges of what plausible cards hold, mm: heights and busts from the ends of ANSUR II, the smallest and largest
 * published sizes, and shapes on which a draft most easily fails.
 */
export const extremeBodies: readonly NamedBody[] = [
  built('short and slight', { height: 1410, bust: 700, waist: 540, hip: 800 }),
  built('short and full', { height: 1480, bust: 1260, waist: 1160, hip: 1290 }),
  built('tall and slight', { height: 1829, bust: 800, waist: 640, hip: 890, shoulderLength: 135 }),
  built('tall and full', { height: 1829, bust: 1266, waist: 1120, hip: 1300 }),
  built('full hips', { height: 1630, bust: 820, waist: 680, hip: 1040 }),
  built('full waist', { height: 1600, bust: 1080, waist: 1180, hip: 1130 }),
  built('narrow shoulders', { height: 1600, bust: 1000, waist: 820, hip: 1060, shoulderLength: 108 }),
  built('broad shoulders', { height: 1720, bust: 900, waist: 740, hip: 960, shoulderLength: 160 }),
  built('large arms', { height: 1620, bust: 1000, waist: 860, hip: 1060, upperArm: 380 }),
  built('slight arms', { height: 1680, bust: 940, waist: 780, hip: 980, upperArm: 232 }),
  built('long back', { height: 1700, bust: 920, waist: 740, hip: 980, napeToWaist: 445 }),
  built('short back', { height: 1580, bust: 900, waist: 740, hip: 980, napeToWaist: 342 }),
  built('thick neck', { height: 1650, bust: 1000, waist: 850, hip: 1060, neckBase: 420 }),
  built('slender neck', { height: 1650, bust: 900, waist: 720, hip: 960, neckBase: 325 }),
  ...sizeBodies.filter(({ name }) => /-(?:00-curvy|20-straight|3ar|76|152)$/.test(name)),
]

/**
 * How much bodies differ from the estimate of each measurement, mm (standard deviation). From the regressions of ANSUR II where it has
 * the measurement, otherwise about a third of the usual range. In an order in which each is drawn after those it depends on.
 */
const spread: readonly (readonly [id: string, deviation: number])[] = [
  ['waist', 45],
  ['hip', 50.8],
  ['highHip', 12],
  ['neckBase', 14.8],
  ['upperBust', 20],
  ['underBust', 20],
  ['shoulderLength', 9.4],
  ['acrossShoulders', 10],
  ['acrossBack', 22.2],
  ['acrossFront', 7],
  ['napeToWaist', 20],
  ['frontWaistLength', 14],
  ['centreFrontToWaist', 14],
  ['bustHeight', 10],
  ['bustSpan', 9],
  ['scyeDepth', 8],
  ['upperArm', 17.4],
  ['wrist', 6.3],
  ['hand', 5],
  ['elbow', 8],
  ['armLength', 17.9],
  ['shoulderToElbow', 6.7],
  ['waistToHip', 14],
  ['waistToKnee', 12],
  ['waistToFloor', 20],
  ['napeToFloor', 10.5],
  ['head', 18.4],
]

/** Three throws between −1 and 1: their sum is nearly normal with deviation 1, never beyond 3, and shrinks to the average. */
const throws = fc.tuple(...[1, 2, 3].map(() => fc.integer({ min: -100, max: 100 })))
const deviations = throws.map((three) => three.reduce((sum, one) => sum + one, 0) / 100)

function usual(id: string, card: Card): readonly [number, number] {
  const { min = 0, max = Infinity } = measurementById(id) ?? {}
  return relations
    .filter(({ judged, by }) => judged === id && by.every((other) => other in card))
    .map(({ by, bounds }) => bounds(...by.map((other) => card[other] ?? 0)))
    .reduce(([low, high], [a, b]) => [Math.max(low, a), Math.min(high, b)], [min, max])
}

function within(value: number, [low, high]: readonly [number, number]): number {
  return Math.min(Math.max(value, low), high)
}

function grow(height: number, bust: number, turns: readonly number[]): Card {
  const card: Record<string, number> = {
    height: within(1628.5 + 64.2 * height, [1350, 1950]),
    bust: within(946.9 + 82.7 * bust, [680, 1650]),
  }
  spread.forEach(([id, deviation], at) => {
    const centre = estimates[id]?.estimate(card) ?? NaN
    card[id] = within(centre + deviation * (turns[at] ?? 0), usual(id, card))
  })
  return card
}

/** Full cards of random bodies, mm, correlated as bodies are, within 3 deviations, on which the review finds nothing odd. */
export function plausibleBody(): fc.Arbitrary<Card> {
  const turns = fc.tuple(...spread.map(() => deviations))
  return fc
    .tuple(deviations, deviations, turns)
    .map(([height, bust, all]) => grow(height, bust, all))
    .filter((card) => reviewMeasurements(card).length === 0)
}
