import cautions from '../../data/sources/cautions.json'
import conventions from '../../data/sources/conventions.json'
import curves from '../../data/sources/curves.json'
import devices from '../../data/sources/devices.json'
import electrolytes from '../../data/sources/electrolytes.json'
import equilibria from '../../data/sources/equilibria.json'
import general from '../../data/sources/general.json'
import ingredients from '../../data/sources/ingredients.json'
import routes from '../../data/sources/routes.json'
import { checked } from './checked.ts'
import { sourcesSchema } from './schema.ts'
import type { Source } from './types.ts'

export const sourceFiles: Readonly<Record<string, unknown>> = {
  cautions,
  conventions,
  curves,
  devices,
  electrolytes,
  equilibria,
  general,
  ingredients,
  routes,
}

/** All sources by key. The same key may stand in two files only with the same words. */
export function loadSources(): ReadonlyMap<string, Source> {
  const byKey = new Map<string, Source>()
  for (const [file, content] of Object.entries(sourceFiles)) {
    for (const source of checked(sourcesSchema, content, `sources/${file}`)) {
      const earlier = byKey.get(source.key)
      if (earlier && (earlier.title !== source.title || earlier.kind !== source.kind)) {
        throw new Error(`data/sources/${file}.json: ${source.key} is already another source`)
      }
      byKey.set(source.key, source)
    }
  }
  return byKey
}
