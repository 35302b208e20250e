import type { Case } from '../contexts.ts'

const peripheral = 'intravenous-peripheral'
const silver = { 'silver-nitrate': '1 %' }
const bac = { 'benzalkonium-chloride': '0.01 %' }

export const ionCases: readonly Case[] = [
  [
    'silver-with-chloride',
    { lines: { ...silver, 'sodium-chloride': '0.5 %' } },
    { lines: { ...silver, 'sodium-nitrate': '1 %' } },
  ],
  [
    'silver-with-precipitating-anion',
    { lines: { ...silver, 'sodium-borate-decahydrate': '0.1 %' } },
    { lines: { ...silver, 'boric-acid': '1 %' } },
  ],
  [
    'silver-with-sulfonamide',
    { lines: { ...silver, 'sulfacetamide-sodium-monohydrate': '10 %' } },
    { lines: { ...silver, 'dorzolamide-hydrochloride': '2 %' } },
  ],
  [
    'zinc-with-phosphate',
    {
      route: peripheral,
      lines: { 'zinc-sulfate-heptahydrate': '0.2 mmol/L', 'potassium-phosphate-monobasic': '10 mmol/L' },
    },
    { lines: { 'zinc-sulfate-heptahydrate': '0.199 mmol/L', 'potassium-phosphate-monobasic': '10 mmol/L' } },
  ],
  [
    'zinc-with-carbonate',
    { lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'sodium-bicarbonate': '0.5 %' } },
    { lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'sodium-chloride': '0.5 %' } },
  ],
  [
    'zinc-in-alkaline-borate',
    { lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'boric-acid': '1 %' }, pH: 6.51 },
    { pH: 6.5 },
  ],
  [
    'zinc-held-by-citrate',
    { lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'sodium-citrate-dihydrate': '0.5 %' } },
    { lines: { 'zinc-sulfate-heptahydrate': '0.25 %', 'fentanyl-citrate': '0.005 %' } },
  ],
  [
    'calcium-with-phosphate',
    {
      route: 'irrigation',
      lines: {
        'calcium-chloride-dihydrate': '1.26 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '3 mmol/L',
      },
    },
    {
      lines: {
        'calcium-chloride-dihydrate': '1.25 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '3 mmol/L',
      },
    },
  ],
  [
    'calcium-with-phosphate-at-physiological-strength',
    {
      route: 'ophthalmic-irrigation',
      lines: {
        'calcium-chloride-dihydrate': '1.05 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '3.5 mmol/L',
      },
    },
    {
      lines: {
        'calcium-chloride-dihydrate': '1.05 mmol/L',
        'sodium-phosphate-dibasic-anhydrous': '3.51 mmol/L',
      },
    },
  ],
  [
    'calcium-and-phosphate-order-of-mixing',
    {
      route: peripheral,
      lines: {
        'calcium-gluconate-monohydrate': '2 mmol/L',
        'sodium-phosphate-monobasic-monohydrate': '5 mmol/L',
      },
    },
    {
      lines: {
        'calcium-gluconate-monohydrate': '2 mmol/L',
        'sodium-glycerophosphate-anhydrous': '5 mmol/L',
      },
    },
  ],
  [
    'calcium-chloride-beside-phosphate',
    {
      route: peripheral,
      lines: {
        'calcium-chloride-dihydrate': '2 mmol/L',
        'sodium-phosphate-monobasic-monohydrate': '5 mmol/L',
      },
    },
    {
      lines: {
        'calcium-gluconate-monohydrate': '2 mmol/L',
        'sodium-phosphate-monobasic-monohydrate': '5 mmol/L',
      },
    },
  ],
  [
    'calcium-with-sulfate',
    {
      lines: {
        'calcium-gluconate-monohydrate': '10.01 mmol/L',
        'magnesium-sulfate-heptahydrate': '11 mmol/L',
      },
    },
    {
      lines: { 'calcium-gluconate-monohydrate': '10 mmol/L', 'magnesium-sulfate-heptahydrate': '11 mmol/L' },
    },
  ],
  [
    'calcium-with-carbonate',
    { lines: { 'calcium-chloride-dihydrate': '2.01 mmol/L', 'sodium-bicarbonate': '25 mmol/L' } },
    { lines: { 'calcium-chloride-dihydrate': '2 mmol/L', 'sodium-bicarbonate': '25 mmol/L' } },
  ],
  [
    'calcium-with-carbonate-at-physiological-strength',
    { lines: { 'calcium-chloride-dihydrate': '1.2 mmol/L', 'sodium-bicarbonate': '40 mmol/L' } },
    { lines: { 'calcium-chloride-dihydrate': '1.2 mmol/L', 'sodium-bicarbonate': '40.1 mmol/L' } },
  ],
  [
    'calcium-or-magnesium-bound',
    { lines: { 'magnesium-chloride-hexahydrate': '1 mmol/L', 'sodium-citrate-dihydrate': '5 mmol/L' } },
    {
      lines: {
        'magnesium-chloride-hexahydrate': '1 mmol/L',
        'norepinephrine-bitartrate-monohydrate': '4 mg/L',
      },
    },
  ],
  [
    'ceftriaxone-with-calcium-in-a-newborn',
    {
      route: peripheral,
      lines: {
        'calcium-gluconate-monohydrate': '1 mmol/L',
        'ceftriaxone-disodium-hemiheptahydrate': '10 mg/mL',
      },
      patient: { ageYears: 28 / 365.25 },
    },
    { patient: { ageYears: 29 / 365.25 } },
  ],
  [
    'ceftriaxone-with-calcium',
    {
      route: peripheral,
      lines: {
        'calcium-gluconate-monohydrate': '1 mmol/L',
        'ceftriaxone-disodium-hemiheptahydrate': '10 mg/mL',
      },
    },
    { lines: { 'calcium-gluconate-monohydrate': '1 mmol/L', 'cefazolin-sodium': '10 mg/mL' } },
  ],
  [
    'fluoride-with-calcium-or-magnesium',
    { lines: { 'sodium-fluoride': '1 mmol/L', 'magnesium-chloride-hexahydrate': '1 mmol/L' } },
    { lines: { 'sodium-fluoride': '1 mmol/L', 'sodium-chloride': '1 mmol/L' } },
  ],
  [
    'magnesium-in-alkali',
    { lines: { 'magnesium-sulfate-heptahydrate': '1 mmol/L', 'sodium-hydroxide': '1 mmol/L' }, pH: 8.01 },
    { pH: 8 },
  ],
  [
    'aluminium-with-precipitating-anion',
    { lines: { 'aluminum-potassium-sulfate-dodecahydrate': '1 %', 'boric-acid': '1 %' } },
    { lines: { 'aluminum-potassium-sulfate-dodecahydrate': '1 %', 'sodium-chloride': '0.5 %' } },
  ],
  [
    'edetate-binds-metal',
    { lines: { 'edetate-disodium-dihydrate': '0.05 %', 'zinc-sulfate-heptahydrate': '0.25 %' } },
    { lines: { 'edetate-calcium-disodium-anhydrous': '0.05 %', 'zinc-sulfate-heptahydrate': '0.25 %' } },
  ],
  [
    'alkaloid-with-classic-precipitant',
    { lines: { 'atropine-sulfate-monohydrate': '1 %', 'potassium-iodide': '1 %' } },
    { lines: { 'atropine-sulfate-monohydrate': '1 %', 'sodium-chloride': '0.5 %' } },
  ],
  [
    'bicarbonate-with-acid',
    { lines: { 'sodium-bicarbonate': '1 %', 'citric-acid-monohydrate': '0.1 %' } },
    { lines: { 'sodium-bicarbonate': '1 %', 'sodium-citrate-dihydrate': '0.1 %' } },
  ],
  [
    'sulfite-with-oxidant',
    { lines: { 'sodium-metabisulfite': '0.1 %', 'povidone-iodine': '5 %' } },
    { lines: { 'sodium-metabisulfite': '0.1 %', 'sodium-nitrate': '1 %' } },
  ],
  [
    'ascorbate-with-metal-selenite-or-bicarbonate',
    { route: 'intravenous-central', lines: { 'ascorbic-acid': '0.1 %', 'selenious-acid': '1 mcg/mL' } },
    { lines: { 'ascorbic-acid': '0.1 %', 'zinc-chloride': '1 mcg/mL' } },
  ],
  [
    'carbomer-with-salt',
    { lines: { carbomer: '0.2 %', 'sodium-chloride': '0.1 %' } },
    { lines: { carbomer: '0.2 %', glycerin: '2 %' } },
  ],
  [
    'gellan-with-cation',
    { lines: { 'gellan-gum': '0.6 %', 'sodium-chloride': '0.5 %' } },
    { lines: { 'gellan-gum': '0.6 %', 'sodium-hydroxide': '1 mmol/L' } },
  ],
  [
    'cromoglicate-with-metal',
    { lines: { 'cromolyn-sodium': '2 %', 'zinc-sulfate-heptahydrate': '0.1 %' } },
    { lines: { 'cromolyn-sodium': '2 %', 'sodium-chloride': '0.1 %' } },
  ],
  [
    'chelating-antibiotic-with-metal',
    { lines: { ofloxacin: '0.3 %', 'magnesium-chloride-hexahydrate': '0.1 %' } },
    { lines: { ofloxacin: '0.3 %', 'sodium-chloride': '0.5 %' } },
  ],
]

