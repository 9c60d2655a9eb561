import { type BrowserContext, expect, type Page, test } from '@playwright/test'
import { expectAccessible } from './support/axe'
import { body, changeAndSave, measureClient, signInToDemo, startDress } from './support/demo'
import { standInFront } from './support/in-front'

/** A name that nothing else contains. */
const client = 'Peregrine Oakapple'

const neckDepth = (page: Page) => page.getByRole('textbox', { name: 'Neck depth, in', exact: true })
const saved = (page: Page) => page.getByRole('banner').getByRole('status')
const away = (page: Page) => page.getByRole('heading', { level: 1, name: 'You are offline' })

/** What the content policy refused on any page of the context. */
async function refusedBy(context: BrowserContext): Promise<string[]> {
  const refused: string[] = []
  await context.exposeFunction('reportRefused', (words: string) => void refused.push(words))
  await context.addInitScript(() => {
    addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) => {
      const { reportRefused } = globalThis as unknown as { reportRefused: (words: string) => void }
      reportRefused(`${violatedDirective} ${blockedURI}`)
    })
  })
  return refused
}

/** Waits until this device keeps the build. */
const kept = (page: Page) =>
  page.evaluate(async () => {
    await navigator.serviceWorker.ready
  })

/** Everything that pages of this origin have left on the device, as text. */
const leftBehind = (page: Page) =>
  page.evaluate(async () => {
    const left: string[] = [JSON.stringify({ ...localStorage }), JSON.stringify({ ...sessionStorage })]
    for (const name of await caches.keys()) {
      const cache = await caches.open(name)
      for (const request of await cache.keys()) {
        const answer = await cache.match(request)
        left.push(request.url, request.url.includes('/_next/') ? '' : ((await answer?.text()) ?? ''))
      }
    }
    for (const { name = '' } of await indexedDB.databases()) left.push(`database ${name}`)
    return left.join('\n')
  })

async function startNamed(page: Page, name: string): Promise<string> {
  await measureClient(page, client, body)
  const address = await startDress(page, name)
  await kept(page)
  return address
}

test('a draft opened before opens without the network, is changed there, and is saved when it is back', async ({
  page,
  context,
}) => {
  test.setTimeout(150_000)
  const refused = await refusedBy(context)
  await signInToDemo(page)
  const address = await startNamed(page, 'Kept dress')
  await changeAndSave(page, async () => {
    await neckDepth(page).fill('4')
    await page.keyboard.press('Enter')
  })

  await context.setOffline(true)
  await page.reload()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Kept dress')
  await expect(page.getByText('Opened from this device, without the network.')).toBeVisible()
  await expect(neckDepth(page)).toHaveValue('4')
  await expectAccessible(page)
  await neckDepth(page).fill('4 3/4')
  await page.keyboard.press('Enter')
  await expect(saved(page)).toHaveText('Offline: kept on this device')
  await page.close()

  const again = await context.newPage()
  await again.goto(address)
  await expect(neckDepth(again)).toHaveValue('4 3⁄4')
  await context.setOffline(false)
  await expect(saved(again)).toHaveText('Saved', { timeout: 30_000 })
  await again.reload()
  await expect(neckDepth(again)).toHaveValue('4 3⁄4')
  await expect(again.getByText('Opened from this device')).toHaveCount(0)
  expect(refused).toEqual([])
})

