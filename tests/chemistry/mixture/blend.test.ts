import { describe, expect, it } from 'vitest'
import { blend } from '../../../src/chemistry/mixture/blend.ts'

const straight = (osmolality: number) => ({ shareAt: (at: number) => osmolality / at })

describe('equal water activity', () => {
  it('adds straight curves: 0.1, 0.05 and 0.14 give 0.29', () => {
    const blended = blend([straight(0.1), straight(0.05), straight(0.14)], 0.3)
    expect(blended).toMatchObject({ status: 'blended' })
    expect(blended.status === 'blended' ? blended.osmolalityOsmPerKg : NaN).toBeCloseTo(0.29, 12)
  })

  it('finds its root from any guess', () => {
    for (const guess of [1e-9, 0.01, 1, 1e6]) {
      const blended = blend([straight(0.29)], guess)
      expect(blended.status === 'blended' ? blended.osmolalityOsmPerKg : NaN).toBeCloseTo(0.29, 11)
    }
  })

  it('of nothing is nothing, and a member without an answer is said', () => {
    expect(blend([], 0)).toEqual({ status: 'blended', osmolalityOsmPerKg: 0 })
    expect(blend([{ shareAt: () => NaN }], 1)).toEqual({ status: 'not-converged' })
  })
})
