import * as v from 'valibot'

/** Which ingredients are meant: one that has any of these, and none of what is excepted. */
export interface Selector {
  readonly ids?: readonly string[]
  readonly tags?: readonly string[]
  readonly roles?: readonly string[]
  /** Species that dissolving gives. */
  readonly releases?: readonly string[]
  /** Words in the name or a synonym, in lower case: for what a line's own record brings in. */
  readonly names?: readonly string[]
  /** Whatever it is. */
  readonly everything?: true
  /** Whatever has other forms in the library, such as another hydrate. */
  readonly hasOtherForms?: true
  readonly except?: Selector
}

/**
 * One side (`above`, `atLeast`, `below`, `atMost`), outside (`below` and `above` together), or between with both
 * ends (`from`, `to`).
 */
export interface Limit {
  readonly above?: number
  readonly atLeast?: number
  readonly below?: number
  readonly atMost?: number
  readonly from?: number
  readonly to?: number
}

/** Amounts of a line or an ion. Those per dose, hour or day need what the order says of dose and patient. */
export const amountUnits = [
  '% w/v',
  'mg/mL',
  'mcg/mL',
  'mmol/L',
  'mmol/mL',
  'mEq/L',
  'mcg per dose',
  'mg per dose',
  'mg/kg per dose',
  'mmol per dose',
  'mg/min',
  'mmol/h',
  'mg/day',
  'mmol/day',
  'mg/kg/day',
  'mcg/kg/day',
] as const
export type AmountUnit = (typeof amountUnits)[number]

/** Figures of the whole solution, the dose or the patient; the unit is the one a person sees. */
export const metricUnits = {
  osmolality: ['mOsm/kg'],
  'effective-osmolality': ['mOsm/kg'],
  osmolarity: ['mOsm/L'],
  'sodium-chloride-equivalent': ['% w/v'],
  pH: ['pH'],
  'buffer-capacity': ['mol/L per pH'],
  'total-solutes': ['% w/v'],
  'final-volume': ['mL'],
  age: ['days', 'years'],
  weight: ['kg'],
  'dose-volume': ['mL'],
  'infusion-rate': ['mL/h'],
} as const
export type Metric = keyof typeof metricUnits

export type Condition =
  | { readonly all: readonly Condition[] }
  | { readonly any: readonly Condition[] }
  | { readonly not: Condition }
  /** Holds until the opposite is known: an exemption that needs a figure does not exempt without it. */
  | { readonly unless: Condition }
  | { readonly route: readonly string[] }
  | { readonly line: Selector; readonly strength?: Limit & StrengthOf }
  | { readonly line: Selector; readonly pHMinusPKa: Limit & { readonly acidCharge: number } }
  | { readonly line: Selector; readonly usual: Usual }
  /** Kinds of amount, or units as they were typed. */
  | { readonly line: Selector; readonly orderedIn: readonly string[] }
  | { readonly line: Selector; readonly writtenIn: readonly string[] }
  | { readonly everyLine: Selector }
  | { readonly together: readonly [Selector, Selector] }
  | { readonly ion: string; readonly amount: Limit & IonAmount }
  | { readonly measure: Metric; readonly is: Limit & { readonly unit: string } }
  | { readonly beyond: 'tolerated' | 'absolute'; readonly of: 'tonicity' | 'pH' }

export interface StrengthOf {
  readonly unit: AmountUnit
  /** `each` (the usual): one line alone; `sum`: the lines together. */
  readonly of?: 'each' | 'sum'
}

export interface IonAmount {
  readonly unit: AmountUnit
  /** g/mol, where a mass of the element is meant. */
  readonly gramsPerMole?: number
}

/** Against the usual range: so many times its upper end or more, its lower end divided by so much or less, or merely outside. */
export interface Usual {
  readonly outside?: true
  readonly timesAbove?: number
  readonly timesBelow?: number
}

const finite = v.pipe(v.number(), v.finite())
const texts = v.pipe(v.array(v.pipe(v.string(), v.nonEmpty())), v.minLength(1))

