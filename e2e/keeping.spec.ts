import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

test('a reload restores what was typed last', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '5 %')
  await page.getByRole('textbox', { name: 'Title' }).fill('Kept')
  await page.reload()
  await expect(page.getByRole('textbox', { name: 'Title' })).toHaveValue('Kept')
  await expect(sheet.amount(1)).toHaveValue('5 %')
})

test('a page that is closed in the midst of typing misses at most the key in flight', async ({ context }) => {
  for (let round = 0; round < 5; round += 1) {
    const page = await context.newPage()
    const sheet = new SheetPage(page)
    await sheet.open()
    await page.getByRole('textbox', { name: 'Title' }).fill('')
    await page.getByRole('textbox', { name: 'Title' }).focus()
    const typed = 'abcdefghijklmnop'.slice(0, 4 + round * 3)
    await page.keyboard.type(typed)
    await page.close()
    const next = await context.newPage()
    await new SheetPage(next).open()
    const restored = await next.getByRole('textbox', { name: 'Title' }).inputValue()
    expect([typed, typed.slice(0, -1)]).toContain(restored)
    await next.close()
  }
})

test('a full storage is said, an export offered, and nothing is lost from the screen', async ({ page }) => {
  await page.addInitScript(() => {
    IDBObjectStore.prototype.put = () => {
      throw new DOMException('full', 'QuotaExceededError')
    }
  })
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '5 %')
  await expect(sheet.notices).toContainText('storage of this browser is full')
  await expect(sheet.notices.getByRole('button', { name: 'Save as file' })).toBeVisible()
  await expect(sheet.amount(1)).toHaveValue('5 %')
  await expect(sheet.running).toContainText('mOsm/kg')
})

test('a denied storage is said and the page works', async ({ page }) => {
  await page.addInitScript(() => {
    indexedDB.open = () => {
      throw new DOMException('denied', 'SecurityError')
    }
  })
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '5 %')
  await expect(sheet.notices).toContainText('does not let the page keep anything')
  await expect(sheet.running).toContainText('mOsm/kg')
})

test('two windows never overwrite each other silently', async ({ context }) => {
  const first = new SheetPage(await context.newPage())
  await first.open()
  await first.addLine('mannitol', '5 %')
  const second = new SheetPage(await context.newPage())
  await second.open()
  await expect(second.notices).toContainText('open in another window')
  await second.amount(1).fill('4 %')
  await first.amount(1).fill('3 %')

  await test.step('the second keeps its own only when a person says so, and the first is told', async () => {
    await second.page.getByRole('button', { name: 'Keep this one' }).click()
    await expect(second.notices).not.toContainText('another window')
    await expect(first.notices).toContainText('open in another window')
    await second.page.reload()
    await expect(second.amount(1)).toHaveValue('4 %')
  })

  await test.step('the first can show the other’s and go back with undo', async () => {
    await first.page.getByRole('button', { name: 'Show the other one' }).click()
    await expect(first.amount(1)).toHaveValue('4 %')
    await first.page.keyboard.press('Control+z')
    await expect(first.amount(1)).toHaveValue('3 %')
  })
})
