import * as v from 'valibot'
import raw from '../../data/parameters/curves/neutral.json'

const curve = v.strictObject({
  /** φ = 1 + a₁m + a₂m² + a₃m³, m in mol per kg of water. */
  coefficients: v.tuple([v.number(), v.number(), v.number()]),
  maximumMolality: v.number(),
  relativeUncertainty: v.number(),
  source: v.string(),
  note: v.string(),
})
export type PhiCurve = v.InferOutput<typeof curve>

const entry = v.strictObject({ species: v.string(), freezing: curve, at25: curve })
export type NeutralCurve = v.InferOutput<typeof entry>

export const curveFiles: Readonly<Record<string, unknown>> = { neutral: raw }

/** Osmotic curves of neutral solutes by species id. Throws when data/parameters/curves is malformed. */
export const loadCurves = (): ReadonlyMap<string, NeutralCurve> =>
  new Map(v.parse(v.array(entry), raw).map((item) => [item.species, item]))
