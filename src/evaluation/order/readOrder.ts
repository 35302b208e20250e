import type { Read } from '../../quantity/amount.ts'
import { readTarget, readTemperature, readVolume, readReadability } from '../../quantity/readMeasure.ts'
import type { Library } from '../../library/library.ts'
import type { Formula } from '../../formula/types.ts'
import { targetUnits, type Target } from '../adjusting/target.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import { batchFactorOf, batchPartsOf } from '../weighing/batchParts.ts'
import { readBench } from '../weighing/bench.ts'
import type { Measure } from '../weighing/measures.ts'
import type { Scale } from '../weighing/scales.ts'

/** The formula's frame, read; null where it could not be. */
export interface Order {
  readonly volumeMl: number | null
  readonly temperatureCelsius: number
  readonly target: Target | null
  readonly scales: readonly Scale[]
  readonly measures: readonly Measure[]
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
  const bench = readBench(formula, readabilityG, library)
  findings.push(...bench.findings)
  const batchRead = volumeMl === null ? null : batchPartsOf(batch, volumeMl, library)
  findings.push(...(batchRead?.findings ?? []))
  const unreadable = findings.some(({ blocks }) => blocks)
  const parts = batchRead?.parts
  return {
    findings,
    order: {
      volumeMl,
      temperatureCelsius: celsius ?? roomTemperature,
      target:
        target && wanted !== null
          ? { quantity: target.quantity, value: wanted, unit: targetUnits[target.quantity] }
          : null,
      scales: bench.scales,
      measures: bench.measures,
      batchFactor: unreadable || !parts ? 1 : batchFactorOf(parts),
    },
  }
}
