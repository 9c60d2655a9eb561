import AxeBuilder from '@axe-core/playwright'
import { type Page, expect } from '@playwright/test'

/** Expects axe to find nothing on the page as it stands, in daylight and with the lamp on. */
export async function expectAccessible(page: Page): Promise<void> {
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' })
    const { violations } = await new AxeBuilder({ page })
      .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
      .analyze()
    const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`)
    expect(found, `${page.url()}, ${colorScheme}`).toEqual([])
  }
}
