import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { expect, test } from '@playwright/test'
import { extractText, getDocumentProxy } from 'unpdf'
import { singleFile } from '../.run/page/files.ts'
import { builtPage } from './built-page.ts'
import { SheetPage } from './sheet-page.ts'

const address = pathToFileURL(join(builtPage, singleFile)).href

test('one file from disk evaluates, draws, samples and prints, and asks for nothing else', async ({
  page,
}) => {
  const strangers: string[] = []
  const wrong: string[] = []
  page.on('request', (request) => {
    const url = request.url()
    if (url.split('#')[0] !== address && !/^(data|blob):/.test(url)) strangers.push(url)
  })
  page.on('console', (message) => {
    if (message.type() === 'error') wrong.push(message.text())
  })
  page.on('pageerror', (error) => wrong.push(error.message))
  const sheet = new SheetPage(page)
  await page.goto(address)
  await sheet.openDemo('Eye drop')
  await expect(sheet.running).toContainText('mOsm/kg')
  const figure = /\d+ mOsm\/kg/.exec((await sheet.running.textContent()) ?? '')?.[0] ?? 'no figure'
  await expect(page.locator('.recharts-surface').first()).toBeVisible()
  await page.getByRole('button', { name: 'Check the interval with 10,000 draws' }).click()
  await expect(page.getByText(/10,000 draws: mean/)).toBeVisible({ timeout: 20_000 })
  await page.getByRole('heading', { name: 'pH and buffer' }).click()
  await expect(page.getByText('Opening…')).toBeHidden()
  const pdf = await page.pdf({ preferCSSPageSize: true })
  const { text } = await extractText(await getDocumentProxy(new Uint8Array(pdf)), { mergePages: true })
  expect(text).toContain(figure.replace(' mOsm/kg', ''))
  expect(text).toMatch(/page 1 of \d/i)
  expect(strangers).toEqual([])
  expect(wrong).toEqual([])
})

test('what was typed is there again when the file is opened again', async ({ page }) => {
  const sheet = new SheetPage(page)
  await page.goto(address)
  await sheet.addLine('sodium chloride', '0.9 %')
  await expect(sheet.running).toContainText('mOsm/kg')
  await page.goto('about:blank')
  await page.goto(address)
  await expect(sheet.lines).toHaveCount(1)
})

test('where the browser keeps nothing for a file that is said, and the sheet still calculates', async ({
  page,
}) => {
  await page.addInitScript(() => {
    IDBFactory.prototype.open = () => {
      throw new DOMException('denied', 'SecurityError')
    }
  })
  const sheet = new SheetPage(page)
  await page.goto(address)
  await sheet.addLine('sodium chloride', '0.9 %')
  await expect(sheet.running).toContainText('mOsm/kg')
  await expect(sheet.notices).toContainText('Save as file')
})

test('its policy names the one script and the one style sheet by their hashes', async () => {
  const text = await readFile(join(builtPage, singleFile), 'utf8')
  const policy = /http-equiv="Content-Security-Policy" content="([^"]*)"/.exec(text)?.[1] ?? ''
  expect(policy).toMatch(/script-src 'sha256-[\w+/=]{44}';/)
  expect(policy).toMatch(/style-src 'sha256-[\w+/=]{44}';/)
  expect(policy).not.toMatch(/unsafe|\*|https?:/)
})
