import { expect, test, type Page } from '@playwright/test'
import { documentIds, type DocumentId } from '../src/worksheet/types.ts'
import { documentKinds } from '../src/worksheet/kinds.ts'
import {
  expectedOf,
  figuresIn,
  keepPaper,
  printed,
  squeezed,
  stringsOf,
  wholesOf,
  type Expected,
  type PaperPage,
} from './paper.ts'
import { SheetPage } from './sheet-page.ts'

/* The model is asked in a process of its own, which takes its time on a busy machine. */
test.describe.configure({ timeout: 120_000 })

const whole = (pages: readonly PaperPage[]) => pages.map(({ text }) => text).join(' ')

/** Page and step numbers come from the style sheet, not from the model. */
function layoutNumbers({ documents }: Expected, pages: readonly PaperPage[]): readonly string[] {
  const steps = documents.flatMap(({ sections }) =>
    sections.map((section) => (section.kind === 'steps' ? section.steps.length : 0)),
  )
  const most = Math.max(pages.length, ...steps)
  return Array.from({ length: most }, (_, index) => String(index + 1))
}

/** Every figure of the model stands on paper, and every figure on paper is the model's. */
function sameFigures(expected: Expected, pages: readonly PaperPage[]): void {
  const layout = new Set(layoutNumbers(expected, pages))
  const onPaper = figuresIn(whole(pages))
  const inModel = figuresIn(stringsOf(expected.documents).join(' \n '))
  expect([...onPaper].filter((figure) => !inModel.has(figure) && !layout.has(figure))).toEqual([])
  expect([...inModel].filter((figure) => !onPaper.has(figure))).toEqual([])
}

/** Every text of the model stands on paper whole, and what belongs together on one page. */
function nothingCut({ documents }: Expected, pages: readonly PaperPage[]): void {
  const text = squeezed(whole(pages))
  const sheets = pages.map((page) => squeezed(page.text))
  for (const { sections } of documents) {
    for (const section of sections) {
      for (const parts of wholesOf(section)) {
        const shown = parts.map(squeezed)
        expect(
          sheets.some((sheet) => shown.every((part) => sheet.includes(part))),
          `${section.heading}: ${parts.join(' | ')}`,
        ).toBe(true)
      }
    }
  }
  for (const string of stringsOf(documents.map(({ sections }) => sections))) {
    if (!text.includes(squeezed(string))) expect(whole(pages)).toContain(string)
  }
}

const millimetre = 72 / 25.4

/** Inside the margins, nothing smaller than 9 points, black on white needs no test of colour. */
function insideAndLegible(pages: readonly PaperPage[]): void {
  for (const { pieces, width, height } of pages) {
    for (const piece of pieces) {
      const at = `“${piece.text}”`
      expect(piece.left, at).toBeGreaterThanOrEqual(10 * millimetre)
      expect(piece.right, at).toBeLessThanOrEqual(width - 10 * millimetre)
      expect(piece.bottom, at).toBeGreaterThan(4 * millimetre)
      expect(piece.bottom + piece.size, at).toBeLessThan(height - 8 * millimetre)
      expect(piece.size, at).toBeGreaterThan(8.95)
    }
  }
}

/** Under each heading there is something of its own on the same page. */
function noOrphanHeading({ documents }: Expected, pages: readonly PaperPage[]): void {
  const headings = new Set(
    documents.flatMap(({ sections }) => sections.map(({ heading }) => squeezed(heading))),
  )
  for (const [index, { pieces }] of pages.entries()) {
    const foot = Math.max(
      ...pieces.filter(({ text }) => /^page \d+ of/.test(text.trim())).map(({ bottom }) => bottom),
    )
    const body = pieces.filter(({ bottom }) => bottom > foot + 1)
    const lowest = Math.min(...body.map(({ bottom }) => bottom))
    const last = body
      .filter(({ bottom }) => Math.abs(bottom - lowest) < 1)
      .map(({ text }) => text)
      .join('')
    expect(headings.has(squeezed(last)), `page ${index + 1} ends with ${last}`).toBe(false)
  }
}

