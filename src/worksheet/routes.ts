import type { RouteId } from '../formula/types.ts'

/** Routes in words, as they stand on the sheet. */
export const routeNames: Readonly<Record<RouteId, string>> = {
  ophthalmic: 'for the eye',
  'ophthalmic-irrigation': 'to rinse the eye',
  intracameral: 'into the anterior chamber of the eye',
  intravitreal: 'into the vitreous of the eye',
  nasal: 'for the nose',
  otic: 'for the ear',
  inhaled: 'to be nebulised and inhaled',
  'intravenous-peripheral': 'into a peripheral vein',
  'intravenous-central': 'into a central vein',
  intramuscular: 'into a muscle',
  subcutaneous: 'under the skin',
  intrathecal: 'into the cerebrospinal fluid, intrathecal',
  epidural: 'into the epidural space',
  irrigation: 'to irrigate a body cavity or wound',
  enteral: 'by mouth or feeding tube',
}

/** Dosage forms of a solution by its route. */
export const dosageForms: Readonly<Record<RouteId, string>> = {
  ophthalmic: 'solution, eye drops',
  'ophthalmic-irrigation': 'solution, eye rinse',
  intracameral: 'solution for injection into the eye',
  intravitreal: 'solution for injection into the eye',
  nasal: 'solution, nasal drops or spray',
  otic: 'solution, ear drops',
  inhaled: 'solution for a nebuliser',
  'intravenous-peripheral': 'solution for infusion or injection',
  'intravenous-central': 'solution for infusion or injection',
  intramuscular: 'solution for injection',
  subcutaneous: 'solution for injection',
  intrathecal: 'solution for injection',
  epidural: 'solution for injection',
  irrigation: 'solution for irrigation',
  enteral: 'solution to be swallowed or given by tube',
}

const notSterile: ReadonlySet<RouteId> = new Set(['nasal', 'otic', 'enteral'])

/** Routes whose preparations are sterile; the others follow their monograph or local policy. */
export const sterileRoutes: ReadonlySet<RouteId> = new Set(
  (Object.keys(routeNames) as RouteId[]).filter((route) => !notSterile.has(route)),
)

export const eyeRoutes: ReadonlySet<RouteId> = new Set([
  'ophthalmic',
  'ophthalmic-irrigation',
  'intracameral',
  'intravitreal',
])

export const veinRoutes: ReadonlySet<RouteId> = new Set(['intravenous-peripheral', 'intravenous-central'])
