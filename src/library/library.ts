import { type BufferSystem, loadBufferSystems, loadRankingRules, type RankingRule } from './buffers.ts'
import { type Caution, cautionWords, loadCautions } from './cautions.ts'
import { contentMark } from './content-mark.ts'
import { libraryContent } from './content.ts'
import { type NeutralCurve, loadCurves } from './curves.ts'
import { type ElectrolyteParameters, loadElectrolytes } from './electrolytes.ts'
import { type Equilibria, loadEquilibria, loadSpecies } from './equilibria.ts'
import { type Estimates, loadEstimates } from './estimates.ts'
import { type FindingText, loadFindings } from './findings.ts'
import type { Moiety } from './forms.ts'
import { keyed } from './keyed.ts'
import { loadOpening } from './opening.ts'
import { type RouteLimits, loadRoutes } from './routes.ts'
import { type IntrinsicSolubility, loadIntrinsicSolubilities, loadSolids, type Solid } from './solids.ts'
import { loadSources } from './sources.ts'
import { loadSteps, type StepRule } from './steps.ts'
import type { Stock } from './stocks.ts'
import type { Ingredient, Source, SpeciesRecord } from './types.ts'
import { loadVehicles, type PublishedVehicle } from './vehicles.ts'

/** The read-only view of everything under data/. */
export interface Library {
  /** Mark of the content of all data: the same data, the same mark. */
  readonly version: string
  readonly ingredients: ReadonlyMap<string, Ingredient>
  /** What an order can mean beside the article: bases, anhydrous salts, elements. */
  readonly moieties: readonly Moiety[]
  /** Solutions on the shelf; no id of one is that of an ingredient. */
  readonly stocks: ReadonlyMap<string, Stock>
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
  readonly bufferSystems: readonly BufferSystem[]
  /** How buffers are put in order. */
  readonly rankingRules: readonly RankingRule[]
  /** Solids that can fall out, and what water holds of uncharged acids and bases. */
  readonly solids: readonly Solid[]
  readonly intrinsicSolubilities: readonly IntrinsicSolubility[]
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
    ...loadOpening(),
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
    bufferSystems: loadBufferSystems(),
    rankingRules: loadRankingRules(),
    solids: loadSolids(),
    intrinsicSolubilities: loadIntrinsicSolubilities(),
  }
}
