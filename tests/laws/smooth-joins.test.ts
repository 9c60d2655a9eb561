import { describe, expect, it } from 'vitest'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { holdsForDrafts } from '../support/laws/hold'
import { dipOf, smoothJoins } from '../support/laws/law-5-smooth-joins'

const measurements = sanityBodies.one

describe('Law 5: edges run on smoothly across the seams that say so', () => {
  holdsForDrafts(smoothJoins)

  // Read when it changes: a seam that joins two edges of one line belongs to those declared smooth.
  it.each([
    [
      'flared-dress',
      { sleeve: 'flared' },
      [
        'front-neckline-facing',
        'back-neckline-facing',
        'armhole-front',
        'armhole-back',
        'side-pocket-front',
        'side-pocket-back',
        'pocket-bags',
      ],
    ],
    [
      'flared-dress',
      { sleeve: 'none' },
      [
        'front-neckline-facing',
        'back-neckline-facing',
        'front-armhole-facing',
        'back-armhole-facing',
        'side-pocket-front',
        'side-pocket-back',
        'pocket-bags',
      ],
    ],
    ['circle-skirt', { pockets: true }, ['waist', 'side-pocket-front', 'side-pocket-back', 'pocket-bags']],
  ])('%s %o: the seams that are not declared smooth', (garment, design, expected) => {
    const draft = engine.draftGarment({ garment, measurements, design })
    const plain = draft.seams.filter((seam) => !seam.smooth).map((seam) => seam.id)
    expect(plain.toSorted()).toEqual(expected.toSorted())
  })

  it('with a flared side seam an armhole dips a little below the underarm, 3 to 8 mm at 22½°', () => {
    for (const body of [sanityBodies.one, sanityBodies.two]) {
      const draft = engine.draftGarment({
        garment: 'flared-dress',
        measurements: body,
        design: { flare: 0.25 },
      })
      for (const piece of ['front', 'back']) {
        expect(dipOf(draft, piece)).toBeGreaterThanOrEqual(3)
        expect(dipOf(draft, piece)).toBeLessThanOrEqual(8)
      }
    }
  })
})
