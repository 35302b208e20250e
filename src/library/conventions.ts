import * as v from 'valibot'
import raw from '../../data/parameters/conventions.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'
import type { Datum, ElectrolyteClass } from './types.ts'

/** Numbers that the trade's methods agree on, and the thresholds of this program's own remarks. */
export interface Conventions {
  /** % w/v. */
  readonly isotonicSodiumChloridePercent: Datum
  /** K, taken as equal to 0.9 % sodium chloride. */
  readonly isotonicDepressionKelvin: Datum
  /** K·kg/Osm, defines the reading of a freezing-point osmometer. */
  readonly cryoscopicConstant: Datum
  /** E = 17·L_iso/M. */
  readonly equivalentPerLiso: Datum
  /** V = w·E·111.1 mL. */
  readonly isotonicVolumePerGramMl: Datum
  readonly gasConstant: Datum
  readonly waterDensity37: Datum
  /** Least weighable mass in readabilities of the balance. */
  readonly leastWeighableReadabilities: Datum
  readonly finalVolumeRelativeUncertainty: Datum
  readonly methodsDisagreeFraction: Datum
  readonly roundingWorthMentionFraction: Datum
  readonly notIsotonicFraction: Datum
  readonly isosmoticLowMilliosmPerKg: Datum
  readonly nearReadingFraction: Datum
  readonly equivalentUncertainty: Datum
  readonly redCellFixedFraction: Datum
  readonly plasmaOsmolality: Datum
  readonly haemolysisOnsetPercent: Datum
  /** K·L/mol by ionic class. */
  readonly lIso: Readonly<Record<ElectrolyteClass, Datum>>
}

const datum = datumSchema(v.pipe(v.number(), v.finite(), v.gtValue(0)))

const conventionsSchema = v.strictObject({
  isotonicSodiumChloridePercent: datum,
  isotonicDepressionKelvin: datum,
  cryoscopicConstant: datum,
  equivalentPerLiso: datum,
  isotonicVolumePerGramMl: datum,
  gasConstant: datum,
  waterDensity37: datum,
  leastWeighableReadabilities: datum,
  finalVolumeRelativeUncertainty: datum,
  methodsDisagreeFraction: datum,
  roundingWorthMentionFraction: datum,
  notIsotonicFraction: datum,
  isosmoticLowMilliosmPerKg: datum,
  nearReadingFraction: datum,
  equivalentUncertainty: datum,
  redCellFixedFraction: datum,
  plasmaOsmolality: datum,
  haemolysisOnsetPercent: datum,
  lIso: v.strictObject({
    'non-electrolyte': datum,
    'weak-electrolyte': datum,
    'di-divalent': datum,
    'uni-univalent': datum,
    'uni-divalent': datum,
    'di-univalent': datum,
    'uni-trivalent': datum,
    'tri-univalent': datum,
    tetraborate: datum,
  }),
})

export const conventionFiles: Readonly<Record<string, unknown>> = { conventions: raw }

let known: Conventions | undefined

/** The conventions, checked once. */
export function loadConventions(): Conventions {
  known ??= checked(conventionsSchema, raw, 'parameters/conventions')
  return known
}
