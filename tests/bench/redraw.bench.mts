import { draftGarment, garments, handles } from '../../drafting'
import { sanityBodies } from '../support/bodies'
import { bench } from './support/bench'

/** How far the value is dragged by now: another length each time, so that no draft is remembered. */
let pulled = 0
const next = (): number => (pulled = pulled > 20 ? 0 : pulled + 0.5)

for (const garment of garments) {
  const dragged = garment.design.find((value) => value.kind === 'length')
  const from = typeof dragged?.default === 'number' ? dragged.default : 0
  const order = (explain: boolean) => ({
    garment: garment.id,
    measurements: { ...sanityBodies.two, height: 1640, head: 560 },
    design: dragged ? { [dragged.id]: Math.min(from + next(), dragged.max ?? Infinity) } : {},
    explain,
  })
  await bench(`${garment.name}, order to draft, no words`, () => draftGarment(order(false)), { aim: 0.5 })
  await bench(`${garment.name}, order to draft, steps and sums`, () => draftGarment(order(true)), { aim: 1 })
}

await bench('Flared dress, every point to drag found', () =>
  handles({ garment: 'flared-dress', measurements: sanityBodies.two, design: { frontNeckDrop: next() } }),
)
