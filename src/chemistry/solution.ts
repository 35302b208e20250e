import { loadConventions } from '../library/conventions.ts'
import type { NeutralCurve } from '../library/curves.ts'
import { loadEstimates } from '../library/estimates.ts'
import type { Ingredient } from '../library/types.ts'
import { debyeHueckelSlope } from './activity/debye-hueckel.ts'
import { osmolalityAtOwnFreezing } from './activity/freezing.ts'
import { kgPerMolWater } from './activity/model.ts'
import { sodiumChlorideOsmolality } from './activity/sodium-chloride.ts'
import { mix, type Mixture, type Movable } from './mixture/thermal.ts'
import { problemsOf } from './mixture/problems.ts'
import { apparentCount, sharesOf } from './mixture/shares.ts'
import type { SoluteFacts } from './mixture/facts.ts'
import { factsOf, isProblem, soluteOf, type Solute, type SoluteParts } from './mixture/solutes.ts'
import {
  contentsOf,
  contentsWith,
  systemAt,
  type Contents,
  type ReadySystem,
  type SystemParts,
} from './mixture/system.ts'
import { soluteTotals, type SoluteTotals } from './mixture/totals.ts'
import { uncertaintyParts } from './mixture/uncertainty.ts'
import { impliedIons, pHIsKnown } from './mixture/acidity.ts'
import type { ProtonCondition, Speciated, SpeciationFailure } from './speciation/types.ts'
import type {
  ChemistryProblem,
  Composition,
  SolutionResult,
  SolutionState,
  Temperature,
  ThermalState,
} from './types.ts'
import { waterIn, type Water } from './water/water.ts'

/** What the chemistry needs of the library. */
export interface ChemistryParts extends SystemParts {
  readonly curves: ReadonlyMap<string, NeutralCurve>
}

export interface SolveOptions {
  /** Default: all four. The other states are copies of the freezing one, and not to be read. */
  readonly temperatures?: readonly Temperature[]
  readonly uncertainty?: boolean
}

const celsiusOf: Readonly<Record<Temperature, number>> = { freezing: 0, '5': 5, '25': 25, '37': 37 }
const everyTemperature: readonly Temperature[] = ['freezing', '5', '25', '37']

/** What one solve carries from step to step. */
export interface Work {
  readonly composition: Composition
  readonly parts: ChemistryParts
  readonly water: Water
  readonly solutes: readonly Solute[]
  readonly contents: Contents
  readonly totals: SoluteTotals
}

interface Solved {
  readonly mixture: Mixture
  readonly system: ReadySystem
}

/**
 * Composition in, solution out: water per litre, speciation, osmolality by ion interaction, tabulated solutes mixed at
 * equal water activity, at four temperatures. Every reason why not is a named problem.
 */
export function solveSolution(
  composition: Composition,
  parts: ChemistryParts,
  options: SolveOptions = {},
): SolutionResult {
  const prepared = prepare(composition, parts)
  if ('problems' in prepared) return refused(prepared.problems)
  const { work, condition } = prepared
  const solved = new Map<Temperature, Solved>()
  for (const temperature of options.temperatures ?? everyTemperature) {
    const outcome =
      temperature === 'freezing'
        ? solveFreezing(condition, work)
        : solveAt(celsiusOf[temperature], condition, work)
    if ('status' in outcome) return refused([failureProblem(outcome, work)])
    solved.set(temperature, outcome)
  }
  const state = stateOf(work, solved, condition.implied, options.uncertainty ?? true)
  return state ?? refused([{ code: 'mixture-not-converged', values: {}, keys: [], fatal: true }])
}

export interface Prepared {
  readonly work: Work
  readonly condition: ReadyCondition
}

/** Water, the sorted solutes and the proton condition: what all temperatures share. */
export function prepare(
  composition: Composition,
  parts: ChemistryParts,
): Prepared | { readonly problems: readonly ChemistryProblem[] } {
  const water = waterIn(composition, parts.species)
  if ('code' in water) return { problems: [water] }
  const { solutes, problems } = sortSolutes(composition, water, parts)
  if (problems.length > 0) return { problems }
  const work: Work = {
    composition,
    parts,
    water,
    solutes,
    contents: contentsOf(solutes, parts),
    totals: soluteTotals(solutes),
  }
  const condition = conditionOf(work)
  return condition.status === 'ready'
    ? { work, condition }
    : { problems: [failureProblem(condition.failure, work)] }
}

