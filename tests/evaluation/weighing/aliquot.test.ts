import { assert, double, property } from 'fast-check'
import { describe, expect, it } from 'vitest'
import { designAliquot, leastWeighable } from '../../../src/evaluation/weighing/aliquot.ts'
import { measureOf } from '../../../src/evaluation/weighing/measures.ts'
import { loadDevices } from '../../../src/library/devices.ts'

const devices = loadDevices().map(measureOf)
const need = { neededGrams: 0.004, leastWeighableGrams: 0.12, weighingErrorGrams: 0.006, roomMl: 50 }

describe('least weighable quantity', () => {
  it('follows from sensitivity and allowed error', () => {
    // Class III balance, 6 mg at 5 %: Ansel/Stoklosa practice problem, from memory; at 1 %: public course text.
    expect(leastWeighable(0.006, 5)).toBeCloseTo(0.12, 12)
    expect(leastWeighable(0.006, 1)).toBeCloseTo(0.6, 12)
  })
})

describe('aliquot', () => {
  it('weighs a sensible multiple in small vessels', () => {
    const plan = designAliquot(need, devices)
    expect(plan?.weighGrams).toBeCloseTo(0.2, 12)
    expect(plan?.multiple).toBe(50)
    expect(plan?.steps.map(({ flaskMl, drawMl }) => [flaskMl, drawMl])).toEqual([[50, 1]])
  })

  it('adds the errors by root sum of squares', () => {
    const plan = designAliquot(need, devices)
    // 6 mg of 200 mg, 0.05 mL of 50 mL, 0.006 mL of 1 mL.
    expect(plan?.errorPercent).toBeCloseTo(100 * Math.hypot(0.03, 0.001, 0.006), 9)
  })

  it('needs a second dilution for a very small dose and never a third', () => {
    expect(designAliquot({ ...need, neededGrams: 1e-6 }, devices)?.steps).toHaveLength(2)
    expect(designAliquot({ ...need, neededGrams: 1e-9 }, devices)).toBeNull()
  })

  it('keeps its diluent within the room that the preparation leaves', () => {
    expect(designAliquot({ ...need, roomMl: 0.5 }, devices)).toBeNull()
  })

  it('delivers the needed mass, weighs enough, and measures no vessel below its smallest volume', () => {
    assert(
      property(
        double({ min: 1e-6, max: 0.119, noNaN: true }),
        double({ min: 1, max: 1000, noNaN: true }),
        (neededGrams, roomMl) => {
          const plan = designAliquot({ ...need, neededGrams, roomMl }, devices)
          if (!plan) return
          const delivered = plan.steps.reduce(
            (mass, step) => (mass * step.drawMl) / step.flaskMl,
            plan.weighGrams,
          )
          expect(Math.abs(delivered / neededGrams - 1)).toBeLessThan(1e-12)
          expect(plan.weighGrams).toBeGreaterThanOrEqual(need.leastWeighableGrams * (1 - 1e-12))
          expect(plan.carriedMl).toBeLessThanOrEqual(roomMl)
        },
      ),
      { numRuns: 200 },
    )
  })
})
