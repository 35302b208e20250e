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

const notSterile: ReadonlySet<RouteId> = new Set(['nasal', 'otic', 'enteral'])

/** Routes whose preparations are sterile; the others follow their monograph or local policy. */
export const sterileRoutes: ReadonlySet<RouteId> = new Set(
  (Object.keys(routeNames) as RouteId[]).filter((route) => !notSterile.has(route)),
)
