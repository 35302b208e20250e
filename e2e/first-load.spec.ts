import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { expect, test, type Page } from '@playwright/test'
import { namedIn } from '../.run/page/firstLoad.ts'
import { builtPage } from './built-page.ts'
import { SheetPage } from './sheet-page.ts'

/* The budget counts the files that the page names in its head; these tests hold it to that. */

const first = new Set(namedIn(readFileSync(join(builtPage, 'index.html'), 'utf8')))

/** Everything but the first load waits until it is let through, or never comes. */
async function holdTheRest(page: Page, outcome: 'continue' | 'abort'): Promise<() => void> {
  let letThrough = () => {}
  const gate = new Promise<void>((resolve) => (letThrough = resolve))
  await page.route('**/assets/*', async (route) => {
    const path = new URL(route.request().url()).pathname.slice(1)
    if (!first.has(path)) {
      await gate
      if (outcome === 'abort') return route.abort()
    }
    return route.continue()
  })
  return letThrough
}

test('lines can be typed before the calculating part is here; it says so, and then gives the result', async ({
  page,
}) => {
  const letThrough = await holdTheRest(page, 'continue')
  const sheet = new SheetPage(page)
  await sheet.open()
  await expect(sheet.running).toContainText('calculating')
  await sheet.addLine('sodium chloride', '0.9 %')
  await expect(sheet.lines).toHaveCount(1)
  await expect(sheet.running).toContainText('calculating')
  await expect(sheet.running).not.toContainText('mOsm')
  await expect(page.getByText('Calculating…').first()).toBeVisible()
  await page.emulateMedia({ media: 'print' })
  await expect(page.getByText('Not a worksheet. The figures are being worked out.')).toBeVisible()
  await page.emulateMedia({ media: 'screen' })
  letThrough()
  await expect(sheet.running).toContainText('mOsm/kg')
  await expect(page.getByText('Calculating…')).toHaveCount(0)
  await expect(sheet.amount(1)).toHaveValue('0.9 %')
})

test('a calculating part that cannot be loaded is said, and no number is shown', async ({ page }) => {
  const letThrough = await holdTheRest(page, 'abort')
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('sodium chloride', '0.9 %')
  letThrough()
  await expect(page.getByText('The calculating part could not be loaded').first()).toBeVisible()
  await expect(sheet.running).toContainText('no figure')
  await expect(sheet.lines).toHaveCount(1)
})