/** The mixture at freezing, ready to be asked again with errors in its inputs; null where it has no answer. */
export function movableMixture(composition: Composition, parts: ChemistryParts): Movable | null {
  const prepared = prepare(composition, parts)
  if ('problems' in prepared) return null
  const { work, condition } = prepared
  const cold = solveAt(celsiusOf.freezing, condition, work)
  return 'status' in cold ? null : { solutes: work.solutes, ...cold }
}

const refused = (problems: readonly ChemistryProblem[]): SolutionResult => ({ status: 'refused', problems })

export const failureProblem = ({ code, values }: SpeciationFailure, { solutes }: Work): ChemistryProblem => ({
  code,
  values,
  keys: solutes.map(({ key }) => key),
  fatal: true,
})

function sortSolutes(composition: Composition, water: Water, parts: ChemistryParts) {
  const known = knownOf(parts)
  const solutes: Solute[] = []
  const problems: ChemistryProblem[] = []
  for (const item of composition.dissolved) {
    const molality = water.molality.get(item.key) ?? 0
    if (molality <= 0 || item.ingredient.roles.includes('vehicle')) continue
    const grams = molality * water.kgPerLitre * (item.ingredient.molarMass?.value ?? 1)
    const solute = soluteOf(item, molality, grams / 10, factsIn(known, item.ingredient), known.parts)
    if (isProblem(solute)) problems.push(solute)
    else solutes.push(solute)
  }
  return { solutes, problems }
}

/** The data with what was made of each ingredient from them. */
interface Known {
  readonly parts: SoluteParts
  readonly facts: WeakMap<Ingredient, SoluteFacts>
  seen: number
}

/* It follows from data and ingredient alone, so that no answer hangs on what was asked before. */
const kept = new WeakMap<ChemistryParts, Known>()

function knownOf(parts: ChemistryParts): Known {
  const known = kept.get(parts)
  if (known) return known
  const { species, electrolytes, curves } = parts
  const soluteParts = {
    species,
    electrolytes,
    curves,
    conventions: loadConventions(),
    estimates: loadEstimates(),
    sodiumChloride: sodiumChlorideOsmolality(parts),
    slope: debyeHueckelSlope(celsiusOf.freezing),
  }
  const made = { parts: soluteParts, facts: new WeakMap<Ingredient, SoluteFacts>(), seen: 0 }
  kept.set(parts, made)
  return made
}

function factsIn(known: Known, ingredient: Ingredient): SoluteFacts {
  const earlier = known.facts.get(ingredient)
  if (earlier) return earlier
  known.seen += 1
  const made = factsOf(ingredient, known.parts, known.seen)
  known.facts.set(ingredient, made)
  return made
}

interface ReadyCondition {
  readonly status: 'ready'
  readonly totals: Readonly<Record<string, number>>
  /** With the ions of an implied adjuster. */
  readonly contents: Contents
  readonly implied: Speciated | null
}

type Condition = ReadyCondition | { readonly status: 'failed'; readonly failure: SpeciationFailure }

/** Where a pH is given, the acid or base that it implies joins the totals, so that the other temperatures follow. */
function conditionOf(work: Work): Condition {
  const { composition, contents, parts, totals } = work
  if (composition.pH === 'solve') {
    if (totals.charge === 0) return { status: 'ready', totals: totals.all, contents, implied: null }
    const values = { millimolesPerKg: 1000 * totals.charge }
    return { status: 'failed', failure: { status: 'impossible', code: 'released-ions-unbalanced', values } }
  }
  const system = systemAt(contents, composition.temperatureCelsius, parts)
  if (!('activity' in system)) return { status: 'failed', failure: system }
  const answer = system.speciation.solve(totals.all, { kind: 'pH', pH: composition.pH })
  if (answer.status !== 'converged') return { status: 'failed', failure: answer }
  const all = impliedIons(totals.all, answer)
  return { status: 'ready', totals: all, contents: contentsWith(contents, all), implied: answer }
}

const neutral: ProtonCondition = { kind: 'electroneutral' }

function solveAt(
  celsius: number,
  { totals, contents }: ReadyCondition,
  work: Work,
): Solved | SpeciationFailure {
  const { parts, solutes } = work
  const system = systemAt(contents, celsius, parts)
  if (!('activity' in system)) return system
  const speciated = system.speciation.solve(totals, neutral)
  if (speciated.status !== 'converged') return speciated
  const mixture = mix(solutes, speciated, work.totals.outsidePool, system, celsius)
  if (mixture) return { mixture, system }
  return { status: 'not-converged', code: 'mixture-not-converged', values: { celsius } }
}

