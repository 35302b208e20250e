import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findRoot } from '../../src/numeric/roots.ts'

describe('a bracketed root', () => {
  it('is found', () => {
    const found = findRoot((x) => x * x - 2, 0, 2)
    expect(found.status === 'converged' && found.root).toBeCloseTo(Math.SQRT2, 12)
  })

  it('is found where a secant would creep: a step, a pole of curvature, a flat foot', () => {
    for (const [f, root] of [
      [(x: number) => Math.tanh(1e6 * (x - 0.3)), 0.3],
      [(x: number) => (x - 0.7) ** 9, 0.7],
      [(x: number) => Math.exp(40 * x) - Math.exp(36), 0.9],
    ] as const) {
      const found = findRoot(f, 0, 1, { relativeTolerance: 1e-9 })
      expect(found.status === 'converged' && found.root).toBeCloseTo(root, 6)
    }
  })

  it('says why there is none', () => {
    expect(findRoot((x) => x * x + 1, -1, 1)).toEqual({ status: 'no-bracket', atLow: 2, atHigh: 2 })
    expect(findRoot((x) => 1 / (x - 0.5) / 0, 0, 1).status).toBe('not-finite')
    expect(findRoot(Math.cos, 0, 3, { maximumIterations: 1 }).status).toBe('not-converged')
  })

  it('lies in the bracket and is a root, for any cubic with one', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -5, max: 5, noNaN: true }),
        fc.double({ min: 0.1, max: 3, noNaN: true }),
        (root, k) => {
          const found = findRoot((x) => k * (x - root) + (x - root) ** 3, root - 3.1, root + 7.7)
          expect(found.status === 'converged' && Math.abs(found.root - root)).toBeLessThan(1e-9)
        },
      ),
      { numRuns: 200 },
    )
  })
})
