import { expect, test, type Page } from '@playwright/test'
import { body, measureClient, signInToDemo, startDress } from './support/demo'

/** Bytes of scripts that a page fetched, as they came over the wire. */
async function scriptsOf(page: Page): Promise<number> {
  await page.waitForLoadState('networkidle')
  return page.evaluate(() =>
    performance
      .getEntriesByType('resource')
      .filter(({ name }) => new URL(name).pathname.endsWith('.js'))
      .reduce((sum, entry) => sum + (entry as PerformanceResourceTiming).encodedBodySize, 0),
  )
}

/** Says the weight in the report, and holds the page to its budget in kB (1,000 bytes, gzipped). */
function hold(what: string, weight: number, budget: number): void {
  test
    .info()
    .annotations.push({ type: `scripts of ${what}`, description: `${(weight / 1000).toFixed(0)} kB` })
  expect.soft(weight, `scripts of ${what}, bytes`).toBeLessThanOrEqual(budget * 1000)
}

// A first visit: what the device keeps already would be counted unpacked.
test.use({ serviceWorkers: 'block' })

test('no page brings more scripts than its budget', async ({ page }) => {
  test.setTimeout(120_000)
  await page.goto('/')
  hold('the first page', await scriptsOf(page), 230)
  await page.goto('/sign-in')
  hold('the sign-in', await scriptsOf(page), 230)
  await signInToDemo(page)
  for (const path of ['/clients', '/clients/new', '/drafts', '/drafts/new?for=nobody', '/settings']) {
    await page.goto(path)
    hold(path, await scriptsOf(page), 230)
  }
  const card = await measureClient(page, 'Weight Test', body)
  await page.goto(card)
  hold('a measure card', await scriptsOf(page), 230)
  const draft = await startDress(page, 'Weight dress')
  await page.goto(draft)
  await expect(page.getByRole('textbox', { name: 'Neck depth, in', exact: true })).toBeVisible()
  // The aim is 320. With twelve garments in one engine it weighs 371; to come down, each garment must be fetched by itself.
  // Held here meanwhile, so that it does not grow unseen.
  hold('the studio', await scriptsOf(page), 375)
})
