import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, test, type Page } from '@playwright/test'
import { extractText, getDocumentProxy } from 'unpdf'
import { SheetPage } from './sheet-page.ts'

interface Expected {
  readonly strings: readonly string[]
  readonly answer: {
    readonly solution: Readonly<Record<string, number | null>>
    readonly lines: readonly Readonly<Record<string, number | string | null>>[]
  }
}

const numbers = (text: string) =>
  new Set(
    text
      .replaceAll('−', '-')
      .match(/\d[\d,]*(?:\.\d+)?/g)
      ?.map((token) => token.replace(/,$/, '')) ?? [],
  )

async function printed(page: Page): Promise<{ readonly text: string; readonly pages: number }> {
  const pdf = await getDocumentProxy(new Uint8Array(await page.pdf({ preferCSSPageSize: true })))
  const { text, totalPages } = await extractText(pdf, { mergePages: true })
  return { text: String(text), pages: totalPages }
}

/** The saved file of what is on the page, and what the sheet of that file must say. */
async function expectedOf(page: Page): Promise<Expected> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save as file' }).click(),
  ])
  const file = join(mkdtempSync(join(tmpdir(), 'evenwater-')), 'formula.json')
  await download.saveAs(file)
  expect(readFileSync(file, 'utf8')).toContain('evenwater.formula')
  const output = execFileSync(process.execPath, ['--import', 'tsx', 'e2e/expected-sheet.ts', file], {
    encoding: 'utf8',
    maxBuffer: 1 << 26,
  })
  return JSON.parse(output) as Expected
}

/** Page numbers and step numbers come from the style sheet, not from the model. */
const ofLayout = (pages: number) =>
  Array.from({ length: Math.max(pages, 40) }, (_, index) => String(index + 1))

async function compareWithPaper(page: Page): Promise<string> {
  const expected = await expectedOf(page)
  const { text, pages } = await printed(page)
  const onPaper = numbers(text)
  const inModel = numbers(expected.strings.join(' \n '))
  for (const layout of ofLayout(pages)) inModel.add(layout)
  expect([...onPaper].filter((token) => !inModel.has(token))).toEqual([])
  for (const layout of ofLayout(pages)) onPaper.add(layout)
  expect([...inModel].filter((token) => !onPaper.has(token))).toEqual([])
  return text
}

test('a formula built by keyboard prints a sheet whose every number is that of the headless answer', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('pilocarpine hydrochloride', '1 %')
  await sheet.addLine('boric acid', '0.5 %')
  await sheet.addLine('sodium chloride', 'q.s.')
  await expect(sheet.running).toContainText('mOsm/kg')
  const expected = await expectedOf(page)
  const text = await compareWithPaper(page)
  const { solution, lines } = expected.answer
  expect(text).toContain(`${Math.round(Number(solution['osmolality_mOsm_per_kg']))} mOsm/kg`)
  expect(text).toContain(`${Math.round(Number(solution['effective_osmolality_mOsm_per_kg']))} mOsm/kg`)
  for (const line of lines) {
    const grams = Number(line['grams'])
    const shown =
      grams >= 1 ? `${Number(grams.toPrecision(5))} g` : `${Number((grams * 1000).toPrecision(5))} mg`
    expect(text).toContain(shown)
  }
})

for (const name of ['Eye drop', 'Intravenous electrolytes']) {
  test(`the printed sheet of the demo order “${name}” says what the model says`, async ({ page }) => {
    const sheet = new SheetPage(page)
    await sheet.open()
    await sheet.openDemo(name)
    await expect(sheet.running).toContainText('mOsm/kg')
    const text = await compareWithPaper(page)
    expect(text).toContain('independent verification')
    expect(text).toMatch(/page 1 of \d/)
    expect(text).not.toMatch(/(?<![\d.])\.\d/)
    expect(text).not.toMatch(/µg|\bcc\b/)
  })
}

test('a blocked formula prints no worksheet', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('sodium chloride', '9')
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
  const { text } = await printed(page)
  expect(text).toContain('Not a worksheet')
  expect(text).not.toContain('Weigh and measure')
})

test('an open stop shuts the sheet until a reason is written, and the reason is on paper', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('silver nitrate', '1 %')
  await sheet.addLine('sodium chloride', '0.5 %')
  await expect(page.getByText('Stop', { exact: true }).first()).toBeVisible()
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
})
