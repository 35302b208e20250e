import type { Paper } from '../../worksheet/types.ts'

let rules: CSSStyleSheet | null = null

/** Text inside a CSS string. */
const quoted = (text: string) => `"${text.replace(/[\\"]/g, '\\$&').replace(/[\n\r\f]/g, ' ')}"`

/**
 * Paper size, and on each page the mark of the sheet and its number. A constructed style sheet, because the mark is
 * only known now and the policy of the page allows no inline style.
 */
export function applyPageRules(paper: Paper, pageMark: string): void {
  if (!rules) {
    rules = new CSSStyleSheet()
    document.adoptedStyleSheets = [...document.adoptedStyleSheets, rules]
  }
  rules.replaceSync(`@page {
    size: ${paper === 'A4' ? 'A4' : 'letter'};
    margin: 14mm 13mm 17mm;
    @bottom-left { content: ${quoted(pageMark)}; font: 8pt sans-serif; color: #000; }
    @bottom-right { content: "page " counter(page) " of " counter(pages); font: 8pt sans-serif; color: #000; }
  }`)
}
