import { assert, double, property } from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Scale } from '../../../src/evaluation/weighing/scales.ts'
import { designTrituration } from '../../../src/evaluation/weighing/trituration.ts'
import { evaluated, line } from '../formulas.ts'

const prescription: Scale = {
  name: 'prescription',
  readabilityG: 0.001,
  leastWeighableG: 0.12,
  dilutedBelowG: 0.12,
  errorG: 0.006,
  basis: 'sensitivity',
  capacityG: 120,
}

describe('trituration', () => {
  it('gives the published solid aliquots', () => {
    // W87: 4 mg, weigh 120 mg, mixture 3600 mg, portion 120 mg (multiple 30).
    const atropine = designTrituration(0.004, prescription, 50)
    expect(atropine?.steps).toEqual([{ weighGrams: 0.12, diluentGrams: 3.48, portionGrams: 0.12 }])
    expect(atropine?.doseGrams).toBeCloseTo(0.004, 12)
    // W59: 10 mg a dose, least 120 mg: 12 doses, diluent 1320 mg.
    expect(designTrituration(0.01, prescription, 50)?.steps[0]?.diluentGrams).toBeCloseTo(1.32, 12)
  })

  it('adds the errors of its weighings by root sum of squares', () => {
    expect(designTrituration(0.004, prescription, 50)?.errorPercent).toBeCloseTo(
      100 * Math.hypot(0.05, 0.05),
      9,
    )
  })

  it('takes a second step for a very small dose and never a third', () => {
    expect(designTrituration(0.0002, prescription, 50)?.steps).toHaveLength(2)
    expect(designTrituration(0.00001, prescription, 50)).toBeNull()
  })

  it('weighs nothing below the least weighable mass by more than a step, and delivers the dose', () => {
    assert(
      property(double({ min: 0.00006, max: 0.119, noNaN: true }), (needed) => {
        const plan = designTrituration(needed, prescription, 50)
        if (!plan) return
        for (const { weighGrams, portionGrams } of plan.steps) {
          expect(Math.min(weighGrams, portionGrams)).toBeGreaterThan(0.12 - 0.0021)
        }
        expect(Math.abs(plan.doseGrams / needed - 1)).toBeLessThan(0.01)
      }),
      { numRuns: 300 },
    )
  })

  it('is used where no dilution fits into the batch, with the heaviest solid as diluent', () => {
    const { weighingPlan, findings } = evaluated(
      [line('atropine-sulfate-monohydrate', '4 mg'), line('mannitol', '0.4 g')],
      { finalVolume: '5 mL', bench: { balances: [{ name: 'own', readability: '0.1 mg' }] } },
    )
    const trituration = weighingPlan?.lines[0]?.trituration
    expect(trituration?.diluentKey).toBe('line-2')
    expect(trituration?.doseGrams).toBeCloseTo(0.004, 5)
    expect(findings.map(({ code }) => code)).toContain('measured-by-trituration')
  })
})
