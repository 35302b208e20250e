import { bufferedAt, capacityOf } from '../../chemistry/buffering.ts'
import type { Library } from '../../library/library.ts'
import { compositionOf } from '../model.ts'
import { portionsInEvaluation } from '../portions.ts'
import type { Evaluation } from '../types.ts'

/* Capacities are given at room temperature; over the range of use they move by a few percent. */
const celsius = 25

/**
 * Buffer capacity of an answered formula at its pH, solved or ordered, mol of strong base per litre and pH; null where
 * an ion's own ionisation is not known.
 */
export function bufferCapacityOf(evaluation: Evaluation, library: Library): number | null {
  const { solution, volumeMl } = evaluation
  const pH = solution?.pH ?? null
  if (pH === null || volumeMl === null) return null
  const setting = { volumeMl, pH: 'solve', temperatureCelsius: celsius } as const
  const buffered = bufferedAt(compositionOf(portionsInEvaluation(evaluation), setting), library, celsius)
  if (buffered.status === 'refused') return null
  const answer = buffered.compiled.solve(buffered.totals, { kind: 'pH', pH })
  if (answer.status !== 'converged') return null
  const { molPerLitrePerPH } = capacityOf({ ...buffered, answer })
  return Number.isFinite(molPerLitrePerPH) ? molPerLitrePerPH : null
}
