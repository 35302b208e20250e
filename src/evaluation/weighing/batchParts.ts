import type { Batch } from '../../formula/types.ts'
import { loadDeviceData, type LabelExcessTable } from '../../library/devices.ts'
import type { Library } from '../../library/library.ts'
import type { Read } from '../../quantity/amount.ts'
import { readVolume } from '../../quantity/readMeasure.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'

/** What the volume of a batch is made of, mL. */
export interface BatchParts {
  readonly units: number
  readonly labelMl: number
  /** Of each container, so that the label volume can be drawn out. */
  readonly overfillMl: number
  readonly overfillKind: 'mobile' | 'viscous' | null
  readonly holdUpMl: number
  readonly samplesMl: number
  /** Extra for losses, apart from the rest. */
  readonly excessMl: number
  readonly totalMl: number
}

export interface Excess {
  readonly millilitres: number
  /** Size of the table whose row was taken, mL. */
  readonly takenMl: number
}

/**
 * Excess volume of one container by its label size: the row of that size, or of the next larger one where the table
 * has none; from 50 mL on a percentage. mL (Usp1151).
 * @example excessOf(10, 'mobile', table).millilitres → 0.5
 */
export function excessOf(labelMl: number, kind: 'mobile' | 'viscous', table: LabelExcessTable): Excess {
  const row = table.sizes.find((size) => size.labelMl >= labelMl * (1 - 1e-9))
  if (row) return { millilitres: row[kind].value, takenMl: row.labelMl }
  const takenMl = Math.max(labelMl, 50)
  return { millilitres: (takenMl * table.from50Ml[kind].value) / 100, takenMl }
}

/** The batch in its parts, or the findings that say what of it cannot be read. */
export function batchPartsOf(
  batch: Batch | undefined,
  labelMl: number,
  library: Library,
): { readonly parts: BatchParts | null; readonly findings: readonly Finding[] } {
  const findings: Finding[] = []
  const read = (part: string, text: string | undefined, code = 'batch-part-unreadable'): number => {
    const result: Read<number> = text === undefined ? { ok: true, value: 0 } : readVolume(text)
    if (result.ok) return result.value
    const { message, wayOut } = result.refusal
    const values = { part, text: text ?? '', reason: message, instead: wayOut }
    findings.push(findingOf(library, code, { values, blocks: true }))
    return 0
  }
  const units = batch?.units ?? 1
  if (!(Number.isFinite(units) && units > 0)) {
    findings.push(findingOf(library, 'batch-unusable', { values: { text: String(units) }, blocks: true }))
  }
  const excessMl = read('extra', batch?.excess, 'excess-unreadable')
  const holdUpMl = read('hold-up', batch?.holdUp)
  const samplesMl = read('sample volume', batch?.samples)
  if (findings.length > 0) return { parts: null, findings }
  const kind = batch?.overfill ?? null
  const excess = kind === null ? null : excessOf(labelMl, kind, loadDeviceData().labelExcess)
  if (excess && Math.abs(excess.takenMl / labelMl - 1) > 1e-9) {
    const values = { volume: labelMl, taken: excess.takenMl }
    findings.push(findingOf(library, 'label-size-not-listed', { values }))
  }
  const overfillMl = excess?.millilitres ?? 0
  const totalMl = units * (labelMl + overfillMl) + holdUpMl + samplesMl + excessMl
  const parts = { units, labelMl, overfillMl, overfillKind: kind, holdUpMl, samplesMl, excessMl, totalMl }
  return { parts, findings }
}

/**
 * Batch volume over the volume of one container. Whole units are kept apart from the rest, so that a batch of
 * containers alone has a whole factor.
 */
export const batchFactorOf = ({ units, labelMl, totalMl }: BatchParts): number =>
  units + (totalMl - units * labelMl) / labelMl
