import { compileSpeciation } from '../../../src/chemistry/speciation/speciation.ts'
import type { CompiledSpeciation } from '../../../src/chemistry/speciation/speciation.ts'
import type {
  ActivityOf,
  ProtonCondition,
  Speciated,
  SpeciationParts,
  SpeciationSystem,
  Totals,
} from '../../../src/chemistry/speciation/types.ts'
import { loadEquilibria, loadSpecies } from '../../../src/library/equilibria.ts'

export const species = loadSpecies()
export const equilibria = loadEquilibria()
export const electroneutral: ProtonCondition = { kind: 'electroneutral' }

export const partsWith = (activity: ActivityOf): SpeciationParts => ({
  species,
  equilibria,
  activity,
  debyeHueckelSlope: () => 0.3915,
})

/** Compiles, or fails the test with the refusal. */
export function compiledOr(system: SpeciationSystem, parts: SpeciationParts): CompiledSpeciation {
  const compiled = compileSpeciation(system, parts)
  if (compiled.status !== 'compiled') throw new Error(JSON.stringify(compiled))
  return compiled
}

/** Solves, or fails the test with the refusal. */
export function solvedOr(
  compiled: CompiledSpeciation,
  totals: Totals,
  condition: ProtonCondition = electroneutral,
): Speciated {
  const answer = compiled.solve(totals, condition)
  if (answer.status !== 'converged') throw new Error(JSON.stringify(answer))
  return answer
}

export function solveWith(
  parts: SpeciationParts,
  totals: Totals,
  condition: ProtonCondition = electroneutral,
  system: Partial<SpeciationSystem> = {},
): Speciated {
  const background = new Set((system.background ?? []).map((ion) => ion.id))
  const components = Object.keys(totals).filter((component) => !background.has(component))
  return solvedOr(compiledOr({ celsius: 25, components, ...system }, parts), totals, condition)
}
