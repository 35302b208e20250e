import { readFileSync } from 'node:fs'
import { evaluate } from '../../evaluation/evaluate.ts'
import { readFormula } from '../../formula/document.ts'
import type { Library } from '../../library/library.ts'
import { answer } from '../../worksheet/answer.ts'

export type FileAnswer =
  { readonly ok: true; readonly json: string } | { readonly ok: false; readonly sentence: string }

/** One formula file as one line of JSON, or one plain sentence why it is none. */
export function answerFile(path: string, library: Library): FileAnswer {
  let content: string
  try {
    content = readFileSync(path, 'utf8')
  } catch {
    return { ok: false, sentence: `The file ${path} cannot be read.` }
  }
  let document: unknown
  try {
    document = JSON.parse(content)
  } catch {
    return { ok: false, sentence: `The file ${path} is not a formula: it is not JSON.` }
  }
  const read = readFormula(document)
  if (!read.ok) return { ok: false, sentence: `The file ${path} is not a formula: ${read.refusal.message}` }
  return { ok: true, json: JSON.stringify(answer(evaluate(read.formula, library), library)) }
}
