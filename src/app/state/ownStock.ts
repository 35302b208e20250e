import type { Library } from '../../library/library.ts'
import { ingredientIdOf } from '../../library/ingredients.ts'
import type { Stock } from '../../library/stocks.ts'
import { typedNumber } from '../words/typed.ts'

export type OwnStock =
  { readonly ok: true; readonly stock: Stock } | { readonly ok: false; readonly refusal: string }

/** A solution as typed, made a record; every row must name an ingredient of the library exactly. */
export function ownStock(
  name: string,
  rows: readonly { readonly name: string; readonly grams: string }[],
  fills: boolean,
  idOf: (text: string) => string | null,
  library: Library,
): OwnStock {
  const title = name.trim()
  const id = ingredientIdOf(title)
  if (title === '' || id === '') return { ok: false, refusal: 'Give the solution a name.' }
  if (library.stocks.has(id) || library.ingredients.has(id))
    return { ok: false, refusal: 'The library has that name already; write another.' }
  const contains: Stock['contains'][number][] = []
  for (const row of rows) {
    if (row.name.trim() === '' && row.grams.trim() === '') continue
    const ingredient = idOf(row.name)
    if (ingredient === null || !library.ingredients.has(ingredient))
      return { ok: false, refusal: `“${row.name}” is no ingredient of the library; write its name in full.` }
    const grams = typedNumber(row.grams, 0.000_01, 2000)
    if (grams === null) return { ok: false, refusal: `Write the strength of ${row.name} as a number of g/L.` }
    contains.push({
      ingredient,
      gramsPerLitre: {
        value: grams,
        unit: 'g/L',
        kind: 'measured',
        source: 'own-entry',
        confidence: 'low',
        fromMemory: false,
      },
    })
  }
  if (contains.length === 0) return { ok: false, refusal: 'Say what the solution holds.' }
  return {
    ok: true,
    stock: { id, name: title, synonyms: [], use: fills ? 'vehicle' : 'concentrate', contains },
  }
}
