import * as v from 'valibot'

/* Shapes of the data files. Every object is strict: a key that is not known is a mistake, not a remark. */

const filledText = v.pipe(v.string(), v.trim(), v.nonEmpty())
const finite = v.pipe(v.number(), v.finite())
const positive = v.pipe(finite, v.gtValue(0))
const notNegative = v.pipe(finite, v.minValue(0))
const charge = v.pipe(finite, v.integer())

const datumFields = {
  unit: filledText,
  kind: v.picklist(['measured', 'tabulated', 'derived', 'estimate']),
  source: filledText,
  confidence: v.picklist(['high', 'medium', 'low']),
  fromMemory: v.boolean(),
  uncertainty: v.exactOptional(notNegative),
  note: v.exactOptional(filledText),
}

/** A figure with unit, kind, source and confidence, and what other sources say. */
export function datumSchema<const Value extends v.GenericSchema>(value: Value) {
  const single = v.strictObject({ value, ...datumFields })
  return v.strictObject({ value, ...datumFields, alternatives: v.exactOptional(v.array(single)) })
}

const numberDatum = datumSchema(finite)
const positiveDatum = datumSchema(positive)
const shareDatum = datumSchema(v.pipe(finite, v.minValue(0), v.maxValue(1)))
const percentDatum = datumSchema(v.pipe(finite, v.minValue(0), v.maxValue(100)))

export const sourceSchema = v.strictObject({
  key: v.pipe(v.string(), v.regex(/^[A-Za-z0-9-]+$/)),
  title: filledText,
  kind: v.picklist(['publication', 'pharmacopoeia', 'label', 'common-practice', 'from-memory', 'project']),
  note: v.exactOptional(filledText),
})

export const sourcesSchema = v.array(sourceSchema)

const releasedSpecies = v.strictObject({
  species: filledText,
  count: v.pipe(finite, v.integer(), v.minValue(1)),
  charge,
})

const ownIonisation = v.strictObject({
  pKa: numberDatum,
  acidCharge: charge,
  enthalpyKilojoulePerMole: v.exactOptional(numberDatum),
})

export const electrolyteClassSchema = v.picklist([
  'non-electrolyte',
  'weak-electrolyte',
  'di-divalent',
  'uni-univalent',
  'uni-divalent',
  'di-univalent',
  'uni-trivalent',
  'tri-univalent',
  'tetraborate',
])

const article = v.strictObject({ massFraction: shareDatum, density: positiveDatum })

export const ingredientSchema = v.strictObject({
  id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
  name: filledText,
  tallManName: v.exactOptional(filledText),
  synonyms: v.array(filledText),
  family: v.exactOptional(filledText),
  cas: v.exactOptional(datumSchema(v.pipe(v.string(), v.regex(/^\d{2,7}-\d\d-\d$/)))),
  formula: v.exactOptional(filledText),
  crystalWaters: notNegative,
  waterReleased: v.exactOptional(finite),
  molarMass: v.exactOptional(positiveDatum),
  state: v.picklist(['solid', 'liquid']),
  percentBasis: v.picklist(['w/v', 'v/v']),
  density: v.exactOptional(positiveDatum),
  article: v.exactOptional(article),
  displacement: v.exactOptional(numberDatum),
  roles: v.array(filledText),
  tags: v.array(filledText),
  releases: v.exactOptional(v.array(releasedSpecies)),
  electrolyteClass: v.exactOptional(electrolyteClassSchema),
  ionisingSpecies: v.exactOptional(filledText),
  ownIonisation: v.exactOptional(v.array(ownIonisation)),
  sodiumChlorideEquivalents: v.array(v.strictObject({ atPercent: positive, e: datumSchema(notNegative) })),
  isoOsmoticPercent: v.exactOptional(positiveDatum),
  measuredOsmolality: v.exactOptional(
    v.array(v.strictObject({ atPercent: positive, osmolality: datumSchema(notNegative) })),
  ),
  freezingPointDepression1Percent: v.exactOptional(datumSchema(notNegative)),
  measuredI: v.exactOptional(positiveDatum),
  reflection: v.exactOptional(shareDatum),
  haemolysisPercent: v.exactOptional(percentDatum),
  usualStrength: v.exactOptional(filledText),
  routeNotes: v.exactOptional(filledText),
  handling: v.exactOptional(filledText),
  notes: v.exactOptional(v.array(filledText)),
})

export const ingredientsSchema = v.array(ingredientSchema)
