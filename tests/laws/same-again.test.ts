import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import * as engine from '@/drafting/index'
import { holdsForOrders } from '../support/laws/hold'
import { onlyWhatUsesIt, sameAgain } from '../support/laws/law-9-same-again'
import { namedOrders } from '../support/laws/orders'

/** Drafts the orders that it reads and prints a fingerprint of each draft. */
const inFreshProcess = `
  import { createHash } from 'node:crypto'
  import { readFileSync } from 'node:fs'
  const { draftGarment } = await import('./drafting/index.ts')
  const orders = JSON.parse(readFileSync(0, 'utf8'))
  const prints = orders.map((order) => createHash('sha256').update(JSON.stringify(draftGarment(order))).digest('hex'))
  console.log(JSON.stringify(prints))
`

describe('Law 9: same in, same out', () => {
  describe('the same bytes twice; the unit changes words only', () => holdsForOrders(sameAgain, { by: 5 }))

  describe('a value raised moves every step that names it and nothing that does not use it', () =>
    holdsForOrders(onlyWhatUsesIt, { by: 8, garments: ['flared-dress', 'circle-skirt', 'bodice'] }))

  it('the same bytes in a fresh process', () => {
    const orders = engine.garments
      .flatMap(namedOrders)
      .filter((_, index) => index % 9 === 0)
      .map(({ order }) => order)
    const here = orders.map((order) =>
      createHash('sha256')
        .update(JSON.stringify(engine.draftGarment(order)))
        .digest('hex'),
    )
    const there: unknown = JSON.parse(
      execFileSync(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', inFreshProcess], {
        cwd: fileURLToPath(new URL('../..', import.meta.url)),
        input: JSON.stringify(orders),
        encoding: 'utf8',
      }),
    )
    expect(there).toEqual(here)
  })
})
