import { loadConventions } from '../library/conventions.ts'
import type { NeutralCurve } from '../library/curves.ts'
import { loadEstimates } from '../library/estimates.ts'
import { debyeHueckelSlope } from './activity/debye-hueckel.ts'
import { osmolalityAtOwnFreezing } from './activity/freezing.ts'
import { kgPerMolWater } from './activity/model.ts'
import { sodiumChlorideOsmolality } from './activity/sodium-chloride.ts'
import { mix, type Mixture, type Movable } from './mixture/thermal.ts'
import { problemsOf } from './mixture/problems.ts'
import { apparentCount, formalCount, sharesOf } from './mixture/shares.ts'
import { isProblem, soluteOf, type Solute } from './mixture/solutes.ts'
import { contentsOf, systemAt, type Contents, type ReadySystem, type SystemParts } from './mixture/system.ts'
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
interface Work {
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
        ? solveFreezing(condition.totals, work)
        : solveAt(celsiusOf[temperature], condition.totals, work)
    if ('status' in outcome) return refused([failureProblem(outcome, work)])
    solved.set(temperature, outcome)
  }
  const state = stateOf(work, solved, condition.implied, options.uncertainty ?? true)
  return state ?? refused([{ code: 'mixture-not-converged', values: {}, keys: [], fatal: true }])
}

interface Prepared {
  readonly work: Work
  readonly condition: Extract<Condition, { status: 'ready' }>
}

/** Water, the sorted solutes and the proton condition: what all temperatures share. */
function prepare(
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
    contents: contentsOf(solutes, parts.species),
    totals: soluteTotals(solutes, parts.species),
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
  const cold = solveAt(celsiusOf.freezing, condition.totals, work)
  return 'status' in cold ? null : { solutes: work.solutes, ...cold }
}

const refused = (problems: readonly ChemistryProblem[]): SolutionResult => ({ status: 'refused', problems })

const failureProblem = ({ code, values }: SpeciationFailure, { solutes }: Work): ChemistryProblem => ({
  code,
  values,
  keys: solutes.map(({ key }) => key),
  fatal: true,
})

function sortSolutes(composition: Composition, water: Water, parts: ChemistryParts) {
  const slope = debyeHueckelSlope(celsiusOf.freezing)
  const known = {
    ...parts,
    conventions: loadConventions(),
    estimates: loadEstimates(),
    sodiumChloride: sodiumChlorideOsmolality(parts),
    slope,
  }
  const solutes: Solute[] = []
  const problems: ChemistryProblem[] = []
  for (const item of composition.dissolved) {
    const molality = water.molality.get(item.key) ?? 0
    if (molality <= 0 || item.ingredient.roles.includes('vehicle')) continue
    const grams = molality * water.kgPerLitre * (item.ingredient.molarMass?.value ?? 1)
    const solute = soluteOf(item, molality, grams / 10, known)
    if (isProblem(solute)) problems.push(solute)
    else solutes.push(solute)
  }
  return { solutes, problems }
}

type Condition =
  | {
      readonly status: 'ready'
      readonly totals: Readonly<Record<string, number>>
      readonly implied: Speciated | null
    }
  | { readonly status: 'failed'; readonly failure: SpeciationFailure }

/** Where a pH is given, the acid or base that it implies joins the totals, so that the other temperatures follow. */
function conditionOf(work: Work): Condition {
  const { composition, contents, parts, totals } = work
  if (composition.pH === 'solve') {
    if (totals.charge === 0) return { status: 'ready', totals: totals.all, implied: null }
    const values = { millimolesPerKg: 1000 * totals.charge }
    return { status: 'failed', failure: { status: 'impossible', code: 'released-ions-unbalanced', values } }
  }
  const system = systemAt(contents, composition.temperatureCelsius, parts)
  if (!('activity' in system)) return { status: 'failed', failure: system }
  const answer = system.speciation.solve(totals.all, { kind: 'pH', pH: composition.pH })
  if (answer.status !== 'converged') return { status: 'failed', failure: answer }
  return { status: 'ready', totals: impliedIons(totals.all, answer), implied: answer }
}

const neutral: ProtonCondition = { kind: 'electroneutral' }

function solveAt(
  celsius: number,
  totals: Readonly<Record<string, number>>,
  work: Work,
): Solved | SpeciationFailure {
  const { contents, parts, solutes } = work
  const withAdjuster = contentsWith(contents, totals)
  const system = systemAt(withAdjuster, celsius, parts)
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
function solveFreezing(totals: Readonly<Record<string, number>>, work: Work): Solved | SpeciationFailure {
  const atZero = solveAt(celsiusOf.freezing, totals, work)
  if ('status' in atZero) return atZero
  const { osmolalityOsmPerKg: zero } = atZero.mixture
  const weight = Math.min(1, Math.max(0, (zero - 0.5) / 0.3))
  if (weight === 0) return atZero
  const below = solveAt(belowZero, totals, work)
  if ('status' in below) return below
  const slope = ((below.mixture.osmolalityOsmPerKg - zero) / belowZero) * weight
  const osmolality = osmolalityAtOwnFreezing(zero, slope)
  if (osmolality === null)
    return { status: 'not-converged', code: 'freezes-too-deep', values: { osmolality: zero } }
  const { kelvin, osmolalityOsmPerKg } = osmolality
  return { ...atZero, mixture: { ...atZero.mixture, osmolalityOsmPerKg, celsius: -kelvin } }
}

/** The ions of an implied adjuster may be new to the contents. */
function contentsWith(contents: Contents, totals: Readonly<Record<string, number>>): Contents {
  const own = new Set(contents.background.map(({ id }) => id))
  const more = Object.keys(totals).filter(
    (component) => !own.has(component) && !contents.components.includes(component),
  )
  if (more.length === 0) return contents
  const components = [...contents.components, ...more].toSorted()
  return { ...contents, components, key: `${more.join(' ')}+${contents.key}` }
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
  const at = (temperature: Temperature) => thermalState(solved.get(temperature) ?? cold, solutes, pHKnown)
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
  const outside = solutes.reduce((sum, solute) => {
    if (solute.kind === 'pool') return sum
    return sum + solute.molality * (formalCount(solute) ?? apparentCount(solute))
  }, 0)
  const particles = pool.sumOfMolalities + outside
  const byId = (values: Float64Array, of: (value: number) => number) =>
    Object.fromEntries(system.speciation.species.map(({ id }, index) => [id, of(values[index] ?? 0)]))
  return {
    celsius: mixture.celsius,
    osmolalityOsmPerKg,
    waterActivity: Math.exp(-kgPerMolWater * osmolalityOsmPerKg),
    osmoticCoefficient: particles === 0 ? 1 : osmolalityOsmPerKg / particles,
    ionicStrength: speciated.ionicStrength,
    pH: pHKnown ? speciated.pH : null,
    species: byId(speciated.molalities, (value) => value),
    activityCoefficients: byId(speciated.lnGamma, Math.exp),
  }
}
