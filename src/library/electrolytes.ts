import * as v from 'valibot'
import rawBinary from '../../data/parameters/pitzer/binary.json'
import rawMixing from '../../data/parameters/pitzer/mixing.json'
import rawNeutral from '../../data/parameters/pitzer/neutral.json'

const coefficient = v.strictObject({ at25: v.number(), perK: v.number(), perK2: v.number() })
export type Coefficient = v.InferOutput<typeof coefficient>

const binary = v.strictObject({
  cation: v.string(),
  anion: v.string(),
  beta0: coefficient,
  beta1: coefficient,
  beta2: coefficient,
  cphi: coefficient,
  alpha1: v.number(),
  alpha2: v.number(),
  maximumMolality: v.number(),
  relativeUncertainty: v.number(),
  source: v.string(),
  temperatureSource: v.optional(v.string()),
  fromMemory: v.optional(v.boolean()),
  /** Temperature of the measurements behind `at25` where it is not 25 °C. */
  measuredAtCelsius: v.optional(v.number()),
  /** `low`: not from osmotic data. `stand-in`: converted from another theory. Each is named in a finding. */
  quality: v.optional(v.picklist(['low', 'stand-in'])),
  /** Measurements it was fitted to: never a check of it. */
  fittedOn: v.optional(v.string()),
  note: v.optional(v.string()),
})
export type BinaryRow = v.InferOutput<typeof binary>

const mixing = v.strictObject({
  ions: v.array(v.string()),
  value: coefficient,
  source: v.string(),
  fittedOn: v.optional(v.string()),
})
const neutral = mixing

export interface ElectrolyteParameters {
  readonly binary: ReadonlyMap<string, BinaryRow>
  readonly theta: ReadonlyMap<string, Coefficient>
  readonly psi: ReadonlyMap<string, Coefficient>
  readonly lambda: ReadonlyMap<string, Coefficient>
  readonly zeta: ReadonlyMap<string, Coefficient>
}

export function loadElectrolytes(): ElectrolyteParameters {
  const rows = v.parse(v.array(binary), rawBinary)
  const mixed = v.parse(v.strictObject({ theta: v.array(mixing), psi: v.array(mixing) }), rawMixing)
  const plain = v.parse(v.strictObject({ lambda: v.array(neutral), zeta: v.array(neutral) }), rawNeutral)
  const keyed = (list: readonly v.InferOutput<typeof mixing>[], key: (ions: readonly string[]) => string) =>
    new Map(list.map(({ ions, value }) => [key(ions), value]))
  const sorted = (ions: readonly string[]) => ions.slice(0, 2).toSorted().concat(ions.slice(2)).join('|')
  const lambda = keyed(plain.lambda, (ions) => ions.join('|'))
  for (const { ions, value } of plain.lambda) lambda.set(ions.toReversed().join('|'), value)
  return {
    binary: new Map(rows.map((row) => [`${row.cation}|${row.anion}`, row])),
    theta: keyed(mixed.theta, sorted),
    psi: keyed(mixed.psi, sorted),
    lambda,
    zeta: keyed(plain.zeta, (ions) => ions.join('|')),
  }
}
