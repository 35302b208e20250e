import { expect, test } from '@playwright/test'
import { readFileSync } from 'node:fs'
import { violations } from './barriers.ts'
import { SheetPage } from './sheet-page.ts'

/** Types a value into a field of the opened detail and leaves it. */
async function fillIn(sheet: SheetPage, label: string, text: string): Promise<void> {
  const field = sheet.page.getByLabel(label, { exact: true })
  await field.fill(text)
  await field.blur()
}

test('forms, certificate, stock and an ingredient of one’s own come through reload, export and import', async ({
  page,
  browser,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('dibasic heptahydrate', '0.5 %')
  await page.keyboard.press('Escape')
  await page.getByRole('button', { name: /^More about line 1/ }).click()
  await page.getByLabel('Form on the shelf').selectOption({ label: 'Sodium phosphate dibasic dodecahydrate' })
  await expect(sheet.figures(1).first()).toContainText('from Sodium phosphate dibasic heptahydrate')
  await fillIn(sheet, 'Assay of Sodium phosphate dibasic dodecahydrate', '99')
  await expect(sheet.figures(1).first()).toContainText('of the lot (99 %)')
  await sheet.addLine('potassium chloride 2 mEq', '2 mmol')
  await expect(sheet.figures(2).first()).toContainText('mL')

  await page.getByText('Your own ingredients, stocks and dilutions').click()
  const form = page.getByRole('form', { name: 'Enter an ingredient' })
  await form.getByLabel('Name').fill('Testamide')
  await form.getByLabel('Sodium chloride equivalent').fill('0.2')
  await form.getByRole('button', { name: 'Keep it and add it' }).click()
  await sheet.amount(3).fill('1 %')
  await sheet.amount(3).press('Enter')
  await expect(sheet.running).toContainText('mOsm/kg')
  const before = await sheet.running.textContent()
  const paper = async (of: SheetPage) => (await of.page.locator('.paper-sheet').allTextContents()).join('\n')
  await expect.poll(() => paper(sheet)).toContain('entered by hand, not from the library')
  const sheetBefore = await paper(sheet)
  expect(sheetBefore).toContain('lot holds 99 %')

  await page.waitForTimeout(700)
  await page.reload()
  await expect(sheet.lines).toHaveCount(3)
  await expect(sheet.running).toHaveText(before ?? '')
  await expect.poll(() => paper(sheet)).toBe(sheetBefore)

  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save as file' }).click(),
  ])
  const text = readFileSync(await download.path(), 'utf8')
  const other = await browser.newContext()
  const fresh = new SheetPage(await other.newPage())
  await fresh.open()
  await fresh.openFile('formula.json', text)
  await expect(fresh.lines).toHaveCount(3)
  await expect(fresh.running).toHaveText(before ?? '')
  await expect.poll(() => paper(fresh)).toBe(sheetBefore)
  await other.close()
})

test('what was added last is offered by the arrow in the empty row', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '1 %')
  await sheet.addRow.focus()
  await page.keyboard.press('ArrowDown')
  await expect(sheet.candidates.first()).toContainText('Mannitol')
})

test('a vehicle fills up, and a percentage of a solution is refused with the way to write it', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '5 %')
  await sheet.addLine('normal saline', 'q.s.')
  await expect(sheet.figures(2).first()).toContainText('to volume')
  await sheet.amount(2).fill('20 %')
  await sheet.amount(2).press('Enter')
  await expect(page.getByText(/could mean its volume or what it holds/).first()).toBeVisible()
})

test('the opened shelf and the opened line have no accessibility violation', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('timolol', '0.5 %')
  await page.getByRole('button', { name: /^More about line 1/ }).click()
  await page.getByText('What is known of Timolol maleate').click()
  await page.getByText('Your own ingredients, stocks and dilutions').click()
  await page.getByLabel('Stock', { exact: true }).fill('95')
  await page.getByLabel('second stock, empty for water').fill('50')
  await page.getByLabel('wanted strength').fill('70')
  await expect(page.getByText(/Mix 44\.44 mL of the first and 55\.56 mL of the second/)).toBeVisible()
  await expect(page.locator('.curve-chart svg').first()).toBeVisible()
  expect(await violations(page)).toEqual([])
})

/* The twenty commonest: what is typed before Enter, under six keystrokes with it. */
const commonest = [
  ['nacl', 'Sodium chloride'],
  ['dex', 'Dextrose monohydrate'],
  ['man', 'Mannitol'],
  ['kcl', 'Potassium chloride'],
  ['benz', 'Benzalkonium chloride'],
  ['edta', 'Edetate disodium'],
  ['bor', 'Boric acid'],
  ['bica', 'Sodium bicarbonate'],
  ['glyc', 'Glycerin'],
  ['citr', 'Sodium citrate'],
  ['wate', 'Water'],
  ['diba', 'Sodium phosphate dibasic'],
  ['cacl', 'Calcium chloride dihydrate'],
  ['mgso', 'Magnesium sulfate'],
  ['lido', 'Lidocaine'],
  ['pilo', 'Pilocarpine'],
  ['tobr', 'Tobramycin'],
  ['vanc', 'Vancomycin'],
  ['naoh', 'Sodium hydroxide'],
  ['hcl', 'Hydrochloric acid'],
] as const

test('the commonest ingredients are found in under six keystrokes', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  for (const [typed, name] of commonest) {
    await sheet.addRow.fill(typed)
    await expect(sheet.candidates.first()).toContainText(name)
  }
})
