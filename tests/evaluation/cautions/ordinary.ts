import type { Formula, PatientData, RouteId } from '../../../src/formula/types.ts'

/** Formulas of textbooks, pharmacopoeias and labels: nothing in them deserves a stop. */
export interface Ordinary {
  readonly name: string
  readonly route: RouteId
  readonly lines: Readonly<Record<string, string>>
  readonly pH?: number
  readonly volume?: string
  readonly target?: Formula['target']
  readonly patient?: PatientData
}

const isotonic = { quantity: 'osmolality', value: '290 mOsm/kg' } as const
const peripheral = 'intravenous-peripheral'
const central = 'intravenous-central'
const bac = { 'benzalkonium-chloride': '0.01 %' }

const intravenous: readonly Ordinary[] = [
  { name: 'sodium chloride 0.9 %', route: peripheral, lines: { 'sodium-chloride': '0.9 %' } },
  { name: 'sodium chloride 0.45 %', route: peripheral, lines: { 'sodium-chloride': '0.45 %' } },
  { name: 'sodium chloride 3 %', route: peripheral, lines: { 'sodium-chloride': '3 %' } },
  {
    name: 'sodium chloride 0.9 % for a child',
    route: peripheral,
    lines: { 'sodium-chloride': '0.9 %' },
    patient: { ageYears: 4, weightKg: 16, infusionRate: '50 mL/h' },
  },
  { name: 'dextrose 5 %', route: peripheral, lines: { 'dextrose-monohydrate': '5 %' } },
  {
    name: 'dextrose 10 % for a newborn',
    route: peripheral,
    lines: { 'dextrose-monohydrate': '10 %' },
    patient: { ageYears: 0.01, weightKg: 3.2, infusionRate: '8 mL/h' },
  },
  {
    name: 'dextrose 5 % in sodium chloride 0.45 %',
    route: peripheral,
    lines: { 'dextrose-monohydrate': '5 %', 'sodium-chloride': '0.45 %' },
  },
  { name: 'dextrose 50 %', route: central, lines: { 'dextrose-monohydrate': '50 %' } },
  {
    name: 'Ringer’s solution',
    route: peripheral,
    lines: {
      'sodium-chloride': '8.6 g/L',
      'potassium-chloride': '0.3 g/L',
      'calcium-chloride-dihydrate': '0.33 g/L',
    },
  },
  {
    name: 'lactated Ringer’s solution',
    route: peripheral,
    lines: {
      'sodium-chloride': '6 g/L',
      'sodium-lactate': '3.1 g/L',
      'potassium-chloride': '0.3 g/L',
      'calcium-chloride-dihydrate': '0.2 g/L',
    },
  },
  {
    name: 'potassium chloride 20 mmol/L in saline',
    route: peripheral,
    lines: { 'sodium-chloride': '0.9 %', 'potassium-chloride': '20 mmol/L' },
    patient: { ageYears: 60, weightKg: 70, infusionRate: '125 mL/h' },
  },
  { name: 'sodium bicarbonate 8.4 %', route: central, lines: { 'sodium-bicarbonate': '8.4 %' } },
  { name: 'sodium bicarbonate 1.4 %', route: peripheral, lines: { 'sodium-bicarbonate': '1.4 %' } },
  { name: 'mannitol 20 %', route: central, lines: { mannitol: '20 %' } },
  {
    name: 'parenteral nutrition base without phosphate',
    route: central,
    lines: {
      'dextrose-monohydrate': '15 %',
      'sodium-chloride': '40 mmol/L',
      'potassium-acetate': '30 mmol/L',
      'calcium-gluconate-monohydrate': '4 mmol/L',
      'magnesium-sulfate-heptahydrate': '4 mmol/L',
      'zinc-sulfate-heptahydrate': '0.04 mmol/L',
    },
  },
  {
    name: 'parenteral nutrition base with organic phosphate',
    route: central,
    lines: {
      'dextrose-monohydrate': '15 %',
      'sodium-glycerophosphate-anhydrous': '10 mmol/L',
      'potassium-chloride': '30 mmol/L',
      'calcium-gluconate-monohydrate': '4 mmol/L',
    },
  },
  {
    name: 'potassium phosphates diluted',
    route: peripheral,
    lines: {
      'sodium-chloride': '0.9 %',
      'potassium-phosphate-monobasic': '10 mmol/L',
      'potassium-phosphate-dibasic': '10 mmol/L',
    },
  },
  {
    name: 'cardioplegia with bicarbonate',
    route: central,
    lines: {
      'sodium-chloride': '110 mmol/L',
      'potassium-chloride': '16 mmol/L',
      'magnesium-chloride-hexahydrate': '16 mmol/L',
      'calcium-chloride-dihydrate': '1.2 mmol/L',
      'sodium-bicarbonate': '10 mmol/L',
    },
  },
  {
    name: 'norepinephrine in dextrose',
    route: central,
    lines: { 'norepinephrine-bitartrate-monohydrate': '16 mcg/mL', 'dextrose-monohydrate': '5 %' },
    pH: 4,
  },
  {
    name: 'vancomycin infusion',
    route: peripheral,
    lines: { 'vancomycin-hydrochloride': '5 mg/mL', 'sodium-chloride': '0.9 %' },
    pH: 4,
  },
  {
    name: 'cefazolin infusion for a child',
    route: peripheral,
    lines: { 'cefazolin-sodium': '20 mg/mL', 'sodium-chloride': '0.9 %' },
    pH: 5.5,
    patient: { ageYears: 8, weightKg: 25 },
  },
  {
    name: 'magnesium sulfate 4 %',
    route: peripheral,
    lines: { 'magnesium-sulfate-heptahydrate': '4 %' },
  },
]

