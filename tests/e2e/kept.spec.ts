import { promisify } from 'node:util'
import { gunzip, gzip } from 'node:zlib'
import { expect, test } from '@playwright/test'
import mariadb from 'mariadb'
import { body, measureClient, signInToDemo, startDress } from './support/demo'

/** Makes the newest kept drawing one of an older engine, whose front was cut so many mm lower at the centre. */
async function age(lower: number): Promise<void> {
  const url = new URL(process.env.DATABASE_URL ?? '')
  const connection = await mariadb.createConnection({
    host: url.hostname,
    port: Number(url.port),
    user: url.username,
    password: url.password,
    database: url.pathname.slice(1),
  })
  try {
    const [row] = await connection.query<{ revisionId: string; drafted: Buffer }[]>(
      'SELECT revisionId, drafted FROM kept_drafts ORDER BY keptAt DESC LIMIT 1',
    )
    if (!row) throw new Error('Nothing was kept.')
    const draft = JSON.parse((await promisify(gunzip)(row.drafted)).toString())
    const hem = draft.pieces
      .find((piece: { id: string }) => piece.id === 'front')
      .edges.find((edge: { id: string }) => edge.id === 'hem')
    for (const segment of hem.path.segments)
      for (const point of Object.values(segment)) {
        if (point && typeof point === 'object') (point as { y: number }).y += lower
      }
    const drafted = await promisify(gzip)(JSON.stringify(draft))
    await connection.query('UPDATE kept_drafts SET drafted = ? WHERE revisionId = ?', [
      drafted,
      row.revisionId,
    ])
  } finally {
    await connection.end()
  }
}

test('what was printed says when it is drawn otherwise today, where, and is printed again as it was', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signInToDemo(page)
  await measureClient(page, 'Kept Test', body)
  const address = await startDress(page, 'Kept dress')
  await page.getByRole('button', { name: 'Print', exact: true }).click()
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name: 'Download in one piece (SVG)' }).click()
  await waiting
  await page.goto(address)
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Kept dress')
  await expect(page.getByText('draws it a little otherwise')).toHaveCount(0)

  await age(3)
  await page.reload()
  const notice = page.getByRole('status').filter({ hasText: 'Chalkfold draws it a little otherwise today' })
  await expect(notice).toContainText('Front: hem, stitching line (0.3 cm)')
  await notice.getByRole('button', { name: 'See where, and print' }).click()
  const dialog = page.getByRole('dialog', { name: 'Print the pattern' })
  await expect(dialog.getByRole('radio', { name: 'As it was' })).toBeChecked()
  const link = dialog.getByRole('link', { name: 'Download the sheets (PDF)' })
  await expect(link).not.toHaveAttribute('href', /drawing=today/)
  await dialog.getByRole('radio', { name: 'As it is drawn today' }).check()
  await expect(link).toHaveAttribute('href', /drawing=today/)
  await dialog.getByRole('button', { name: 'Close' }).click()

  await page.getByRole('button', { name: 'Versions' }).click()
  await page.getByRole('button', { name: 'Print again' }).click()
  await expect(page.getByRole('radio', { name: 'As it was' })).toBeChecked()
})
