import * as v from 'valibot'
import publishedVehicles from '../../data/buffers/published-vehicles.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'
import type { Datum } from './types.ts'

/** A published buffer made to a volume, with the pH its source gives. */
export interface PublishedVehicle {
  readonly id: string
  readonly title: string
  /** Buffer system, e.g. "phosphate". */
  readonly system: string
  /** Temperature of the published pH. */
  readonly celsius: number
  readonly pH: Datum
  /** Grams of the pure substance in a litre; water to volume. */
  readonly gramsPerLitre: readonly { readonly ingredient: string; readonly grams: number }[]
  readonly note?: string
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())
const finite = v.pipe(v.number(), v.finite())
const positive = v.pipe(finite, v.gtValue(0))

const vehiclesSchema = v.array(
  v.strictObject({
    id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
    title: text,
    system: text,
    celsius: finite,
    pH: datumSchema(finite),
    gramsPerLitre: v.pipe(v.array(v.strictObject({ ingredient: text, grams: positive })), v.minLength(1)),
    note: v.exactOptional(text),
  }),
)

export const vehicleFiles: Readonly<Record<string, unknown>> = { 'published-vehicles': publishedVehicles }

/** Published vehicles, in the order of the file. */
export const loadVehicles = (): readonly PublishedVehicle[] =>
  checked(vehiclesSchema, publishedVehicles, 'buffers/published-vehicles')
