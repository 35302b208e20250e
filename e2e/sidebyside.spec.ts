import { expect, test, type Page } from '@playwright/test'
import { violations } from './barriers.ts'
import { SheetPage } from './sheet-page.ts'

const nav = (page: Page) => page.getByRole('navigation')

/** The first demo on the shelf, the second on the desk, both in columns. */
async function compareDemos(page: Page, first: string, second: string): Promise<SheetPage> {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo(first)
  await expect(sheet.running).toContainText('mOsm/kg')
  await nav(page).getByRole('button', { name: 'Keep on the shelf' }).click()
  await expect(nav(page).getByRole('button', { name: 'Kept on the shelf' })).toBeVisible()
  await sheet.openDemo(second)
  await expect(nav(page).getByRole('button', { name: 'Keep on the shelf' })).toBeVisible()
  await nav(page).getByRole('button', { name: 'Shelf', exact: true }).click()
  await page.locator('.shelf-row').getByRole('checkbox').check()
  await expect(page.getByRole('table', { name: 'Formulas side by side' })).toBeVisible()
  return sheet
}

const table = (page: Page) => page.getByRole('table', { name: 'Formulas side by side' })
const rowOf = (page: Page, label: string) =>
  table(page)
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: label, exact: true }) })

test('two demos stand side by side, line by line, and say where they differ', async ({ page }) => {
  const sheet = await compareDemos(page, 'Eye drop', 'Nasal spray')
  await expect(table(page).getByRole('columnheader')).toHaveCount(2)
  const salt = rowOf(page, 'Sodium chloride').getByRole('cell')
  await expect(salt).toHaveCount(2)
  await expect(rowOf(page, 'Pilocarpine hydrochloride').getByRole('cell').nth(0)).toContainText('not in it')
  await expect(rowOf(page, 'Pilocarpine hydrochloride').getByRole('cell').nth(1)).toContainText('≠')
  await expect(rowOf(page, 'Pilocarpine hydrochloride').getByRole('cell').nth(1)).toContainText('1 %')

  await test.step('the figures of the desk are those of the sheet', async () => {
    const running = (await sheet.running.textContent()) ?? ''
    const value = /^(\d+) mOsm\/kg \((\d+ to \d+)\)/.exec(running)
    expect(value).not.toBeNull()
    const osmolality = rowOf(page, 'osmolality, mOsm/kg').getByRole('cell').nth(0)
    await expect(osmolality).toContainText(value?.[1] ?? '?')
    await expect(osmolality).toContainText(value?.[2] ?? '?')
  })

  await test.step('the axis says the same in words', async () => {
    await expect(page.locator('#shared-axis-said')).toContainText('A, Demo nasal spray')
    await expect(page.locator('#shared-axis-said')).toContainText('B, Demo eye drops')
  })

  await test.step('a change on the desk is followed', async () => {
    const row = rowOf(page, 'final volume').getByRole('cell').nth(0)
    await page.getByRole('textbox', { name: 'Final volume' }).fill('37 mL')
    await expect(row).toContainText('37 mL')
  })

  await test.step('taking one out ends it', async () => {
    await page.getByRole('button', { name: 'Take Demo eye drops out of the comparison' }).click()
    await expect(table(page)).toHaveCount(0)
  })
})

test('a blocked formula has no figures in its column and says why', async ({ page }) => {
  const sheet = await compareDemos(page, 'Eye drop', 'Irrigation')
  await sheet.amount(1).fill('1,234')
  await sheet.amount(2).focus()
  await expect(table(page).getByRole('columnheader').nth(0)).toContainText('No numbers')
  await expect(rowOf(page, 'osmolality, mOsm/kg').getByRole('cell').nth(0)).toHaveText('—')
})

test('the comparison prints alone, marked as no worksheet', async ({ page }) => {
  await compareDemos(page, 'Eye drop', 'Nasal spray')
  await page.emulateMedia({ media: 'print' })
  await expect(table(page)).toBeHidden()
  await page.evaluate(() => {
    window.print = () => undefined
  })
  await page.emulateMedia({ media: 'screen' })
  await page.getByRole('button', { name: 'Print the comparison' }).click()
  await page.emulateMedia({ media: 'print' })
  await expect(table(page)).toBeVisible()
  await expect(page.getByText('not a batch worksheet').first()).toBeVisible()
  await expect(page.locator('.paper-sheet:visible')).toHaveCount(0)
  await page.evaluate(() => dispatchEvent(new Event('afterprint')))
  await expect(table(page)).toBeHidden()
})

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no barrier is found side by side, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme })
    await compareDemos(page, 'Eye drop', 'Nasal spray')
    expect(await violations(page)).toEqual([])
  })
}

test('nothing side by side is wider than a narrow window', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 900 })
  await compareDemos(page, 'Eye drop', 'Nasal spray')
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
  expect(overflow).toBeLessThanOrEqual(0)
})
