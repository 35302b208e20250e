import type { DocumentId, Paper } from '../../worksheet/types.ts'

let rules: CSSStyleSheet | null = null

/** Text inside a CSS string. */
const quoted = (text: string) => `"${text.replace(/[\\"]/g, '\\$&').replace(/[\n\r\f]/g, ' ')}"`

interface Marked {
  readonly id: DocumentId
  readonly pageMark: string
}

/* The mark may need two lines; the number never does. */
const ofDocument = ({ id, pageMark }: Marked) => `@page ${id} {
    @bottom-left { content: ${quoted(pageMark)}; width: 82%; font: 9pt sans-serif; color: #000; vertical-align: top; padding-top: 2mm; }
  }`

/**
 * Paper size, and on each page the mark of its document and its number. A constructed style sheet, because the marks
 * are only known now and the policy of the page allows no inline style.
 */
export function applyPageRules(paper: Paper, documents: readonly Marked[]): void {
  if (!rules) {
    rules = new CSSStyleSheet()
    document.adoptedStyleSheets = [...document.adoptedStyleSheets, rules]
  }
  rules.replaceSync(`@page {
    size: ${paper === 'A4' ? 'A4' : 'letter'};
    margin: 11mm 12mm 16mm;
    @bottom-right { content: "page " counter(page) " of " counter(pages); width: 18%; font: 9pt sans-serif; color: #000; vertical-align: top; padding-top: 2mm; }
  }
  ${documents.map(ofDocument).join('\n')}`)
}
