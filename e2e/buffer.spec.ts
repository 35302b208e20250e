import { expect, test } from '@playwright/test'
import { violations } from './barriers.ts'
import { SheetPage } from './sheet-page.ts'

async function openBuffers(sheet: SheetPage): Promise<void> {
  await sheet.page.getByText('pH and buffer', { exact: true }).click()
  await expect(sheet.page.getByRole('heading', { name: 'Design a buffer' })).toBeVisible()
}

test('a buffer is designed, put into the formula, reads its pH there, and is undone in one step', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '2 %')
  await openBuffers(sheet)
  await page.getByLabel('Buffer system').selectOption({ label: 'citrate' })
  const design = page.getByRole('region', { name: 'Design a buffer' })
  await design.getByLabel('pH', { exact: true }).fill('5.2')
  await design.getByLabel('Strength', { exact: true }).fill('10')
  await expect(design.getByText(/the whole reads pH 5\.2/)).toBeVisible()
  await design.getByRole('button', { name: 'Put it into the formula' }).click()
  await expect(sheet.lines).toHaveCount(3)
  await expect(page.getByText(/the formula reads pH 5\.2 at 25 °C/)).toBeVisible()
  await page.keyboard.press('Control+z')
  await expect(sheet.lines).toHaveCount(1)
})

test('all buffers are compared in the worker, put in order, weighed anew and taken over', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await openBuffers(sheet)
  const compare = page.getByRole('region', { name: 'Compare all buffers' })
  await compare.getByLabel('at pH').fill('7.2')
  await compare.getByRole('button', { name: 'Compare', exact: true }).click()
  const table = compare.getByRole('table', { name: 'Buffers compared' })
  await expect(table.locator('tbody tr')).toHaveCount(14, { timeout: 20_000 })
  await expect(table.getByRole('row', { name: /lactate/ })).toContainText('lactate is not used by this route')
  const first = await table.locator('tbody tr').first().locator('th').textContent()
  await compare.getByText('rules and weights').click()
  await compare.getByLabel('Weight of pH from 5 to 37 °C').fill('5')
  await compare.getByLabel('Weight of use by this route').fill('0')
  expect(first).toBeTruthy()
  await table.getByRole('button', { name: /^Put in tromethamine/ }).click()
  await expect(compare.getByText('The formula has changed since; compare again.')).toBeVisible()
  await expect(page.getByText(/the formula reads pH 7\.(19|2|21) at 25 °C/)).toBeVisible()
})

test('the open section has no accessibility violation and draws its charts', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await openBuffers(sheet)
  await page.getByText('Charts: titration, species, temperature').click()
  await expect(page.locator('.buffer-chart svg').first()).toBeVisible()
  expect(await violations(page)).toEqual([])
})

test('a published vehicle is added with its source', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '1 %')
  await openBuffers(sheet)
  const vehicles = page.getByRole('region', { name: 'Start from a published buffer' })
  await expect(vehicles.getByText(/Published pH .* at .* °C/)).toBeVisible()
  await expect(vehicles.getByText(/The model gives pH 5\.8\d? there/)).toBeVisible()
  await vehicles.getByRole('button', { name: 'Add it to the formula' }).click()
  await expect(sheet.lines).toHaveCount(4)
})
