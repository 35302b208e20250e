import type { Command } from '../../formula/commands.ts'
import type { Batch, Formula } from '../../formula/types.ts'
import type { Read } from '../../quantity/amount.ts'
import { readAmount } from '../../quantity/readAmount.ts'
import { readReadability, readTarget, readTemperature, readVolume } from '../../quantity/readMeasure.ts'

/** The fields of the order, the batch and the patient; each is one text on the page. */
export const fieldLabels = {
  title: 'the title',
  finalVolume: 'the final volume',
  vehicle: 'the vehicle',
  pH: 'the pH',
  temperature: 'the temperature',
  balance: 'the readability of the balance',
  target: 'the target',
  batchUnits: 'the number of containers',
  batchExcess: 'the extra for the batch',
  batchHoldUp: 'the hold-up of filter and tubing',
  batchSamples: 'the samples',
  orderNumber: 'the order number',
  lot: 'the lot',
  masterRecord: 'the master record',
  container: 'the container',
  preparedFor: 'whom it is prepared for',
  ageYears: 'the age',
  weightKg: 'the weight',
  doseVolume: 'the dose',
  infusionRate: 'the infusion rate',
} as const

export type FieldId = keyof typeof fieldLabels

type OrderField = 'orderNumber' | 'lot' | 'masterRecord' | 'container' | 'preparedFor'
type PatientText = 'doseVolume' | 'infusionRate'
type PatientNumber = 'ageYears' | 'weightKg'
type TopText = 'title' | 'finalVolume' | 'vehicle' | 'temperature' | 'balance'

const orderFields: ReadonlySet<string> = new Set<OrderField>([
  'orderNumber',
  'lot',
  'masterRecord',
  'container',
  'preparedFor',
])
const patientTexts: ReadonlySet<string> = new Set<PatientText>(['doseVolume', 'infusionRate'])
const patientNumbers: ReadonlySet<string> = new Set<PatientNumber>(['ageYears', 'weightKg'])
const neverAbsent: ReadonlySet<string> = new Set(['title', 'finalVolume'])

const isOrderField = (field: FieldId): field is OrderField => orderFields.has(field)
const isPatientText = (field: FieldId): field is PatientText => patientTexts.has(field)
const isPatientNumber = (field: FieldId): field is PatientNumber => patientNumbers.has(field)

const numberText = (value: number | undefined) => (value === undefined ? '' : String(value))

/** What stands in a field, as typed. */
export function fieldText(formula: Formula, field: FieldId): string {
  if (isOrderField(field)) return formula.order?.[field] ?? ''
  if (isPatientText(field)) return formula.patient?.[field] ?? ''
  if (isPatientNumber(field)) return numberText(formula.patient?.[field])
  if (field === 'pH') return numberText(formula.pH)
  if (field === 'target') return formula.target?.value ?? ''
  if (field === 'batchUnits') return numberText(formula.batch?.units)
  const part = batchPart(field)
  if (part) return formula.batch?.[part] ?? ''
  return formula[field as TopText] ?? ''
}

const ranges: Readonly<Partial<Record<FieldId, readonly [low: number, high: number]>>> = {
  pH: [0, 14],
  batchUnits: [1, 100_000],
  ageYears: [0, 130],
  weightKg: [0.2, 700],
}

/** A plain decimal number inside the field's range, or null; for containers a whole one. */
function readNumber(field: FieldId, text: string): number | null {
  const [low, high] = ranges[field] ?? [0, 0]
  if (!/^\d{1,6}(\.\d{1,6})?$/.test(text.trim())) return null
  const value = Number(text.trim())
  if (value < low || value > high) return null
  return field === 'batchUnits' && !Number.isInteger(value) ? null : value
}

/** The object without its absent members; undefined when nothing is left. */
function present<T extends object>(parts: T): T | undefined {
  const entries = Object.entries(parts).filter(([, value]) => value !== undefined && value !== '')
  return entries.length === 0 ? undefined : (Object.fromEntries(entries) as T)
}

const isNumeric = (field: FieldId) => field in ranges

