import { expect, test } from '@playwright/test'
import { SheetPage } from './sheet-page.ts'

test('a strict policy is in the page, nothing breaks it, and no request leaves localhost', async ({
  page,
}) => {
  const strangers: string[] = []
  const violations: string[] = []
  const failures: string[] = []
  page.on('request', (request) => {
    const { hostname, protocol } = new URL(request.url())
    if (hostname !== 'localhost' && protocol !== 'data:' && protocol !== 'blob:')
      strangers.push(request.url())
  })
  page.on('console', (message) => {
    if (message.type() === 'error') violations.push(message.text())
  })
  page.on('pageerror', (error) => failures.push(error.message))
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      throw new Error(`policy: ${event.violatedDirective} ${event.blockedURI}`)
    })
  })

  const sheet = new SheetPage(page)
  await sheet.open()
  for (const name of ['Eye drop', 'Intravenous electrolytes']) {
    await sheet.openDemo(name)
    await expect(sheet.running).toContainText('mOsm/kg')
    await expect(page.locator('.recharts-surface').first()).toBeVisible()
  }
  await page.reload()
  await expect(sheet.lines).not.toHaveCount(0)

  const policy = await page.locator('meta[http-equiv="Content-Security-Policy"]').getAttribute('content')
  expect(policy).toContain("default-src 'none'")
  expect(policy).not.toMatch(/unsafe|\*|https?:/)
  expect(strangers).toEqual([])
  expect(violations).toEqual([])
  expect(failures).toEqual([])
})
