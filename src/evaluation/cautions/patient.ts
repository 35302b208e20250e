import { readVolume } from '../../quantity/readMeasure.ts'
import type { Library } from '../../library/library.ts'
import type { Formula } from '../../formula/types.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import type { CautionPatient } from './context.ts'

const perHour = /\s*(\/|per)\s*(h|hr|hour)$/i

/**
 * Patient and dose as written, read. What cannot be read is left out and named: a dose check that silently did not
 * run would look like one that passed.
 */
export function readPatient(
  { patient = {} }: Formula,
  library: Library,
): { readonly patient: CautionPatient; readonly findings: readonly Finding[] } {
  const findings: Finding[] = []
  const read = (code: string, text: string, volume: string): number | undefined => {
    const result = readVolume(volume)
    if (result.ok) return result.value
    const { message, wayOut } = result.refusal
    findings.push(findingOf(library, code, { values: { text, reason: message, instead: wayOut } }))
    return undefined
  }
  const { ageYears, weightKg, doseVolume, infusionRate } = patient
  const doseVolumeMl =
    doseVolume === undefined ? undefined : read('dose-volume-unreadable', doseVolume, doseVolume)
  const isRate = infusionRate !== undefined && perHour.test(infusionRate)
  const infusionRateMlPerH =
    infusionRate === undefined
      ? undefined
      : read('infusion-rate-unreadable', infusionRate, isRate ? infusionRate.replace(perHour, '') : '')
  return {
    findings,
    patient: {
      ...(ageYears === undefined ? {} : { ageYears }),
      ...(weightKg === undefined ? {} : { weightKg }),
      ...(doseVolumeMl === undefined ? {} : { doseVolumeMl }),
      ...(infusionRateMlPerH === undefined ? {} : { infusionRateMlPerH }),
    },
  }
}