const selectorParts = {
  ids: v.exactOptional(texts),
  tags: v.exactOptional(texts),
  roles: v.exactOptional(texts),
  releases: v.exactOptional(texts),
  names: v.exactOptional(texts),
  everything: v.exactOptional(v.literal(true)),
  hasOtherForms: v.exactOptional(v.literal(true)),
}
const selector = v.pipe(
  v.strictObject({ ...selectorParts, except: v.exactOptional(v.strictObject(selectorParts)) }),
  v.check((given) => Object.keys(given).some((key) => key !== 'except'), 'a selector names something'),
)

const limitParts = {
  above: v.exactOptional(finite),
  atLeast: v.exactOptional(finite),
  below: v.exactOptional(finite),
  atMost: v.exactOptional(finite),
  from: v.exactOptional(finite),
  to: v.exactOptional(finite),
}
const shapes = new Set(['above', 'atLeast', 'below', 'atMost', 'above,below', 'from,to'])

/** Whether the sides that are given make one of the known shapes, the right way round. */
function isLimit(given: Limit): boolean {
  const sides = Object.keys(limitParts).filter((key) => given[key as keyof Limit] !== undefined)
  if (!shapes.has(sides.sort().join())) return false
  if (sides.length === 1) return true
  return (given.below ?? given.from ?? 0) <= (given.above ?? given.to ?? 0)
}
const limited = <const Parts extends v.ObjectEntries>(parts: Parts) =>
  v.pipe(
    v.strictObject({ ...limitParts, ...parts }),
    v.check((given) => isLimit(given as Limit), 'a limit has one side, or two the right way round'),
  )

const unit = v.picklist(amountUnits)
const positive = v.pipe(finite, v.gtValue(0))

const lineWith = <const Parts extends v.ObjectEntries>(parts: Parts) =>
  v.strictObject({ line: selector, ...parts })

const several = () => v.pipe(v.array(v.lazy(() => conditionSchema)), v.minLength(1))
const part = () => v.lazy(() => conditionSchema)

/* By the key that tells the kinds apart; those that begin with a line stand first. */
const kinds: Readonly<Record<string, v.GenericSchema>> = {
  pHMinusPKa: lineWith({ pHMinusPKa: limited({ acidCharge: v.pipe(finite, v.integer()) }) }),
  usual: lineWith({
    usual: v.strictObject({
      outside: v.exactOptional(v.literal(true)),
      timesAbove: v.exactOptional(positive),
      timesBelow: v.exactOptional(positive),
    }),
  }),
  orderedIn: lineWith({ orderedIn: texts }),
  writtenIn: lineWith({ writtenIn: texts }),
  line: lineWith({
    strength: v.exactOptional(limited({ unit, of: v.exactOptional(v.picklist(['each', 'sum'])) })),
  }),
  all: v.strictObject({ all: several() }),
  any: v.strictObject({ any: several() }),
  not: v.strictObject({ not: part() }),
  unless: v.strictObject({ unless: part() }),
  route: v.strictObject({ route: texts }),
  everyLine: v.strictObject({ everyLine: selector }),
  together: v.strictObject({ together: v.strictTuple([selector, selector]) }),
  ion: v.strictObject({
    ion: v.pipe(v.string(), v.nonEmpty()),
    amount: limited({ unit, gramsPerMole: v.exactOptional(positive) }),
  }),
  measure: v.pipe(
    v.strictObject({
      measure: v.picklist(Object.keys(metricUnits) as Metric[]),
      is: limited({ unit: v.string() }),
    }),
    v.check(
      ({ measure, is }) => (metricUnits[measure] as readonly string[]).includes(is.unit),
      'the metric is not seen in that unit',
    ),
  ),
  beyond: v.strictObject({
    beyond: v.picklist(['tolerated', 'absolute']),
    of: v.picklist(['tonicity', 'pH']),
  }),
}

const kindOf = (given: unknown): string | undefined =>
  typeof given === 'object' && given !== null ? Object.keys(kinds).find((key) => key in given) : undefined

const noKind = v.pipe(
  v.unknown(),
  v.check(() => false, 'not a condition of any known kind'),
)

/** The trigger tree of a caution. */
export const conditionSchema = v.lazy((given) => kinds[kindOf(given) ?? ''] ?? noKind) as v.GenericSchema<
  unknown,
  Condition
>
