import { loadMoieties } from './forms.ts'
import { loadIngredients } from './ingredients.ts'
import { keyed } from './keyed.ts'
import type { Library } from './library.ts'
import { loadStocks } from './stocks.ts'

/** What a hand needs before anything is calculated: what can be put on a line. */
export type LibraryOpening = Pick<Library, 'ingredients' | 'moieties' | 'stocks'>

let opened: LibraryOpening | undefined

/** The opening of the library, validated once and kept; the whole library shares it. */
export function loadOpening(): LibraryOpening {
  opened ??= {
    ingredients: keyed(loadIngredients(), ({ id }) => id),
    moieties: loadMoieties(),
    stocks: keyed(loadStocks(), ({ id }) => id),
  }
  return opened
}

/**
 * The library while all but its opening is still on the way. What is not here yet is refused with an error, never
 * answered as empty: a caution that is missing is not a caution that does not speak.
 */
export function openingOnly(): Library {
  return new Proxy(loadOpening() as Library, {
    get(opening, name) {
      if (typeof name === 'symbol' || name in opening) return Reflect.get(opening, name) as unknown
      throw new Error(`The part "${name}" of the library is still being loaded.`)
    },
  })
}
