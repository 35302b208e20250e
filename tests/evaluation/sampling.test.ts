import { describe, expect, it } from 'vitest'
import { seededUniform } from '../../src/numeric/random.ts'
import { startSampling } from '../../src/numeric/sample.ts'
import { headlineSampler } from '../../src/evaluation/sampling.ts'
import { evaluated, library, line } from './formulas.ts'

const formulas = {
  saline: [line('sodium-chloride', '0.9 %')],
  'a drug known by its table, and salt': [
    line('pilocarpine-hydrochloride', '2 %'),
    line('sodium-chloride', '0.4 %'),
  ],
  'a drug known by its class only': [
    line('brimonidine-tartrate', '3 %'),
    line('dextrose-monohydrate', '2 %'),
  ],
  'weighed in tenths of a gram': [
    line('potassium-chloride', '0.4 %'),
    line('mannitol', '2 %'),
    line('boric-acid', '0.5 %'),
  ],
}

describe('10,000 draws', () => {
  for (const [name, lines] of Object.entries(formulas)) {
    it(`agree with the propagated interval: ${name}`, () => {
      const evaluation = evaluated(lines, { balance: '100 mg' })
      const sampler = headlineSampler(evaluation, library)
      if (!sampler || !evaluation.solution) throw new Error('no sampler')
      const { value, standardUncertainty } = evaluation.solution.osmolality
      const sampling = startSampling(sampler.inputs.length, sampler.evaluate, seededUniform(11))
      sampling.step(10_000)
      const result = sampling.result()
      expect(result?.mean).toBeGreaterThan(value - 0.1 * standardUncertainty - 0.002 * value)
      expect(result?.mean).toBeLessThan(value + 0.1 * standardUncertainty + 0.002 * value)
      expect((result?.standardDeviation ?? 0) / standardUncertainty).toBeGreaterThan(0.93)
      expect((result?.standardDeviation ?? 0) / standardUncertainty).toBeLessThan(1.07)
    })
  }

  it('without an error give the headline itself', () => {
    const evaluation = evaluated(formulas['a drug known by its table, and salt'])
    const sampler = headlineSampler(evaluation, library)
    const at = sampler?.evaluate(new Float64Array(sampler.inputs.length))
    expect(at).toBeCloseTo(evaluation.solution?.osmolality.value ?? Number.NaN, 6)
  })
})
