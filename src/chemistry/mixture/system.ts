import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { Equilibria } from '../../library/equilibria.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import { debyeHueckelSlope } from '../activity/debye-hueckel.ts'
import { compileActivityModel, type ActivityModel } from '../activity/model.ts'
import { compileSpeciation, type CompiledSpeciation } from '../speciation/speciation.ts'
import type { BackgroundIon, SpeciationFailure } from '../speciation/types.ts'
import type { Solute } from './solutes.ts'

/** A set of components made ready at one temperature. */
export interface ReadySystem {
  readonly speciation: CompiledSpeciation
  readonly activity: ActivityModel
  /** Debye–Hückel slope. */
  readonly slope: number
  /** Components of each species and how many kinds it joins. */
  readonly componentsOf: readonly (readonly string[])[]
}

export interface SystemParts {
  readonly species: ReadonlyMap<string, SpeciesRecord>
  readonly equilibria: Equilibria
  readonly electrolytes: ElectrolyteParameters
}

/** What a solution holds, apart from how much: decides which compiled system serves it. */
export interface Contents {
  readonly components: readonly string[]
  readonly background: readonly BackgroundIon[]
  readonly key: string
}

/** Components of data/species and ions of its own that each solute brings. */
export function contentsOf(
  solutes: readonly Solute[],
  species: ReadonlyMap<string, SpeciesRecord>,
): Contents {
  const components = new Set<string>()
  const background = new Map<string, BackgroundIon>()
  for (const { ingredient } of solutes) {
    for (const { species: id, charge } of ingredient.releases ?? []) {
      const record = species.get(id)
      if (!record) background.set(id, backgroundIon(id, charge, ingredient))
      else for (const component of held(record)) if (component !== 'proton') components.add(component)
    }
  }
  const sorted = [...components].toSorted()
  const ions = [...background.values()].filter(({ charge, steps }) => charge !== 0 || steps.length > 0)
  const own = ions.map(({ id, steps }) => `${id}:${steps.map(({ pKa }) => pKa).join(',')}`).toSorted()
  return { components: sorted, background: ions, key: `${sorted.join(' ')}|${own.join(' ')}` }
}

export const held = ({ component, partners = [] }: SpeciesRecord): readonly string[] => [
  component,
  ...partners.map((partner) => partner.component),
]

function backgroundIon(id: string, charge: number, ingredient: Ingredient): BackgroundIon {
  const isIonising = ingredient.ionisingSpecies === undefined || ingredient.ionisingSpecies === id
  const steps = isIonising ? (ingredient.ownIonisation ?? []) : []
  return {
    id,
    charge,
    steps: steps.map(({ pKa, acidCharge, enthalpyKilojoulePerMole: enthalpy }) => ({
      pKa: pKa.value,
      acidCharge,
      ...(enthalpy ? { enthalpyKilojoulePerMole: enthalpy.value } : {}),
    })),
  }
}

/** Enough for the formulas at hand; emptied when full, so that a long session cannot grow it without end. */
const cacheLimit = 240
const caches = new WeakMap<SystemParts['species'], Map<string, ReadySystem>>()

/** The compiled system of some contents at a temperature, kept for the next keystroke. */
export function systemAt(
  contents: Contents,
  celsius: number,
  parts: SystemParts,
): ReadySystem | SpeciationFailure {
  let cache = caches.get(parts.species)
  if (!cache) {
    cache = new Map()
    caches.set(parts.species, cache)
  }
  const key = `${celsius}|${contents.key}`
  const known = cache.get(key)
  if (known) return known
  const made = makeSystem(contents, celsius, parts)
  if (!('activity' in made)) return made
  if (cache.size >= cacheLimit) cache.clear()
  cache.set(key, made)
  return made
}

function makeSystem(
  contents: Contents,
  celsius: number,
  parts: SystemParts,
): ReadySystem | SpeciationFailure {
  const compiled = compileSpeciation(
    { celsius, components: contents.components, background: contents.background },
    {
      species: [...parts.species.values()],
      equilibria: parts.equilibria,
      activity: (species, at) => compileActivityModel(species, parts.electrolytes, at),
      debyeHueckelSlope,
    },
  )
  if (compiled.status !== 'compiled') return compiled
  return {
    speciation: compiled,
    activity: compileActivityModel(compiled.species, parts.electrolytes, celsius),
    slope: debyeHueckelSlope(celsius),
    componentsOf: compiled.species.map((record) => held(record)),
  }
}
