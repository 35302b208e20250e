import { measureKinds, type BenchBalance, type BenchMeasure } from '../../formula/types.ts'
import type { Read } from '../../quantity/amount.ts'
import { readMass, readReadability, readVolume } from '../../quantity/readMeasure.ts'

/** One cell of a device: what it is called, what may stand in it, and why something may not. */
export interface BenchColumn {
  readonly field: string
  readonly label: string
  readonly empty: string
  readonly choices?: readonly string[]
  /** Why the text is not taken; null when it is. */
  readonly refusal: (text: string) => string | null
}

const told = (read: Read<unknown>) => (read.ok ? null : `${read.refusal.message} ${read.refusal.wayOut}`)
const optional = (reader: (text: string) => Read<unknown>) => (text: string) =>
  text === '' ? null : told(reader(text))
const anything = () => null
const named = (text: string) => (text === '' ? 'Give it a name.' : null)

const percentRefusal = (text: string) =>
  text === '' || (/^\d{1,3}(\.\d{1,4})?$/.test(text) && Number(text) >= 0.01 && Number(text) <= 100)
    ? null
    : 'Write the allowed error in percent between 0.01 and 100, such as 5.'

export const balanceColumns: readonly BenchColumn[] = [
  { field: 'name', label: 'balance', empty: 'name', refusal: named },
  {
    field: 'readability',
    label: 'reads to',
    empty: '0.1 mg',
    refusal: (text) => told(readReadability(text)),
  },
  { field: 'repeatability', label: 'standard deviation', empty: 'not known', refusal: optional(readMass) },
  { field: 'sensitivity', label: 'sensitivity', empty: 'or 6 mg', refusal: optional(readMass) },
  { field: 'allowedErrorPercent', label: 'allowed error, %', empty: '0.1', refusal: percentRefusal },
  { field: 'capacity', label: 'takes up to', empty: 'not given', refusal: optional(readMass) },
]

export const measureColumns: readonly BenchColumn[] = [
  { field: 'name', label: 'measure', empty: 'name', refusal: named },
  { field: 'kind', label: 'kind', empty: '', choices: measureKinds, refusal: anything },
  { field: 'capacity', label: 'holds', empty: '10 mL', refusal: (text) => told(readVolume(text)) },
  { field: 'graduation', label: 'marks every', empty: 'one mark', refusal: optional(readVolume) },
  { field: 'tolerance', label: 'largest error', empty: 'of its kind', refusal: optional(readVolume) },
]

export type Device = Readonly<Record<string, string | number>>

/** A device with one cell changed; an empty optional cell is left out, a percent is a number. */
export function withCell(device: Device, field: string, text: string): Device {
  const { [field]: _old, ...rest } = device
  if (text === '') return rest
  return { ...device, [field]: field === 'allowedErrorPercent' ? Number(text) : text }
}

export const newBalance: BenchBalance = { name: 'balance', readability: '0.1 mg' }
export const newMeasure: BenchMeasure = { name: 'flask', kind: 'flask', capacity: '100 mL' }