/** Name of the document, batch, library and page number at the foot of every page. */
function marked({ documents }: Expected, pages: readonly PaperPage[]): ReadonlyMap<DocumentId, number> {
  const count = new Map<DocumentId, number>()
  for (const [index, { text }] of pages.entries()) {
    const own = documents.filter(({ pageMark }) => squeezed(text).includes(squeezed(pageMark)))
    expect(own, `page ${index + 1}`).toHaveLength(1)
    expect(text).toMatch(new RegExp(`page ${index + 1} of ${pages.length}`))
    for (const { id } of own) count.set(id, (count.get(id) ?? 0) + 1)
  }
  return count
}

async function choose(page: Page, wanted: readonly DocumentId[]): Promise<void> {
  for (const id of documentIds) {
    await page.getByRole('checkbox', { name: documentKinds[id].name }).setChecked(wanted.includes(id))
  }
  await expect(page.locator('.paper-sheet')).toHaveCount(wanted.length)
}

async function faithful(page: Page, wanted?: readonly DocumentId[]) {
  if (wanted) await choose(page, wanted)
  const expected = await expectedOf(page, wanted)
  const pages = await printed(page)
  sameFigures(expected, pages)
  nothingCut(expected, pages)
  insideAndLegible(pages)
  noOrphanHeading(expected, pages)
  return { expected, pages, count: marked(expected, pages) }
}

const demos = [
  'Eye drop',
  'Low-dose eye drop',
  'Neonatal infusion',
  'Intravenous electrolytes',
  'Nasal spray',
]

for (const name of demos) {
  test(`what is printed of the demo order “${name}” says what the model says`, async ({ page }) => {
    const sheet = new SheetPage(page)
    await sheet.open()
    await sheet.openDemo(name)
    await expect(sheet.running).toContainText('mOsm/kg')
    await expect(page.locator('.paper-sheet')).toHaveCount(2)
    const { pages, count } = await faithful(page)
    await keepPaper(page, name)
    expect(count.get('batch')).toBeLessThanOrEqual(3)
    expect(count.get('checker')).toBe(1)
    const text = whole(pages)
    expect(squeezed(text)).toContain('independentverification')
    expect(text).not.toMatch(/(?<![\d.])\.\d/)
    expect(text).not.toMatch(/µg|\bcc\b|\bIU\b/)
  })
}

test('all documents of an order with an aliquot, on A4 and on Letter', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Low-dose eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  const { pages } = await faithful(page, documentIds)
  await keepPaper(page, 'all documents')
  expect(pages[0]?.width).toBeCloseTo(595, 0)
  await page.getByRole('combobox', { name: 'Paper size' }).selectOption('Letter')
  const letter = await faithful(page, documentIds)
  await keepPaper(page, 'all documents on Letter')
  expect(letter.pages[0]?.width).toBeCloseTo(612, 0)
  expect(letter.count.get('batch')).toBeLessThanOrEqual(3)
})

test('a formula built by keyboard prints the masses and the osmolality of the headless answer', async ({
  page,
}) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('pilocarpine hydrochloride', '1 %')
  await sheet.addLine('boric acid', '0.5 %')
  await sheet.addLine('sodium chloride', 'q.s.')
  await expect(sheet.running).toContainText('mOsm/kg')
  const { expected, pages } = await faithful(page)
  const text = whole(pages)
  const { solution, lines } = expected.answer
  expect(text).toContain(`${Math.round(Number(solution['osmolality_mOsm_per_kg']))} mOsm/kg`)
  for (const line of lines) {
    const grams = Number(line['grams'])
    const shown =
      grams >= 1 ? `${Number(grams.toPrecision(5))} g` : `${Number((grams * 1000).toPrecision(5))} mg`
    expect(text).toContain(shown)
  }
})

test('a blocked formula prints no worksheet', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('sodium chloride', '9')
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
  const text = whole(await printed(page))
  expect(text).toContain('Not a worksheet')
  expect(text).not.toContain('Weigh and measure')
})

test('nothing chosen prints nothing', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.openDemo('Eye drop')
  await expect(page.locator('.paper-sheet')).toHaveCount(2)
  await choose(page, [])
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
})

test('an open stop shuts the sheet until a reason is written', async ({ page }) => {
  const sheet = new SheetPage(page)
  await sheet.open()
  await sheet.addLine('silver nitrate', '1 %')
  await sheet.addLine('sodium chloride', '0.5 %')
  await expect(page.getByText('Stop', { exact: true }).first()).toBeVisible()
  await expect(sheet.printButton).toHaveAttribute('aria-disabled', 'true')
})
