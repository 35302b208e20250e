import { unitOfMathjs } from './mathjsUnit.ts'

/** What a unit measures. A molarity (M, mM) is moles per volume in one word. */
export type Dimension = 'mass' | 'volume' | 'moles' | 'equivalents' | 'molarity' | 'biological'

/** One unit of the trade. `factor` turns it into the canonical unit: g, mL, mmol, mEq, mmol/mL. */
export interface TradeUnit {
  readonly dimension: Dimension
  /** How it is written back. */
  readonly symbol: string
  readonly factor: number
}

/** All factors here are powers of ten; the library's own binary noise (1000.0000000000001) is cut off. */
const factorOf = (name: string, canonical: string) =>
  Number(unitOfMathjs(1, name).toNumber(canonical).toPrecision(12))

const gramsIn = (name: string) => factorOf(name, 'g')
const millilitresIn = (name: string) => factorOf(name, 'mL')
const millimolesIn = (name: string) => factorOf(name, 'mmol')

type Row = readonly [Dimension, symbol: string, factor: number, spellings: string]

const rows: readonly Row[] = [
  ['mass', 'kg', gramsIn('kg'), 'kg kilogram kilograms'],
  ['mass', 'g', gramsIn('g'), 'g gram grams'],
  ['mass', 'mg', gramsIn('mg'), 'mg milligram milligrams'],
  ['mass', 'mcg', gramsIn('ug'), 'mcg ug µg μg microgram micrograms'],
  ['mass', 'ng', gramsIn('ng'), 'ng nanogram nanograms'],
  ['volume', 'L', millilitresIn('L'), 'L l litre litres liter liters'],
  ['volume', 'mL', millilitresIn('mL'), 'mL ml millilitre millilitres milliliter milliliters'],
  ['volume', 'microL', millilitresIn('uL'), 'microL uL µL μL ul µl μl microlitre microlitres microliter'],
  ['moles', 'mol', millimolesIn('mol'), 'mol mole moles'],
  ['moles', 'mmol', millimolesIn('mmol'), 'mmol millimole millimoles'],
  ['moles', 'micromol', millimolesIn('umol'), 'micromol umol µmol μmol micromole micromoles'],
  ['equivalents', 'Eq', millimolesIn('mol'), 'Eq eq'],
  ['equivalents', 'mEq', millimolesIn('mmol'), 'mEq meq'],
  ['molarity', 'mol/L', millimolesIn('mol') / millilitresIn('L'), 'M'],
  ['molarity', 'mmol/L', millimolesIn('mmol') / millilitresIn('L'), 'mM'],
  ['molarity', 'micromol/L', millimolesIn('umol') / millilitresIn('L'), 'microM uM µM μM'],
  ['biological', 'units', 1, 'units unit'],
]

const table: ReadonlyMap<string, TradeUnit> = new Map(
  rows.flatMap(([dimension, symbol, factor, spellings]) => {
    const record = Object.freeze({ dimension, symbol, factor })
    return spellings.split(' ').map((spelling) => [spelling, record] as const)
  }),
)

/**
 * The unit of a spelling, case kept apart (mg is not Mg). Undefined where it is no unit of the trade.
 * Masses in g, volumes in mL, amounts of substance in mmol, equivalents in mEq.
 * @example unitOf('µg') → { dimension: 'mass', symbol: 'mcg', factor: 0.000001 }
 */
export const unitOf = (spelling: string): TradeUnit | undefined => table.get(spelling)

/** Spellings that look like units and are known to be misread, with what to write. */
export const misread: ReadonlyMap<string, string> = new Map([
  ['cc', 'Write mL.'],
  ['gr', 'Write g for grams; grains are not used here.'],
  ['gm', 'Write g.'],
  ['Mg', 'Write mg for milligrams.'],
  ['MG', 'Write mg for milligrams.'],
  ['mgm', 'Write mg.'],
  ['ML', 'Write mL.'],
  ['gtt', 'Write the volume in mL.'],
  ['drop', 'Write the volume in mL.'],
  ['drops', 'Write the volume in mL.'],
  ['mOsm', 'An osmolality is the target, not the amount of an ingredient; write a mass, a volume or moles.'],
  [
    'mOsmol',
    'An osmolality is the target, not the amount of an ingredient; write a mass, a volume or moles.',
  ],
  ['dL', 'Write per 100 mL, such as 5 mg/100 mL.'],
  ['dl', 'Write per 100 mL, such as 5 mg/100 mL.'],
  ['ppm', 'Write mg/L.'],
  ['N', 'Write mEq/mL for a normality.'],
  ['U', 'Write units in full.'],
  ['u', 'Write units in full.'],
  ['IU', 'Write units in full.'],
  ['iu', 'Write units in full.'],
  ['UI', 'Write units in full.'],
  ['m', 'Write mol/kg for a molality.'],
])