const eyeNoseEarLung: readonly Ordinary[] = [
  {
    name: 'pilocarpine drops',
    route: 'ophthalmic',
    lines: { 'pilocarpine-hydrochloride': '1 %', ...bac, 'sodium-chloride': 'q.s.' },
    pH: 5.5,
    target: isotonic,
  },
  {
    name: 'phenylephrine drops with benzalkonium',
    route: 'ophthalmic',
    lines: {
      'phenylephrine-hydrochloride': '2.5 %',
      'sodium-metabisulfite': '0.1 %',
      'edetate-disodium-dihydrate': '0.05 %',
      ...bac,
      'sodium-chloride': 'q.s.',
    },
    pH: 5.5,
    target: isotonic,
  },
  {
    name: 'timolol with phosphate',
    route: 'ophthalmic',
    lines: {
      'timolol-maleate': '0.68 %',
      'sodium-phosphate-monobasic-dihydrate': '20 mmol/L',
      'sodium-phosphate-dibasic-dodecahydrate': '60 mmol/L',
      ...bac,
      'sodium-chloride': 'q.s.',
    },
    pH: 7,
    target: isotonic,
  },
  {
    name: 'zinc sulfate in boric acid',
    route: 'ophthalmic',
    lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'boric-acid': '1.7 %' },
    pH: 6,
  },
  {
    name: 'atropine drops',
    route: 'ophthalmic',
    lines: { 'atropine-sulfate-monohydrate': '1 %', ...bac, 'sodium-chloride': 'q.s.' },
    pH: 5,
    target: isotonic,
  },
  {
    name: 'chloramphenicol drops in borate',
    route: 'ophthalmic',
    lines: { chloramphenicol: '0.5 %', 'boric-acid': '1.5 %', 'sodium-borate-decahydrate': '0.3 %' },
    pH: 7,
  },
  {
    name: 'fluorescein drops in single doses',
    route: 'ophthalmic',
    lines: { 'fluorescein-sodium': '2 %', 'sodium-chloride': 'q.s.' },
    pH: 8.5,
    target: isotonic,
  },
  {
    name: 'fortified vancomycin drops',
    route: 'ophthalmic',
    lines: { 'vancomycin-hydrochloride': '50 mg/mL', 'sodium-chloride': '0.6 %' },
    pH: 3.5,
  },
  {
    name: 'sulfacetamide drops',
    route: 'ophthalmic',
    lines: { 'sulfacetamide-sodium-monohydrate': '10 %', methylparaben: '0.05 %' },
    pH: 7.4,
  },
  {
    name: 'hypertonic saline drops 5 %',
    route: 'ophthalmic',
    lines: { 'sodium-chloride': '5 %' },
  },
  {
    name: 'silver nitrate drops made isotonic with nitrate',
    route: 'ophthalmic',
    lines: { 'silver-nitrate': '1 %', 'sodium-nitrate': '1.1 %' },
    pH: 6,
  },
  { name: 'boric acid eye wash', route: 'ophthalmic-irrigation', lines: { 'boric-acid': '1.9 %' }, pH: 5 },
  {
    name: 'balanced salt solution',
    route: 'ophthalmic-irrigation',
    lines: {
      'sodium-chloride': '0.64 %',
      'potassium-chloride': '0.075 %',
      'calcium-chloride-dihydrate': '0.048 %',
      'magnesium-chloride-hexahydrate': '0.03 %',
      'sodium-acetate-trihydrate': '0.39 %',
      'sodium-citrate-dihydrate': '0.17 %',
    },
    pH: 7.5,
  },
  {
    name: 'moxifloxacin for the anterior chamber',
    route: 'intracameral',
    lines: { 'moxifloxacin-hydrochloride': '0.5 %', 'sodium-chloride': 'q.s.' },
    pH: 6.9,
    target: { quantity: 'osmolality', value: '300 mOsm/kg' },
  },
  {
    name: 'xylometazoline nasal drops',
    route: 'nasal',
    lines: {
      'xylometazoline-hydrochloride': '0.1 %',
      'sodium-phosphate-monobasic-dihydrate': '20 mmol/L',
      'sodium-phosphate-dibasic-dodecahydrate': '5 mmol/L',
      'edetate-disodium-dihydrate': '0.05 %',
      ...bac,
      'sodium-chloride': 'q.s.',
    },
    pH: 6.2,
    target: isotonic,
  },
  {
    name: 'xylometazoline nasal drops for a child',
    route: 'nasal',
    lines: { 'xylometazoline-hydrochloride': '0.05 %', 'sodium-chloride': '0.9 %' },
    pH: 6,
    patient: { ageYears: 7, weightKg: 23 },
  },
  { name: 'acetic acid ear drops', route: 'otic', lines: { 'acetic-acid-glacial': '2 %' }, pH: 3 },
  {
    name: 'salbutamol nebuliser solution',
    route: 'inhaled',
    lines: { 'salbutamol-sulfate': '1.2 mg/mL', 'sodium-chloride': '0.9 %' },
    pH: 4.5,
    patient: { doseVolume: '2.5 mL' },
  },
  { name: 'sodium chloride 3 % to inhale', route: 'inhaled', lines: { 'sodium-chloride': '3 %' }, pH: 6 },
  { name: 'sodium chloride 7 % to inhale', route: 'inhaled', lines: { 'sodium-chloride': '7 %' }, pH: 6 },
  {
    name: 'tobramycin to inhale',
    route: 'inhaled',
    lines: { tobramycin: '60 mg/mL', 'sodium-chloride': '0.225 %' },
    pH: 6,
  },
]

