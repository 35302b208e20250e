import type { Failure } from './row.ts'

const peripheral = 'intravenous-peripheral'
const central = 'intravenous-central'
const saline = { 'sodium-chloride': '0.9 %' }
const dextrose = { 'dextrose-monohydrate': '10 %' }
const infant = { ageYears: 0.1, weightKg: 4 }
const preterm = { ageYears: 0.05, weightKg: 1.4 }

export const electrolyteFailures: readonly Failure[] = [
  {
    failure: 'ten-fold sodium in infant fluid',
    wrong: {
      route: peripheral,
      lines: { ...dextrose, 'sodium-chloride': '77 mEq/100 mL' },
      patient: infant,
    },
    caught: { stop: ['sodium-for-a-child', 'sodium-chloride-above-3-percent-peripheral'] },
    sound: { lines: { ...dextrose, 'sodium-chloride': '7.7 mEq/100 mL' } },
  },
  {
    failure: '23.4 % in place of dilute',
    wrong: { route: central, lines: { 'sodium-chloride': '23.4 %' }, volume: '100 mL' },
    caught: { stop: ['sodium-chloride-concentrate'] },
    sound: { lines: saline },
  },
  {
    failure: '3 % bag made with the amount of a litre',
    wrong: { route: peripheral, lines: { 'sodium-chloride': '30 g' }, volume: '500 mL' },
    caught: { stop: ['sodium-chloride-above-3-percent-peripheral'] },
    sound: { lines: { 'sodium-chloride': '15 g' } },
  },
  {
    failure: '3 % bag made with the amount of a litre',
    wrong: { route: peripheral, lines: { 'sodium-chloride': '15 g' }, volume: '500 mL' },
    caught: { note: ['label-figures-per-litre'] },
    sound: { lines: { 'sodium-chloride': '30 g' }, volume: '1000 mL' },
  },
  {
    failure: '23.4 % as the base of chemotherapy',
    wrong: {
      route: peripheral,
      lines: { fluorouracil: '5 mg/mL', 'sodium-chloride': '23.4 %' },
      pH: 8.8,
    },
    caught: { stop: ['sodium-chloride-concentrate'] },
    sound: { lines: { fluorouracil: '5 mg/mL', ...saline } },
  },
  {
    failure: 'thousand-fold zinc',
    wrong: {
      route: central,
      lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '1500 mg' },
      volume: '100 mL',
      patient: preterm,
    },
    caught: { stop: ['trace-element-in-milligrams-for-an-infant', 'ten-times-the-usual-strength'] },
    sound: { lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '1500 mcg' } },
  },
  {
    failure: 'thousand-fold zinc',
    wrong: { route: central, lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '11 mg' } },
    caught: { warn: ['trace-element-in-milligrams'] },
    sound: { lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '11000 mcg' } },
  },
  {
    failure: 'thousand-fold zinc',
    wrong: { route: central, lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '40 mmol/L' } },
    caught: { stop: ['ten-times-the-usual-strength'] },
    sound: { lines: { ...dextrose, 'zinc-sulfate-heptahydrate': '0.04 mmol/L' } },
  },
  {
    failure: 'concentrated potassium into a vein',
    wrong: { route: peripheral, lines: { 'potassium-chloride': '2 mmol/mL' }, volume: '50 mL' },
    caught: { stop: ['potassium-above-400'] },
    sound: { lines: { ...saline, 'potassium-chloride': '20 mmol/L' } },
  },
  {
    failure: 'concentrated potassium into a vein',
    wrong: {
      route: central,
      lines: { 'potassium-chloride': '400 mmol/L' },
      patient: { ageYears: 50, weightKg: 70, infusionRate: '150 mL/h' },
    },
    caught: { stop: ['potassium-faster-than-40-an-hour'], warn: ['potassium-above-100'] },
    sound: {
      lines: { ...saline, 'potassium-chloride': '40 mmol/L' },
      patient: { ageYears: 50, weightKg: 70, infusionRate: '150 mL/h' },
    },
  },
  {
    failure: 'calcium phosphate in nutrition',
    wrong: {
      route: central,
      lines: {
        ...dextrose,
        'calcium-chloride-dihydrate': '10 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '15 mmol/L',
      },
    },
    caught: {
      stop: ['calcium-with-phosphate'],
      warn: ['calcium-and-phosphate-order-of-mixing', 'calcium-chloride-beside-phosphate'],
    },
    sound: {
      lines: {
        ...dextrose,
        'calcium-gluconate-monohydrate': '4 mmol/L',
        'sodium-glycerophosphate-anhydrous': '10 mmol/L',
      },
    },
  },
  {
    failure: 'potassium phosphates too fast, their potassium forgotten',
    wrong: {
      route: peripheral,
      lines: {
        ...saline,
        'potassium-phosphate-monobasic': '20 mmol/L',
        'potassium-phosphate-dibasic': '20 mmol/L',
      },
      volume: '250 mL',
      patient: { ageYears: 50, weightKg: 70, infusionRate: '500 mL/h' },
    },
    caught: {
      warn: [
        'potassium-carried-with-phosphate',
        'potassium-above-40-peripheral',
        'potassium-faster-than-20-an-hour',
      ],
    },
    sound: {
      lines: {
        ...saline,
        'sodium-phosphate-monobasic-monohydrate': '20 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '20 mmol/L',
      },
    },
  },
  {
    failure: 'potassium phosphates too fast, their potassium forgotten',
    wrong: {
      route: peripheral,
      lines: {
        ...dextrose,
        'potassium-phosphate-monobasic': '20 mmol/L',
        'potassium-phosphate-dibasic': '10 mmol/L',
      },
      patient: { ageYears: 3, weightKg: 14 },
    },
    caught: { stop: ['potassium-phosphates-peripheral-in-a-child'] },
    sound: {
      lines: {
        ...dextrose,
        'potassium-phosphate-monobasic': '10 mmol/L',
        'potassium-phosphate-dibasic': '10 mmol/L',
      },
    },
  },
  {
    failure: 'potassium phosphates too fast, their potassium forgotten',
    wrong: {
      route: central,
      lines: {
        'potassium-phosphate-monobasic': '100 mmol/L',
        'potassium-phosphate-dibasic': '50 mmol/L',
      },
      volume: '500 mL',
      patient: { ageYears: 50, weightKg: 70, doseVolume: '500 mL' },
    },
    caught: { stop: ['phosphate-single-dose'] },
    sound: { patient: { ageYears: 50, weightKg: 70, doseVolume: '250 mL' } },
  },
  {
    failure: 'magnesium in grams for milliequivalents',
    wrong: { route: peripheral, lines: { 'magnesium-sulfate-heptahydrate': '16 g' }, volume: '50 mL' },
    caught: { stop: ['magnesium-sulfate-above-20-percent'], warn: ['magnesium-sulfate-units'] },
    sound: { lines: { 'magnesium-sulfate-heptahydrate': '8 mmol' } },
  },
  {
    failure: 'magnesium in grams for milliequivalents',
    wrong: {
      route: peripheral,
      lines: { ...saline, 'magnesium-sulfate-heptahydrate': '16 g' },
      patient: { ageYears: 50, weightKg: 70, infusionRate: '1000 mL/h' },
    },
    caught: { warn: ['magnesium-sulfate-units', 'magnesium-sulfate-too-fast'] },
    sound: { lines: { ...saline, 'magnesium-sulfate-heptahydrate': '8 mmol' } },
  },
]
