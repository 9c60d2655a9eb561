import { draftGarment, garments, handles } from '../../drafting'
import { sanityBodies } from '../support/bodies'
import { bench } from './support/bench'

/** The value that is dragged: another each time, so that no draft is remembered. */
let drop = 0
const next = (): number => (drop = drop > 60 ? 0 : drop + 0.5)

for (const garment of garments) {
  const dragged = garment.design.some((value) => value.id === 'frontNeckDrop') ? 'frontNeckDrop' : 'hipEase'
  const order = (explain: boolean) => ({
    garment: garment.id,
    measurements: { ...sanityBodies.two, height: 1640, head: 560 },
    design: { [dragged]: next() },
    explain,
  })
  await bench(`${garment.name}, order to draft, no words`, () => draftGarment(order(false)), { aim: 0.5 })
  await bench(`${garment.name}, order to draft, steps and sums`, () => draftGarment(order(true)), { aim: 1 })
}

await bench('Flared dress, every point to drag found', () =>
  handles({ garment: 'flared-dress', measurements: sanityBodies.two, design: { frontNeckDrop: next() } }),
)
