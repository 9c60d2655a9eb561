import { draftGarment, garments, handles } from '../../drafting'
import { sanityBodies } from '../support/bodies'
import { allocationNote } from './support/allocation'
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
  for (const [words, explain, aim] of [
    ['no words', false, 0.5],
    ['steps and sums', true, 1],
  ] as const) {
    const draft = () => draftGarment(order(explain))
    const note = await allocationNote(draft)
    await bench(`${garment.name}, order to draft, ${words}`, draft, { aim, note })
  }
}

await bench('Flared dress, every point to drag found', () =>
  handles({ garment: 'flared-dress', measurements: sanityBodies.two, design: { frontNeckDrop: next() } }),
)
