import type { Failure } from './row.ts'

const peripheral = 'intravenous-peripheral'
const central = 'intravenous-central'
const saline = { 'sodium-chloride': '0.9 %' }
const bac = { 'benzalkonium-chloride': '0.01 %' }
const newborn = { ageYears: 0.01, weightKg: 1.2 }

export const substanceFailures: readonly Failure[] = [
  {
    failure: 'benzyl alcohol in flushes of newborns',
    wrong: {
      route: peripheral,
      lines: { ...saline, 'benzyl-alcohol': '0.9 %' },
      volume: '30 mL',
      patient: newborn,
    },
    caught: { stop: ['benzyl-alcohol-for-a-newborn'] },
    sound: { lines: saline },
  },
  {
    failure: 'sterile water infused',
    wrong: { route: peripheral, lines: { 'water-for-injection': '1000 mL' } },
    caught: { stop: ['water-alone-into-a-vein'] },
    sound: { lines: { 'dextrose-monohydrate': '5 %' } },
  },
  {
    failure: 'sterile water infused',
    wrong: { route: peripheral, lines: { 'sodium-chloride': '0.2 %' } },
    caught: { stop: ['very-hypotonic-into-a-vein'] },
    sound: { lines: { 'sodium-chloride': '0.45 %', 'dextrose-monohydrate': '2.5 %' } },
  },
  {
    failure: 'edetate disodium for calcium disodium',
    wrong: {
      route: peripheral,
      lines: { ...saline, 'edetate-disodium-dihydrate': '2 mg/mL' },
      volume: '500 mL',
    },
    caught: { stop: ['edetate-disodium-for-edetate-calcium'] },
    sound: { lines: { ...saline, 'edetate-calcium-disodium-anhydrous': '2 mg/mL' } },
  },
  {
    failure: 'hydrates and salts mixed up',
    wrong: { route: peripheral, lines: { 'dextrose-anhydrous': '5 %' } },
    caught: { note: ['dextrose-anhydrous-or-monohydrate'] },
    sound: { lines: { mannitol: '5 %' } },
  },
  {
    failure: 'hydrates and salts mixed up',
    wrong: { route: peripheral, lines: { ...saline, 'calcium-chloride-dihydrate': '1 g' } },
    caught: { note: ['calcium-chloride-or-gluconate', 'other-forms-on-the-shelf'] },
    sound: { lines: saline },
  },
  {
    failure: 'hydrates and salts mixed up',
    wrong: { route: 'ophthalmic', lines: { 'timolol-maleate': '0.25 %' }, pH: 7 },
    caught: { warn: ['salt-or-base'] },
    sound: { lines: { 'cyclopentolate-hydrochloride': '1 %' }, pH: 5 },
  },
  {
    failure: 'sodium chloride equivalent far from its table',
    wrong: { route: 'ophthalmic', lines: { 'pilocarpine-hydrochloride': '8 %' }, pH: 5 },
    caught: { warn: ['table-left'], note: ['equivalent-beyond-table', 'methods-disagree'] },
    sound: { lines: { 'pilocarpine-hydrochloride': '1 %' } },
  },
  {
    failure: 'isosmotic thought isotonic',
    wrong: { route: peripheral, lines: { glycerin: '2.6 %' } },
    caught: { stop: ['isosmotic-by-permeant-solute'], warn: ['isosmotic-not-isotonic'] },
    sound: { lines: { 'dextrose-monohydrate': '5.5 %' } },
  },
  {
    failure: 'isosmotic thought isotonic',
    wrong: { route: peripheral, lines: { urea: '1.63 %' } },
    caught: { stop: ['isosmotic-by-permeant-solute'], warn: ['isosmotic-not-isotonic'] },
    sound: { lines: { urea: '1.63 %', ...saline } },
  },
  {
    failure: 'isosmotic thought isotonic',
    wrong: { route: 'irrigation', lines: { 'boric-acid': '1.9 %' }, pH: 5 },
    caught: {
      stop: ['isosmotic-by-permeant-solute', 'borate-where-it-is-absorbed'],
      warn: ['isosmotic-not-isotonic'],
    },
    sound: { lines: saline, pH: 6 },
  },
  {
    failure: 'isosmotic thought isotonic',
    wrong: { route: 'ophthalmic', lines: { 'boric-acid': '1.9 %' }, pH: 5 },
    caught: { warn: ['isosmotic-not-isotonic'] },
    sound: { lines: saline },
  },
  {
    failure: 'borate by one pKa, or diluted',
    wrong: { route: 'ophthalmic', lines: { 'boric-acid': '1.2 %', 'sodium-borate-decahydrate': '0.1 %' } },
    caught: { note: ['borate-buffer-diluted'] },
    sound: { lines: { 'boric-acid': '1.2 %' }, pH: 5 },
  },
  {
    failure: 'frozen phosphate',
    wrong: {
      route: 'ophthalmic',
      lines: {
        'sodium-phosphate-monobasic-monohydrate': '5 mmol/L',
        'sodium-phosphate-dibasic-heptahydrate': '15 mmol/L',
        'sodium-chloride': '0.7 %',
      },
    },
    caught: { note: ['sodium-phosphate-frozen'] },
    sound: {
      lines: {
        'potassium-phosphate-monobasic': '5 mmol/L',
        'potassium-phosphate-dibasic': '15 mmol/L',
        'sodium-chloride': '0.7 %',
      },
    },
  },
  {
    failure: 'aluminium in phosphate for infants',
    wrong: {
      route: central,
      lines: { 'dextrose-monohydrate': '10 %', 'potassium-phosphate-monobasic': '10 mmol/L' },
      volume: '500 mL',
      patient: { ageYears: 0.05, weightKg: 2.6, infusionRate: '10 mL/h' },
    },
    caught: { warn: ['aluminium-from-components'] },
    sound: { patient: { ageYears: 50, weightKg: 70, infusionRate: '10 mL/h' } },
  },
  {
    failure: 'wrong density or assay',
    wrong: { route: 'otic', lines: { glycerin: '5 %' }, volume: '100 mL' },
    caught: { note: ['liquid-by-assay-and-density'] },
    sound: { lines: { mannitol: '5 %' } },
  },
  {
    failure: 'wrong density or assay',
    wrong: { route: 'otic', lines: { ethanol: '20 %' }, volume: '100 mL' },
    caught: { note: ['alcohol-by-volume-or-weight'] },
    sound: { lines: { mannitol: '5 %' } },
  },
  {
    failure: 'excipient changed after the tonicity',
    wrong: {
      route: 'ophthalmic',
      lines: { 'pilocarpine-hydrochloride': '1 %', 'sodium-chloride': '0.68 %', mannitol: '2 %' },
      pH: 5.5,
      target: { quantity: 'osmolality', value: '287 mOsm/kg' },
    },
    caught: { warn: ['target-missed'] },
    sound: { lines: { 'pilocarpine-hydrochloride': '1 %', 'sodium-chloride': '0.68 %' } },
  },
  {
    failure: 'excipient changed after the tonicity',
    wrong: {
      route: 'ophthalmic',
      lines: { 'pilocarpine-hydrochloride': '1 %', 'sodium-chloride': '0.68 %', ...bac, mannitol: '2 %' },
      pH: 5.5,
      target: { quantity: 'sodium-chloride-equivalent', value: '0.9 %' },
    },
    caught: { warn: ['target-missed'] },
    sound: {
      lines: { 'pilocarpine-hydrochloride': '1 %', 'sodium-chloride': 'q.s.', ...bac, mannitol: '2 %' },
    },
  },
]