/** The command that writes the text into the document, or null when a number is needed and this is none. */
export function fieldCommand(formula: Formula, field: FieldId, text: string): Command | null {
  const isEmpty = text.trim() === ''
  if (!isNumeric(field)) return textCommand(formula, field, text)
  const value = isEmpty ? undefined : readNumber(field, text)
  if (value === null) return null
  if (field === 'pH') return { kind: 'set-field', field: 'pH', value }
  if (field === 'batchUnits') return batchCommand(formula, { units: value ?? 1 })
  return { kind: 'set-field', field: 'patient', value: present({ ...formula.patient, [field]: value }) }
}

function textCommand(formula: Formula, field: FieldId, text: string): Command {
  if (isOrderField(field)) {
    return { kind: 'set-field', field: 'order', value: present({ ...formula.order, [field]: text }) }
  }
  if (isPatientText(field)) {
    return { kind: 'set-field', field: 'patient', value: present({ ...formula.patient, [field]: text }) }
  }
  if (field === 'target') {
    const quantity = formula.target?.quantity ?? 'osmolality'
    return { kind: 'set-field', field: 'target', value: { quantity, value: text } }
  }
  const part = batchPart(field)
  if (part) return batchCommand(formula, { [part]: text })
  const value = text === '' && !neverAbsent.has(field) ? undefined : text
  return { kind: 'set-field', field: field as TopText, value }
}

/** One container without anything beside it is no batch of its own. */
export function batchCommand(
  { batch }: Formula,
  change: { readonly [Part in keyof Batch]?: Batch[Part] | '' },
): Command {
  const { units = 1, ...parts } = { ...batch, ...change } as Batch
  const value = present({ ...parts })
  return {
    kind: 'set-field',
    field: 'batch',
    value: units === 1 && value === undefined ? undefined : { units, ...value },
  }
}

type BatchText = 'excess' | 'holdUp' | 'samples'
const batchTexts: Readonly<Partial<Record<FieldId, BatchText>>> = {
  batchExcess: 'excess',
  batchHoldUp: 'holdUp',
  batchSamples: 'samples',
}
const batchPart = (field: FieldId): BatchText | undefined => batchTexts[field]

const numberWays: Readonly<Partial<Record<FieldId, string>>> = {
  pH: 'Write a pH between 0 and 14 with a point, such as 6.8, or leave it empty.',
  batchUnits: 'Write a whole number of containers, such as 10.',
  ageYears: 'Write the age in years with a point, such as 0.5, or leave it empty.',
  weightKg: 'Write the weight in kg with a point, such as 3.2, or leave it empty.',
}

const toldOf = <T>(read: Read<T>) => (read.ok ? null : `${read.refusal.message} ${read.refusal.wayOut}`)

const readers: Readonly<Partial<Record<FieldId, (text: string) => Read<unknown>>>> = {
  finalVolume: (text) => readVolume(text),
  temperature: (text) => readTemperature(text),
  balance: (text) => readReadability(text),
  batchExcess: (text) => readVolume(text),
  batchHoldUp: (text) => readVolume(text),
  batchSamples: (text) => readVolume(text),
  doseVolume: (text) => readVolume(text),
}

/** Why a field is not taken and how to write it; null when it is. */
export function fieldRefusal(formula: Formula, field: FieldId, draft: string | undefined): string | null {
  if (draft !== undefined) return `“${draft.slice(0, 40)}” is not taken. ${numberWays[field] ?? ''}`.trim()
  const text = fieldText(formula, field)
  if (field === 'target') return formula.target ? toldOf(readTarget(formula.target.quantity, text)) : null
  const reader = readers[field]
  return reader && (text !== '' || field === 'finalVolume') ? toldOf(reader(text)) : null
}

export const amountRefusal = (text: string): string | null => toldOf(readAmount(text))

/** The target as a place on the osmolality axis; null for targets of another quantity. */
export function targetOnAxis({ target }: Formula): number | null {
  if (!target) return null
  if (target.quantity !== 'osmolality' && target.quantity !== 'effective-osmolality') return null
  const read = readTarget(target.quantity, target.value)
  return read.ok ? read.value : null
}
