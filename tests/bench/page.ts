import { chromium, type Browser, type Page } from '@playwright/test'
import { builtPage, serveFolder } from '../../e2e/built-page.ts'
import { loadLibrary } from '../../src/library/library.ts'
import type { Formula } from '../../src/formula/types.ts'

/*
 * The built page in a real browser, slowed down: a keystroke in a formula of many lines until its result is painted,
 * and the first load until the page can be typed into and until it calculates. Prints JSON; needs `npm run build`.
 */

const slowdown = 4
const lineCount = 40
const keystrokes = 60
const loads = 7
/** Between two keystrokes, so that each is measured alone. */
const restMs = 400

const salts = [
  'sodium-chloride',
  'potassium-chloride',
  'sodium-acetate-trihydrate',
  'calcium-chloride-dihydrate',
]

function formula(): Formula {
  const weighable = [...loadLibrary().ingredients.values()]
    .filter(({ id, state, molarMass, sodiumChlorideEquivalents }) => {
      return state === 'solid' && molarMass && sodiumChlorideEquivalents.length > 0 && !salts.includes(id)
    })
    .map(({ id }) => id)
  const ids = [...salts, ...weighable].slice(0, lineCount)
  if (ids.length < lineCount) throw new Error(`The library has only ${ids.length} ingredients for the bench.`)
  return {
    format: 'evenwater.formula',
    version: 1,
    title: 'bench',
    route: 'irrigation',
    finalVolume: '1000 mL',
    lines: ids.map((ingredient, index) => ({ key: `l${index}`, ingredient, amount: '250 mg' })),
  }
}

const rankOf = (values: readonly number[], share: number) =>
  values.toSorted((a, b) => a - b)[Math.min(values.length - 1, Math.ceil(share * values.length) - 1)] ??
  Number.NaN

const summary = (values: readonly number[]) => ({
  count: values.length,
  medianMs: Math.round(rankOf(values, 0.5)),
  p95Ms: Math.round(rankOf(values, 0.95)),
  mostMs: Math.round(Math.max(...values)),
})

async function slowPage(browser: Browser): Promise<Page> {
  const context = await browser.newContext({
    viewport: { width: 1280, height: 900 },
    serviceWorkers: 'block',
  })
  const page = await context.newPage()
  // The runner names functions through a helper of its own, which the page does not know.
  await page.addInitScript({ content: 'globalThis.__name = (named) => named' })
  const session = await context.newCDPSession(page)
  await session.send('Emulation.setCPUThrottlingRate', { rate: slowdown })
  return page
}

/** From the key going down to the frame in which the mass of its line has changed. */
function oneKeystroke(page: Page, row: number, digit: string): Promise<number> {
  const measured = page.evaluate(async (order) => {
    const input = document.querySelector<HTMLInputElement>(`input[data-column="amount"][data-row="${order}"]`)
    const figure = input?.closest('tr')?.querySelector('td.figure')
    if (!input || !figure) throw new Error('The line of the bench is not there.')
    input.focus()
    input.setSelectionRange(0, 1)
    const began = new Promise<number>((resolve) => {
      input.addEventListener('keydown', (event) => resolve(event.timeStamp), { once: true })
    })
    const painted = new Promise<number>((resolve) => {
      const before = figure.textContent
      const observer = new MutationObserver(() => {
        if (figure.textContent === before || /no figure/.test(figure.textContent ?? '')) return
        observer.disconnect()
        requestAnimationFrame(() => {
          const { port1, port2 } = new MessageChannel()
          port1.addEventListener('message', () => resolve(performance.now()), { once: true })
          port1.start()
          port2.postMessage(null)
        })
      })
      observer.observe(figure, { childList: true, subtree: true, characterData: true })
    })
    return (await painted) - (await began)
  }, row)
  return page
    .waitForTimeout(restMs)
    .then(() => page.keyboard.press(digit))
    .then(() => measured)
}

async function keystrokeTimes(browser: Browser, address: string): Promise<readonly number[]> {
  const page = await slowPage(browser)
  await page.goto(address)
  const buffer = Buffer.from(JSON.stringify(formula()), 'utf8')
  await page
    .locator('input.file-picker')
    .setInputFiles({ name: 'bench.json', mimeType: 'application/json', buffer })
  await page
    .locator('tr.line')
    .nth(lineCount - 1)
    .waitFor()
  await page.locator('.running', { hasText: 'mOsm/kg' }).waitFor()
  const times: number[] = []
  for (let index = 0; index < keystrokes + 5; index += 1) {
    const time = await oneKeystroke(page, 20, String((index % 8) + 1 === 2 ? 9 : (index % 8) + 1))
    // The first few warm the machine up.
    if (index >= 5) times.push(time)
  }
  await page.context().close()
  return times
}

interface Load {
  readonly toFirstKeystroke: number
  readonly toCalculating: number
}

async function oneLoad(browser: Browser, address: string): Promise<Load> {
  const page = await slowPage(browser)
  await page.addInitScript(() => {
    const marks = { ready: 0, calculates: 0 }
    Object.assign(window, { marks })
    const look = () => {
      const running = document.querySelector('.running')?.textContent ?? ''
      if (marks.ready === 0 && document.querySelector('input[role="combobox"]'))
        marks.ready = performance.now()
      if (running !== '' && !running.includes('calculating')) marks.calculates = performance.now()
      if (marks.calculates === 0) requestAnimationFrame(look)
    }
    requestAnimationFrame(look)
  })
  await page.goto(address)
  await page.waitForFunction(
    () => (window as unknown as { marks: { calculates: number } }).marks.calculates > 0,
  )
  const { ready, calculates } = await page.evaluate(
    () => (window as unknown as { marks: { ready: number; calculates: number } }).marks,
  )
  await page.context().close()
  return { toFirstKeystroke: ready, toCalculating: calculates }
}

async function run(): Promise<void> {
  const server = await serveFolder(builtPage)
  const browser = await chromium.launch({
    executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
    args: ['--headless', '--no-sandbox', '--disable-gpu', '--disable-background-networking'],
  })
  try {
    const loaded: Load[] = []
    for (let count = 0; count < loads; count += 1) loaded.push(await oneLoad(browser, server.address))
    const typed = await keystrokeTimes(browser, server.address)
    const result = {
      slowdown,
      keystrokeToPaintedResult: { lines: lineCount, ...summary(typed) },
      loadToFirstKeystroke: summary(loaded.map(({ toFirstKeystroke }) => toFirstKeystroke)),
      loadToCalculating: summary(loaded.map(({ toCalculating }) => toCalculating)),
    }
    console.log(JSON.stringify(result, null, 2))
  } finally {
    await browser.close()
    await server.stop()
  }
}

await run()
