import type { Situation } from '../contexts.ts'

const peripheral = 'intravenous-peripheral'
const water = { 'water-for-injection': 'q.s.' }

/** Situations in which a quieter and a louder caution both hold. */
export const meetings: readonly Situation[] = [
  { route: peripheral, lines: { 'sodium-chloride': '23.4 %' }, osmolality: 9000 },
  { route: peripheral, lines: { 'sodium-chloride': '5 %' }, osmolality: 1600 },
  { route: peripheral, lines: { 'potassium-chloride': '2 mmol/mL' } },
  {
    route: peripheral,
    lines: { 'calcium-gluconate-monohydrate': '100 mg/mL' },
    patient: { infusionRateMlPerH: 10 },
  },
  { lines: { 'benzalkonium-chloride': '0.2 %' } },
  { route: 'irrigation', lines: { 'heparin-sodium': '0.1 %', tobramycin: '0.1 %' } },
  { route: peripheral, lines: water, osmolality: 0 },
  { route: peripheral, lines: { urea: '1.6 %' }, osmolality: 290, effective: 0 },
  { equivalent: 3, osmolality: 960 },
  { route: 'irrigation', lines: { glycine: '1.5 %' }, osmolality: 200 },
  { route: 'irrigation', lines: water, osmolality: 0 },
  { route: 'irrigation', lines: { urea: '1.4 %' }, osmolality: 250, effective: 0 },
  { route: 'enteral', osmolality: 700, patient: { ageYears: 0.1 } },
]
