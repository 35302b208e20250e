import { expect, test, type Page } from '@playwright/test'
import { violations } from './barriers.ts'
import { SheetPage } from './sheet-page.ts'

const title = (page: Page) => page.getByRole('textbox', { name: 'Title' })
const keep = (page: Page) => page.getByRole('navigation').getByRole('button', { name: 'Keep on the shelf' })
const kept = (page: Page) => page.getByRole('navigation').getByRole('button', { name: 'Kept on the shelf' })
const openShelf = (page: Page) =>
  page.getByRole('navigation').getByRole('button', { name: 'Shelf', exact: true }).click()
const rows = (page: Page) => page.getByRole('list', { name: 'Formulas on the shelf' }).locator('.shelf-row')

async function keepNamed(sheet: SheetPage, name: string, amount: string) {
  await sheet.page.getByRole('button', { name: 'New' }).click()
  await title(sheet.page).fill(name)
  await sheet.addLine('mannitol', amount)
  await keep(sheet.page).click()
  await expect(kept(sheet.page)).toBeVisible()
}

test('a formula is kept, found after a reload, searched for and opened again', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await keepNamed(sheet, 'First wash', '5 %')
  await keepNamed(sheet, 'Second wash', '4 %')
  await page.reload()
  await openShelf(page)
  await expect(rows(page)).toHaveCount(2)
  await page.getByRole('searchbox', { name: 'search the shelf' }).fill('first')
  await expect(rows(page)).toHaveCount(1)
  await page.getByRole('button', { name: 'Open First wash' }).click()
  await expect(title(page)).toHaveValue('First wash')
  await expect(sheet.amount(1)).toHaveValue('5 %')
  await expect(kept(page)).toBeVisible()

  await test.step('what stood on the desk is one undo away, and still known to the shelf', async () => {
    await title(page).focus()
    await page.keyboard.press('Control+z')
    await expect(title(page)).toHaveValue('Second wash')
    await expect(kept(page)).toBeVisible()
  })
})

test('deleting, archiving and copying are taken back one by one', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await keepNamed(sheet, 'Only one', '5 %')
  await openShelf(page)
  await page.getByRole('button', { name: 'Copy Only one' }).click()
  await expect(rows(page)).toHaveCount(2)
  await page.getByRole('button', { name: 'Delete Only one', exact: true }).click()
  await expect(rows(page)).toHaveCount(1)
  await expect(page.getByRole('button', { name: 'Open Only one (copy)' })).toBeFocused()
  await page.keyboard.press('Control+z')
  await expect(rows(page)).toHaveCount(2)
  await expect(title(page)).toHaveValue('Only one')
  await page.getByRole('button', { name: 'Archive Only one', exact: true }).click()
  await expect(rows(page)).toHaveCount(1)
  await page.getByRole('checkbox', { name: 'with archived' }).check()
  await expect(rows(page)).toHaveCount(2)
  await page.getByRole('button', { name: 'Undo on the shelf' }).click()
  await expect(page.locator('.shelf-tag')).toHaveCount(0)
})

test('a full storage is said at the shelf and a file offered', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await keepNamed(sheet, 'Kept before', '5 %')
  await page.evaluate(() => {
    IDBObjectStore.prototype.put = () => {
      throw new DOMException('full', 'QuotaExceededError')
    }
  })
  await title(page).fill('Kept after')
  await openShelf(page)
  await page.locator('.keep-row').getByRole('button').click()
  await expect(page.getByRole('alert')).toContainText('nothing was put on the shelf')
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save the sheet as a file' }).click(),
  ])
  expect(download.suggestedFilename()).toBe('kept-after.evenwater.json')
  await expect(rows(page)).toHaveCount(1)
})

test('two windows on one formula: the later one is asked, nothing is overwritten', async ({ context }) => {
  const first = new SheetPage(await context.newPage())
  await first.open()
  await keepNamed(first, 'Shared', '5 %')
  const second = new SheetPage(await context.newPage())
  await second.open()
  await expect(second.amount(1)).toHaveValue('5 %')
  await openShelf(second.page)
  await second.amount(1).fill('3 %')
  await second.page.locator('.keep-row').getByRole('button').click()
  await expect(second.page.locator('.shelf-said')).toContainText('Version 2')

  await first.amount(1).fill('2 %')
  await keep(first.page).click()
  await expect(first.page.getByRole('alert')).toContainText('Nothing was overwritten')
  await first.page.getByRole('button', { name: 'Keep this one beside it' }).click()
  await expect(rows(first.page)).toHaveCount(2)
  await expect(rows(second.page)).toHaveCount(2)
})

test('versions carry their notes, tell what changed, and go back to the desk', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await keepNamed(sheet, 'Wash', '5 %')
  await openShelf(page)
  await sheet.amount(1).fill('4 %')
  await sheet.addLine('urea', '1 %')
  await page.getByRole('textbox', { name: 'note for this version' }).fill('weaker, with urea')
  await page.locator('.keep-row').getByRole('button').click()
  await page.locator('.shelf-versions summary').click()
  await expect(page.getByRole('list', { name: 'Versions of Wash' })).toContainText('weaker, with urea')
  await page.getByRole('combobox', { name: 'Difference of Wash: from' }).selectOption('version 1')
  await page.getByRole('combobox', { name: 'Difference of Wash: to' }).selectOption('version 2')
  const difference = page.locator('.difference')
  await expect(difference.getByRole('row', { name: /^Mannitol 5 % 4 % amount/ })).toBeVisible()
  await expect(difference.getByRole('row', { name: /^Urea — 1 % added as line 2/ })).toBeVisible()
  await expect(difference.getByRole('row', { name: /^osmolality, mOsm\/kg \d+ \(.*\) \d+/ })).toBeVisible()
  await page.getByRole('button', { name: 'Put version 1 of Wash on the desk' }).click()
  await expect(sheet.lines).toHaveCount(1)
  await expect(sheet.amount(1)).toHaveValue('5 %')
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(sheet.lines).toHaveCount(2)
})

const states: Readonly<Record<string, (sheet: SheetPage) => Promise<void>>> = {
  'with nothing on it': async ({ page }) => {
    await openShelf(page)
    await expect(page.getByText('Nothing on the shelf yet.')).toBeVisible()
  },
  'with versions and their difference': async (sheet) => {
    await keepNamed(sheet, 'Seen', '5 %')
    await openShelf(sheet.page)
    await sheet.amount(1).fill('4 %')
    await sheet.page.locator('.shelf-versions summary').click()
    await expect(sheet.page.locator('.difference-table').first()).toBeVisible()
  },
}

for (const colorScheme of ['light', 'dark'] as const) {
  for (const [state, reach] of Object.entries(states)) {
    test(`no barrier is found at the shelf ${state}, ${colorScheme}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme })
      const sheet = new SheetPage(page)
      await sheet.open()
      await reach(sheet)
      expect(await violations(page)).toEqual([])
    })
  }
}

test('nothing at the shelf is wider than a narrow window, and every target is large enough', async ({
  page,
}) => {
  await page.setViewportSize({ width: 390, height: 900 })
  const sheet = new SheetPage(page)
  await sheet.open()
  await states['with versions and their difference']?.(sheet)
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
  expect(overflow).toBeLessThanOrEqual(0)
  const small = await page
    .locator('.shelf-panel :is(button, input, select, summary):visible')
    .evaluateAll((targets) =>
      targets
        .map((target) => ({ name: target.outerHTML.slice(0, 90), box: target.getBoundingClientRect() }))
        .filter(({ box }) => box.width < 24 || box.height < 24)
        .map(({ name }) => name),
    )
  expect(small).toEqual([])
})
