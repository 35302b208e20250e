import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

test('text that cannot be read stays, says how to write it, and takes every number off the page', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  const before = await sheet.running.innerText()

  await sheet.amount(1).fill('1,234')
  await sheet.amount(2).focus()
  await expect(sheet.amount(1)).toHaveValue('1,234')
  await expect(sheet.amount(1)).toHaveAttribute('aria-invalid', 'true')
  await expect(page.locator('.refusal-row').first()).toBeVisible()
  await expect(sheet.blocked).toBeVisible()
  await expect(sheet.running).not.toContainText('mOsm/kg')
  for (const figure of await page.locator('td.figure').allInnerTexts())
    expect(figure).toMatch(/^(—|[a-z].*\n?—)/i)
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
  await expect(page.locator('#print-refusal')).toBeVisible()

  await page.keyboard.press('Control+z')
  await expect(sheet.blocked).toHaveCount(0)
  await expect(sheet.running).toHaveText(before)
})

test('a field of the order that cannot be read blocks too and survives a reload', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Nasal spray')
  await expect(sheet.running).toContainText('mOsm/kg')
  const pH = page.getByRole('textbox', { name: 'pH', exact: true })
  await pH.fill('six')
  await sheet.amount(1).focus()
  await expect(sheet.blocked).toContainText('pH')
  await page.reload()
  await expect(pH).toHaveValue('six')
  await expect(sheet.blocked).toContainText('pH')
  await pH.fill('6')
  await expect(sheet.blocked).toHaveCount(0)
})

test('10 kB in a cell and 200 lines are borne', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  const line = (index: number) => ({ key: `k${index}`, ingredient: 'sodium-chloride', amount: '1 mmol/L' })
  const lines = Array.from({ length: 200 }, (_, index) => line(index))
  const formula = {
    format: 'evenwater.formula',
    version: 1,
    title: 'Two hundred lines',
    route: 'irrigation',
    finalVolume: '1000 mL',
    lines,
  }
  await sheet.openFile('many.json', JSON.stringify(formula))
  await expect(sheet.lines).toHaveCount(200)
  await expect(sheet.running).toContainText('mOsm/kg')
  await sheet.amount(1).fill('x'.repeat(10_000))
  await sheet.amount(2).focus()
  await expect(sheet.blocked).toBeVisible()
  await page.keyboard.press('Control+z')
  await expect(sheet.running).toContainText('mOsm/kg')
})
