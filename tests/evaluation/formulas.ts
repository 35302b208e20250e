import type { ElectrolyteClass, Ingredient, SingleDatum } from '../../src/library/types.ts'
import type { Formula, FormulaLine } from '../../src/formula/types.ts'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { ingredientIdOf } from '../../src/library/ingredients.ts'
import { loadLibrary } from '../../src/library/library.ts'
import type { Evaluation, SolutionAnswer } from '../../src/evaluation/types.ts'

export const library = loadLibrary()

/** The figures that a published example gives for a substance of its own. */
export interface OwnRecord {
  readonly name: string
  readonly molarMass?: number
  readonly equivalent?: number
  readonly equivalentAtPercent?: number
  readonly depression?: number
  readonly measuredI?: number
  readonly electrolyteClass?: ElectrolyteClass
  /** Charges of what one formula unit gives. */
  readonly ions?: readonly number[]
}

const datum = (value: number, unit: string): SingleDatum => ({
  value,
  unit,
  kind: 'tabulated',
  source: 'common-practice',
  confidence: 'medium',
  fromMemory: false,
})

/** An ingredient with exactly the figures of the example and nothing else. */
export function ownIngredient(own: OwnRecord): Ingredient {
  const { name, molarMass, equivalent, equivalentAtPercent, depression, measuredI, electrolyteClass, ions } =
    own
  return {
    id: ingredientIdOf(name),
    name,
    synonyms: [],
    crystalWaters: 0,
    state: 'solid',
    percentBasis: 'w/v',
    roles: ['active'],
    tags: [],
    sodiumChlorideEquivalents:
      equivalent === undefined
        ? []
        : [{ atPercent: equivalentAtPercent ?? 1, e: datum(equivalent, 'g NaCl/g') }],
    ...(molarMass === undefined ? {} : { molarMass: datum(molarMass, 'g/mol') }),
    ...(depression === undefined ? {} : { freezingPointDepression1Percent: datum(depression, 'K') }),
    ...(measuredI === undefined ? {} : { measuredI: datum(measuredI, '1') }),
    ...(electrolyteClass === undefined ? {} : { electrolyteClass }),
    ...(ions === undefined
      ? {}
      : {
          releases: ions.map((charge, index) => ({
            species: `${name} ${index + 1}${charge === 0 ? '' : charge > 0 ? `+${charge}` : charge}`,
            count: 1,
            charge,
          })),
        }),
  }
}

export type WrittenLine = Omit<FormulaLine, 'key'>

export const line = (ingredient: string | Ingredient, amount: string): WrittenLine => ({ ingredient, amount })

/** A formula with what the test cares about. */
export function formulaOf(lines: readonly WrittenLine[], rest: Partial<Formula> = {}): Formula {
  return {
    format: 'evenwater.formula',
    version: 1,
    title: 'Test',
    route: 'ophthalmic',
    finalVolume: '100 mL',
    ...rest,
    lines: lines.map((written, index) => ({ key: `line-${index + 1}`, ...written })),
  }
}

export const evaluated = (lines: readonly WrittenLine[], rest: Partial<Formula> = {}): Evaluation =>
  evaluate(formulaOf(lines, rest), library)

/** The solution of a formula that must have one. */
export function solved(evaluation: Evaluation): SolutionAnswer {
  if (evaluation.solution) return evaluation.solution
  throw new Error(`blocked: ${evaluation.findings.map(({ code }) => code).join(', ')}`)
}

export const codesOf = (evaluation: Evaluation): readonly string[] =>
  evaluation.findings.map(({ code }) => code)
