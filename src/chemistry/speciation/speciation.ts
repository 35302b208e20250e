import { Workspace } from './balance.ts'
import { compileNetwork } from './compile.ts'
import type { Network } from './compile.ts'
import { RecentAnswers } from './recent.ts'
import { solveNetwork } from './solve.ts'
import type {
  ProtonCondition,
  SpeciationFailure,
  SpeciationParts,
  SpeciationResult,
  SpeciationSystem,
  Totals,
} from './types.ts'
import type { SpeciesRecord } from '../../library/types.ts'

/** A system ready to be solved for any amounts. Not re-entrant: one solve at a time. */
export interface CompiledSpeciation {
  readonly status: 'compiled'
  readonly network: Network
  readonly components: readonly string[]
  readonly species: readonly SpeciesRecord[]
  solve(totals: Totals, condition: ProtonCondition): SpeciationResult
}

/**
 * Compiles a system at one temperature. `solve` takes mol per kg of water by component (background ions by
 * their id); a component that is left out counts as absent, one that was not compiled is refused.
 */
export function compileSpeciation(
  system: SpeciationSystem,
  parts: SpeciationParts,
): CompiledSpeciation | SpeciationFailure {
  const network = compileNetwork(system, parts)
  if ('status' in network) return network
  const work = new Workspace(network.layout)
  const { components, species } = network.layout
  const indexOf = new Map(components.map((component, index) => [component, index]))
  const recent = new RecentAnswers()
  return {
    status: 'compiled',
    network,
    components,
    species,
    solve(totals, condition) {
      work.totals.fill(0)
      for (const component in totals) {
        const index = indexOf.get(component)
        if (index !== undefined) work.totals[index] = totals[component] ?? 0
        else if (component !== 'proton' && component !== 'carbonate') {
          return { status: 'impossible', code: 'species-unknown', values: { species: component } }
        }
      }
      return recent.answer(work.totals, condition, () => solveNetwork(network, work, condition))
    },
  }
}

export interface SpeciationProblem extends SpeciationSystem {
  readonly totals: Totals
  readonly condition: ProtonCondition
}

/** Compiles and solves once: see `compileSpeciation` for many solves of one system. */
export function solveSpeciation(
  problem: Omit<SpeciationProblem, 'components'>,
  parts: SpeciationParts,
): SpeciationResult {
  const background = new Set((problem.background ?? []).map((ion) => ion.id))
  const components = Object.keys(problem.totals).filter((component) => !background.has(component))
  const compiled = compileSpeciation({ ...problem, components }, parts)
  return compiled.status === 'compiled' ? compiled.solve(problem.totals, problem.condition) : compiled
}

/** mol per kg of water of one species in an answer; 0 when it is not among them. */
export const molalityOf = (
  answer: { readonly species: readonly SpeciesRecord[]; readonly molalities: Float64Array },
  id: string,
): number => answer.molalities[answer.species.findIndex((record) => record.id === id)] ?? 0
