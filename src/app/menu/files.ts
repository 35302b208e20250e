import { longestDocument, readFormulaText, writeFormula } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'

export type Opened =
  | { readonly ok: true; readonly formula: Formula; readonly notices: readonly string[] }
  | { readonly ok: false; readonly reason: string; readonly sentence: string }

export const notOpened = (name: string, reason: string): Opened => ({
  ok: false,
  reason,
  sentence: `“${name}” was not opened. ${reason} The sheet on the screen is unchanged.`,
})

/** Reads the text of a formula file; whatever is in it, the answer is a formula or a plain sentence. */
export function openText(name: string, text: string): Opened {
  const read = readFormulaText(text)
  return read.ok ? read : notOpened(name, `${read.refusal.message} ${read.refusal.wayOut}`)
}

/** The same for a file that was picked or dropped; a large one is refused before it is read. */
export async function openFile(file: File): Promise<Opened> {
  if (file.size > longestDocument) {
    return notOpened(file.name, 'The file is far too large to be a formula. Choose another file.')
  }
  try {
    return openText(file.name, await file.text())
  } catch {
    return notOpened(file.name, 'This browser could not read it.')
  }
}

/** A file name made of the title's letters and digits. */
export function fileName(title: string, ending = 'evenwater.json'): string {
  const plain = title
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
  return `${plain || 'formula'}.${ending}`
}

/** Hands the formula to the browser as a download. */
export const saveAsFile = (formula: Formula): void =>
  download(fileName(formula.title), 'application/json', writeFormula(formula))

/** Hands a text to the browser as a file. */
export function download(name: string, type: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type }))
  const link = document.createElement('a')
  link.href = address
  link.download = name
  link.click()
  setTimeout(() => URL.revokeObjectURL(address), 10_000)
}
