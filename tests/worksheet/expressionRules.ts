import type { Printed } from './printed.ts'

/**
 * How a quantity may stand on paper, by the error-prone list that is common practice. Trailing zeros are forbidden
 * everywhere, in readings too: the resolution of a pH or a density is said by its limits, and only a box for a
 * weight that was read off a balance may keep its zeros, which no text made here does. Titles of sources and molecular
 * formulas are quoted as they are; a molecular formula stands only beside the full name, and an ion goes by its
 * symbol with its charge (EDTA-4), never by the symbol alone.
 */
interface ExpressionRule {
  readonly name: string
  readonly forbidden: RegExp
}

const units = 'mcg|mg|g|kg|mL|L|mmol|mol|mEq|mOsm|units?|K|%'

export const expressionRules: readonly ExpressionRule[] = [
  { name: 'no trailing zero', forbidden: /\d\.\d*0(?![\d])/ },
  { name: 'no naked decimal point', forbidden: /(?<![\d.])\.\d/ },
  { name: 'no micro sign', forbidden: /[µμ]|\bug\b/ },
  { name: 'no exponent', forbidden: /\d[eE][+\-−]?\d/ },
  {
    name: 'thousands are marked',
    forbidden: new RegExp(`(?<![\\d.,])\\d{4,}(\\.\\d+)?\\s?(${units})(?![A-Za-z])`),
  },
  { name: 'a space before the unit', forbidden: /\d(mcg|mg|mL|mmol|mEq|mOsm|units?)\b/ },
  {
    name: 'no abbreviation of the error-prone list',
    forbidden:
      /(?<![\w·])(U|u|IU|iu|QD|qd|q\.d\.|QOD|qod|cc|MS|MSO4|MgSO4|ZnSO4|HCl|HCT|EDTA(?!-\d)|AZT|CPZ|DPT|MTX|PTU|TAC|TNK|OD|OS|OU|AD|AS|AU|BT|HS|hs|SC|SQ|TIW|D\/C)(?![\w·])/,
  },
  { name: 'no hole', forbidden: /\{\w+(:\w+)?\}|undefined|\bNaN\b|Infinity|\bnull\b/ },
]

export interface Violation extends Printed {
  readonly rule: string
}

/* Between quotation marks stands what a person typed and nobody could read. */
const quoted = /“[^”]*”/g
/* The mark of the library is a sign, not a figure. */
const libraryMark = /\blibrary [0-9a-f]{8}\b/gi
const molecularFormula = /^[A-Z][A-Za-z0-9()·.]*, [\d.,]+ g\/mol/

export const violationsIn = (texts: readonly Printed[]): readonly Violation[] =>
  texts.flatMap(({ at, text }) => {
    const own = text.replaceAll(quoted, '“”').replaceAll(libraryMark, 'library')
    const said = at.endsWith('/small') ? own.replace(molecularFormula, '') : own
    return expressionRules
      .filter(({ forbidden }) => forbidden.test(said))
      .map(({ name }) => ({ rule: name, at, text }))
  })
