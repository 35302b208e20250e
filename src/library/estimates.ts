import * as v from 'valibot'
import raw from '../../data/parameters/estimates.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'

const datum = datumSchema(v.pipe(v.number(), v.finite(), v.gtValue(0)))

const estimatesSchema = v.strictObject({
  typicalSpecificVolume: datum,
  equivalentRounding: datum,
  depressionRounding: datum,
  classScatter: datum,
  macromoleculeEquivalent: datum,
  traceEquivalent: datum,
  traceUpToPercent: datum,
  driftAboveTable: datum,
  driftBelowTable: datum,
  temperatureOfTable: datum,
  waterOfVolume: datum,
  missingPair: datum,
  missingTemperature: datum,
  temperatureForm: datum,
  outOfRange: datum,
  leastModelUncertainty: datum,
  measuredReading: datum,
})

/** What is assumed, with what uncertainty, where nothing was measured. Each use is named in a finding. */
export type Estimates = v.InferOutput<typeof estimatesSchema>

export const estimateFiles: Readonly<Record<string, unknown>> = { estimates: raw }

let loaded: Estimates | undefined

/** The stated estimates of data/parameters. Throws when the file is malformed. */
export const loadEstimates = (): Estimates =>
  (loaded ??= checked(estimatesSchema, raw, 'parameters/estimates'))
