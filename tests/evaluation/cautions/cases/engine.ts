import type { Formula } from '../../../../src/formula/types.ts'
import type { Situation } from '../contexts.ts'

/** What a person types for a rule about a figure that the engine itself finds; others take their case as it is. */
export interface Ordered extends Omit<
  Situation,
  'osmolality' | 'effective' | 'osmolarity' | 'equivalent' | 'capacity'
> {
  readonly target?: Formula['target']
}

type Target = NonNullable<Formula['target']>
const sized = { 'sodium-chloride': 'q.s.' }
const sodiumChloride = (amount: string) => ({ 'sodium-chloride': amount })

/** Sodium chloride sized to a figure, so that the figure itself stands a step either side of the limit. */
const at = (figure: number, rest: Ordered = {}): Ordered => ({
  lines: sized,
  target: { quantity: 'osmolality', value: `${figure} mOsm/kg` } satisfies Target,
  ...rest,
})
const heldAt = (figure: number, rest: Ordered = {}): Ordered =>
  at(figure, {
    target: { quantity: 'effective-osmolality', value: `${figure} mOsm/kg` },
    ...rest,
  })

const peripheral = 'intravenous-peripheral'
const central = 'intravenous-central'

/* mOsm/L go by the higher of the solved figure and the ideal sum that labels print: for sodium chloride the sum,
   2000 × g/L ÷ 58.44. */
export const engineCases: Readonly<Record<string, readonly [fires: Ordered, silent: Ordered]>> = {
  'ear-drops-and-an-open-eardrum': [at(601, { route: 'otic' }), at(600, { route: 'otic' })],
  'tonicity-inside-the-eye': [at(279, { route: 'intracameral' }), at(280, { route: 'intracameral' })],
  'tonicity-far-off-inside-the-eye': [at(351, { route: 'intravitreal' }), at(350, { route: 'intravitreal' })],
  'child-above-1000-in-a-peripheral-vein': [
    { route: peripheral, lines: sodiumChloride('2.93 %'), patient: { ageYears: 17, weightKg: 60 } },
    { route: peripheral, lines: sodiumChloride('2.92 %'), patient: { ageYears: 17, weightKg: 60 } },
  ],
  'peripheral-vein-above-its-ceiling': [
    { route: peripheral, lines: sodiumChloride('2.64 %') },
    { route: peripheral, lines: sodiumChloride('2.62 %') },
  ],
  'peripheral-vein-hypertonic': [
    { route: peripheral, lines: sodiumChloride('1.754 %') },
    { route: peripheral, lines: sodiumChloride('1.75 %') },
  ],
  'central-vein-very-hypertonic': [
    { route: central, lines: sodiumChloride('5.27 %') },
    { route: central, lines: sodiumChloride('5.25 %') },
  ],
  'hypotonic-into-a-vein': [heldAt(239, { route: peripheral }), heldAt(240, { route: peripheral })],
  'very-hypotonic-into-a-vein': [heldAt(111, { route: peripheral }), heldAt(112, { route: peripheral })],
  'isosmotic-by-permeant-solute': [
    heldAt(149, { route: peripheral, lines: { glycerin: '2.6 %', ...sized } }),
    heldAt(150, { route: peripheral, lines: { glycerin: '2.6 %', ...sized } }),
  ],
  'hypertonic-into-a-muscle': [at(601, { route: 'intramuscular' }), at(600, { route: 'intramuscular' })],
  'hypertonic-under-the-skin': [at(601, { route: 'subcutaneous' }), at(600, { route: 'subcutaneous' })],
  'infusion-under-the-skin': [
    at(311, { route: 'subcutaneous', patient: { infusionRateMlPerH: 50 } }),
    at(310, { route: 'subcutaneous', patient: { infusionRateMlPerH: 50 } }),
  ],
  'tonicity-in-the-spinal-fluid': [at(321, { route: 'intrathecal' }), at(320, { route: 'intrathecal' })],
  'tonicity-far-off-in-the-spinal-fluid': [
    at(401, { route: 'intrathecal' }),
    at(400, { route: 'intrathecal' }),
  ],
  'tonicity-in-the-epidural-space': [at(249, { route: 'epidural' }), at(250, { route: 'epidural' })],
  'tonicity-of-eye-drops': [
    at(0, { target: { quantity: 'sodium-chloride-equivalent', value: '2.001 %' } }),
    at(0, { target: { quantity: 'sodium-chloride-equivalent', value: '2 %' } }),
  ],
  'hypertonic-for-a-damaged-eye': [at(321), at(320)],
  'tonicity-of-an-eye-wash': [
    at(331, { route: 'ophthalmic-irrigation' }),
    at(330, { route: 'ophthalmic-irrigation' }),
  ],
  'tonicity-in-the-nose': [
    { route: 'nasal', lines: sodiumChloride('0.58 %') },
    { route: 'nasal', lines: sodiumChloride('0.585 %') },
  ],
  'tonicity-of-an-inhaled-mist': [at(149, { route: 'inhaled' }), at(150, { route: 'inhaled' })],
  'hypotonic-irrigant': [at(259, { route: 'irrigation' }), at(260, { route: 'irrigation' })],
  'hyperosmolar-for-an-infant-gut': [
    at(451, { route: 'enteral', patient: { ageYears: 0.1, weightKg: 4 } }),
    at(450, { route: 'enteral', patient: { ageYears: 0.1, weightKg: 4 } }),
  ],
  'hyperosmolar-feed': [at(601, { route: 'enteral' }), at(600, { route: 'enteral' })],
  'hypertonic-saline': [
    { route: peripheral, lines: sodiumChloride('0.98 %') },
    { route: peripheral, lines: sodiumChloride('0.97 %') },
  ],
  'sodium-for-a-child': [
    {
      route: peripheral,
      lines: { ...sodiumChloride('154.1 mmol/L'), 'dextrose-monohydrate': '1 %' },
      patient: { ageYears: 17.9, weightKg: 60 },
    },
    {
      route: peripheral,
      lines: { ...sodiumChloride('154 mmol/L'), 'dextrose-monohydrate': '1 %' },
      patient: { ageYears: 17.9, weightKg: 60 },
    },
  ],
  'osmometer-method': [at(2001, { route: 'enteral' }), at(2000, { route: 'enteral' })],
  /* At its best pH a phosphate buffer of strength C has a capacity of C × 0.576. */
  'weak-buffer-capacity': [
    {
      lines: {
        'sodium-phosphate-monobasic-monohydrate': '8 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '8 mmol/L',
      },
      pH: null,
    },
    {
      lines: {
        'sodium-phosphate-monobasic-monohydrate': '10 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '10 mmol/L',
      },
      pH: null,
    },
  ],
}
