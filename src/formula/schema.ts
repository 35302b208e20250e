import * as v from 'valibot'
import { ingredientSchema } from '../library/schema.ts'
import { stockSchema } from '../library/stocks.ts'
import { measureKinds, routeIds, targetQuantities } from './types.ts'

/* Shape of the saved document. Messages are the end of a sentence that begins with the place. */

export const mostLines = 500
export const longestAmount = 2000
export const longestText = 500
export const longestNotes = 20_000
const mostUnits = 100_000
const mostStocks = 100

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
  orderedAs: v.exactOptional(text),
  certificate: v.exactOptional(
    objectOf({
      assayPercent: v.exactOptional(numberFrom(0, 1000)),
      assayBasis: v.exactOptional(chosenFrom(['as-is', 'anhydrous', 'dried'])),
      waterPercent: v.exactOptional(numberFrom(0, 100)),
      unitsPerMg: v.exactOptional(above0),
    }),
  ),
})

const benchBalance = objectOf({
  name: text,
  readability: text,
  repeatability: v.exactOptional(text),
  sensitivity: v.exactOptional(text),
  allowedErrorPercent: v.exactOptional(numberFrom(0.01, 100)),
  capacity: v.exactOptional(text),
})

const benchMeasure = objectOf({
  name: text,
  kind: chosenFrom(measureKinds),
  capacity: text,
  graduation: v.exactOptional(text),
  tolerance: v.exactOptional(text),
})

const mostDevices = 50
const devicesOf = <const Item extends v.GenericSchema>(item: Item) =>
  v.pipe(v.array(item, 'has to be a list'), v.maxLength(mostDevices, `holds more than ${mostDevices}`))

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
  stocks: v.exactOptional(
    v.pipe(
      v.array(stockSchema, 'has to be a list'),
      v.maxLength(mostStocks, `holds more than ${mostStocks}`),
    ),
  ),
  balance: v.exactOptional(text),
  bench: v.exactOptional(
    objectOf({
      balances: v.exactOptional(devicesOf(benchBalance)),
      measures: v.exactOptional(devicesOf(benchMeasure)),
    }),
  ),
  batch: v.exactOptional(
    objectOf({
      units: v.pipe(numberFrom(1, mostUnits), v.integer('has to be a whole number')),
      excess: v.exactOptional(text),
      overfill: v.exactOptional(chosenFrom(['mobile', 'viscous'])),
      holdUp: v.exactOptional(text),
      samples: v.exactOptional(text),
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
