import { expect, type Locator, type Page } from '@playwright/test'

/** The working sheet as a person meets it. */
export class SheetPage {
  readonly page: Page
  readonly addRow: Locator
  readonly running: Locator
  readonly blocked: Locator
  readonly notices: Locator
  readonly printButton: Locator

  constructor(page: Page) {
    this.page = page
    this.addRow = page.getByRole('combobox', { name: 'Add an ingredient' })
    this.running = page.locator('.running')
    this.blocked = page.locator('.blocked')
    this.notices = page.locator('.notices')
    this.printButton = page.getByRole('button', { name: 'Print the sheet' })
  }

  async open(): Promise<void> {
    await this.page.goto('/')
    await expect(this.addRow).toBeVisible()
  }

  /** What the ingredient cell offers. */
  get candidates(): Locator {
    return this.page.getByRole('listbox', { name: 'Ingredients found' }).getByRole('option')
  }

  /** Types a name into the row for adding, takes the first candidate, types its amount. Keyboard only. */
  async addLine(name: string, amount: string): Promise<void> {
    await this.addRow.focus()
    await this.page.keyboard.type(name)
    await expect(this.candidates.first()).toBeVisible()
    await this.page.keyboard.press('Enter')
    await expect(this.amountFocused()).toBeVisible()
    await this.page.keyboard.type(amount)
    await this.page.keyboard.press('Enter')
  }

  amountFocused(): Locator {
    return this.page.locator('input[data-column="amount"]:focus')
  }

  amount(line: number): Locator {
    return this.page.locator(`input[data-column="amount"][data-row="${line - 1}"]`)
  }

  ingredient(line: number): Locator {
    return this.page.locator(`input[data-column="ingredient"][data-row="${line - 1}"]`)
  }

  get lines(): Locator {
    return this.page.locator('tr.line')
  }

  /** The figure cells of a line: weigh, mmol, particles, share, mOsm/kg. */
  figures(line: number): Locator {
    return this.lines.nth(line - 1).locator('td.figure')
  }

  async openDemo(name: string): Promise<void> {
    await this.page.getByText('Demo orders').click()
    await this.page.getByRole('button', { name, exact: true }).click()
  }

  async openFile(name: string, text: string): Promise<void> {
    const buffer = Buffer.from(text, 'utf8')
    await this.page.locator('input.file-picker').setInputFiles({ name, mimeType: 'application/json', buffer })
  }
}
