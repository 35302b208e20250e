import {
  deepestDepression,
  freezingDepression,
  osmolalityAtDepression,
} from '../chemistry/activity/freezing.ts'
import { solveSolution } from '../chemistry/solution.ts'
import type { Conventions } from '../library/conventions.ts'
import type { Library } from '../library/library.ts'
import type {
  ChemistryProblem,
  Composition,
  Dissolved,
  SolutionResult,
  SolutionState,
  SoluteShare,
} from '../chemistry/types.ts'
import type { Ingredient } from '../library/types.ts'

export interface Portion {
  readonly key: string
  readonly ingredient: Ingredient
  readonly grams: number
}

/** The physical setting that all solutions of one evaluation share. */
export interface Setting {
  readonly volumeMl: number
  readonly pH: number | 'solve'
  readonly temperatureCelsius: number
}

export const quick = { temperatures: ['freezing'], uncertainty: false } as const

/** Masses in a volume as the composition that the chemistry room solves. */
export function compositionOf(portions: readonly Portion[], setting: Setting): Composition {
  return {
    volumeLitres: setting.volumeMl / 1000,
    dissolved: portions.filter(({ grams }) => grams > 0).map(dissolvedOf),
    pH: setting.pH,
    temperatureCelsius: setting.temperatureCelsius,
  }
}

function dissolvedOf({ key, ingredient, grams }: Portion): Dissolved {
  const molarMass = ingredient.molarMass?.value
  const amount = molarMass
    ? ({ kind: 'moles', mol: grams / molarMass } as const)
    : ({ kind: 'mass', g: grams } as const)
  return { key, ingredient, amount }
}

/** The solution of some portions; one that makes no physical sense is refused like one that has no answer. */
export function solve(
  portions: readonly Portion[],
  setting: Setting,
  library: Library,
  options?: typeof quick,
): SolutionResult {
  const result = solveSolution(compositionOf(portions, setting), library, options)
  if (result.status === 'refused' || isPhysical(result.state)) return result
  return { status: 'refused', problems: [outsideValidity(portions)] }
}

/** No solute takes water's activity above that of pure water. */
const isPhysical = ({ states, shares }: SolutionState): boolean =>
  Object.values(states).every(({ osmolalityOsmPerKg }) => osmolalityOsmPerKg >= -noise) &&
  shares.every(({ osmolalityOsmPerKg }) => osmolalityOsmPerKg >= -noise)

/* Pure water comes out at the molality of its own ions, give or take rounding. */
const noise = 1e-6

const outsideValidity = (portions: readonly Portion[]): ChemistryProblem => ({
  code: 'model-outside-validity',
  values: {},
  keys: portions.map(({ key }) => key),
  fatal: true,
})

/**
 * What a freezing-point osmometer shows: ΔTf / 1.860 K·kg/mol with the depression from the water activity at
 * freezing. mOsm/kg. Beyond the reach of the ice relation it is continued along its last slope; see
 * `isBeyondOsmometer`.
 */
export function readingOf(state: SolutionState, { cryoscopicConstant }: Conventions): number {
  const { osmolalityOsmPerKg } = state.states.freezing
  return (depressionAt(osmolalityOsmPerKg) / cryoscopicConstant.value) * 1000
}

const deepestOsmolality = osmolalityAtDepression(deepestDepression)
const lastSlope = 1 / (deepestOsmolality - osmolalityAtDepression(deepestDepression - 1))

const depressionAt = (osmolalityOsmPerKg: number): number =>
  osmolalityOsmPerKg < deepestOsmolality
    ? freezingDepression(osmolalityOsmPerKg)
    : deepestDepression + (osmolalityOsmPerKg - deepestOsmolality) * lastSlope

/** So concentrated that no freezing point is reckoned from the ice relation any more. */
export const isBeyondOsmometer = (state: SolutionState): boolean =>
  state.states.freezing.osmolalityOsmPerKg >= deepestOsmolality

/** A solute whose reflection coefficient is not known counts as staying outside; a finding names it. */
export const reflectionOf = ({ reflection }: SoluteShare): number => reflection?.value ?? 1

/** Part of the reading that holds water out of a red cell, mOsm/kg. */
export function effectiveReadingOf(state: SolutionState, conventions: Conventions): number {
  const scale = readingOf(state, conventions) / state.states.freezing.osmolalityOsmPerKg
  const effective = state.shares.reduce(
    (sum, share) => sum + reflectionOf(share) * share.osmolalityOsmPerKg,
    0,
  )
  return state.shares.length === 0 ? 0 : scale * effective
}

/** Masses of lines as portions; a line without a mass is no part of the solution. */
export function portionsOf(
  plan: Lines,
  lowered: readonly { readonly key: string; readonly grams: number }[],
): readonly Portion[] {
  const masses = new Map(lowered.map(({ key, grams }) => [key, grams]))
  return [...plan.solutes, ...plan.adjusters, ...plan.fills].flatMap(({ key, ingredient }) => {
    const grams = masses.get(key)
    return grams === undefined ? [] : [{ key, ingredient, grams }]
  })
}

interface Lines {
  readonly solutes: readonly Omit<Portion, 'grams'>[]
  readonly adjusters: readonly Omit<Portion, 'grams'>[]
  readonly fills: readonly Omit<Portion, 'grams'>[]
}
