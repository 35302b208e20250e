import type { Library } from '../../library/library.ts'
import { loadUsualStrengths } from '../../library/usual-strengths.ts'
import type { Evaluation, LineAnswer, SolutionAnswer } from '../types.ts'
import { bufferCapacityOf } from './bufferCapacity.ts'
import type { CautionContext, CautionLine, CautionPatient, CautionSolution } from './context.ts'

/** What an evaluation says, as the caution rules want it. */
export function cautionContextOf(
  evaluation: Evaluation,
  patient: CautionPatient,
  library: Library,
): CautionContext {
  const { formula, volumeMl, solution } = evaluation
  const limits = library.routes.get(formula.route)
  if (!limits) throw new Error(`data/routes has no limits for ${formula.route}`)
  const lines = evaluation.lines.map((line) => cautionLine(line, volumeMl))
  return {
    formula,
    routeId: formula.route,
    limits,
    patient,
    lines,
    solution: solution && solutionOf(solution, () => bufferCapacityOf(evaluation, library)),
    ionTotals: ionTotalsOf(lines, library),
    volumeMl,
    usualStrengths: loadUsualStrengths(),
  }
}

/** A line in the units of the caution rules; what needs an unknown volume or molar mass is null. */
export function cautionLine(
  { key, ingredient, grams, millimoles, isAdjuster }: LineAnswerPart,
  volumeMl: number | null,
): CautionLine {
  const charges = (ingredient.releases ?? []).reduce(
    (sum, { charge, count }) => sum + Math.max(0, charge) * count,
    0,
  )
  const mmolPerL = millimoles === null || volumeMl === null ? null : (millimoles / volumeMl) * 1000
  return {
    key,
    ingredient,
    grams,
    mmol: millimoles,
    concentrations: {
      percentWV: grams === null || volumeMl === null ? null : (grams / volumeMl) * 100,
      mmolPerL,
      mEqPerL: mmolPerL === null || charges === 0 ? null : mmolPerL * charges,
    },
    isAdjuster,
  }
}

type LineAnswerPart = Pick<LineAnswer, 'key' | 'ingredient' | 'grams' | 'millimoles' | 'isAdjuster'>

const solutionOf = (solution: SolutionAnswer, capacity: () => number | null): CautionSolution => ({
  osmolality: solution.osmolality.value,
  effectiveOsmolality: solution.effectiveOsmolality.value,
  intervals: { osmolality: solution.osmolality, effectiveOsmolality: solution.effectiveOsmolality },
  freezingPointDepressionK: solution.freezingPointDepressionK,
  osmolarity: solution.osmolarityMilliosmPerL,
  labelOsmolarity: solution.labelOsmolarityMilliosmPerL,
  sodiumChlorideEquivalentPercent: solution.sodiumChlorideEquivalentPercent,
  pH: solution.pH,
  bufferCapacity: capacity,
})

/** mmol/L of each ion or component as put in; null where a line that gives it has no known strength. */
export function ionTotalsOf(
  lines: readonly CautionLine[],
  { species }: Pick<Library, 'species'>,
): Readonly<Record<string, number | null>> {
  const totals: Record<string, number | null> = {}
  for (const { ingredient, concentrations } of lines) {
    for (const released of ingredient.releases ?? []) {
      const record = species.get(released.species)
      const name = record?.component ?? released.species
      const earlier = totals[name] === undefined ? 0 : totals[name]
      const { mmolPerL } = concentrations
      totals[name] =
        earlier === null || mmolPerL === null
          ? null
          : earlier + mmolPerL * released.count * (record?.count ?? 1)
    }
  }
  return totals
}
