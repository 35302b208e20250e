import type { Coefficient } from '../../library/electrolytes.ts'

/**
 * p(t) = p₂₅ + p′·(t − 25) + p″·(t − 25)².
 * @example atCelsius({ at25: 1, perK: 0.01, perK2: 0 }, 0) → 0.75
 */
export function atCelsius({ at25, perK, perK2 }: Coefficient, celsius: number): number {
  const difference = celsius - 25
  return at25 + difference * (perK + difference * perK2)
}