const others: readonly Ordinary[] = [
  {
    name: 'heavy bupivacaine',
    route: 'intrathecal',
    lines: { 'bupivacaine-hydrochloride-monohydrate': '0.528 %', 'dextrose-anhydrous': '8 %' },
    pH: 5,
  },
  {
    name: 'morphine, unpreserved',
    route: 'intrathecal',
    lines: { 'morphine-sulfate-pentahydrate': '0.5 mg/mL', 'sodium-chloride': '0.9 %' },
    pH: 5,
  },
  {
    name: 'bupivacaine with fentanyl',
    route: 'epidural',
    lines: {
      'bupivacaine-hydrochloride-monohydrate': '0.125 %',
      'fentanyl-citrate': '3 mcg/mL',
      'sodium-chloride': '0.9 %',
    },
    pH: 5.5,
  },
  {
    name: 'lidocaine injection 1 %',
    route: 'subcutaneous',
    lines: { 'lidocaine-hydrochloride-monohydrate': '1 %', 'sodium-chloride': '0.7 %' },
    pH: 6,
  },
  {
    name: 'lidocaine 1 % with epinephrine and metabisulfite',
    route: 'subcutaneous',
    lines: {
      'lidocaine-hydrochloride-monohydrate': '1 %',
      'epinephrine-bitartrate': '9.1 mcg/mL',
      'sodium-metabisulfite': '0.05 %',
      'sodium-chloride': '0.6 %',
    },
    pH: 4.5,
  },
  {
    name: 'ketamine with benzethonium',
    route: 'intramuscular',
    lines: { 'ketamine-hydrochloride': '57.7 mg/mL', 'benzethonium-chloride': '0.01 %' },
    pH: 4.5,
  },
  {
    name: 'bacteriostatic saline for an adult',
    route: 'intramuscular',
    lines: { 'sodium-chloride': '0.9 %', 'benzyl-alcohol': '0.9 %' },
    pH: 6,
    patient: { ageYears: 40, weightKg: 70 },
  },
  {
    name: 'glycine irrigation',
    route: 'irrigation',
    lines: { glycine: '1.5 %' },
    pH: 6.1,
    volume: '3000 mL',
  },
  { name: 'sorbitol irrigation', route: 'irrigation', lines: { sorbitol: '3 %' }, volume: '3000 mL' },
  { name: 'saline irrigation', route: 'irrigation', lines: { 'sodium-chloride': '0.9 %' } },
  {
    name: 'acetic acid bladder irrigation',
    route: 'irrigation',
    lines: { 'acetic-acid-glacial': '0.25 %' },
    pH: 3,
  },
  {
    name: 'oral rehydration salts',
    route: 'enteral',
    lines: {
      'sodium-chloride': '2.6 g/L',
      'potassium-chloride': '1.5 g/L',
      'sodium-citrate-dihydrate': '2.9 g/L',
      'dextrose-anhydrous': '13.5 g/L',
    },
    patient: { ageYears: 3, weightKg: 14, doseVolume: '200 mL' },
  },
  {
    name: 'sodium bicarbonate by mouth',
    route: 'enteral',
    lines: { 'sodium-bicarbonate': '8.4 %' },
  },
]

export const ordinary: readonly Ordinary[] = [...intravenous, ...eyeNoseEarLung, ...others]

export const formulaOfOrdinary = ({
  name,
  route,
  lines,
  pH,
  volume,
  target,
  patient,
}: Ordinary): Formula => ({
  format: 'evenwater.formula',
  version: 1,
  title: name,
  route,
  finalVolume: volume ?? '1000 mL',
  ...(target ? { target } : {}),
  ...(pH === undefined ? {} : { pH }),
  ...(patient ? { patient } : {}),
  lines: Object.entries(lines).map(([ingredient, amount], index) => ({
    key: `line-${index + 1}`,
    ingredient,
    amount,
  })),
})
