import { beforeAll, describe, expect, test } from 'vitest'
import { onTape } from '@/app/_server/print/chalk-answer'
import { chalkPdf } from '@/app/_server/print/chalk-pdf'
import type { ChalkRequest } from '@/app/_server/print/chalk-pdf'
import { garments } from '@/drafting'
import { tapes } from '@/drafting/chalk/tapes'
import { paperOf } from '@/drafting/drawing'
import { sanityBodies } from '../support/bodies'
import { inkedNearEdge } from './support/near-edge'
import { checkedByQpdf, pageText, rendered, words } from './support/rendered'

const requestFor = (garment: string): ChalkRequest => ({
  draft: onTape({ garment, measurements: sanityBodies.one, unit: 'in' }),
  title: { name: 'Dress for Ọlá', garment, version: 'version 2', maker: 'Invented workroom' },
  paper: paperOf('letter'),
  unit: 'in',
  tape: tapes.in,
  savedAt: new Date('2026-01-01T12:00:00Z'),
})

describe('the chalk guide of a flared dress', () => {
  let pdf: Uint8Array
  beforeAll(async () => {
    pdf = await chalkPdf(requestFor('flared-dress'))
  })

  test('tells the fold, the layings of the tape, the curves and the seams', () => {
    expect(pageText(pdf, 1)).toContain('Fold the cloth once along the grain')
    const all = words(pdf)
      .flat()
      .map(({ text }) => text)
      .join(' ')
    for (const said of ['From A straight down', 'Off it inwards', 'Walk the seams', 'Shoulder 5 in to 5 in'])
      expect(all).toContain(said)
    expect(all).toContain('chalk guide · version 2')
  })

  test('keeps 10 mm clear on every side, and nothing is cut off', () => {
    expect(checkedByQpdf(pdf)).toContain('No syntax or stream encoding errors found')
    for (const picture of rendered(pdf)) expect(inkedNearEdge(picture, 10)).toBe(0)
  })

  test('is the same bytes when it is asked for again', async () => {
    expect(Buffer.from(await chalkPdf(requestFor('flared-dress'))).equals(pdf)).toBe(true)
  })
})

test.each(garments.map(({ id }) => id))('every piece of a %s has its page', async (garment) => {
  const request = requestFor(garment)
  const said = words(await chalkPdf(request))
    .flat()
    .map(({ text }) => text)
    .join(' ')
  for (const piece of request.draft.pieces.filter(({ cut }) => cut.some(({ cloth }) => cloth === 'main')))
    expect(said).toContain(piece.name)
})
