import type { Case } from '../contexts.ts'

const water = { 'water-for-injection': 'q.s.' }
const saline = { 'sodium-chloride': '0.9 %' }
const bac = { 'benzalkonium-chloride': '0.01 %' }

export const routeCases: readonly Case[] = [
  [
    'preservative-near-the-spinal-cord',
    { route: 'epidural', lines: { methylparaben: '0.1 %' } },
    { route: 'subcutaneous' },
  ],
  [
    'excipient-near-the-spinal-cord',
    { route: 'intrathecal', lines: { 'sodium-metabisulfite': '0.1 %' } },
    { lines: saline },
  ],
  [
    'contrast-or-dye-intrathecal',
    { route: 'intrathecal', lines: { 'Methylene blue': '1 %' } },
    { route: 'irrigation' },
  ],
  [
    'tranexamic-acid-near-the-spinal-cord',
    { route: 'epidural', lines: { 'tranexamic-acid': '100 mg/mL' } },
    { route: 'intravenous-peripheral' },
  ],
  [
    'vinca-alkaloid-intrathecal',
    { route: 'intrathecal', lines: { 'Vincristine sulfate': '1 mg/mL' } },
    { route: 'intravenous-central' },
  ],
  [
    'potassium-intrathecal',
    { route: 'intrathecal', lines: { 'potassium-chloride': '5.01 mmol/L' } },
    { lines: { 'potassium-chloride': '5 mmol/L' } },
  ],
  [
    'never-intrathecal',
    { route: 'intrathecal', lines: { fluorouracil: '50 mg/mL' } },
    { lines: { 'methotrexate-disodium': '2.5 mg/mL' } },
  ],
  ['baricity-of-a-spinal-solution', { route: 'intrathecal', lines: saline }, { route: 'epidural' }],
  ['quaternary-inside-the-eye', { route: 'intracameral', lines: bac }, { route: 'ophthalmic' }],
  [
    'sulfite-inside-the-eye',
    { route: 'intracameral', lines: { 'sodium-metabisulfite': '0.05 %' } },
    { lines: { 'epinephrine-hydrochloride': '0.1 mg/mL' } },
  ],
  [
    'preservative-inside-the-eye',
    { route: 'intravitreal', lines: { 'benzyl-alcohol': '0.9 %' } },
    { lines: { 'dexamethasone-sodium-phosphate': '4 mg/mL' } },
  ],
  [
    'aminoglycoside-into-the-vitreous',
    { route: 'intravitreal', lines: { 'amikacin-sulfate': '4 mg/mL' } },
    { lines: { 'ceftazidime-pentahydrate': '22.5 mg/mL' } },
  ],
  [
    'intravitreal-volume',
    { route: 'intravitreal', patient: { doseVolumeMl: 0.101 } },
    { patient: { doseVolumeMl: 0.1 } },
  ],
  ['borate-where-it-is-absorbed', { route: 'irrigation', lines: { 'boric-acid': '1 %' } }, { route: 'otic' }],
  ['mercurial-preservative', { lines: { thimerosal: '0.005 %' } }, { lines: bac }],
  [
    'antiseptic-by-injection',
    { route: 'intramuscular', lines: { 'chlorhexidine-gluconate': '0.01 %' } },
    { lines: { 'benzethonium-chloride': '0.01 %' } },
  ],
  [
    'potassium-concentrate-into-tissue',
    { route: 'subcutaneous', lines: { 'potassium-chloride': '40.1 mmol/L' } },
    { lines: { 'potassium-chloride': '40 mmol/L' } },
  ],
  [
    'calcium-chloride-into-tissue',
    { route: 'subcutaneous', lines: { 'calcium-chloride-dihydrate': '5.01 mmol/L' } },
    { lines: { 'calcium-chloride-dihydrate': '5 mmol/L' } },
  ],
  [
    'calcium-chloride-peripheral',
    { route: 'intravenous-peripheral', lines: { 'calcium-chloride-dihydrate': '2 %' } },
    { lines: { 'calcium-chloride-dihydrate': '1.99 %' } },
  ],
  [
    'promethazine-under-the-skin',
    { route: 'subcutaneous', lines: { 'promethazine-hydrochloride': '25 mg/mL' } },
    { route: 'intramuscular' },
  ],
  [
    'promethazine-into-a-small-vein',
    { route: 'intravenous-peripheral', lines: { 'promethazine-hydrochloride': '1 mg/mL' } },
    { route: 'intramuscular' },
  ],
  ['ear-drops-and-an-open-eardrum', { route: 'otic', lines: saline, osmolality: 601 }, { osmolality: 600 }],
  [
    'benzalkonium-dose-to-inhale',
    { route: 'inhaled', lines: { 'benzalkonium-chloride': '0.01 %' }, patient: { doseVolumeMl: 0.501 } },
    { patient: { doseVolumeMl: 0.5 } },
  ],
  ['quaternary-to-inhale', { route: 'inhaled', lines: bac }, { lines: saline }],
  ['sulfite-to-inhale', { route: 'inhaled', lines: { 'sodium-bisulfite': '0.1 %' } }, { lines: saline }],
  [
    'edetate-dose-to-inhale',
    { route: 'inhaled', lines: { 'edetate-disodium-dihydrate': '0.01 %' }, patient: { doseVolumeMl: 3.001 } },
    { patient: { doseVolumeMl: 3 } },
  ],
  ['inhalation-solutions-are-sterile', { route: 'inhaled', lines: saline }, { route: 'nasal' }],
  ['benzalkonium-in-the-nose', { route: 'nasal', lines: bac }, { lines: { 'potassium-sorbate': '0.2 %' } }],
  [
    'electrolyte-free-irrigant',
    { route: 'irrigation', lines: { glycine: '1.5 %' } },
    { lines: { glycine: '0.5 %', ...saline } },
  ],
  ['water-alone-as-irrigant', { route: 'irrigation', lines: water }, { lines: { ...water, ...saline } }],
  [
    'alum-irrigation',
    { route: 'irrigation', lines: { 'aluminum-potassium-sulfate-dodecahydrate': '1 %' } },
    { lines: saline },
  ],
  ['for-irrigation-only', { route: 'ophthalmic-irrigation', lines: saline }, { route: 'ophthalmic' }],
  ['enteral-syringe', { route: 'enteral', lines: saline }, { route: 'otic' }],
]

