import type { Evaluation } from '../evaluation/types.ts'
import type { Library } from '../library/library.ts'
import { sterileRoutes } from './routes.ts'
import { decimalText, numberText, wholeText } from './say.ts'
import { blankCells, box, cell, words } from './sections.ts'
import type { SheetCell, SheetSection } from './types.ts'

/** Tests with their limits; in the record of a batch with blanks beside them. */
export function readingSection(
  evaluation: Evaluation,
  library: Library,
  kind: 'expected' | 'record',
): SheetSection {
  const isRecord = kind === 'record'
  return {
    kind: 'table',
    heading: isRecord ? 'Readings before release' : 'Quality control: tests and expected results',
    columns: [
      words('Test'),
      words('Accepted'),
      ...(isRecord ? [box('Reading', 'some'), box('Passes'), box('Initials')] : []),
    ],
    rows: rowsOf(evaluation, library).map((row) => (isRecord ? [...row, ...blankCells(3)] : row)),
  }
}

function rowsOf(evaluation: Evaluation, library: Library): readonly (readonly SheetCell[])[] {
  const isSterile = sterileRoutes.has(evaluation.formula.route)
  return [
    [cell('Osmolality, mean of three'), cell(osmolalityLimit(evaluation))],
    [cell('pH at ____ °C, meter checked on two buffers'), cell(pHLimit(evaluation, library))],
    [
      cell('Colour, clarity, particles, on black and on white'),
      cell('clear and free of visible particles; colour as in the master record; else stop and ask'),
    ],
    [
      cell('Filter integrity (bubble point)'),
      cell(
        isSterile
          ? 'at or above ____ by the maker of the filter; below: stop and ask'
          : 'not asked by this route; by local policy where it is filtered',
      ),
    ],
    [
      cell('Sterility and endotoxin'),
      cell(
        isSterile
          ? 'by local policy and starting materials; limit ____'
          : 'not asked by this route; microbial limits by local policy',
      ),
    ],
    [cell('Fill volume or mass of a container'), cell('not below the label volume; limits ____')],
  ]
}

function osmolalityLimit({ solution }: Evaluation): string {
  if (!solution) return 'no limits: the formula is blocked'
  const { value, low, high } = solution.osmolality
  return `expected ${wholeText(value)}; below ${wholeText(low)} or above ${wholeText(high)} mOsm/kg: stop and ask`
}

function pHLimit({ solution, formula }: Evaluation, library: Library): string {
  const { low, high } = library.routes.get(formula.route)?.pH.tolerated ?? {}
  const expected = solution?.pH === undefined || solution.pH === null ? null : decimalText(solution.pH, 2)
  const sides = [
    low === undefined ? '' : `below ${numberText(low, 4)}`,
    high === undefined ? '' : `above ${numberText(high, 4)}`,
  ].filter(Boolean)
  const span =
    sides.length > 0
      ? `${sides.join(' or ')}: stop and ask (limit of the route)`
      : 'no limit of the route is known'
  const own = 'limits of the formula ____'
  return expected === null ? `not predicted; ${span}; ${own}` : `expected ${expected}; ${span}; ${own}`
}
