import { loadDevices } from '../../library/devices.ts'
import type { Balance } from '../lowering.ts'
import type { LineAliquot, LineAnswer } from '../types.ts'
import { designAliquot } from './aliquot.ts'

/** Largest part of the batch that diluents of aliquots may fill, so that room is left to dissolve and adjust. */
const roomShare = 0.25

/** Aliquots for the lines whose batch mass is below the least weighable one. */
export function aliquotsOf(
  lines: readonly LineAnswer[],
  { readabilityG, leastWeighableG, batchFactor }: Balance,
  volumeMl: number | null,
): readonly LineAliquot[] {
  if (readabilityG === null || volumeMl === null) return []
  const small = lines.filter((line) => line.belowLeastWeighable && line.grams !== null)
  const roomMl = (volumeMl * batchFactor * roomShare) / Math.max(1, small.length)
  return small.map(({ key, grams, articleGrams }) => {
    const neededGrams = (articleGrams ?? grams ?? 0) * batchFactor
    const need = {
      neededGrams,
      leastWeighableGrams: leastWeighableG,
      weighingErrorGrams: readabilityG,
      roomMl,
    }
    return { key, neededGrams, plan: designAliquot(need, loadDevices()) }
  })
}
