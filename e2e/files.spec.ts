import { readFileSync } from 'node:fs'
import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

const valid = {
  format: 'evenwater.formula',
  version: 1,
  title: 'Opened',
  route: 'nasal',
  finalVolume: '30 mL',
  lines: [{ key: 'a', ingredient: 'sodium-chloride', amount: '0.9 %' }],
}

const hostile: Readonly<Record<string, string>> = {
  'no JSON': '{"format": "evenwater',
  empty: '',
  'another format': '{"hello": [1, 2, 3]}',
  'a newer version': JSON.stringify({ ...valid, version: 99 }),
  'lines that are no lines': JSON.stringify({ ...valid, lines: 'all of them' }),
  'not a number where one must be': JSON.stringify({ ...valid, pH: 'NaN' }),
  'far too deep': '['.repeat(50_000) + ']'.repeat(50_000),
  'a prototype in disguise':
    '{"__proto__": {"format": "evenwater.formula"}, "constructor": {"prototype": {"x": 1}}}',
  huge: JSON.stringify({ ...valid, notes: 'x'.repeat(2_000_000) }),
}

for (const [kind, text] of Object.entries(hostile)) {
  test(`a file with ${kind} is refused in a plain sentence and nothing is lost`, async ({ page }) => {
    const failures: string[] = []
    page.on('pageerror', (error) => failures.push(error.message))
    const sheet = new SheetPage(page)
    await sheet.open()
    await sheet.addLine('mannitol', '5 %')
    await sheet.openFile('bad.json', text)
    await expect(sheet.notices).toContainText('“bad.json” was not opened.')
    await expect(sheet.notices).toContainText('unchanged')
    await expect(sheet.lines).toHaveCount(1)
    await expect(sheet.amount(1)).toHaveValue('5 %')
    expect(failures).toEqual([])
  })
}

test('a script in a title is text', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  const title = '<img src=x onerror="document.body.innerHTML=1">'
  await sheet.openFile('script.json', JSON.stringify({ ...valid, title }))
  await expect(page.getByRole('textbox', { name: 'Title' })).toHaveValue(title)
  await expect(page.locator('img')).toHaveCount(0)
})

test('opening is one step that can be taken back', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('mannitol', '5 %')
  await sheet.openFile('good.json', JSON.stringify(valid))
  await expect(page.getByRole('textbox', { name: 'Title' })).toHaveValue('Opened')
  await page.keyboard.press('Control+z')
  await expect(sheet.amount(1)).toHaveValue('5 %')
})

test('a saved file holds the formula and opens again as it was', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Irrigation')
  await expect(sheet.lines).not.toHaveCount(0)
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save as file' }).click(),
  ])
  expect(download.suggestedFilename()).toBe('demo-irrigation.evenwater.json')
  const text = readFileSync(await download.path(), 'utf8')
  const amounts = await page
    .locator('input[data-column="amount"]')
    .evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value))
  await page.getByRole('button', { name: 'New' }).click()
  await expect(sheet.lines).toHaveCount(0)
  await sheet.openFile('again.json', text)
  await expect(sheet.lines).toHaveCount(amounts.length)
  expect((JSON.parse(text) as typeof valid).lines.map((line) => line.amount)).toEqual(amounts)
})

for (const name of [
  'Eye drop',
  'Nasal spray',
  'Nebuliser solution',
  'Intravenous electrolytes',
  'Irrigation',
]) {
  test(`the demo order “${name}” gives numbers and says that it is invented`, async ({ page }) => {
    const sheet = new SheetPage(page)
    await sheet.open()
    await sheet.openDemo(name)
    await expect(sheet.running).toContainText('mOsm/kg')
    await expect(sheet.blocked).toHaveCount(0)
    await expect(page.getByRole('textbox', { name: 'Title' })).toHaveValue(/^Demo /)
  })
}
