import type { Failure } from './row.ts'

const peripheral = 'intravenous-peripheral'
const saline = { 'sodium-chloride': '0.9 %' }
const bac = { 'benzalkonium-chloride': '0.01 %' }
const salbutamol = { 'salbutamol-sulfate': '1 mg/mL', ...saline }
const nebule = { doseVolume: '2.5 mL' }
const child = { ageYears: 6, weightKg: 20 }

export const routeFailures: readonly Failure[] = [
  {
    failure: 'preserved vehicle in theatre, sulfite in the eye',
    wrong: { route: 'intracameral', lines: { ...saline, ...bac }, pH: 7.2 },
    caught: { stop: ['quaternary-inside-the-eye'] },
    sound: { lines: saline },
  },
  {
    failure: 'preserved vehicle in theatre, sulfite in the eye',
    wrong: {
      route: 'intracameral',
      lines: {
        ...saline,
        'epinephrine-bitartrate': '0.18 mg/mL',
        'sodium-metabisulfite': '0.05 %',
      },
      pH: 6.9,
    },
    caught: { stop: ['sulfite-inside-the-eye'] },
    sound: { lines: { ...saline, 'epinephrine-bitartrate': '0.18 mg/mL' } },
  },
  {
    failure: 'viscoelastic preserved with benzalkonium',
    wrong: { route: 'intracameral', lines: { 'sodium-hyaluronate': '1 %', ...saline, ...bac }, pH: 7.2 },
    caught: { stop: ['quaternary-inside-the-eye'] },
    sound: { lines: { 'sodium-hyaluronate': '1 %', ...saline } },
  },
  {
    failure: 'nebule with benzalkonium or sulfite',
    wrong: { route: 'inhaled', lines: { ...salbutamol, ...bac }, pH: 4.5, patient: nebule },
    caught: { warn: ['benzalkonium-dose-to-inhale'] },
    sound: { lines: salbutamol },
  },
  {
    failure: 'nebule with benzalkonium or sulfite',
    wrong: { route: 'inhaled', lines: { ...salbutamol, ...bac }, pH: 4.5 },
    caught: { warn: ['quaternary-to-inhale'] },
    sound: { lines: salbutamol },
  },
  {
    failure: 'nebule with benzalkonium or sulfite',
    wrong: {
      route: 'inhaled',
      lines: { ...salbutamol, 'sodium-metabisulfite': '0.1 %' },
      pH: 4.5,
      patient: nebule,
    },
    caught: { stop: ['sulfite-to-inhale'] },
    sound: { lines: salbutamol },
  },
  {
    failure: 'hyperosmolar infusion into a peripheral vein',
    wrong: { route: peripheral, lines: { 'dextrose-monohydrate': '20 %', 'sodium-chloride': '40 mmol/L' } },
    caught: { warn: ['peripheral-vein-above-its-ceiling'] },
    sound: { lines: { 'dextrose-monohydrate': '10 %', 'sodium-chloride': '40 mmol/L' } },
  },
  {
    failure: 'hyperosmolar infusion into a peripheral vein',
    wrong: {
      route: peripheral,
      lines: { 'dextrose-monohydrate': '20 %', 'sodium-chloride': '40 mmol/L' },
      patient: child,
    },
    caught: { stop: ['child-above-1000-in-a-peripheral-vein'] },
    sound: { lines: { 'dextrose-monohydrate': '10 %', 'sodium-chloride': '40 mmol/L' } },
  },
  {
    failure: 'hyperosmolar feed or medicine for the preterm',
    wrong: {
      route: 'enteral',
      lines: { sorbitol: '20 %', glycerin: '10 %' },
      volume: '100 mL',
      patient: { ageYears: 0.05, weightKg: 1.6, doseVolume: '1 mL' },
    },
    caught: { warn: ['hyperosmolar-for-an-infant-gut'] },
    sound: { lines: { sorbitol: '5 %' } },
  },
  {
    failure: 'glycine irrigant absorbed',
    wrong: { route: 'irrigation', lines: { glycine: '1.5 %' }, volume: '3000 mL' },
    caught: { warn: ['electrolyte-free-irrigant'] },
    sound: { lines: saline },
  },
]
