import { cp, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, test } from '@playwright/test'
import { copyOf } from '../.run/page/offlineCopy.ts'
import { builtPage, serveFolder } from './built-page.ts'
import { SheetPage } from './sheet-page.ts'

test.use({ serviceWorkers: 'allow' })

const kept = 'A copy of this page is kept in this browser'
const newVersion = 'A new version is ready'

test('with the server stopped the page opens, calculates, draws, samples and shows the sheet', async ({
  page,
}) => {
  const server = await serveFolder(builtPage)
  const sheet = new SheetPage(page)
  await page.goto(server.address)
  await expect(page.getByText(kept)).toBeVisible({ timeout: 20_000 })
  await server.stop()
  await expect(page.request.get(server.address)).rejects.toThrow(/ECONNREFUSED/)

  await page.reload()
  await sheet.addLine('sodium chloride', '0.9 %')
  await expect(sheet.running).toContainText('28')
  await expect(sheet.running).toContainText('mOsm/kg')
  await expect(page.locator('.recharts-surface').first()).toBeVisible()
  await page.getByRole('button', { name: 'Check the interval with 10,000 draws' }).click()
  await expect(page.getByText(/10,000 draws: mean/)).toBeVisible({ timeout: 20_000 })
  await page.getByRole('heading', { name: 'pH and buffer' }).click()
  await expect(page.getByText('Opening…')).toBeHidden()
  await page.emulateMedia({ media: 'print' })
  await expect(page.locator('.paper-sheet').first()).toContainText(/sodium chloride/i)
})

test('a second window on the same address opens without the server too', async ({ page, context }) => {
  const server = await serveFolder(builtPage)
  await page.goto(server.address)
  await expect(page.getByText(kept)).toBeVisible({ timeout: 20_000 })
  await server.stop()
  const other = await context.newPage()
  await other.goto(`${server.address}index.html#sheet`)
  await expect(other.getByRole('combobox', { name: 'Add an ingredient' })).toBeVisible()
})

test.describe('a newer build', () => {
  let folder = ''

  test.beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'evenwater-'))
    await cp(builtPage, folder, { recursive: true })
  })
  test.afterEach(() => rm(folder, { recursive: true, force: true }))

  /** The same page under another title, with the list of its files as the build would write it. */
  async function publish(title: string): Promise<void> {
    const page = join(folder, 'index.html')
    const worker = join(folder, 'service-worker.js')
    await writeFile(
      page,
      (await readFile(page, 'utf8')).replace(/<title>.*<\/title>/, `<title>${title}</title>`),
    )
    const code = (await readFile(worker, 'utf8')).replace(/^const pageCopy=.*?\};/, '')
    await writeFile(worker, `const pageCopy=${JSON.stringify(copyOf(folder))};${code}`)
  }

  test('waits without touching what is being typed, says so, and starts with the next load', async ({
    page,
  }) => {
    const server = await serveFolder(folder)
    const sheet = new SheetPage(page)
    await page.goto(server.address)
    await expect(page.getByText(kept)).toBeVisible({ timeout: 20_000 })
    await sheet.addRow.focus()
    await page.keyboard.type('mann')
    await publish('Evenwater, next')
    await page.evaluate(async () => (await navigator.serviceWorker.getRegistration())?.update())
    await expect(page.getByText(newVersion)).toBeVisible({ timeout: 20_000 })
    await page.keyboard.type('itol')
    await expect(sheet.addRow).toHaveValue('mannitol')
    await expect(sheet.addRow).toBeFocused()
    await expect(page).toHaveTitle('Evenwater')
    await page.keyboard.press('Enter')
    await page.keyboard.type('5 %')
    await page.keyboard.press('Enter')
    await expect(sheet.running).toContainText('mOsm/kg')

    await page.reload()
    await expect(page).toHaveTitle('Evenwater, next', { timeout: 20_000 })
    await expect(sheet.lines).toHaveCount(1)
    await expect(page.getByText(newVersion)).toBeHidden()
    await server.stop()
    await page.reload()
    await expect(page).toHaveTitle('Evenwater, next')
  })

  test('leaves another window that is open what it runs on', async ({ page, context }) => {
    const server = await serveFolder(folder)
    await page.goto(server.address)
    await expect(page.getByText(kept)).toBeVisible({ timeout: 20_000 })
    const other = await context.newPage()
    await other.goto(server.address)
    await publish('Evenwater, next')
    await page.evaluate(async () => (await navigator.serviceWorker.getRegistration())?.update())
    await expect(page.getByText(newVersion)).toBeVisible({ timeout: 20_000 })
    await page.reload()
    await expect(page).toHaveTitle('Evenwater, next')
    await server.stop()
    await expect(other).toHaveTitle('Evenwater')
    await other.getByRole('heading', { name: 'pH and buffer' }).click()
    await expect(other.getByText('Opening…')).toBeHidden()
    await expect(other.getByText('broke')).toHaveCount(0)
  })

  test('that is mixed with files of another build is not taken', async ({ page }) => {
    const server = await serveFolder(folder)
    await page.goto(server.address)
    await expect(page.getByText(kept)).toBeVisible({ timeout: 20_000 })
    await publish('Evenwater, next')
    await writeFile(join(folder, 'mark.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>')
    const failed = await page.evaluate(async () => {
      const registration = await navigator.serviceWorker.getRegistration()
      const found = new Promise<ServiceWorker | null | undefined>((resolve) =>
        registration?.addEventListener('updatefound', () => resolve(registration.installing)),
      )
      await registration?.update().catch(() => null)
      const worker = await found
      if (worker?.state === 'installing') {
        await new Promise((resolve) => worker.addEventListener('statechange', resolve, { once: true }))
      }
      return worker?.state
    })
    expect(failed).toBe('redundant')
    await expect(page.getByText(newVersion)).toBeHidden()
    await page.reload()
    await expect(page).toHaveTitle('Evenwater')
    await server.stop()
  })
})
