import type { CarbonDioxide, Speciated, SpeciationFailure, Totals } from './speciation/types.ts'
import { bufferCapacity } from './speciation/capacity.ts'
import { compileSpeciation, type CompiledSpeciation } from './speciation/speciation.ts'
import { amountToReach, titrate, type Titrant, type Titre } from './speciation/titrate.ts'
import { compileActivityModel } from './activity/model.ts'
import { debyeHueckelSlope } from './activity/debye-hueckel.ts'
import { contentsWith, systemAt } from './mixture/system.ts'
import { pHIsKnown } from './mixture/acidity.ts'
import { failureProblem, prepare, type ChemistryParts, type Prepared } from './solution.ts'
import type { ChemistryProblem, Composition } from './types.ts'

/** The acid and base side of a solution at one temperature, ready to be asked. */
export interface Buffered {
  readonly status: 'ready'
  readonly celsius: number
  readonly waterKgPerLitre: number
  readonly compiled: CompiledSpeciation
  readonly totals: Totals
  readonly answer: Speciated
}

export type BufferedResult =
  Buffered | { readonly status: 'refused'; readonly problems: readonly ChemistryProblem[] }

export interface BufferedOptions {
  /** Components that a titrant brings and the composition does not hold. */
  readonly components?: readonly string[]
  readonly carbonDioxide?: CarbonDioxide
}

/**
 * Speciates a composition by charge balance at one temperature (0 to 40 °C). Refuses a composition whose pH nobody
 * can know: an ion of its own without ionisation steps.
 */
export function bufferedAt(
  composition: Composition,
  parts: ChemistryParts,
  celsius: number,
  options: BufferedOptions = {},
): BufferedResult {
  const prepared = prepare(composition, parts)
  if ('problems' in prepared) return { status: 'refused', problems: prepared.problems }
  const { work } = prepared
  if (!pHIsKnown(work.solutes)) {
    return {
      status: 'refused',
      problems: [
        { code: 'ph-not-predictable', values: {}, keys: work.solutes.map(({ key }) => key), fatal: false },
      ],
    }
  }
  const compiled = compiledFor(prepared, parts, celsius, options)
  if (compiled.status !== 'compiled') return { status: 'refused', problems: [failureProblem(compiled, work)] }
  const { totals } = prepared.condition
  const answer = compiled.solve(totals, { kind: 'electroneutral' })
  if (answer.status !== 'converged') return { status: 'refused', problems: [failureProblem(answer, work)] }
  return { status: 'ready', celsius, waterKgPerLitre: work.water.kgPerLitre, compiled, totals, answer }
}

function compiledFor(
  { work, condition }: Prepared,
  parts: ChemistryParts,
  celsius: number,
  { components = [], carbonDioxide }: BufferedOptions,
): CompiledSpeciation | SpeciationFailure {
  const wanted = { ...condition.totals, ...Object.fromEntries(components.map((component) => [component, 0])) }
  const contents = contentsWith(work.contents, wanted)
  if (!carbonDioxide) {
    const system = systemAt(contents, celsius, parts)
    return 'activity' in system ? system.speciation : system
  }
  return compileSpeciation(
    { celsius, components: contents.components, background: contents.background, carbonDioxide },
    {
      species: [...parts.species.values()],
      equilibria: parts.equilibria,
      activity: (species, at) => compileActivityModel(species, parts.electrolytes, at),
      debyeHueckelSlope,
    },
  )
}

/** Buffer capacity at the actual composition, mol of strong base per litre and pH, and its parts by component. */
export function capacityOf({ compiled, totals, answer, waterKgPerLitre }: Buffered): {
  readonly molPerLitrePerPH: number
  readonly byComponent: Readonly<Record<string, number>>
} {
  const { molPerKgPerPH, byComponent } = bufferCapacity(compiled, totals, answer)
  return {
    molPerLitrePerPH: molPerKgPerPH * waterKgPerLitre,
    byComponent: Object.fromEntries(
      Object.entries(byComponent).map(([component, part]) => [component, part * waterKgPerLitre]),
    ),
  }
}

/** mol per litre of a titrant (its components per mole) that brings the solution to a pH. */
export function titreTo(buffered: Buffered, titrant: Titrant, pH: number): Titre {
  const titre = amountToReach(buffered.compiled, buffered.totals, titrant, pH)
  const { waterKgPerLitre: water } = buffered
  if (titre.status === 'reached') return { ...titre, molPerKg: titre.molPerKg * water }
  return titre.status === 'not-reached' ? { ...titre, atMolPerKg: titre.atMolPerKg * water } : titre
}

export interface CurvePoint {
  readonly molPerLitre: number
  readonly pH: number
  readonly capacityMolPerLitrePerPH: number
}

/** pH and capacity along additions of a titrant, mol per litre; a point that has no answer is left out. */
export function titrationCurve(
  { compiled, totals, waterKgPerLitre }: Buffered,
  titrant: Titrant,
  molPerLitre: readonly number[],
): readonly CurvePoint[] {
  const amounts = molPerLitre.map((amount) => amount / waterKgPerLitre)
  return titrate(compiled, totals, titrant, amounts).flatMap(({ molPerKg, result }, index) => {
    if (result.status !== 'converged') return []
    const titrated: Record<string, number> = { ...totals }
    for (const [component, count] of Object.entries(titrant)) {
      titrated[component] = (titrated[component] ?? 0) + count * molPerKg
    }
    const { molPerKgPerPH } = bufferCapacity(compiled, titrated, result)
    return [
      {
        molPerLitre: molPerLitre[index] ?? 0,
        pH: result.pH,
        capacityMolPerLitrePerPH: molPerKgPerPH * waterKgPerLitre,
      },
    ]
  })
}

export interface SpeciesAtPH {
  readonly pH: number
  /** Share of the component in each species, by species id. */
  readonly shares: Readonly<Record<string, number>>
}

/** How a component spreads over its species at each pH (set with hydrochloric acid or sodium hydroxide). */
export function speciesAgainstPH(
  { compiled, totals }: Buffered,
  component: string,
  pHs: readonly number[],
): readonly SpeciesAtPH[] {
  const held = compiled.species.map((record) => {
    if (record.component === component) return record.count
    return record.partners?.find((partner) => partner.component === component)?.count ?? 0
  })
  return pHs.flatMap((pH) => {
    const answer = compiled.solve(totals, { kind: 'pH', pH })
    if (answer.status !== 'converged') return []
    const amounts = held.map((count, index) => count * (answer.molalities[index] ?? 0))
    const sum = amounts.reduce((total, amount) => total + amount, 0)
    if (sum <= 0) return []
    const shares = Object.fromEntries(
      compiled.species.flatMap(({ id }, index) =>
        (held[index] ?? 0) > 0 ? [[id, (amounts[index] ?? 0) / sum] as const] : [],
      ),
    )
    return [{ pH, shares }]
  })
}
