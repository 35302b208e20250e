import { movableMixture } from '../chemistry/solution.ts'
import { osmolalityWithErrors } from '../chemistry/mixture/thermal.ts'
import type { Library } from '../library/library.ts'
import { compositionOf } from './model.ts'
import type { Evaluation } from './types.ts'

/** The headline as a function of standard normal deviates, one for each uncertain input. */
export interface HeadlineSampler {
  readonly inputs: readonly string[]
  /** mOsm/kg. */
  readonly evaluate: (deviates: Float64Array) => number
}

/**
 * A sampler of the evaluated formula: the mixture at freezing is solved again with an error in each curve, in the
 * model of the pool, in each weighing, in the water and in the filled volume. Null where the model gave no headline.
 */
export function headlineSampler(evaluation: Evaluation, library: Library): HeadlineSampler | null {
  const { solution, volumeMl, uncertainty, lines, formula } = evaluation
  if (!solution || volumeMl === null || evaluation.headline !== 'electrolyte') return null
  const portions = lines.flatMap(({ key, ingredient, grams }) =>
    grams === null ? [] : [{ key, ingredient, grams }],
  )
  const setting = { volumeMl, pH: formula.pH ?? ('solve' as const), temperatureCelsius: 25 }
  const movable = movableMixture(compositionOf(portions, setting), library)
  if (!movable) return null
  const pool = movable.solutes.filter(({ kind }) => kind === 'pool').map(({ key }) => key)
  const shareOf = new Map(lines.map((line) => [line.key, line.osmolalityShareMilliosmPerKg ?? 0]))
  const inPool = pool.reduce((sum, key) => sum + (shareOf.get(key) ?? 0), 0)
  const poolShares = new Map(pool.map((key) => [key, inPool > 0 ? (shareOf.get(key) ?? 0) / inPool : 0]))
  // The reading lies beside the osmolality at 0 °C by the same factor for every draw.
  const scale = solution.osmolality.value / movable.mixture.osmolalityOsmPerKg
  return {
    inputs: uncertainty.map(({ input }) => input),
    evaluate(deviates) {
      const curve = new Map<string, number>()
      const amount = new Map<string, number>()
      let everyAmount = 1
      let ofPool = 1
      uncertainty.forEach(({ kind, key, relative }, index) => {
        const factor = Math.exp(relative * (deviates[index] ?? 0))
        if (kind === 'curve') curve.set(key, factor)
        else if (kind === 'amount') amount.set(key, factor)
        else if (kind === 'pool') ofPool = factor
        else everyAmount *= factor
      })
      return scale * osmolalityWithErrors(movable, { curve, amount, everyAmount, pool: ofPool, poolShares })
    },
  }
}