/** A second temperature below zero, for solutions that freeze well below. */
const belowZero = -5

/**
 * The state at the solution's own freezing point. Near physiological strength that is 0 °C to within the model; from
 * 0.5 osmol/kg on, the osmolality is carried on linearly from 0 and −5 °C to where ice is in equilibrium. A solution
 * that freezes deeper than the ice relation reaches keeps its state at 0 °C and has no reading.
 */
function solveFreezing(condition: ReadyCondition, work: Work): Solved | SpeciationFailure {
  const atZero = solveAt(celsiusOf.freezing, condition, work)
  if ('status' in atZero) return atZero
  const { osmolalityOsmPerKg: zero } = atZero.mixture
  const weight = Math.min(1, Math.max(0, (zero - 0.5) / 0.3))
  if (weight === 0) return atZero
  const below = solveAt(belowZero, condition, work)
  if ('status' in below) return below
  const slope = ((below.mixture.osmolalityOsmPerKg - zero) / belowZero) * weight
  const osmolality = osmolalityAtOwnFreezing(zero, slope)
  if (osmolality === null)
    return { status: 'not-converged', code: 'freezes-too-deep', values: { osmolality: zero } }
  const { kelvin, osmolalityOsmPerKg } = osmolality
  return { ...atZero, mixture: { ...atZero.mixture, osmolalityOsmPerKg, celsius: -kelvin } }
}

function stateOf(
  work: Work,
  solved: ReadonlyMap<Temperature, Solved>,
  implied: Speciated | null,
  withUncertainty: boolean,
): SolutionResult | null {
  const cold = solved.get('freezing') ?? [...solved.values()][0]
  if (!cold) return null
  const { water, solutes, composition } = work
  const pHKnown = composition.pH !== 'solve' || pHIsKnown(solutes)
  const shares = sharesOf(solutes, cold.mixture, cold.system)
  const freezing = thermalState(cold, solutes, pHKnown)
  const at = (temperature: Temperature) => {
    const own = solved.get(temperature)
    return own && own !== cold ? thermalState(own, solutes, pHKnown) : freezing
  }
  const state: SolutionState = {
    waterKgPerLitre: water.kgPerLitre,
    waterUncertainty: water.relativeUncertainty,
    densityGPerMl: water.densityGPerMl,
    waterKg: water.waterKg,
    states: { freezing: at('freezing'), '5': at('5'), '25': at('25'), '37': at('37') },
    shares,
    pHSolved: composition.pH === 'solve' && pHKnown,
    uncertainty: withUncertainty ? uncertaintyParts(solutes, cold.mixture, cold.system, shares, water) : [],
    problems: withUncertainty ? problemsOf(solutes, cold.mixture, cold.system, water, implied, pHKnown) : [],
  }
  return { status: 'solved', state }
}

function thermalState(
  { mixture, system }: Solved,
  solutes: readonly Solute[],
  pHKnown: boolean,
): ThermalState {
  const { speciated, pool, osmolalityOsmPerKg } = mixture
  let particles = pool.sumOfMolalities
  for (const solute of solutes) {
    if (solute.kind !== 'pool')
      particles += solute.molality * (solute.facts.formalCount ?? apparentCount(solute))
  }
  const { species } = system.speciation
  const { molalities, lnGamma } = speciated
  let bySpecies: Readonly<Record<string, number>> | undefined
  let coefficients: Readonly<Record<string, number>> | undefined
  return {
    celsius: mixture.celsius,
    osmolalityOsmPerKg,
    waterActivity: Math.exp(-kgPerMolWater * osmolalityOsmPerKg),
    osmoticCoefficient: particles === 0 ? 1 : osmolalityOsmPerKg / particles,
    ionicStrength: speciated.ionicStrength,
    pH: pHKnown ? speciated.pH : null,
    // Made when they are read: of most solutions only the osmolality is.
    get species() {
      return (bySpecies ??= recordOf(species, (index) => molalities[index] ?? 0))
    },
    get activityCoefficients() {
      return (coefficients ??= recordOf(species, (index) => Math.exp(lnGamma[index] ?? 0)))
    },
  }
}

function recordOf(
  species: readonly { readonly id: string }[],
  valueAt: (index: number) => number,
): Readonly<Record<string, number>> {
  const record: Record<string, number> = {}
  for (const [index, { id }] of species.entries()) record[id] = valueAt(index)
  return record
}
