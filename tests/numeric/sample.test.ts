import { describe, expect, it } from 'vitest'
import { seededUniform } from '../../src/numeric/random.ts'
import { quantile, startSampling } from '../../src/numeric/sample.ts'

describe('the seeded generator', () => {
  it('repeats itself from the same seed and not from another', () => {
    expect(seededUniform(1)()).toBe(seededUniform(1)())
    expect(seededUniform(1)()).not.toBe(seededUniform(2)())
  })

  it('is uniform: mean, variance and serial correlation of 100,000 draws', () => {
    const uniform = seededUniform(7)
    const draws = Array.from({ length: 100_000 }, uniform)
    const mean = draws.reduce((sum, draw) => sum + draw, 0) / draws.length
    const variance = draws.reduce((sum, draw) => sum + (draw - mean) ** 2, 0) / draws.length
    const serial = draws
      .slice(1)
      .reduce((sum, draw, at) => sum + (draw - mean) * ((draws[at] ?? 0) - mean), 0)
    expect(mean).toBeCloseTo(0.5, 2)
    expect(variance).toBeCloseTo(1 / 12, 2)
    expect(Math.abs(serial / draws.length / variance)).toBeLessThan(0.01)
    expect(draws.every((draw) => draw > 0 && draw < 1)).toBe(true)
  })
})

describe('sampling', () => {
  it('brings back the spread of a linear answer', () => {
    const sampling = startSampling(3, (z) => 10 + 3 * (z[0] ?? 0) + 4 * (z[1] ?? 0), seededUniform(3))
    expect(sampling.result()).toBeNull()
    sampling.step(20_000)
    const result = sampling.result()
    expect(sampling.done).toBe(20_000)
    expect(result?.mean).toBeCloseTo(10, 0)
    expect(result?.standardDeviation).toBeCloseTo(5, 0)
    expect(result?.low).toBeCloseTo(10 - 1.96 * 5, 0)
    expect(result?.high).toBeCloseTo(10 + 1.96 * 5, 0)
  })

  it('refuses an answer that is not finite', () => {
    expect(() => startSampling(1, () => Number.NaN, seededUniform(1)).step(1)).toThrow(RangeError)
  })

  it('takes quantiles between order statistics', () => {
    expect(quantile(Float64Array.of(1, 2, 3), 0.5)).toBe(2)
    expect(quantile(Float64Array.of(1, 2), 0.25)).toBe(1.25)
  })
})
