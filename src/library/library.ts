import { type Caution, cautionWords, loadCautions } from './cautions.ts'
import { contentMark } from './content-mark.ts'
import { libraryContent } from './content.ts'
import { type NeutralCurve, loadCurves } from './curves.ts'
import { type ElectrolyteParameters, loadElectrolytes } from './electrolytes.ts'
import { type Equilibria, loadEquilibria, loadSpecies } from './equilibria.ts'
import { type Estimates, loadEstimates } from './estimates.ts'
import { type FindingText, loadFindings } from './findings.ts'
import { loadIngredients } from './ingredients.ts'
import { type RouteLimits, loadRoutes } from './routes.ts'
import { loadSources } from './sources.ts'
import { loadSteps, type StepRule } from './steps.ts'
import type { Ingredient, Source, SpeciesRecord } from './types.ts'
import { loadVehicles, type PublishedVehicle } from './vehicles.ts'

/** The read-only view of everything under data/. */
export interface Library {
  /** Mark of the content of all data: the same data, the same mark. */
  readonly version: string
  readonly ingredients: ReadonlyMap<string, Ingredient>
  readonly sources: ReadonlyMap<string, Source>
  readonly species: ReadonlyMap<string, SpeciesRecord>
  readonly electrolytes: ElectrolyteParameters
  readonly equilibria: Equilibria
  /** Osmotic curves of neutral solutes by species id. */
  readonly curves: ReadonlyMap<string, NeutralCurve>
  /** What is assumed where nothing was measured. */
  readonly estimates: Estimates
  /** Limits of the routes. */
  readonly routes: ReadonlyMap<string, RouteLimits>
  readonly cautions: readonly Caution[]
  /** Words of every finding, those of the cautions among them. */
  readonly findings: ReadonlyMap<string, FindingText>
  /** Published buffers made to a volume. */
  readonly vehicles: readonly PublishedVehicle[]
  /** Rules of the order of mixing. */
  readonly steps: readonly StepRule[]
}

let loaded: Library | undefined

/** The whole library, validated once and kept. Throws when a data file is malformed: nothing can be computed then. */
export function loadLibrary(): Library {
  loaded ??= assemble()
  return loaded
}

function assemble(): Library {
  return {
    version: contentMark(JSON.stringify(libraryContent())),
    ingredients: keyed(loadIngredients(), ({ id }) => id),
    sources: loadSources(),
    species: keyed(loadSpecies(), ({ id }) => id),
    electrolytes: loadElectrolytes(),
    equilibria: loadEquilibria(),
    curves: loadCurves(),
    estimates: loadEstimates(),
    routes: loadRoutes(),
    cautions: loadCautions(),
    findings: keyed([...loadFindings(), ...cautionWords()], ({ code }) => code),
    steps: loadSteps(),
    vehicles: loadVehicles(),
  }
}

function keyed<Item>(items: readonly Item[], keyOf: (item: Item) => string): ReadonlyMap<string, Item> {
  const map = new Map<string, Item>()
  for (const item of items) {
    const key = keyOf(item)
    if (map.has(key)) throw new Error(`${key} stands twice in the data`)
    map.set(key, item)
  }
  return map
}