export const osmolalityCases: readonly Case[] = [
  ['tonicity-inside-the-eye', { route: 'intracameral', osmolality: 279 }, { osmolality: 280 }],
  ['tonicity-far-off-inside-the-eye', { route: 'intravitreal', osmolality: 351 }, { osmolality: 350 }],
  [
    'child-above-1000-in-a-peripheral-vein',
    { route: 'intravenous-peripheral', osmolarity: 1001, patient: { ageYears: 17 } },
    { osmolarity: 1000 },
  ],
  [
    'peripheral-vein-above-its-ceiling',
    { route: 'intravenous-peripheral', osmolarity: 901 },
    { osmolarity: 900 },
  ],
  ['peripheral-vein-hypertonic', { route: 'intravenous-peripheral', osmolarity: 600 }, { osmolarity: 599 }],
  ['central-vein-very-hypertonic', { route: 'intravenous-central', osmolarity: 1801 }, { osmolarity: 1800 }],
  ['hypotonic-into-a-vein', { route: 'intravenous-peripheral', effective: 239 }, { effective: 240 }],
  [
    'very-hypotonic-into-a-vein',
    { route: 'intravenous-peripheral', effective: 111, lines: saline },
    { effective: 112 },
  ],
  [
    'water-alone-into-a-vein',
    { route: 'intravenous-central', lines: water },
    { lines: { ...water, ...saline } },
  ],
  [
    'isosmotic-by-permeant-solute',
    { route: 'intravenous-peripheral', lines: { glycerin: '2.6 %' }, osmolality: 290, effective: 149 },
    { effective: 150 },
  ],
  ['hypertonic-into-a-muscle', { route: 'intramuscular', osmolality: 601 }, { osmolality: 600 }],
  ['hypertonic-under-the-skin', { route: 'subcutaneous', osmolality: 601 }, { osmolality: 600 }],
  [
    'infusion-under-the-skin',
    { route: 'subcutaneous', osmolality: 311, patient: { infusionRateMlPerH: 50 } },
    { osmolality: 310 },
  ],
  ['tonicity-in-the-spinal-fluid', { route: 'intrathecal', osmolality: 321 }, { osmolality: 320 }],
  [
    'tonicity-far-off-in-the-spinal-fluid',
    {
      route: 'intrathecal',
      osmolality: 480,
      lines: { 'bupivacaine-hydrochloride-monohydrate': '0.5 %', 'dextrose-monohydrate': '4.99 %' },
    },
    { lines: { 'bupivacaine-hydrochloride-monohydrate': '0.5 %', 'dextrose-monohydrate': '5 %' } },
  ],
  ['tonicity-in-the-epidural-space', { route: 'epidural', osmolality: 249 }, { osmolality: 250 }],
  ['tonicity-of-eye-drops', { equivalent: 2.001 }, { equivalent: 2 }],
  ['hypertonic-for-a-damaged-eye', { osmolality: 321 }, { osmolality: 320 }],
  ['tonicity-of-an-eye-wash', { route: 'ophthalmic-irrigation', osmolality: 331 }, { osmolality: 330 }],
  ['tonicity-in-the-nose', { route: 'nasal', osmolarity: 199 }, { osmolarity: 200 }],
  ['tonicity-of-an-inhaled-mist', { route: 'inhaled', osmolality: 149 }, { osmolality: 150 }],
  [
    'hypertonic-saline-to-inhale',
    { route: 'inhaled', lines: { 'sodium-chloride': '3 %' } },
    { lines: { 'sodium-chloride': '2.99 %' } },
  ],
  ['hypotonic-irrigant', { route: 'irrigation', osmolality: 259 }, { osmolality: 260 }],
  [
    'hyperosmolar-for-an-infant-gut',
    { route: 'enteral', osmolality: 451, patient: { ageYears: 0.1 } },
    { osmolality: 450 },
  ],
  ['hyperosmolar-feed', { route: 'enteral', osmolality: 601 }, { osmolality: 600 }],
  [
    'dextrose-for-a-newborn-vein',
    {
      route: 'intravenous-peripheral',
      lines: { 'dextrose-monohydrate': '12.51 %' },
      patient: { ageYears: 0.01 },
    },
    { lines: { 'dextrose-monohydrate': '12.5 %' } },
  ],
  [
    'bicarbonate-for-an-infant',
    {
      route: 'intravenous-central',
      lines: { 'sodium-bicarbonate': '4.21 %' },
      patient: { ageYears: 0.5 },
    },
    { lines: { 'sodium-bicarbonate': '4.2 %' } },
  ],
  [
    'mannitol-crystallises',
    { route: 'intravenous-central', lines: { mannitol: '15 %' } },
    { lines: { mannitol: '14.99 %' } },
  ],
  [
    'concentrated-osmolarity-and-osmolality',
    { lines: { mannitol: '5.01 %' } },
    { lines: { mannitol: '5 %' } },
  ],
]

