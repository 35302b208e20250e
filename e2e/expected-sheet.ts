import { readFileSync } from 'node:fs'
import { evaluate } from '../src/evaluation/evaluate.ts'
import { readFormulaText } from '../src/formula/document.ts'
import { loadLibrary } from '../src/library/library.ts'
import { answer } from '../src/worksheet/answer.ts'
import { buildWorksheet } from '../src/worksheet/build.ts'
import { usualDocuments } from '../src/worksheet/kinds.ts'
import { documentIds } from '../src/worksheet/types.ts'

/*
 * Prints what the documents of a formula file must say, and the headless answer beside them. After the file, the ids
 * of the documents; without any, the usual ones.
 */

const [file = '', ...ids] = process.argv.slice(2)
const read = readFormulaText(readFileSync(file, 'utf8'))
if (!read.ok) throw new Error(read.refusal.message)
const library = loadLibrary()
const evaluation = evaluate(read.formula, library)
const wanted = ids.length === 0 ? usualDocuments : documentIds.filter((id) => ids.includes(id))
const { documents } = buildWorksheet(evaluation, library, 'A4', wanted)
process.stdout.write(JSON.stringify({ documents, answer: answer(evaluation, library) }))
