import { describe, expect, it } from 'vitest'
import { roundStep, spanScale, zeroScale } from '../../../src/app/axis/scale.ts'

describe('an axis', () => {
  it('steps by 1, 2 or 5 times a power of ten', () => {
    expect([0.013, 0.2, 3, 41, 70, 100].map(roundStep)).toEqual([0.02, 0.2, 5, 50, 100, 100])
  })

  it('starts at zero, ends beyond what it must reach, and places values in proportion', () => {
    const scale = zeroScale(300, 0, 600)
    expect(scale.ticks[0]).toBe(0)
    expect(scale.maximum).toBeGreaterThan(300)
    expect(scale.place(0)).toBe(0)
    expect(scale.place(scale.maximum)).toBe(600)
    expect(scale.place(scale.maximum / 2)).toBeCloseTo(300, 9)
  })

  it('puts what lies beyond an end at the end', () => {
    const scale = spanScale(0.3, 0.5, 10, 110)
    expect(scale.place(0.1)).toBe(10)
    expect(scale.place(9)).toBe(110)
  })

  it('has ticks inside the span only, and none that carries a rounding tail', () => {
    const scale = spanScale(0.31, 0.52, 0, 400)
    expect(scale.ticks.length).toBeGreaterThan(1)
    for (const tick of scale.ticks) {
      expect(tick).toBeGreaterThanOrEqual(0.31)
      expect(tick).toBeLessThanOrEqual(0.52)
      expect(String(tick).length).toBeLessThan(6)
    }
  })

  it('survives a span of no width', () => {
    expect(Number.isFinite(spanScale(2, 2, 0, 100).place(2))).toBe(true)
  })
})
