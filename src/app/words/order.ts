import type { RouteId, TargetQuantity } from '../../formula/types.ts'

/** Where the tolerated span lies, for "tolerated …". */
export const toleratedWords: Readonly<Record<RouteId, string>> = {
  ophthalmic: 'by the eye',
  'ophthalmic-irrigation': 'by the rinsed eye',
  intracameral: 'in the anterior chamber',
  intravitreal: 'in the vitreous',
  nasal: 'by the nose',
  otic: 'by the ear',
  inhaled: 'by the airways',
  'intravenous-peripheral': 'by a peripheral vein',
  'intravenous-central': 'by a central vein',
  intramuscular: 'by a muscle',
  subcutaneous: 'under the skin',
  intrathecal: 'in the cerebrospinal fluid',
  epidural: 'in the epidural space',
  irrigation: 'by irrigated tissue',
  enteral: 'by the gut',
}

export const targetChoices = [
  'osmolality',
  'effective-osmolality',
  'sodium-chloride-equivalent',
  'freezing-point-depression',
  'none',
] as const satisfies readonly (TargetQuantity | 'none')[]

export type TargetChoice = (typeof targetChoices)[number]

export const quantityWords: Readonly<Record<TargetChoice, string>> = {
  osmolality: 'its osmolality',
  'effective-osmolality': 'its effective osmolality',
  'sodium-chloride-equivalent': 'its sodium chloride equivalent',
  'freezing-point-depression': 'its freezing-point depression',
  none: 'nothing to a target',
}

/** What the trade calls isotonic, in each quantity: written into the order when the quantity is chosen. */
export const usualTarget: Readonly<Record<TargetQuantity, string>> = {
  osmolality: '290 mOsm/kg',
  'effective-osmolality': '290 mOsm/kg',
  'sodium-chloride-equivalent': '0.9 %',
  'freezing-point-depression': '0.52 K',
}