export const drugCases: readonly Case[] = [
  [
    'borate-with-catecholamine',
    { lines: { 'epinephrine-hydrochloride': '0.1 %', 'boric-acid': '1 %' } },
    { lines: { 'phenylephrine-hydrochloride': '0.1 %', 'boric-acid': '1 %' } },
  ],
  ['phenylephrine-in-alkali', { lines: { 'phenylephrine-hydrochloride': '2.5 %' }, pH: 7.01 }, { pH: 7 }],
  /* pKa 7.9 */
  ['amine-near-its-pka', { lines: { 'lidocaine-hydrochloride-monohydrate': '2 %' }, pH: 6.91 }, { pH: 6.9 }],
  [
    'local-anaesthetic-with-bicarbonate',
    {
      route: 'epidural',
      lines: { 'lidocaine-hydrochloride-monohydrate': '2 %', 'sodium-bicarbonate': '0.8 %' },
    },
    { lines: { 'lidocaine-hydrochloride-monohydrate': '2 %', 'sodium-chloride': '0.8 %' } },
  ],
  /* pKa 7.4 */
  [
    'weak-acid-drug-in-acid',
    { route: peripheral, lines: { 'phenobarbital-sodium': '20 mg/mL' }, pH: 8.39 },
    { pH: 8.4 },
  ],
  [
    'drug-falls-out-with-carbon-dioxide',
    { route: peripheral, lines: { 'pentobarbital-sodium': '50 mg/mL' } },
    { lines: { 'cefazolin-sodium': '50 mg/mL' } },
  ],
  [
    'sulfite-with-thiamine',
    { route: peripheral, lines: { 'thiamine-hydrochloride': '1 mg/mL', 'sodium-bisulfite': '0.05 %' } },
    { lines: { 'pyridoxine-hydrochloride': '1 mg/mL', 'sodium-bisulfite': '0.05 %' } },
  ],
  [
    'sulfite-with-cisplatin',
    { route: peripheral, lines: { Cisplatin: '1 mg/mL', 'sodium-bisulfite': '0.05 %' } },
    { lines: { Carboplatin: '1 mg/mL', 'sodium-bisulfite': '0.05 %' } },
  ],
  [
    'sulfite-with-sympathomimetic',
    { lines: { 'phenylephrine-hydrochloride': '2.5 %', 'sodium-metabisulfite': '0.1 %' } },
    { lines: { 'naphazoline-hydrochloride': '0.1 %', 'sodium-metabisulfite': '0.1 %' } },
  ],
  ['physostigmine-above-ph-4-5', { lines: { 'physostigmine-sulfate': '0.25 %' }, pH: 4.51 }, { pH: 4.5 }],
  ['pilocarpine-above-ph-6-5', { lines: { 'pilocarpine-nitrate': '1 %' }, pH: 6.51 }, { pH: 6.5 }],
  [
    'aminoglycoside-or-polymyxin-with-anionic-polymer',
    { lines: { tobramycin: '0.3 %', 'carmellose-sodium': '0.5 %' } },
    { lines: { 'colistimethate-sodium': '0.3 %', 'carmellose-sodium': '0.5 %' } },
  ],
  [
    'aminoglycoside-with-beta-lactam',
    { lines: { tobramycin: '0.3 %', 'cefazolin-sodium': '3 %' } },
    { lines: { tobramycin: '0.3 %', 'vancomycin-hydrochloride': '3 %' } },
  ],
  [
    'vancomycin-with-beta-lactam',
    {
      route: 'intravitreal',
      lines: { 'vancomycin-hydrochloride': '10 mg/mL', 'ceftazidime-pentahydrate': '22.5 mg/mL' },
    },
    { lines: { 'vancomycin-hydrochloride': '10 mg/mL', 'amikacin-sulfate': '4 mg/mL' } },
  ],
  [
    'vancomycin-in-phosphate-or-alkali',
    {
      lines: { 'vancomycin-hydrochloride': '50 mg/mL', 'sodium-phosphate-monobasic-monohydrate': '5 mmol/L' },
      pH: 5.01,
    },
    { pH: 5 },
  ],
  [
    'ciprofloxacin-near-neutral',
    { lines: { 'ciprofloxacin-hydrochloride-monohydrate': '0.3 %' }, pH: 5.5 },
    { pH: 5.49 },
  ],
  [
    'erythromycin-with-saline-first',
    { route: peripheral, lines: { 'erythromycin-lactobionate': '5 mg/mL', 'sodium-chloride': '0.9 %' } },
    { lines: { 'erythromycin-lactobionate': '5 mg/mL', 'dextrose-monohydrate': '5 %' } },
  ],
  [
    'amphotericin-with-electrolyte',
    { route: peripheral, lines: { 'Amphotericin B': '0.1 mg/mL', 'sodium-chloride': '0.9 %' } },
    { lines: { 'Amphotericin B': '0.1 mg/mL', 'dextrose-monohydrate': '5 %' } },
  ],
  [
    'catecholamine-in-alkali',
    {
      route: 'intravenous-central',
      lines: { 'dopamine-hydrochloride': '1 mg/mL', 'sodium-bicarbonate': '4.2 %' },
    },
    { lines: { 'dopamine-hydrochloride': '1 mg/mL', 'sodium-chloride': '0.9 %' } },
  ],
  [
    'eye-anaesthetic-with-fluorescein',
    { lines: { 'oxybuprocaine-hydrochloride': '0.4 %', 'fluorescein-sodium': '0.25 %' } },
    { lines: { 'proparacaine-hydrochloride': '0.5 %', 'fluorescein-sodium': '0.25 %' } },
  ],
  [
    'thiol-with-metal-and-rubber',
    { lines: { acetylcysteine: '5 %' } },
    { lines: { 'sodium-chloride': '0.9 %' } },
  ],
  [
    'tromethamine-with-reducing-sugar',
    { lines: { tromethamine: '20 mmol/L', 'dextrose-monohydrate': '5 %' } },
    { lines: { tromethamine: '20 mmol/L', mannitol: '5 %' } },
  ],
  [
    'penicillin-hydrolysis',
    { lines: { 'penicillin-g-sodium': '1 %', 'zinc-sulfate-heptahydrate': '0.1 %' } },
    { lines: { 'penicillin-g-sodium': '1 %', 'sodium-citrate-dihydrate': '0.5 %' } },
  ],
  [
    'heparin-in-acid-or-with-polycation',
    { route: peripheral, lines: { 'heparin-sodium': '0.1 %' }, pH: 4.99 },
    { pH: 5 },
  ],
]

