import { freezingDepression } from '../../../src/chemistry/activity/freezing.ts'
import { solveSolution } from '../../../src/chemistry/solution.ts'
import type { SolutionState, Temperature } from '../../../src/chemistry/types.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import named from '../FreezingPoints/named.json'
import isopiesticFits from '../IsopiesticPairs/fitted.json'
import standards from '../OsmometerStandards/rows.json'
import { rowsOf } from '../support/rows.ts'
import { library, particles, solute } from '../support/salts.ts'

/** One measured value, and what the program gives for it with the standard uncertainty it states itself. */
export interface Measured {
  readonly table: 'standards' | 'fluids' | 'osmotic coefficients' | 'isopiestic pairs' | 'freezing points'
  readonly label: string
  /** Name of the solute in the support tables. */
  readonly solute: string
  readonly molality: number
  /** osmol/kg, or K for a freezing point. */
  readonly measured: number
  readonly ours: number
  readonly standardUncertainty: number
  /** Half a unit of the last printed digit. */
  readonly halfDigit: number
  /** A parameter was fitted to the row: it checks nothing, and is left out of every count. */
  readonly isFitted: boolean
}

export interface Answer {
  readonly osmolality: number
  readonly relative: number
}

/** One solute in water at one temperature, with the relative standard uncertainty of its osmolality. */
export function answerOf(ingredient: Ingredient, molality: number, temperature: Temperature): Answer {
  const state = stateOf(ingredient, { kind: 'per-water', molPerKg: molality }, temperature)
  const { osmolalityOsmPerKg: osmolality } = state.states[temperature]
  return { osmolality, relative: relativeOf(state, osmolality) }
}

function relativeOf({ uncertainty }: SolutionState, osmolality: number): number {
  const sum = uncertainty.reduce((squares, part) => squares + part.osmolalityMilliosmPerKg ** 2, 0)
  return Math.sqrt(sum) / (1000 * osmolality)
}

type Amount = Parameters<typeof solveSolution>[0]['dissolved'][number]['amount']

export function stateOf(ingredient: Ingredient, amount: Amount, temperature: Temperature): SolutionState {
  const dissolved = [{ key: ingredient.id, ingredient, amount }]
  const composition = { volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved } as const
  const result = solveSolution(composition, library, { temperatures: [temperature], uncertainty: true })
  if (result.status === 'refused') throw new Error(`${ingredient.id}: ${JSON.stringify(result.problems)}`)
  return result.state
}

const halfDigitOf = (printed: string) => 0.5 * 10 ** -(printed.split('.')[1]?.length ?? 0)

function ofStandards(): readonly Measured[] {
  const molarMass = library.ingredients.get('sodium-chloride')?.molarMass?.value ?? Number.NaN
  return standards.rows.map(({ gramsPerKgWater, osmolality, depressionKelvin }) => {
    const molality = gramsPerKgWater / molarMass
    const { osmolality: ours, relative } = answerOf(solute('NaCl'), molality, 'freezing')
    const kelvin = freezingDepression(ours)
    return {
      table: 'standards',
      label: `NaCl ${osmolality} mOsm/kg`,
      solute: 'NaCl',
      molality,
      measured: depressionKelvin,
      ours: kelvin,
      standardUncertainty: kelvin * relative,
      halfDigit: 0.0005,
      isFitted: standards.fitted.includes(osmolality),
    }
  })
}

function ofOsmoticCoefficients(): readonly Measured[] {
  return rowsOf(new URL('../OsmoticCoefficients/rows.csv', import.meta.url)).map((row) => {
    const { solute: name = '', phi = '' } = row
    const molality = Number(row['molality'])
    const ideal = particles(name) * molality
    const { osmolality, relative } = answerOf(solute(name), molality, '25')
    return {
      table: 'osmotic coefficients',
      label: `${name} ${molality}`,
      solute: name,
      molality,
      measured: Number(phi) * ideal,
      ours: osmolality,
      standardUncertainty: osmolality * relative,
      halfDigit: halfDigitOf(phi) * ideal,
      isFitted: false,
    }
  })
}

const fittedPairs = new Set(isopiesticFits.rows)
const fittedSolutes = new Set(isopiesticFits.solutes)

function ofIsopiesticPairs(): readonly Measured[] {
  return rowsOf(new URL('../IsopiesticPairs/rows.csv', import.meta.url)).map((row) => {
    const { solute: name = '', molality: printed = '', reference = '' } = row
    const molality = Number(printed)
    const { osmolality, relative } = answerOf(solute(name), molality, '25')
    const standard = answerOf(solute(reference), Number(row['referenceMolality']), '25')
    return {
      table: 'isopiestic pairs',
      label: `${name} ${printed} ${reference} ${row['referenceMolality']}`,
      solute: name,
      molality,
      measured: standard.osmolality,
      ours: osmolality,
      standardUncertainty: Math.hypot(osmolality * relative, standard.osmolality * standard.relative),
      halfDigit: (halfDigitOf(printed) / molality) * osmolality,
      isFitted: fittedSolutes.has(name) || fittedPairs.has(`${name} ${printed}`),
    }
  })
}

function ofFreezingPoints(): readonly Measured[] {
  const formulas: Readonly<Record<string, string>> = named.formulas
  const fits: Readonly<Record<string, readonly string[]>> = named.fitted
  return rowsOf(new URL('../FreezingPoints/rows.csv', import.meta.url)).map((row) => {
    const { solute: substance = '', massPercent = '', depression = '' } = row
    const name = formulas[substance] ?? ''
    const molality = Number(row['molality'])
    const { osmolality, relative } = answerOf(solute(name), molality, 'freezing')
    const kelvin = freezingDepression(osmolality)
    return {
      table: 'freezing points',
      label: `${substance} ${massPercent}`,
      solute: name,
      molality,
      measured: Number(depression),
      ours: kelvin,
      standardUncertainty: kelvin * relative,
      halfDigit: halfDigitOf(depression),
      isFitted: (fits[substance] ?? []).includes(massPercent),
    }
  })
}

/* Sodium chloride 9 g/L, read by freezing point. */
const fluids = [
  { label: 'micro-osmometer, Williams 1999', milliosmPerKg: 286 },
  { label: 'nebuliser fill, Schöni and Kraemer 1989, printed with ± 7', milliosmPerKg: 282 },
]

function ofFluids(): readonly Measured[] {
  const state = stateOf(solute('NaCl'), { kind: 'mass', g: 9 }, 'freezing')
  const { osmolalityOsmPerKg } = state.states.freezing
  const relative = relativeOf(state, osmolalityOsmPerKg)
  const reading = freezingDepression(osmolalityOsmPerKg) / 1.86
  return fluids.map(({ label, milliosmPerKg }) => ({
    table: 'fluids',
    label: `NaCl 9 g/L, ${label}`,
    solute: 'NaCl',
    molality: state.shares[0]?.molality ?? Number.NaN,
    measured: milliosmPerKg / 1000,
    ours: reading,
    standardUncertainty: reading * relative,
    halfDigit: 0.0005,
    isFitted: false,
  }))
}

/** Every measured row of the literature tables. */
export const measuredRows: readonly Measured[] = [
  ...ofStandards(),
  ...ofFluids(),
  ...ofOsmoticCoefficients(),
  ...ofIsopiesticPairs(),
  ...ofFreezingPoints(),
]
