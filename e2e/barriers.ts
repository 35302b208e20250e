import { AxeBuilder } from '@axe-core/playwright'
import type { Page } from '@playwright/test'

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

/** What the accessibility rules find wrong with the page as it stands, one line for each rule. */
export async function violations(page: Page): Promise<string[]> {
  const found = await new AxeBuilder({ page }).withTags(tags).analyze()
  return found.violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(' | ')}`,
  )
}
