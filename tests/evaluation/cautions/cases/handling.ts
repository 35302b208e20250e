import type { Case } from '../contexts.ts'

const peripheral = 'intravenous-peripheral'
const saline = { 'sodium-chloride': '0.9 %' }
const bac = { 'benzalkonium-chloride': '0.01 %' }

export const handlingCases: readonly Case[] = [
  [
    'ten-times-the-usual-strength',
    { lines: { 'timolol-maleate': '5 %' } },
    { lines: { 'timolol-maleate': '4.99 %' } },
  ],
  [
    'a-tenth-of-the-usual-strength',
    { lines: { 'timolol-maleate': '0.025 %' } },
    { lines: { 'timolol-maleate': '0.0251 %' } },
  ],
  [
    'preservative-outside-its-usual-range',
    { lines: { 'benzalkonium-chloride': '0.0201 %' } },
    { lines: { 'benzalkonium-chloride': '0.02 %' } },
  ],
  ['unpreserved-means-single-dose', { lines: saline }, { lines: { ...saline, ...bac } }],
  ['preserved-drops-once-opened', { lines: bac }, { lines: saline }],
  [
    'fluorescein-in-a-multiple-dose-bottle',
    { lines: { 'fluorescein-sodium': '2 %', 'chlorobutanol-hemihydrate': '0.5 %' } },
    { lines: { 'fluorescein-sodium': '2 %' } },
  ],
  ['fluorescein-in-single-doses', { lines: { 'fluorescein-sodium': '2 %' } }, { lines: saline }],
  [
    'moist-takes-up-water',
    { lines: { 'magnesium-chloride-hexahydrate': '1 mmol/L' } },
    { lines: { 'magnesium-sulfate-heptahydrate': '1 mmol/L' } },
  ],
  [
    'efflorescent-loses-water',
    { lines: { 'magnesium-sulfate-heptahydrate': '1 mmol/L' } },
    { lines: { 'magnesium-chloride-hexahydrate': '1 mmol/L' } },
  ],
  ['potency-of-this-lot', { lines: { bacitracin: '1 %' } }, { lines: { ofloxacin: '0.3 %' } }],
  [
    'salt-or-base',
    { lines: { 'timolol-maleate': '0.34 %' } },
    { lines: { 'cyclopentolate-hydrochloride': '1 %' } },
  ],
  [
    'light-sensitive',
    { lines: { 'pilocarpine-nitrate': '1 %' } },
    { lines: { 'pilocarpine-hydrochloride': '1 %' } },
  ],
  ['not-for-the-autoclave', { lines: { chloramphenicol: '0.5 %' } }, { route: 'nasal' }],
  [
    'dextrose-in-heat',
    { route: peripheral, lines: { 'dextrose-monohydrate': '5 %' }, pH: 4.51 },
    { pH: 4.5 },
  ],
  [
    'bicarbonate-in-heat',
    { route: 'irrigation', lines: { 'sodium-bicarbonate': '1.4 %' } },
    { route: 'otic' },
  ],
  ['urea-in-heat', { route: 'otic', lines: { urea: '5 %' } }, { lines: saline }],
  [
    'sodium-phosphate-frozen',
    { lines: { 'sodium-phosphate-dibasic-heptahydrate': '5 mmol/L' } },
    { lines: { 'potassium-phosphate-dibasic': '5 mmol/L' } },
  ],
  [
    'dicarboxylate-buffer-frozen',
    { lines: { 'succinic-acid': '5 mmol/L' } },
    { lines: { 'malic-acid-dl': '0.1 %' } },
  ],
  [
    'volatile-buffer',
    { lines: { 'sodium-acetate-trihydrate': '5 mmol/L' } },
    { lines: { 'zinc-acetate-dihydrate': '5 mmol/L' } },
  ],
  [
    'glass-gives-aluminium',
    { route: peripheral, lines: { 'sodium-citrate-dihydrate': '5 mmol/L' } },
    { route: 'nasal' },
  ],
  [
    'cellulose-ether-in-the-autoclave',
    { lines: { hypromellose: '0.5 %' } },
    { lines: { 'povidone-k25-k30': '0.5 %' } },
  ],
  [
    'osmotic-effect-below-ideal',
    { lines: { 'caffeine-anhydrous': '0.5 %' } },
    { lines: { 'caffeine-anhydrous': '0.499 %' } },
  ],
  ['osmometer-method', { osmolality: 2001 }, { osmolality: 2000 }],
  ['hazardous-drug', { lines: { mitomycin: '0.02 %' } }, { lines: { ofloxacin: '0.3 %' } }],
  [
    'ceftazidime-gives-gas',
    { lines: { 'ceftazidime-pentahydrate': '5 %' } },
    { lines: { 'cefazolin-sodium': '5 %' } },
  ],
  ['benzalkonium-from-stock', { lines: bac }, { lines: { cetrimide: '0.005 %' } }],
  ['liquid-by-assay-and-density', { lines: { glycerin: '2 %' } }, { lines: { mannitol: '2 %' } }],
  ['alcohol-by-volume-or-weight', { lines: { ethanol: '5 %' } }, { lines: { glycerin: '5 %' } }],
  ['sterile-from-unsterile', { lines: saline }, { route: 'nasal' }],
]

export const nameCases: readonly Case[] = [
  [
    'edetate-disodium-for-edetate-calcium',
    { route: peripheral, lines: { 'edetate-disodium-dihydrate': '0.101 %' } },
    { lines: { 'edetate-disodium-dihydrate': '0.1 %' } },
  ],
  [
    'edetate-by-its-full-name',
    { route: peripheral, lines: { 'edetate-calcium-disodium-anhydrous': '2 mg/mL' } },
    { route: 'ophthalmic' },
  ],
  [
    'calcium-chloride-or-gluconate',
    { route: peripheral, lines: { 'calcium-gluconate-monohydrate': '2 mmol/L' } },
    { lines: { 'calcium-lactate-pentahydrate': '2 mmol/L' } },
  ],
  [
    'dextrose-anhydrous-or-monohydrate',
    { lines: { 'dextrose-anhydrous': '5 %' } },
    { lines: { mannitol: '5 %' } },
  ],
  [
    'other-forms-on-the-shelf',
    { lines: { 'sodium-sulfate-anhydrous': '1 %' } },
    { lines: { 'sodium-chloride': '1 %' } },
  ],
  ['shelf-neighbours', { lines: { 'potassium-chloride': '1 %' } }, { lines: { 'sodium-chloride': '1 %' } }],
  [
    'glacial-or-dilute-acetic-acid',
    { route: 'otic', lines: { 'acetic-acid-glacial': '5.01 %' } },
    { lines: { 'acetic-acid-glacial': '5 %' } },
  ],
  [
    'acetic-acid-by-its-strength',
    { route: 'otic', lines: { 'acetic-acid-glacial': '2 %' } },
    { route: 'subcutaneous' },
  ],
  [
    'magnesium-or-morphine-sulfate',
    { route: peripheral, lines: { 'morphine-sulfate-pentahydrate': '1 mg/mL' } },
    { lines: { 'morphine-hydrochloride-trihydrate': '1 mg/mL' } },
  ],
  [
    'ratio-strength',
    { lines: { 'epinephrine-hydrochloride': '1:1000' } },
    { lines: { 'epinephrine-hydrochloride': '1 mg/mL' } },
  ],
]
