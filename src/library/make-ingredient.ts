import type { Read } from '../quantity/amount.ts'
import { molarMassOf } from './formula-mass.ts'
import { ingredientIdOf } from './ingredients.ts'
import { readIngredient } from './own-ingredient.ts'
import type { Datum, ElectrolyteClass, Ingredient } from './types.ts'

/** What a person knows of an ingredient that the library has not; absent figures stay absent. */
export interface KnownOfIngredient {
  readonly name: string
  readonly formula?: string
  readonly state: 'solid' | 'liquid'
  readonly electrolyteClass?: ElectrolyteClass
  readonly equivalents: readonly { readonly atPercent: number; readonly value: number }[]
  readonly depression1Percent?: number
  readonly measuredI?: number
  readonly measured: readonly { readonly atPercent: number; readonly milliosmPerKg: number }[]
  readonly densityGPerMl?: number
  /** Where the figures are from, in the person's own words; kept as a note. */
  readonly origin: string
}

/** Marks a record that a person entered. */
export const ownTag = 'own-entry'

const refuse = (code: string, message: string, wayOut: string): Read<never> => ({
  ok: false,
  refusal: { code, message, wayOut },
})

/** Number of crystal waters in a formula: the "7" of "MgSO4·7H2O". */
const crystalWatersOf = (formula: string): number => {
  const match = /[·.]\s*(\d*)\s*H2O$/.exec(formula.trim())
  return match ? Number(match[1] === '' ? 1 : match[1]) : 0
}

/**
 * A record of one's own from what is known, held to the rules of the library. Refuses a name that the library has, a
 * formula that cannot be read, and a record from which no osmotic effect can follow.
 */
export function makeIngredient(
  known: KnownOfIngredient,
  library: ReadonlyMap<string, Ingredient>,
): Read<Ingredient> {
  const name = known.name.trim()
  if (name === '') return refuse('name-missing', 'The ingredient has no name.', 'Write its generic name.')
  const id = ingredientIdOf(name)
  if (library.has(id))
    return refuse(
      'name-taken',
      `The library has ${name} already.`,
      'Take it from there, or write another name.',
    )
  const { equivalents, measured, depression1Percent, measuredI } = known
  const mass = known.formula ? molarMassOf(known.formula) : null
  if (mass && !mass.ok) return mass
  const isKnown = equivalents.length > 0 || measured.length > 0 || depression1Percent !== undefined
  if (!isKnown && !(measuredI !== undefined && mass) && !(known.electrolyteClass && mass)) {
    return refuse(
      'osmotic-effect-unknown',
      `Nothing that is given says how ${name} acts on water.`,
      'Give E, a freezing-point depression, a measured osmolality, or a molecular formula with i or the kind of ions.',
    )
  }
  return readIngredient(recordOf(known, name, id, mass ? mass.value : null))
}

const figure = (value: number, unit: string, kind: Datum['kind'] = 'measured'): Datum => ({
  value,
  unit,
  kind,
  source: 'own-entry',
  confidence: 'low',
  fromMemory: false,
})

function recordOf(known: KnownOfIngredient, name: string, id: string, molarMass: number | null): Ingredient {
  const { formula, state, electrolyteClass, depression1Percent, measuredI, densityGPerMl } = known
  return {
    id,
    name,
    synonyms: [],
    ...(formula ? { formula } : {}),
    crystalWaters: formula ? crystalWatersOf(formula) : 0,
    ...(molarMass === null ? {} : { molarMass: figure(molarMass, 'g/mol', 'derived') }),
    state,
    percentBasis: 'w/v',
    roles: ['active'],
    tags: [ownTag, 'ionisation-not-given'],
    ...(electrolyteClass ? { electrolyteClass } : {}),
    sodiumChlorideEquivalents: known.equivalents.map(({ atPercent, value }) => ({
      atPercent,
      e: figure(value, 'g NaCl/g'),
    })),
    ...(known.measured.length > 0
      ? {
          measuredOsmolality: known.measured.map(({ atPercent, milliosmPerKg }) => ({
            atPercent,
            osmolality: figure(milliosmPerKg, 'mOsm/kg'),
          })),
        }
      : {}),
    ...(depression1Percent === undefined
      ? {}
      : { freezingPointDepression1Percent: figure(depression1Percent, 'K') }),
    ...(measuredI === undefined ? {} : { measuredI: figure(measuredI, '1') }),
    ...(densityGPerMl === undefined ? {} : { density: figure(densityGPerMl, 'g/mL') }),
    notes: [
      `Entered by hand. ${known.origin.trim() === '' ? 'No origin was given.' : `Origin: ${known.origin.trim()}`}`,
    ],
  }
}
