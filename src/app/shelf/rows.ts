import { readFormulaText } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import { newestVersion, type KeptFormula } from '../storage/formulas.ts'
import { nameOf } from './standing.ts'

export interface ShelfRow {
  readonly kept: KeptFormula
  readonly name: string
  readonly facts: string
  /** False for a document that this version cannot open. */
  readonly readable: boolean
}

const known = new Map<string, Formula | null>()

/** The formula of a kept document, read once; null for one that cannot be opened. */
export function formulaOfText(document: string): Formula | null {
  const before = known.get(document)
  if (before !== undefined) return before
  const read = readFormulaText(document)
  const formula = read.ok ? read.formula : null
  known.set(document, formula)
  return formula
}

const ingredientNames = (formula: Formula, library: Library) =>
  formula.lines.map(({ ingredient }) =>
    typeof ingredient === 'string'
      ? (library.ingredients.get(ingredient)?.name ?? ingredient)
      : ingredient.name,
  )

const moment = new Intl.DateTimeFormat(undefined, { dateStyle: 'medium', timeStyle: 'short' })

/** Date and time of day as this machine writes them. */
export const whenWritten = (at: number) => moment.format(at)

/** What is on the shelf and answers to the text, in title, ingredients or notes; the one changed last first. */
export function shelfRows(
  formulas: readonly KeptFormula[],
  text: string,
  withArchived: boolean,
  library: Library,
): readonly ShelfRow[] {
  const words = text.toLowerCase().split(/\s+/).filter(Boolean)
  return formulas
    .filter(({ archived }) => withArchived || !archived)
    .toSorted((one, other) => newestVersion(other).at - newestVersion(one).at)
    .flatMap((kept) => {
      const newest = newestVersion(kept)
      const formula = formulaOfText(newest.document)
      const names = formula ? ingredientNames(formula, library) : []
      const searched = [kept.title, ...names, ...kept.versions.map(({ note }) => note)]
        .join('\n')
        .toLowerCase()
      if (!words.every((word) => searched.includes(word))) return []
      const what = formula ? linesInWords(names) : 'cannot be opened by this version'
      return [
        {
          kept,
          name: nameOf(kept.title),
          facts: `${whenWritten(newest.at)} · ${what}`,
          readable: formula !== null,
        },
      ]
    })
}

const mostNamed = 4

function linesInWords(names: readonly string[]): string {
  if (names.length === 0) return 'no lines'
  const more = names.length > mostNamed ? ` and ${names.length - mostNamed} more` : ''
  return `${names.slice(0, mostNamed).join(', ')}${more}`
}
