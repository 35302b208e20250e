import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { Equilibria } from '../../library/equilibria.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import { debyeHueckelSlope } from '../activity/debye-hueckel.ts'
import { compileActivityModel, type ActivityModel } from '../activity/model.ts'
import { compileSpeciation, type CompiledSpeciation } from '../speciation/speciation.ts'
import type { BackgroundIon, SpeciationFailure } from '../speciation/types.ts'
import { held } from './facts.ts'
import type { Solute } from './solutes.ts'
import { tiesOf, type Ties } from './ties.ts'

/** A set of components made ready at one temperature. */
export interface ReadySystem {
  readonly speciation: CompiledSpeciation
  readonly activity: ActivityModel
  /** Debye–Hückel slope. */
  readonly slope: number
  /** Components of each species. */
  readonly ties: Ties
}

export interface SystemParts {
  readonly species: ReadonlyMap<string, SpeciesRecord>
  readonly equilibria: Equilibria
  readonly electrolytes: ElectrolyteParameters
}

/** What a solution holds, apart from how much: decides which compiled systems serve it. */
export interface Contents {
  readonly components: readonly string[]
  readonly background: readonly BackgroundIon[]
  /** Compiled so far, by temperature. */
  readonly systems: Map<number, ReadySystem>
  /** The same with further components, by their names. */
  readonly extended: Map<string, Contents>
}

interface Kept {
  /** By the marks of the ingredients in their order. */
  readonly byMarks: Map<string, Contents>
  /** By what they hold: different ingredients may give the same. */
  readonly byContent: Map<string, Contents>
}

/** Enough for the formulas at hand; emptied when full, so that a long session cannot grow them without end. */
const mostMarks = 400
const mostContents = 60
const mostExtended = 8
const mostSystems = 12

/* What was made of one set of data. It follows from the data and the key alone, so that no answer hangs on it. */
const stores = new WeakMap<SystemParts, Kept>()

function keptOf(parts: SystemParts): Kept {
  const known = stores.get(parts)
  if (known) return known
  const made = { byMarks: new Map(), byContent: new Map() }
  stores.set(parts, made)
  return made
}

/** Keeps a value; a full store is emptied first. */
function keep<Key, Value>(store: Map<Key, Value>, most: number, key: Key, value: Value): Value {
  if (store.size >= most) store.clear()
  store.set(key, value)
  return value
}

/** Components of data/species and ions of its own that each solute brings. */
export function contentsOf(solutes: readonly Solute[], parts: SystemParts): Contents {
  const { byMarks, byContent } = keptOf(parts)
  let marks = ''
  for (const { facts } of solutes) marks += `${facts.mark} `
  const known = byMarks.get(marks)
  if (known) return known
  const found = gathered(solutes, parts.species)
  const content = JSON.stringify([found.components, found.background])
  const same = byContent.get(content)
  return keep(byMarks, mostMarks, marks, same ?? keep(byContent, mostContents, content, found))
}

function gathered(solutes: readonly Solute[], species: SystemParts['species']): Contents {
  const components = new Set<string>()
  const background = new Map<string, BackgroundIon>()
  for (const { ingredient } of solutes) {
    for (const { species: id, charge } of ingredient.releases ?? []) {
      const record = species.get(id)
      if (!record) {
        // An ion that two ingredients give is the one whose ionisation is known best, whichever stands first.
        const ion = backgroundIon(id, charge, ingredient)
        if (ion.steps.length >= (background.get(id)?.steps.length ?? 0)) background.set(id, ion)
      } else for (const component of held(record)) if (component !== 'proton') components.add(component)
    }
  }
  const ions = [...background.values()].filter(({ charge, steps }) => charge !== 0 || steps.length > 0)
  return contents(
    [...components].toSorted(),
    ions.toSorted((a, b) => (a.id < b.id ? -1 : 1)),
  )
}

const contents = (components: readonly string[], background: readonly BackgroundIon[]): Contents => ({
  components,
  background,
  systems: new Map(),
  extended: new Map(),
})

/** The ions of an implied adjuster, or of a titrant, may be new to the contents. */
export function contentsWith(known: Contents, totals: Readonly<Record<string, number>>): Contents {
  const more = Object.keys(totals).filter(
    (component) =>
      !known.components.includes(component) && !known.background.some(({ id }) => id === component),
  )
  if (more.length === 0) return known
  const name = more.toSorted().join(' ')
  const made = known.extended.get(name)
  if (made) return made
  const all = contents([...known.components, ...more].toSorted(), known.background)
  return keep(known.extended, mostExtended, name, all)
}

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

/** The compiled system of some contents at a temperature, kept for the next keystroke. */
export function systemAt(
  contents: Contents,
  celsius: number,
  parts: SystemParts,
): ReadySystem | SpeciationFailure {
  const known = contents.systems.get(celsius)
  if (known) return known
  const made = makeSystem(contents, celsius, parts)
  return 'activity' in made ? keep(contents.systems, mostSystems, celsius, made) : made
}

function makeSystem(
  contents: Contents,
  celsius: number,
  parts: SystemParts,
): ReadySystem | SpeciationFailure {
  let activity: ActivityModel | undefined
  const compiled = compileSpeciation(
    { celsius, components: contents.components, background: contents.background },
    {
      species: speciesOf(parts),
      equilibria: parts.equilibria,
      activity: (species, at) => (activity = compileActivityModel(species, parts.electrolytes, at)),
      debyeHueckelSlope,
    },
  )
  if (compiled.status !== 'compiled') return compiled
  return {
    speciation: compiled,
    activity: activity ?? compileActivityModel(compiled.species, parts.electrolytes, celsius),
    slope: debyeHueckelSlope(celsius),
    ties: tiesOf(compiled.species),
  }
}

/* One list for each set of data: what is made of it is kept with it. */
const lists = new WeakMap<SystemParts['species'], readonly SpeciesRecord[]>()

function speciesOf({ species }: SystemParts): readonly SpeciesRecord[] {
  const known = lists.get(species)
  if (known) return known
  const made = [...species.values()]
  lists.set(species, made)
  return made
}
