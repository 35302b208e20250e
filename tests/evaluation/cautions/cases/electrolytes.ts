import type { Case } from '../contexts.ts'

const peripheral = 'intravenous-peripheral'
const central = 'intravenous-central'
const saline = { 'sodium-chloride': '0.9 %' }

export const electrolyteCases: readonly Case[] = [
  [
    'sodium-chloride-concentrate',
    { route: central, lines: { 'sodium-chloride': '14.6 %' } },
    { lines: { 'sodium-chloride': '14.59 %' } },
  ],
  [
    'sodium-chloride-above-3-percent-peripheral',
    { route: peripheral, lines: { 'sodium-chloride': '3.01 %' } },
    { lines: { 'sodium-chloride': '3 %' } },
  ],
  [
    'hypertonic-saline',
    { route: peripheral, lines: { 'sodium-chloride': '0.901 %' }, osmolality: 311 },
    { lines: saline },
  ],
  [
    'sodium-for-a-child',
    {
      route: peripheral,
      lines: { 'sodium-chloride': '154.1 mmol/L' },
      osmolality: 311,
      patient: { ageYears: 17.9 },
    },
    { lines: { 'sodium-chloride': '154 mmol/L' } },
  ],
  ['label-figures-per-litre', { route: peripheral, lines: saline, volumeMl: 500 }, { volumeMl: 1000 }],
  [
    'potassium-above-400',
    { route: central, lines: { 'potassium-chloride': '400.1 mmol/L' } },
    { lines: { 'potassium-chloride': '400 mmol/L' } },
  ],
  [
    'potassium-300-outside-a-central-vein',
    { route: peripheral, lines: { 'potassium-chloride': '300 mmol/L' } },
    { lines: { 'potassium-chloride': '299.9 mmol/L' } },
  ],
  [
    'potassium-above-100',
    { route: central, lines: { 'potassium-chloride': '100.1 mmol/L' } },
    { lines: { 'potassium-chloride': '100 mmol/L' } },
  ],
  [
    'potassium-above-40-peripheral',
    {
      route: peripheral,
      lines: { 'potassium-chloride': '30 mmol/L', 'potassium-phosphate-dibasic': '5.01 mmol/L' },
    },
    { lines: { 'potassium-chloride': '30 mmol/L', 'potassium-phosphate-dibasic': '5 mmol/L' } },
  ],
  [
    'potassium-faster-than-40-an-hour',
    { route: central, lines: { 'potassium-chloride': '400 mmol/L' }, patient: { infusionRateMlPerH: 100.1 } },
    { patient: { infusionRateMlPerH: 100 } },
  ],
  [
    'potassium-faster-than-20-an-hour',
    { route: central, lines: { 'potassium-chloride': '200 mmol/L' }, patient: { infusionRateMlPerH: 100.1 } },
    { patient: { infusionRateMlPerH: 100 } },
  ],
  [
    'potassium-faster-than-10-an-hour',
    {
      route: peripheral,
      lines: { 'potassium-chloride': '40 mmol/L' },
      patient: { infusionRateMlPerH: 250.2 },
    },
    { patient: { infusionRateMlPerH: 250 } },
  ],
  [
    'potassium-mixed-into-a-bag',
    { route: peripheral, lines: { 'potassium-chloride': '20 mmol/L' } },
    { lines: saline },
  ],
  [
    'potassium-phosphates-peripheral',
    { route: peripheral, lines: { 'potassium-phosphate-monobasic': '68.1 mmol/L' } },
    { lines: { 'potassium-phosphate-monobasic': '68 mmol/L' } },
  ],
  [
    'potassium-phosphates-central',
    { route: central, lines: { 'potassium-phosphate-monobasic': '180.1 mmol/L' } },
    { lines: { 'potassium-phosphate-monobasic': '180 mmol/L' } },
  ],
  [
    'potassium-phosphates-peripheral-in-a-child',
    {
      route: peripheral,
      lines: { 'potassium-phosphate-monobasic': '27.1 mmol/L' },
      patient: { ageYears: 11.9 },
    },
    { patient: { ageYears: 12 } },
  ],
  [
    'potassium-phosphates-central-in-a-child',
    {
      route: central,
      lines: { 'potassium-phosphate-monobasic': '55.1 mmol/L' },
      patient: { ageYears: 5 },
    },
    { lines: { 'potassium-phosphate-monobasic': '55 mmol/L' } },
  ],
  [
    'phosphate-single-dose',
    {
      route: central,
      lines: { 'sodium-phosphate-monobasic-monohydrate': '90 mmol/L' },
      patient: { doseVolumeMl: 501 },
    },
    { patient: { doseVolumeMl: 500 } },
  ],
  [
    'potassium-carried-with-phosphate',
    { route: central, lines: { 'potassium-phosphate-dibasic': '5 mmol/L' } },
    { lines: { 'sodium-phosphate-dibasic-anhydrous': '5 mmol/L' } },
  ],
  [
    'phosphate-ordered-in-meq',
    { route: central, lines: { 'potassium-phosphate-dibasic': '10 mEq/L' } },
    { lines: { 'potassium-phosphate-dibasic': '5 mmol/L' } },
  ],
  [
    'calcium-gluconate-undiluted',
    { route: central, lines: { 'calcium-gluconate-monohydrate': '50.1 mg/mL' } },
    { lines: { 'calcium-gluconate-monohydrate': '50 mg/mL' } },
  ],
  [
    'calcium-gluconate-infusion-strength',
    {
      route: peripheral,
      lines: { 'calcium-gluconate-monohydrate': '10.1 mg/mL' },
      patient: { infusionRateMlPerH: 50 },
    },
    { lines: { 'calcium-gluconate-monohydrate': '10 mg/mL' } },
  ],
  [
    'calcium-gluconate-too-fast',
    {
      route: peripheral,
      lines: { 'calcium-gluconate-monohydrate': '10 mg/mL' },
      patient: { infusionRateMlPerH: 1201 },
    },
    { patient: { infusionRateMlPerH: 1200 } },
  ],
  [
    'calcium-gluconate-too-fast-for-a-child',
    {
      route: peripheral,
      lines: { 'calcium-gluconate-monohydrate': '10 mg/mL' },
      patient: { infusionRateMlPerH: 601, ageYears: 10 },
    },
    { patient: { infusionRateMlPerH: 600, ageYears: 10 } },
  ],
  [
    'magnesium-sulfate-above-20-percent',
    { route: central, lines: { 'magnesium-sulfate-heptahydrate': '20.1 %' } },
    { lines: { 'magnesium-sulfate-heptahydrate': '20 %' } },
  ],
  [
    'magnesium-sulfate-too-fast',
    {
      route: central,
      lines: { 'magnesium-sulfate-heptahydrate': '10 %' },
      patient: { infusionRateMlPerH: 90.1 },
    },
    { patient: { infusionRateMlPerH: 90 } },
  ],
  [
    'magnesium-sulfate-units',
    { route: peripheral, lines: { 'magnesium-sulfate-heptahydrate': '2 g' } },
    { lines: { 'magnesium-sulfate-heptahydrate': '8 mmol' } },
  ],
  [
    'load-in-renal-impairment',
    { route: peripheral, lines: { 'magnesium-chloride-hexahydrate': '1 mmol/L' } },
    { lines: saline },
  ],
  [
    'ammonium-chloride-in-hepatic-or-renal-failure',
    { route: central, lines: { 'ammonium-chloride': '100 mmol/L' } },
    { lines: saline },
  ],
  [
    'arginine-for-a-child',
    { route: central, lines: { 'arginine-hydrochloride': '10 %' }, patient: { ageYears: 4 } },
    { lines: { 'arginine-hydrochloride': '9.99 %' } },
  ],
  [
    'trace-element-in-milligrams',
    { route: central, lines: { 'zinc-sulfate-heptahydrate': '5 mg' } },
    { lines: { 'zinc-sulfate-heptahydrate': '5000 mcg' } },
  ],
  [
    'trace-element-in-milligrams-for-an-infant',
    { route: central, lines: { 'zinc-sulfate-heptahydrate': '0.3 mg' }, patient: { ageYears: 0.99 } },
    { patient: { ageYears: 1 } },
  ],
  [
    'aluminium-from-components',
    { route: central, lines: { 'calcium-gluconate-monohydrate': '2 mmol/L' }, patient: { ageYears: 0.5 } },
    { patient: { ageYears: 1 } },
  ],
  [
    'sodium-per-dose',
    { route: 'enteral', lines: { 'sodium-chloride': '100 mmol/L' }, patient: { doseVolumeMl: 10 } },
    { patient: { doseVolumeMl: 9.99 } },
  ],
  [
    'sodium-per-day',
    { route: 'enteral', lines: { 'sodium-chloride': '100 mmol/L' }, patient: { doseVolumeMl: 170 } },
    { patient: { doseVolumeMl: 169.9 } },
  ],
  [
    'potassium-per-dose',
    { route: 'enteral', lines: { 'potassium-chloride': '100 mmol/L' }, patient: { doseVolumeMl: 10 } },
    { patient: { doseVolumeMl: 9.99 } },
  ],
  ['bag-overfill', { route: peripheral, lines: saline, volumeMl: 50 }, { volumeMl: 49.9 }],
]
