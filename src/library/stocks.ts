import * as v from 'valibot'
import stocksFile from '../../data/stocks/stocks.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'
import type { Datum } from './types.ts'

/** A solution on the shelf, measured by volume or mass; what it holds enters the formula. */
export interface Stock {
  readonly id: string
  readonly name: string
  readonly synonyms: readonly string[]
  /** A vehicle may fill up to the final volume; a concentrate never does. */
  readonly use: 'vehicle' | 'concentrate'
  readonly contains: readonly { readonly ingredient: string; readonly gramsPerLitre: Datum }[]
  /** g/mL; absent: reckoned from what it holds. */
  readonly density?: Datum
  readonly note?: string
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())
const positive = datumSchema(v.pipe(v.number(), v.finite(), v.gtValue(0)))

export const stockSchema = v.strictObject({
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'is no id: lower case words with hyphens')),
  name: text,
  synonyms: v.array(text),
  use: v.picklist(['vehicle', 'concentrate']),
  contains: v.pipe(
    v.array(v.strictObject({ ingredient: text, gramsPerLitre: positive })),
    v.minLength(1, 'holds nothing'),
    v.maxLength(30, 'holds more than 30 ingredients'),
  ),
  density: v.exactOptional(positive),
  note: v.exactOptional(text),
})

export const stockFiles: Readonly<Record<string, unknown>> = { stocks: stocksFile }

export const loadStocks = (): readonly Stock[] => checked(v.array(stockSchema), stocksFile, 'stocks/stocks')
