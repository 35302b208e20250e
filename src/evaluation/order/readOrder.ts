import type { Read } from '../../quantity/amount.ts'
import { readTarget, readTemperature, readVolume, readReadability } from '../../quantity/readMeasure.ts'
import type { Library } from '../../library/library.ts'
import type { Formula } from '../../formula/types.ts'
import { targetUnits, type Target } from '../adjusting/target.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'

/** The formula's frame, read; null where it could not be. */
export interface Order {
  readonly volumeMl: number | null
  readonly temperatureCelsius: number
  readonly target: Target | null
  /** Readability of the balance, g. */
  readonly readabilityG: number | null
  /** Batch volume over evaluated volume. */
  readonly batchFactor: number
}

const roomTemperature = 25

/** Reads everything of the formula but its lines; each text that cannot be read is a blocking finding. */
export function readOrder(formula: Formula, library: Library): { order: Order; findings: Finding[] } {
  const findings: Finding[] = []
  const read = <T>(code: string, text: string, result: Read<T>): T | null => {
    if (result.ok) return result.value
    const { message, wayOut } = result.refusal
    findings.push(
      findingOf(library, code, { values: { text, reason: message, instead: wayOut }, blocks: true }),
    )
    return null
  }
  const { finalVolume, temperature, target, balance, batch } = formula
  const volumeMl = read('volume-unreadable', finalVolume, readVolume(finalVolume))
  const celsius =
    temperature === undefined
      ? roomTemperature
      : read('temperature-unreadable', temperature, readTemperature(temperature))
  const wanted =
    target === undefined
      ? null
      : read('target-unreadable', target.value, readTarget(target.quantity, target.value))
  const readabilityG =
    balance === undefined ? null : read('balance-unreadable', balance, readReadability(balance))
  const excessMl =
    batch?.excess === undefined ? 0 : read('excess-unreadable', batch.excess, readVolume(batch.excess))
  const units = batch?.units ?? 1
  if (!(Number.isFinite(units) && units > 0)) {
    findings.push(findingOf(library, 'batch-unusable', { values: { text: String(units) }, blocks: true }))
  }
  const unreadable = findings.length > 0
  return {
    findings,
    order: {
      volumeMl,
      temperatureCelsius: celsius ?? roomTemperature,
      target:
        target && wanted !== null
          ? { quantity: target.quantity, value: wanted, unit: targetUnits[target.quantity] }
          : null,
      readabilityG,
      batchFactor: unreadable || volumeMl === null ? 1 : units + (excessMl ?? 0) / volumeMl,
    },
  }
}
