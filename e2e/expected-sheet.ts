import { readFileSync } from 'node:fs'
import { evaluate } from '../src/evaluation/evaluate.ts'
import { readFormulaText } from '../src/formula/document.ts'
import { loadLibrary } from '../src/library/library.ts'
import { answer } from '../src/worksheet/answer.ts'
import { buildWorksheet } from '../src/worksheet/build.ts'

/* Prints what the sheet of a formula file must say: every string of the model, and the headless answer beside it. */

const [file = ''] = process.argv.slice(2)
const read = readFormulaText(readFileSync(file, 'utf8'))
if (!read.ok) throw new Error(read.refusal.message)
const library = loadLibrary()
const evaluation = evaluate(read.formula, library)

function stringsOf(value: unknown): readonly string[] {
  if (typeof value === 'string') return [value]
  if (typeof value !== 'object' || value === null) return []
  return Object.values(value).flatMap(stringsOf)
}

const sheet = buildWorksheet(evaluation, library, 'A4')
process.stdout.write(JSON.stringify({ strings: stringsOf(sheet), answer: answer(evaluation, library) }))
