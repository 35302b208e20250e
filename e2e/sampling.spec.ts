import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

test('10,000 draws in the worker agree with the interval, and a change of the formula takes them away', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  const [, low = '', high = ''] = /\((\d+) to (\d+)\)/.exec((await sheet.running.textContent()) ?? '') ?? []
  await page.getByRole('button', { name: 'Check the interval with 10,000 draws' }).click()
  const said = page.getByText(/10,000 draws: mean/)
  await expect(said).toBeVisible({ timeout: 20_000 })
  const [, from = '', to = ''] = /from (\d+) to (\d+)/.exec((await said.textContent()) ?? '') ?? []
  expect(Math.abs(Number(from) - Number(low))).toBeLessThanOrEqual(1)
  expect(Math.abs(Number(to) - Number(high))).toBeLessThanOrEqual(1)
  await sheet.amount(1).fill('2 %')
  await expect(said).toBeHidden()
})

test('draws can be stopped', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await page.getByRole('button', { name: 'Check the interval with 10,000 draws' }).click()
  const stop = page.getByRole('button', { name: 'Stop drawing' })
  await stop.click()
  await expect(page.getByRole('button', { name: 'Check the interval with 10,000 draws' })).toBeVisible()
})
