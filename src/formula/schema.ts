import * as v from 'valibot'
import { ingredientSchema } from '../library/schema.ts'
import { routeIds, targetQuantities } from './types.ts'

/* Shape of the saved document. Messages are the end of a sentence that begins with the place. */

export const mostLines = 500
export const longestAmount = 2000
export const longestText = 500
export const longestNotes = 20_000
const mostUnits = 100_000

const textUpTo = (most: number) =>
  v.pipe(v.string('has to be text'), v.maxLength(most, `is longer than ${most} characters`))

const text = textUpTo(longestText)
const amount = textUpTo(longestAmount)

const numberFrom = (least: number, most: number) =>
  v.pipe(
    v.number('has to be a number'),
    v.minValue(least, `has to be at least ${least}`),
    v.maxValue(most, `has to be at most ${most}`),
  )

const above0 = v.pipe(
  v.number('has to be a number'),
  v.finite('has to be finite'),
  v.gtValue(0, 'has to be above zero'),
)

const objectOf = <const Entries extends v.ObjectEntries>(entries: Entries) =>
  v.object(entries, 'has to be an object')

const chosenFrom = <const Options extends readonly string[]>(options: Options) =>
  v.picklist(options, `has to be one of ${options.join(', ')}`)

const line = objectOf({
  key: v.pipe(text, v.nonEmpty('is empty')),
  ingredient: v.union([text, ingredientSchema], 'has to be the id of an ingredient or a record of its own'),
  amount,
  share: v.exactOptional(above0),
  cap: v.exactOptional(amount),
  note: v.exactOptional(text),
})

export const formulaSchema = objectOf({
  format: v.literal('evenwater.formula'),
  version: v.literal(1),
  title: text,
  route: chosenFrom(routeIds),
  finalVolume: text,
  target: v.exactOptional(objectOf({ quantity: chosenFrom(targetQuantities), value: text })),
  pH: v.exactOptional(numberFrom(0, 14)),
  temperature: v.exactOptional(text),
  lines: v.pipe(v.array(line, 'has to be a list'), v.maxLength(mostLines, `holds more than ${mostLines}`)),
  balance: v.exactOptional(text),
  batch: v.exactOptional(
    objectOf({
      units: v.pipe(numberFrom(1, mostUnits), v.integer('has to be a whole number')),
      excess: v.exactOptional(text),
    }),
  ),
  order: v.exactOptional(
    objectOf({
      orderNumber: v.exactOptional(text),
      lot: v.exactOptional(text),
      masterRecord: v.exactOptional(text),
      container: v.exactOptional(text),
      preparedFor: v.exactOptional(text),
    }),
  ),
  patient: v.exactOptional(
    objectOf({
      ageYears: v.exactOptional(numberFrom(0, 130)),
      weightKg: v.exactOptional(numberFrom(0.2, 700)),
      doseVolume: v.exactOptional(text),
      infusionRate: v.exactOptional(text),
    }),
  ),
  vehicle: v.exactOptional(text),
  notes: v.exactOptional(textUpTo(longestNotes)),
  acknowledgements: v.exactOptional(v.array(objectOf({ code: text, reason: amount }), 'has to be a list')),
})