export const preservativeCases: readonly Case[] = [
  [
    'quaternary-with-nitrate',
    { lines: { ...bac, 'pilocarpine-nitrate': '1 %' } },
    { lines: { ...bac, 'pilocarpine-hydrochloride': '1 %' } },
  ],
  [
    'quaternary-with-salicylate',
    { lines: { ...bac, 'physostigmine-salicylate': '0.25 %' } },
    { lines: { ...bac, 'physostigmine-sulfate': '0.25 %' } },
  ],
  [
    'quaternary-with-fluorescein',
    { lines: { ...bac, 'fluorescein-sodium': '1 %' } },
    { lines: { 'chlorobutanol-hemihydrate': '0.5 %', 'fluorescein-sodium': '1 %' } },
  ],
  [
    'quaternary-in-strong-citrate-or-tartrate',
    { route: 'nasal', lines: { ...bac, 'sodium-citrate-dihydrate': '20.01 mmol/L' } },
    { lines: { ...bac, 'sodium-citrate-dihydrate': '20 mmol/L' } },
  ],
  [
    'quaternary-with-iodide',
    { lines: { ...bac, 'potassium-iodide': '1 %' } },
    { lines: { ...bac, 'potassium-chloride': '1 %' } },
  ],
  [
    'quaternary-with-anionic-polymer-or-surfactant',
    { lines: { ...bac, 'carmellose-sodium': '0.5 %' } },
    { lines: { ...bac, hypromellose: '0.5 %' } },
  ],
  [
    'quaternary-with-anionic-drug',
    { lines: { ...bac, 'diclofenac-sodium': '0.1 %' } },
    { lines: { ...bac, 'timolol-maleate': '0.34 %' } },
  ],
  [
    'benzalkonium-with-zinc-sulfate',
    { lines: { ...bac, 'zinc-sulfate-heptahydrate': '0.25 %' } },
    { lines: { ...bac, 'naphazoline-hydrochloride': '0.1 %' } },
  ],
  [
    'quaternary-bound-by-micelle-or-polymer',
    { lines: { ...bac, 'polysorbate-80': '0.1 %' } },
    { lines: { ...bac, 'polysorbate-80': '0.099 %' } },
  ],
  ['quaternary-lost-on-filter', { lines: bac, volumeMl: 100 }, { volumeMl: 101 }],
  [
    'borate-with-polyvinyl-alcohol',
    { lines: { 'boric-acid': '1 %', 'polyvinyl-alcohol': '1.4 %' } },
    { lines: { 'boric-acid': '1 %', 'povidone-k25-k30': '1.4 %' } },
  ],
  [
    'borate-with-guar',
    { lines: { 'boric-acid': '1 %', 'Hydroxypropyl guar': '0.2 %' }, pH: 7.01 },
    { pH: 7 },
  ],
  [
    'borate-with-polyol',
    { lines: { 'boric-acid': '1 %', mannitol: '2 %' } },
    { lines: { 'boric-acid': '1 %', 'propylene-glycol': '1 %' } },
  ],
  [
    'phenylmercuric-with-halide',
    { lines: { 'phenylmercuric-nitrate': '0.002 %', 'homatropine-hydrobromide': '2 %' } },
    { lines: { 'phenylmercuric-nitrate': '0.002 %', 'atropine-sulfate-monohydrate': '1 %' } },
  ],
  [
    'mercurial-with-edetate-or-sulfur',
    { lines: { thimerosal: '0.005 %', 'edetate-disodium-dihydrate': '0.1 %' } },
    { lines: { thimerosal: '0.005 %', 'boric-acid': '1 %' } },
  ],
  [
    'thimerosal-in-saline-or-acid',
    { lines: { thimerosal: '0.005 %', 'sodium-chloride': '0.5 %' } },
    { lines: { thimerosal: '0.005 %', mannitol: '4 %' } },
  ],
  [
    'chlorhexidine-with-anion',
    { route: 'irrigation', lines: { 'chlorhexidine-gluconate': '0.05 %', 'sodium-chloride': '0.9 %' } },
    { lines: { 'chlorhexidine-gluconate': '0.0499 %', 'sodium-chloride': '0.9 %' } },
  ],
  [
    'chlorhexidine-with-anionic-material',
    { lines: { 'chlorhexidine-acetate': '0.01 %', 'carmellose-sodium': '0.5 %' } },
    { lines: { 'chlorhexidine-acetate': '0.01 %', hypromellose: '0.5 %' } },
  ],
  [
    'paraben-bound',
    { lines: { methylparaben: '0.1 %', 'polysorbate-80': '0.5 %' } },
    { lines: { methylparaben: '0.1 %', mannitol: '4 %' } },
  ],
  ['paraben-above-ph-8', { lines: { methylparaben: '0.1 %' }, pH: 8.01 }, { pH: 8 }],
  ['benzoate-above-ph-5', { route: 'enteral', lines: { 'sodium-benzoate': '0.2 %' }, pH: 5.01 }, { pH: 5 }],
  [
    'sorbate-above-ph-6-5',
    { route: 'nasal', lines: { 'potassium-sorbate': '0.2 %' }, pH: 6.51 },
    { pH: 6.5 },
  ],
  ['chlorobutanol-above-ph-5-5', { lines: { 'chlorobutanol-hemihydrate': '0.5 %' }, pH: 5.51 }, { pH: 5.5 }],
  [
    'hyaluronate-in-phosphate',
    { lines: { 'sodium-hyaluronate': '0.1 %', 'sodium-phosphate-dibasic-anhydrous': '5 mmol/L' } },
    { lines: { 'sodium-hyaluronate': '0.1 %', 'sodium-citrate-dihydrate': '5 mmol/L' } },
  ],
]
