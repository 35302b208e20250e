import type { Case } from '../contexts.ts'

const peripheral = 'intravenous-peripheral'
const newborn = { ageYears: 28 / 365.25 }
const older = { ageYears: 29 / 365.25, weightKg: 4 }
const saline = { 'sodium-chloride': '0.9 %' }
/* 0.01 g/mL */
const propyleneGlycol = { 'propylene-glycol': '1 g/100 mL' }

export const populationCases: readonly Case[] = [
  [
    'benzyl-alcohol-for-a-newborn',
    { route: peripheral, lines: { 'benzyl-alcohol': '0.9 %' }, patient: newborn },
    { patient: older },
  ],
  [
    'benzyl-alcohol-under-three-years',
    { route: 'intramuscular', lines: { 'benzyl-alcohol': '0.9 %' }, patient: { ageYears: 2.99 } },
    { patient: { ageYears: 3 } },
  ],
  [
    'preservative-by-injection-for-a-newborn',
    { route: 'intramuscular', lines: { phenol: '0.5 %' }, patient: { ageYears: 0.5, weightKg: 2.49 } },
    { patient: { ageYears: 0.5, weightKg: 2.5 } },
  ],
  [
    'preservative-for-a-newborn',
    { lines: { 'benzalkonium-chloride': '0.01 %' }, patient: newborn },
    { patient: older },
  ],
  [
    'propylene-glycol-for-a-newborn',
    {
      route: 'enteral',
      lines: { 'propylene-glycol': '10 mg/mL' },
      patient: { ...newborn, weightKg: 3, doseVolumeMl: 0.301 },
    },
    { patient: { ...newborn, weightKg: 3, doseVolumeMl: 0.3 } },
  ],
  [
    'propylene-glycol-under-five-years',
    {
      route: 'enteral',
      lines: { 'propylene-glycol': '10 mg/mL' },
      patient: { ageYears: 4.99, weightKg: 10, doseVolumeMl: 50.1 },
    },
    { patient: { ageYears: 5, weightKg: 10, doseVolumeMl: 50.1 } },
  ],
  [
    'propylene-glycol-from-five-years',
    {
      route: peripheral,
      lines: { 'propylene-glycol': '10 mg/mL' },
      patient: { ageYears: 5, weightKg: 12, infusionRateMlPerH: 25.1 },
    },
    { patient: { ageYears: 5, weightKg: 12, infusionRateMlPerH: 25 } },
  ],
  ['propylene-glycol-into-a-vein', { route: peripheral, lines: propyleneGlycol }, { route: 'otic' }],
  [
    'ethanol-for-a-child',
    { route: 'enteral', lines: { ethanol: '1 %' }, patient: { ageYears: 17.9 } },
    { patient: { ageYears: 18 } },
  ],
  [
    'polysorbate-for-a-preterm-infant',
    { route: peripheral, lines: { 'polysorbate-80': '0.1 %' }, patient: newborn },
    { patient: older },
  ],
  ['sulfite-sensitivity', { lines: { 'sodium-bisulfite': '0.1 %' } }, { lines: saline }],
  [
    'benzoate-for-a-newborn',
    { route: 'enteral', lines: { 'sodium-benzoate': '0.1 %' }, patient: newborn },
    { patient: older },
  ],
  [
    'fructose-source-for-an-infant',
    { route: peripheral, lines: { sorbitol: '5 %' }, patient: { ageYears: 1.99 } },
    { patient: { ageYears: 2 } },
  ],
  [
    'fructose-source-into-a-vein',
    { route: peripheral, lines: { fructose: '5 %' } },
    { lines: { mannitol: '5 %' } },
  ],
  [
    'sucrose-into-a-vein',
    { route: peripheral, lines: { sucrose: '5 %' } },
    { lines: { 'trehalose-dihydrate': '5 %' } },
  ],
  [
    'cyclodextrin-under-two-years',
    { route: peripheral, lines: { hydroxypropylbetadex: '10 %' }, patient: { ageYears: 1.99 } },
    { patient: { ageYears: 2 } },
  ],
  [
    'phosphate-on-a-damaged-cornea',
    { lines: { 'sodium-phosphate-dibasic-anhydrous': '5 mmol/L' } },
    { lines: { 'sodium-citrate-dihydrate': '5 mmol/L' } },
  ],
  [
    'benzalkonium-on-the-eye',
    { lines: { 'benzalkonium-chloride': '0.01 %' } },
    { lines: { 'polyquaternium-1': '0.001 %' } },
  ],
  [
    'phenylephrine-for-an-infant-eye',
    { lines: { 'phenylephrine-hydrochloride': '2.51 %' }, patient: { ageYears: 0.5 } },
    { lines: { 'phenylephrine-hydrochloride': '2.5 %' } },
  ],
  [
    'decongestant-for-a-young-child',
    { route: 'nasal', lines: { 'xylometazoline-hydrochloride': '0.05 %' }, patient: { ageYears: 5.99 } },
    { patient: { ageYears: 6 } },
  ],
  ['allergen-source', { lines: { 'lactose-monohydrate': '5 %' } }, { lines: { sucrose: '5 %' } }],
  /* 1 mmol boron weighs 10.81 mg */
  [
    'boron-in-a-day',
    { lines: { 'boric-acid': '100 mmol/L' }, patient: { ageYears: 1.99, doseVolumeMl: 0.926 } },
    { patient: { ageYears: 1.99, doseVolumeMl: 0.925 } },
  ],
  [
    'child-without-a-weight',
    { lines: saline, patient: { ageYears: 5 } },
    { patient: { ageYears: 5, weightKg: 20 } },
  ],
]