test('with the server gone every page says so, and what is on the device is a click away', async ({
  page,
  context,
  baseURL,
}) => {
  test.setTimeout(150_000)
  const front = await standInFront(baseURL ?? '')
  const refused = await refusedBy(context)
  await signInToDemo(page)
  const address = new URL(await startNamed(page, 'Kept coat'))
  await page.goto(`${front.origin}${address.pathname}`)
  await expect(neckDepth(page)).toBeVisible()
  await kept(page)

  await front.stop()
  await page.goto(`${front.origin}/clients`)
  await expect(away(page)).toBeVisible()
  for (const width of [1440, 390]) {
    await page.setViewportSize({ width, height: 800 })
    await expectAccessible(page)
  }
  await page.setViewportSize({ width: 1440, height: 900 })
  await page.getByRole('link', { name: /Kept coat/ }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Kept coat')
  await expect(neckDepth(page)).toBeVisible()

  await front.start()
  await page.goto(`${front.origin}/clients`)
  await expect(page.getByRole('heading', { level: 1, name: 'Clients' })).toBeVisible()
  await front.stop()
  expect(refused).toEqual([])
})

test('after signing out nothing of the person is left on the device, in no open page either', async ({
  page,
  context,
}) => {
  test.setTimeout(150_000)
  await signInToDemo(page)
  const address = await startNamed(page, 'Secret dress')
  const other = await context.newPage()
  await other.goto(address)
  await expect(neckDepth(other)).toBeVisible()
  expect(await leftBehind(page)).toContain('database chalkfold')

  await page.goto('/clients')
  await page.locator('summary', { hasText: 'Adaeze' }).click()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await page.waitForURL(/\/sign-in/)
  await other.waitForURL(/\/sign-in/)

  const left = await leftBehind(page)
  expect(left).toContain('/desk')
  for (const secret of ['Oakapple', 'Secret dress', 'database', address.split('/').at(-1) ?? ''])
    expect(left).not.toContain(secret)
  await context.setOffline(true)
  await page.goto(address)
  await expect(away(page)).toBeVisible()
  await expect(page.getByText('Secret dress')).toHaveCount(0)
})

test('a new build takes over once no page lives on the old one, and leaves nothing of it', async ({
  page,
  context,
  baseURL,
}) => {
  test.setTimeout(150_000)
  const front = await standInFront(baseURL ?? '')
  await signInToDemo(page)
  await page.goto(`${front.origin}/clients`)
  await kept(page)
  const shell = await page.request.get('/api/shell')
  const { build } = (await shell.json()) as { build: string }
  const caches = () => page.evaluate(() => globalThis.caches.keys())
  const waiting = () =>
    page.evaluate(async () =>
      (await navigator.serviceWorker.ready).waiting?.scriptURL.includes('build=newer'),
    )
  expect(await caches()).toEqual([`chalkfold-${build}`])

  const other = await context.newPage()
  await other.goto(`${front.origin}/drafts`)
  front.rename(build, 'newer')
  await page.reload()
  await expect.poll(waiting).toBe(true)
  await page.reload()
  await page.reload()
  expect(await waiting(), 'another page is open').toBe(true)
  await front.stop()
  await page.reload()
  await expect(away(page)).toBeVisible()
  expect(await page.content(), 'the desk is that of the scripts').toContain(build)

  await other.close()
  await front.start()
  await page.goto(`${front.origin}/clients`)
  await expect.poll(caches).toEqual(['chalkfold-newer'])
  await page.reload()
  await expect(page.getByRole('heading', { level: 1, name: 'Clients' })).toBeVisible()
  await front.stop()
  await page.reload()
  await expect(away(page)).toBeVisible()
  expect(await page.content()).toContain('newer')
})

test('the content policy lets a worker of our own run, and no other', async ({ page, context, baseURL }) => {
  const front = await standInFront(baseURL ?? '')
  front.serve('/doubler.js', 'onmessage = ({ data }) => postMessage(data * 2)')
  const refused = await refusedBy(context)
  await page.goto(`${front.origin}/sign-in`)
  const doubled = await page.evaluate(
    () =>
      new Promise((resolve, reject) => {
        const worker = new Worker('/doubler.js')
        worker.onmessage = ({ data }) => resolve(data)
        worker.onerror = reject
        worker.postMessage(21)
      }),
  )
  expect(doubled).toBe(42)
  expect(refused).toEqual([])
  await page.evaluate(() => {
    const address = URL.createObjectURL(new Blob(['postMessage(1)']))
    try {
      new Worker(address)
    } catch {
      // Some versions throw, all report.
    }
  })
  await expect.poll(() => refused).toEqual([expect.stringContaining('worker-src blob')])
  await front.stop()
})

test('it can be installed: the manifest names icons of the right size', async ({ page, request }) => {
  await page.goto('/sign-in')
  const address = await page.locator('link[rel=manifest]').getAttribute('href')
  const answer = await request.get(address ?? '')
  expect(answer.headers()['content-type']).toContain('application/manifest+json')
  const { icons } = (await answer.json()) as { icons: { src: string; sizes: string; type: string }[] }
  for (const { src, sizes, type } of icons) {
    expect((await request.get(src)).headers()['content-type']).toContain(type)
    if (sizes === 'any') continue
    const size = await page.evaluate(async (source) => {
      const image = new Image()
      image.src = source
      await image.decode()
      return `${image.naturalWidth}x${image.naturalHeight}`
    }, src)
    expect(size).toBe(sizes)
  }
})
