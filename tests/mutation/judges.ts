import type { Correction, DraftOrder, MeasurementDefinition } from '@/drafting/contract'
import { sanityBodies, sizeBodies } from '../support/bodies'
import { draftLaws, orderLaws } from '../support/laws/all'
import { honestNeeds, idleNeeds } from '../support/laws/law-15-honest-needs'
import { tellingStyles } from '../support/laws/orders'
import { drafted } from '../support/laws/redraft'
import type { Engine, Violation } from '../support/laws/violation'

export type MeasuringEngine = Engine & { readonly measurements: readonly MeasurementDefinition[] }

const { one, two } = sanityBodies
const small = sizeBodies[0]?.card ?? one
const dress = (measurements: DraftOrder['measurements'], design: DraftOrder['design'] = {}): DraftOrder => ({
  garment: 'flared-dress',
  measurements,
  design,
})
const skirt = (design: DraftOrder['design'], measurements: DraftOrder['measurements'] = one): DraftOrder => ({
  garment: 'circle-skirt',
  measurements,
  design,
})

/** Few orders that between them draw everything there is to draw. */
const orders: readonly DraftOrder[] = [
  dress(one),
  { ...dress(two, { length: 1130, sleeveTaper: 10 }), unit: 'in' },
  dress(
    { ...one, upperArm: 390 },
    { sleeve: 'none', backOpening: 'none', neckShape: 'V', frontNeckDrop: 40 },
  ),
  dress(small, { sleeve: 'flared', sleeveLength: 420, neckShape: 'boat', pockets: false }),
  dress(one, { backOpening: 'none', hemWay: 'swung' }),
  dress({ ...one, upperArm: 380 }),
  dress(small, {
    flare: 0.5,
    armholeDrop: 80,
    armholeAllowance: 15,
    frontHollow: 12,
    bustEase: 40,
    sleeve: 'none',
  }),
  dress(two, { backOpening: 'button band', collar: 'shirt' }),
  dress(one, { collar: 'Peter Pan' }),
  dress(one, {
    collar: 'mandarin',
    standHeight: 50,
    standRise: 30,
    backOpening: 'none',
    neckWidening: 50,
    frontNeckDrop: 42,
  }),
  dress(two, { neckShape: 'high' }),
  dress(one, { backOpening: 'keyhole', backKeyhole: 60 }),
  { garment: 'bodice', measurements: one, design: { dartSharedWith: 'shoulder' } },
  { garment: 'bodice', measurements: two, design: { shaping: 'princess from the armhole', sleeve: 'plain' } },
  { garment: 'shift-dress', measurements: one },
  skirt({}),
  { ...skirt({ share: '1', pockets: true, waistEasedIn: 5 }, two), unit: 'in' },
  skirt({ share: '1 1/2', panels: 5 }),
  { garment: 'kaftan', measurements: two, design: { gusset: 'always', sleeveReach: 0.3 } },
  { garment: 'kaftan', measurements: one, design: { sleeveReach: 0.25, mouthWidth: 150 } },
  { garment: 'waist-seam-dress', measurements: one, design: {} },
  { garment: 'waist-seam-dress', measurements: one, design: { skirt: 'gathered' } },
  { garment: 'straight-skirt', measurements: one, design: { patchPockets: true } },
  dress(one, { sleeve: 'bishop' }),
  dress(two, { sleeve: 'cap', neckShape: 'scoop' }),
  dress(one, { sleeve: 'puff', neckShape: 'sweetheart' }),
]

const taped = orders.slice(0, 9).map((order): DraftOrder => ({ ...order, tape: 3.175, unit: 'in' }))

const move = (mark: string, x: number, y: number): Correction => ({
  id: mark,
  on: { piece: 'front', mark },
  by: { x, y },
})

const corrected: readonly DraftOrder[] = [
  { ...dress(one), corrections: [{ id: 'waist', on: { seam: 'side', level: 480 }, by: 8 }] },
  {
    garment: 'straight-skirt',
    measurements: one,
    corrections: [{ id: 'hip', on: { seam: 'side', level: 205 }, by: 6 }],
  },
  { ...dress(one), corrections: [move('shoulderTip', 4, 5)] },
  { ...dress(two), corrections: [move('underarm', 5, 6)] },
  { ...dress(one), corrections: [{ ...move('hollow', -4, 0), off: true }] },
]

/** Draft laws by their numbers, in the order in which they are listed. */
const lawsOnDrafts: readonly number[] = [1, 2, 3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 17, 19]
const lawsOnOrders: readonly number[] = [9, 9, 10, 10, 11, 11, 13, 16, 18]

function* onDrafts(law: number, list: readonly DraftOrder[], engine: Engine): Generator<Violation> {
  for (const order of list) {
    const draft = drafted(order, engine)
    if (!draft) {
      yield {
        law,
        where: order.garment,
        message: `an order that can be drafted is refused: ${JSON.stringify(order)}`,
      }
      continue
    }
    for (const [index, judge] of draftLaws.entries()) {
      if (lawsOnDrafts[index] === law || law === 18) yield* judge(draft, order, engine)
    }
  }
}

/** Everything by which the engine breaks a law on a few telling orders, found as it is asked for. */
export function* breaches(law: number, engine: MeasuringEngine): Generator<Violation> {
  yield* onDrafts(law, law === 18 ? corrected : law === 19 ? taped : orders, engine)
  for (const [index, judge] of orderLaws.entries()) {
    if (lawsOnOrders[index] !== law) continue
    // Handles are asked for many times over: two orders are enough to see a wrong one.
    const list = law === 18 ? corrected : law === 11 ? [orders[0], orders[7]] : orders
    for (const order of list) if (order) yield* judge(order, engine)
  }
  if (law !== 15) return
  for (const order of [orders[0], orders[4], orders[7]]) if (order) yield* honestNeeds(order, engine)
  for (const garment of engine.garments) {
    const cards = sizeBodies.filter((_, index) => index % 9 === 0).map(({ card }) => card)
    const asked = tellingStyles(garment).flatMap((design) =>
      cards.map((measurements) => ({ garment: garment.id, measurements, design })),
    )
    const idle = idleNeeds(garment, asked, engine)
    for (const id of idle) yield { law, where: id, message: 'is declared and changes nothing' }
  }
}
