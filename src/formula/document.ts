import * as v from 'valibot'
import type { Refusal } from '../quantity/amount.ts'
import { quote } from '../quantity/refusal.ts'
import { readIngredient } from '../library/own-ingredient.ts'
import { ingredientSchema } from '../library/schema.ts'
import { inOrderOfSchema, unknownPlaces } from './arrange.ts'
import { climb, thisVersion } from './ladder.ts'
import { withLineKeys } from './lineKeys.ts'
import { issueInWords, placeInWords } from './places.ts'
import { isPlainObject, type PlainObject } from './plainObject.ts'
import { formulaSchema, mostLines } from './schema.ts'
import type { Formula } from './types.ts'

export type FormulaRead =
  | { readonly ok: true; readonly formula: Formula; readonly notices: readonly string[] }
  | { readonly ok: false; readonly refusal: Refusal }

/** Longest text of a file, in characters. */
export const longestDocument = 2_000_000

const refused = (code: string, message: string, wayOut: string): FormulaRead => ({
  ok: false,
  refusal: { code, message, wayOut },
})

const lineList = ({ lines }: PlainObject): readonly unknown[] => (Array.isArray(lines) ? lines : [])

/** A sheet with nothing on it yet: 100 mL for the eye, to be made isotonic. */
export const emptyFormula = (): Formula => ({
  format: 'evenwater.formula',
  version: thisVersion,
  title: '',
  route: 'ophthalmic',
  finalVolume: '100 mL',
  target: { quantity: 'osmolality', value: '290 mOsm/kg' },
  lines: [],
})

/** The first record of a line's own that does not follow the rules of the library, named with its line. */
function refuseOwnRecord(content: PlainObject): FormulaRead | undefined {
  for (const [index, line] of lineList(content).entries()) {
    if (!isPlainObject(line) || !isPlainObject(line.ingredient)) continue
    const shape = v.safeParse(ingredientSchema, line.ingredient, { abortEarly: true })
    if (!shape.success) return refuseIssue(shape.issues[0], ['lines', index, 'ingredient'])
    const read = readIngredient(line.ingredient)
    if (read.ok) continue
    const { code, message, wayOut } = read.refusal
    return refused(code, `Line ${index + 1}: ${message}`, wayOut)
  }
  return undefined
}

const mostNamed = 5

function noticesOf(content: PlainObject): readonly string[] {
  const places = unknownPlaces(content)
  if (places.length === 0) return []
  const named = places.slice(0, mostNamed).map(quote).join(', ')
  const more = places.length > mostNamed ? ` and ${places.length - mostNamed} more` : ''
  return [`Left out, because this version does not know it: ${named}${more}.`]
}

function refuseIssue(issue: v.BaseIssue<unknown>, from: readonly unknown[] = []): FormulaRead {
  const place = placeInWords([...from, ...(issue.path ?? []).map(({ key }) => key)])
  return refused(
    'formula-unreadable',
    `${place} ${issueInWords(issue)}.`,
    'Mend it in the file, or start a new formula and enter it by hand.',
  )
}

/**
 * Reads a formula document of any version from parsed JSON. What the version does not know is left out and
 * named in a notice; a missing title is empty; lines without a key get "line-1", "line-2". Refusals:
 * not-a-formula, version-unreadable, too-many-lines, line-key-repeated, formula-unreadable, and those of an
 * ingredient record of its own.
 * @example readFormula([]) → { ok: false, refusal: { code: 'not-a-formula', message: 'This is not a formula.', wayOut: 'Choose a file that was saved as a formula.' } }
 */
export function readFormula(json: unknown): FormulaRead {
  if (!isPlainObject(json) || json.format !== 'evenwater.formula') {
    return refused('not-a-formula', 'This is not a formula.', 'Choose a file that was saved as a formula.')
  }
  const climbed = climb(json)
  if (!climbed.ok) return climbed
  const count = lineList(climbed.value).length
  if (count > mostLines) {
    return refused(
      'too-many-lines',
      `The formula has ${count} lines; ${mostLines} is the most that is read.`,
      'Split it into several formulas.',
    )
  }
  const keyed = withLineKeys({ title: '', ...climbed.value })
  if (!keyed.ok) return keyed
  const ownRecord = refuseOwnRecord(keyed.value)
  if (ownRecord) return ownRecord
  const result = v.safeParse(formulaSchema, keyed.value, { abortEarly: true })
  if (!result.success) return refuseIssue(result.issues[0])
  return { ok: true, formula: result.output, notices: noticesOf(climbed.value) }
}

/**
 * The same from the text of a file. Refuses also too-large (more than 2,000,000 characters) and not-json.
 * @example readFormulaText('{') → { ok: false, refusal: { code: 'not-json', message: 'The text is not JSON.', wayOut: 'Choose a file that was saved as a formula.' } }
 */
export function readFormulaText(text: string): FormulaRead {
  if (text.length > longestDocument) {
    return refused('too-large', 'The file is far too large to be a formula.', 'Choose another file.')
  }
  let json: unknown
  try {
    json = JSON.parse(text)
  } catch {
    return refused('not-json', 'The text is not JSON.', 'Choose a file that was saved as a formula.')
  }
  return readFormula(json)
}

/** The document as a file holds it: keys in a fixed order, so that the same document is the same text. */
export const writeFormula = (formula: Formula): string =>
  `${JSON.stringify(inOrderOfSchema(formula), null, 2)}\n`
