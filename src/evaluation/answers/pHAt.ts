import type { SolutionState } from '../../chemistry/types.ts'

const coldest = 0
const hottest = 40

/**
 * pH at a temperature from those at 5, 25 and 37 °C: the parabola through the three, 0 to 40 °C. Null outside, or
 * where the pH is not known.
 *
 * @example pHAt for 7.4, 7.0, 6.76 at 20 °C → 7.1
 */
export function pHAt(celsius: number, { states }: Pick<SolutionState, 'states'>): number | null {
  const points = [states['5'], states['25'], states['37']].map((state) => [state.celsius, state.pH] as const)
  let sum = 0
  for (const [index, [at, value]] of points.entries()) {
    if (value === null) return null
    if (at === celsius) return value
    let weight = 1
    for (const [other, [elsewhere]] of points.entries()) {
      if (other !== index) weight *= (celsius - elsewhere) / (at - elsewhere)
    }
    sum += weight * value
  }
  return celsius < coldest || celsius > hottest ? null : sum
}
