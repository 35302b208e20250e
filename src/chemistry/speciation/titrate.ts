import type { CompiledSpeciation } from './speciation.ts'
import type { SpeciationFailure, SpeciationResult, Totals } from './types.ts'

/** What one mole of a titrant brings, by component: { 'Na+': 1 } for sodium hydroxide, { 'Cl-': 1 } for hydrochloric acid. */
export type Titrant = Totals

export interface TitrationPoint {
  readonly molPerKg: number
  readonly result: SpeciationResult
}

const mostSteps = 100
const pHTolerance = 1e-9

/** Totals with an amount of titrant added. The titrant's components must have been compiled. */
export function withTitrant(totals: Totals, titrant: Titrant, molPerKg: number): Totals {
  const sum: Record<string, number> = { ...totals }
  for (const [component, count] of Object.entries(titrant)) {
    sum[component] = (sum[component] ?? 0) + count * molPerKg
  }
  return sum
}

/** The solution at each amount of titrant, mol per kg of the solution's water, pH from electroneutrality. */
export function titrate(
  compiled: CompiledSpeciation,
  totals: Totals,
  titrant: Titrant,
  amountsMolPerKg: readonly number[],
): readonly TitrationPoint[] {
  return amountsMolPerKg.map((molPerKg) => ({
    molPerKg,
    result: compiled.solve(withTitrant(totals, titrant, molPerKg), { kind: 'electroneutral' }),
  }))
}

export type Titre =
  | { readonly status: 'reached'; readonly molPerKg: number; readonly iterations: number }
  | { readonly status: 'already-past'; readonly pH: number }
  | { readonly status: 'not-reached'; readonly pH: number; readonly atMolPerKg: number }
  | SpeciationFailure

/**
 * Amount of titrant, mol per kg of water, that brings the solution to a pH: bracketed by doubling up to
 * `mostMolPerKg`, then bisected with secant steps. Says when the pH lies on the other side of the start, or
 * cannot be reached with so much.
 */
export function amountToReach(
  compiled: CompiledSpeciation,
  totals: Totals,
  titrant: Titrant,
  pH: number,
  mostMolPerKg = 10,
): Titre {
  const pHAt = (molPerKg: number): number | SpeciationFailure => {
    const result = compiled.solve(withTitrant(totals, titrant, molPerKg), { kind: 'electroneutral' })
    return result.status === 'converged' ? result.pH : result
  }
  const start = pHAt(0)
  if (typeof start !== 'number') return start
  if (Math.abs(start - pH) <= pHTolerance) return { status: 'reached', molPerKg: 0, iterations: 0 }
  const probe = pHAt(1e-7)
  if (typeof probe !== 'number') return probe
  const direction = Math.sign(probe - start)
  if (direction === 0 || direction !== Math.sign(pH - start)) return { status: 'already-past', pH: start }
  const gap = (found: number) => direction * (found - pH)
  let low = 0
  let high = Math.min(1e-4, mostMolPerKg)
  let lowGap = gap(start)
  let highGap = lowGap
  for (;;) {
    const found = pHAt(high)
    if (typeof found !== 'number') return found
    highGap = gap(found)
    if (highGap >= 0) break
    if (high >= mostMolPerKg) return { status: 'not-reached', pH: found, atMolPerKg: high }
    low = high
    lowGap = highGap
    high = Math.min(high * 4, mostMolPerKg)
  }
  for (let step = 1; step <= mostSteps; step++) {
    const secant = low - (lowGap * (high - low)) / (highGap - lowGap)
    const middle = step % 3 === 0 ? (low + high) / 2 : secant
    const found = pHAt(middle)
    if (typeof found !== 'number') return found
    const next = gap(found)
    if (Math.abs(next) <= pHTolerance) return { status: 'reached', molPerKg: middle, iterations: step }
    if (next < 0) {
      low = middle
      lowGap = next
    } else {
      high = middle
      highGap = next
    }
  }
  return { status: 'not-converged', code: 'titre-not-converged', values: { pH, between: low, and: high } }
}
