import { loadConventions } from '../library/conventions.ts'
import type { Library } from '../library/library.ts'
import type { Ingredient } from '../library/types.ts'
import { quick, readingOf, solve } from './model.ts'

export interface CurveAt {
  /** % w/v. */
  readonly percent: number
  readonly milliosmPerKg: number
}

const percents = [0.1, 0.25, 0.5, 1, 1.5, 2, 3, 4, 5, 7, 10] as const
const highest = 1500

/** What an ingredient alone in water reads on an osmometer, against its strength; points without an answer are left out. */
export function osmoticCurve(ingredient: Ingredient, library: Library): readonly CurveAt[] {
  const conventions = loadConventions()
  const setting = { volumeMl: 1000, pH: 'solve', temperatureCelsius: 25 } as const
  return percents.flatMap((percent) => {
    const result = solve([{ key: 'alone', ingredient, grams: percent * 10 }], setting, library, quick)
    if (result.status === 'refused') return []
    const milliosmPerKg = readingOf(result.state, conventions)
    return milliosmPerKg <= highest ? [{ percent, milliosmPerKg }] : []
  })
}