export const pHCases: readonly Case[] = [
  ['ph-into-a-vein-extreme', { route: 'intravenous-central', pH: 1.99 }, { pH: 2 }],
  ['ph-into-a-vein', { route: 'intravenous-peripheral', pH: 9.01 }, { pH: 9 }],
  ['ph-into-tissue', { route: 'intramuscular', pH: 3.99 }, { pH: 4 }],
  ['ph-near-the-spinal-cord', { route: 'epidural', pH: 4.99 }, { pH: 5 }],
  ['ph-inside-the-eye', { route: 'intracameral', pH: 6.79 }, { pH: 6.8 }],
  ['ph-far-off-inside-the-eye', { route: 'intracameral', pH: 8.51 }, { pH: 8.5 }],
  ['ph-of-eye-drops', { pH: 4.49 }, { pH: 4.5 }],
  ['ph-of-eye-drops-uncomfortable', { pH: 6.49 }, { pH: 6.5 }],
  ['ph-in-the-nose', { route: 'nasal', pH: 7.51 }, { pH: 7.5 }],
  ['ph-of-an-inhaled-mist', { route: 'inhaled', pH: 3.99 }, { pH: 4 }],
  ['ph-of-an-eye-wash', { route: 'ophthalmic-irrigation', pH: 6.49 }, { pH: 6.5 }],
  ['ph-on-other-routes', { route: 'enteral', pH: 2.99 }, { pH: 3 }],
  [
    'phosphate-under-the-skin',
    { route: 'subcutaneous', lines: { 'sodium-phosphate-monobasic-monohydrate': '10.01 mmol/L' }, pH: 6 },
    { lines: { 'sodium-phosphate-monobasic-monohydrate': '10 mmol/L' } },
  ],
  [
    'citrate-under-the-skin',
    { route: 'subcutaneous', lines: { 'sodium-citrate-dihydrate': '8 mmol/L' }, pH: 6.99 },
    { pH: 7 },
  ],
  ['weak-buffer-capacity', { lines: { 'boric-acid': '1 %' }, capacity: 0.0099 }, { capacity: 0.01 }],
  [
    'buffer-moves-with-temperature',
    { lines: { tromethamine: '20 mmol/L' } },
    { lines: { 'boric-acid': '1 %' } },
  ],
  [
    'borate-buffer-diluted',
    { lines: { 'boric-acid': '1 %', 'sodium-borate-decahydrate': '0.2 %' } },
    { lines: { 'boric-acid': '1 %' } },
  ],
  ['acid-or-base-of-known-normality', { lines: { 'sodium-hydroxide': '1 mmol/L' } }, { lines: saline }],
]
