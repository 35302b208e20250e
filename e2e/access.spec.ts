import { AxeBuilder } from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

async function violations(page: Page): Promise<string[]> {
  const found = await new AxeBuilder({ page }).withTags(tags).analyze()
  return found.violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(' | ')}`,
  )
}

const states: Readonly<Record<string, (sheet: SheetPage) => Promise<void>>> = {
  empty: async () => undefined,
  'a full order': async (sheet) => {
    await sheet.openDemo('Eye drop')
    await expect(sheet.running).toContainText('mOsm/kg')
    await expect(sheet.page.locator('.recharts-surface').first()).toBeVisible()
  },
  blocked: async (sheet) => {
    await sheet.openDemo('Irrigation')
    await expect(sheet.running).toContainText('mOsm/kg')
    await sheet.amount(1).fill('1,234')
    await sheet.amount(2).focus()
    await expect(sheet.blocked).toBeVisible()
  },
  'searching an ingredient': async (sheet) => {
    await sheet.addRow.focus()
    await sheet.page.keyboard.type('sodium')
    await expect(sheet.candidates.first()).toBeVisible()
  },
  'an opened method': async (sheet) => {
    await sheet.openDemo('Nasal spray')
    await expect(sheet.running).toContainText('mOsm/kg')
    await sheet.page.locator('details.method summary').nth(1).click()
  },
}

for (const colorScheme of ['light', 'dark'] as const) {
  for (const [state, reach] of Object.entries(states)) {
    test(`no barrier is found, ${colorScheme}, ${state}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme })
      const sheet = new SheetPage(page)
      await sheet.open()
      await reach(sheet)
      expect(await violations(page)).toEqual([])
    })
  }
}

test('forced colours and reduced motion leave the page whole', async ({ page }) => {
  await page.emulateMedia({ forcedColors: 'active', reducedMotion: 'reduce' })
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  await expect(page.locator('svg.axis')).toBeVisible()
})

for (const width of [360, 390, 768, 1280, 1920]) {
  test(`nothing is wider than a window of ${width} px`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 })
    const sheet = new SheetPage(page)
    await sheet.open()
    await sheet.openDemo('Eye drop')
    await expect(sheet.running).toContainText('mOsm/kg')
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
    expect(overflow).toBeLessThanOrEqual(0)
  })
}

test('every target is at least 24 px in both directions', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  const small = await page
    .locator('button:visible, input:visible, select:visible, summary:visible')
    .evaluateAll((targets) =>
      targets
        .map((target) => ({
          name: target.getAttribute('aria-label') ?? target.textContent,
          box: target.getBoundingClientRect(),
        }))
        .filter(({ box }) => box.width < 24 || box.height < 24)
        .map(({ name, box }) => `${name} ${Math.round(box.width)}×${Math.round(box.height)}`),
    )
  expect(small).toEqual([])
})
