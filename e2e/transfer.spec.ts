import { readFileSync } from 'node:fs'
import { expect, test, type Page } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'
import { violations } from './barriers.ts'

const formula = (title: string, amount = '5 %') =>
  JSON.stringify({
    format: 'evenwater.formula',
    version: 1,
    title,
    route: 'nasal',
    finalVolume: '30 mL',
    lines: [{ key: 'a', ingredient: 'mannitol', amount }],
  })

/** Drops files on the page as a hand does. */
async function drop(page: Page, files: readonly (readonly [name: string, text: string])[]) {
  const transfer = await page.evaluateHandle((all) => {
    const data = new DataTransfer()
    for (const [name, text] of all) data.items.add(new File([text], name, { type: 'application/json' }))
    return data
  }, files)
  await page.dispatchEvent('body', 'drop', { dataTransfer: transfer })
}

/** Pastes a text as if it came from a spreadsheet, where the hand is. */
const paste = (page: Page, selector: string, text: string) =>
  page.locator(selector).evaluate((target, pasted) => {
    const data = new DataTransfer()
    data.setData('text/plain', pasted)
    target.dispatchEvent(
      new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }),
    )
  }, text)

test('several files dropped at once go to the shelf, the broken ones are named with the reason', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('urea', '1 %')
  await drop(page, [
    ['one.json', formula('One')],
    ['torn.json', formula('Torn').slice(0, 80)],
    ['two.json', formula('Two')],
    ['newer.json', formula('Newer').replace('"version":1', '"version":99')],
  ])
  await expect(page.getByText('2 of 4 files put on the shelf; 2 not taken')).toBeVisible()
  const refused = page.getByRole('list', { name: 'Files that were not taken' }).getByRole('listitem')
  await expect(refused).toHaveCount(2)
  await expect(refused.nth(0)).toContainText('torn.json')
  await expect(refused.nth(1)).toContainText('version 99')
  await expect(page.locator('.shelf-row')).toHaveCount(2)
  await expect(sheet.amount(1)).toHaveValue('1 %')
  expect(await violations(page)).toEqual([])
  await page.getByRole('button', { name: 'Undo on the shelf' }).click()
  await expect(page.locator('.shelf-row')).toHaveCount(0)
})

test('five hundred files come in, fifty broken ones are named', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await drop(
    page,
    Array.from({ length: 500 }, (_, index): [string, string] => [
      `file-${index}.json`,
      index % 10 === 0 ? '{"broken"' : formula(`Formula ${index}`),
    ]),
  )
  await expect(page.getByText('450 of 500 files put on the shelf; 50 not taken')).toBeVisible()
  await expect(page.locator('.not-imported li')).toHaveCount(50)
  await expect(page.locator('.shelf-row')).toHaveCount(450)
})

test('a table of thirty rows becomes lines in one step, doubtful cells are marked', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  const rows = Array.from({ length: 30 }, (_, index) =>
    index === 4
      ? '%\t0,9\tSodium chloride'
      : index === 7
        ? 'mg\t5\tnobody knows this'
        : `mg\t${index + 1}.5\tUrea`,
  )
  await paste(page, 'body', ['Unit\tAmount\tIngredient', ...rows].join('\r\n'))
  await expect(sheet.lines).toHaveCount(30)
  await expect(sheet.notices).toContainText('Pasted: 30 lines. 2 are in doubt')
  await expect(sheet.amount(5)).toHaveValue('0,9 %')
  await expect(sheet.amount(5)).toHaveAttribute('aria-invalid', 'true')
  await expect(sheet.ingredient(8)).toHaveAttribute('aria-invalid', 'true')
  await expect(page.locator('tr.line-refused')).toHaveCount(2)
  await expect(sheet.blocked.first()).toBeVisible()
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(sheet.lines).toHaveCount(0)
})

test('the text of a formula file pasted outside of a field opens it', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await paste(page, 'body', formula('Pasted'))
  await expect(page.getByRole('textbox', { name: 'Title' })).toHaveValue('Pasted')
})

test('a link opens in a fresh profile, asks nothing of a server, and leaves what stood there on the shelf', async ({
  browser,
  baseURL,
}) => {
  const writer = await browser.newContext({ permissions: ['clipboard-read', 'clipboard-write'] })
  const from = new SheetPage(await writer.newPage())
  await from.page.goto(baseURL ?? '/')
  await from.openDemo('Eye drop')
  await expect(from.page.getByRole('textbox', { name: 'Title' })).toHaveValue(/^Demo /)
  await expect(from.running).toContainText('mOsm/kg')
  const title = await from.page.getByRole('textbox', { name: 'Title' }).inputValue()
  await from.page.getByText('Export').click()
  expect(await violations(from.page)).toEqual([])
  await from.page.getByRole('button', { name: 'Copy a link to this formula' }).click()
  await expect(from.notices).toContainText('The link is copied')
  const link = await from.page.evaluate(() => navigator.clipboard.readText())
  const amounts = await from.page
    .locator('input[data-column="amount"]')
    .evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value))
  await writer.close()

  const fresh = await browser.newContext()
  const to = new SheetPage(await fresh.newPage())
  const asked: string[] = []
  to.page.on('request', (request) => asked.push(request.url()))
  await to.page.goto(link)
  await expect(to.page.getByRole('textbox', { name: 'Title' })).toHaveValue(title)
  await expect(to.lines).toHaveCount(amounts.length)
  await expect(to.running).toContainText('mOsm/kg')
  expect(new URL(to.page.url()).hash).toBe('')
  const secret = link.split('.').at(-1) ?? ''
  expect(asked.filter((url) => url.includes(secret.slice(0, 20)))).toEqual([])

  await test.step('the link again over other work: the work goes to the shelf', async () => {
    await to.page.getByRole('textbox', { name: 'Title' }).fill('My own work')
    await to.page.evaluate((hash) => {
      location.hash = hash
    }, new URL(link).hash)
    await expect(to.page.getByRole('textbox', { name: 'Title' })).toHaveValue(title)
    await expect(to.notices).toContainText('What stood here is on the shelf')
    await to.page.reload()
    await to.page.getByRole('navigation').getByRole('button', { name: 'Shelf', exact: true }).click()
    await expect(to.page.getByRole('button', { name: 'Open My own work' })).toBeVisible()
  })

  await test.step('a damaged and a newer link are refused and nothing is lost', async () => {
    for (const [hash, words] of [
      [`${new URL(link).hash.slice(0, -9)}`, 'damaged'],
      ['#formula=7.00000000.AAAA', 'newer version'],
    ] as const) {
      await to.page.evaluate((next) => {
        location.hash = next
      }, hash)
      await expect(to.notices).toContainText(words)
      await expect(to.page.getByRole('textbox', { name: 'Title' })).toHaveValue(title)
    }
  })
  await fresh.close()
})

test('lines and results are saved as a table', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Nasal spray')
  await expect(sheet.running).toContainText('mOsm/kg')
  await page.getByText('Export').click()
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Lines and results as CSV' }).click(),
  ])
  expect(download.suggestedFilename()).toBe('demo-nasal-spray.csv')
  const text = readFileSync(await download.path(), 'utf8')
  const osmolality = /^osmolality,([\d.]+),mOsm\/kg/m.exec(text)
  expect(osmolality).not.toBeNull()
  await expect(sheet.running).toContainText(`${Math.round(Number(osmolality?.[1]))} mOsm/kg`)
})
