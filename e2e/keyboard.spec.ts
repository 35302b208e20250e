import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

test('a formula is built, mended and taken back with the keyboard alone', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('pilocarpine hydrochloride', '1 %')
  await sheet.addLine('sodium chloride', 'q.s.')
  await expect(sheet.lines).toHaveCount(2)
  await expect(sheet.running).toContainText('mOsm/kg')
  await expect(sheet.figures(2).first()).toContainText('g')

  await test.step('arrows and Enter walk the cells', async () => {
    await page.keyboard.press('ArrowUp')
    await expect(sheet.ingredient(2)).toBeFocused()
    await page.keyboard.press('ArrowRight')
    await expect(sheet.amount(2)).toBeFocused()
    await page.keyboard.press('ArrowUp')
    await expect(sheet.amount(1)).toBeFocused()
    await page.keyboard.press('Enter')
    await expect(sheet.amount(2)).toBeFocused()
    await page.keyboard.press('Shift+Tab')
    await expect(sheet.ingredient(2)).toBeFocused()
    await page.keyboard.press('Tab')
    await expect(sheet.amount(2)).toBeFocused()
  })

  await test.step('typing replaces, Escape restores', async () => {
    await page.keyboard.press('ArrowUp')
    await page.keyboard.type('2 %')
    await expect(sheet.amount(1)).toHaveValue('2 %')
    await page.keyboard.press('Escape')
    await expect(sheet.amount(1)).toHaveValue('1 %')
  })

  await test.step('one cell is one step of undo', async () => {
    await page.keyboard.type('2.5 %')
    await page.keyboard.press('Enter')
    await page.keyboard.press('Control+z')
    await expect(sheet.amount(1)).toHaveValue('1 %')
    await page.keyboard.press('Control+Shift+z')
    await expect(sheet.amount(1)).toHaveValue('2.5 %')
    await page.keyboard.press('Control+z')
    await page.keyboard.press('Control+y')
    await expect(sheet.amount(1)).toHaveValue('2.5 %')
  })

  await test.step('lines move and go, and the hand is never lost', async () => {
    await sheet.amount(1).focus()
    await page.keyboard.press('Alt+ArrowDown')
    await expect(sheet.amount(2)).toHaveValue('2.5 %')
    await expect(sheet.amount(2)).toBeFocused()
    await page.keyboard.press('Control+Delete')
    await expect(sheet.lines).toHaveCount(1)
    await expect(page.locator('table.sheet-table :focus')).toHaveCount(1)
    await page.keyboard.press('Control+z')
    await expect(sheet.lines).toHaveCount(2)
  })
})

test('ingredients are found by synonym and in spite of a typing error', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addRow.focus()
  await page.keyboard.type('glucose')
  await expect(sheet.candidates.filter({ hasText: 'Dextrose' }).first()).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(sheet.candidates).toHaveCount(0)
  await page.keyboard.type('pilocrapine')
  await expect(sheet.candidates.filter({ hasText: 'Pilocarpine hydrochloride' })).toBeVisible()
  await page.keyboard.press('ArrowDown')
  await page.keyboard.press('ArrowUp')
  await expect(sheet.candidates.first()).toHaveAttribute('aria-selected', 'true')
})

test('the order is edited where it stands', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await page.getByRole('textbox', { name: 'Final volume' }).fill('50 mL')
  await page.getByRole('combobox', { name: 'Route' }).selectOption('nasal')
  await page
    .getByRole('combobox', { name: 'Quantity to bring to a target' })
    .selectOption('freezing-point-depression')
  await expect(page.getByRole('textbox', { name: 'Target' })).toHaveValue('0.52 K')
  await expect(page.getByRole('columnheader', { name: /weigh for 50 mL/ })).toBeAttached()
  await page.keyboard.press('Control+z')
  await page.keyboard.press('Control+z')
  await page.keyboard.press('Control+z')
  await expect(page.getByRole('combobox', { name: 'Route' })).toHaveValue('ophthalmic')
})

test('rows copied from a spreadsheet become lines in one step', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  const sheet = new SheetPage(page)
  await sheet.open()
  await page.evaluate(() =>
    navigator.clipboard.writeText(
      'Ingredient\tAmount\nBoric acid\t1.5 %\nNo such substance\t1 %\nSodium chloride\tq.s.',
    ),
  )
  await sheet.addRow.focus()
  await page.keyboard.press('Control+v')
  await expect(sheet.lines).toHaveCount(3)
  await expect(sheet.ingredient(2)).toHaveValue('No such substance')
  await expect(sheet.ingredient(2)).toHaveAttribute('aria-invalid', 'true')
  await expect(sheet.blocked).toBeVisible()
  await page.keyboard.press('Control+z')
  await expect(sheet.lines).toHaveCount(0)
})
