import { loadConventions } from '../library/conventions.ts'
import type { Library } from '../library/library.ts'
import { sodiumChlorideScale, type SodiumChlorideScale } from './methods/scale.ts'
import { quick, readingOf, solve } from './model.ts'

const scales = new WeakMap<Library, SodiumChlorideScale>()

const litre = { volumeMl: 1000, pH: 7, temperatureCelsius: 25 } as const

/** The sodium chloride scale of a library, made once from its own model. */
export function scaleOf(library: Library): SodiumChlorideScale {
  const known = scales.get(library)
  if (known) return known
  const made = makeScale(library)
  scales.set(library, made)
  return made
}

function makeScale(library: Library): SodiumChlorideScale {
  const salt = library.ingredients.get('sodium-chloride')
  if (!salt?.molarMass) throw new Error('The library has no sodium chloride with a molar mass')
  const conventions = loadConventions()
  return sodiumChlorideScale(salt.molarMass.value, (percent) => {
    if (percent === 0) return 0
    const portion = { key: 'yardstick', ingredient: salt, grams: percent * 10 }
    const result = solve([portion], litre, library, quick)
    return result.status === 'solved' ? readingOf(result.state, conventions) : null
  })
}
