import { describe, expect, it } from 'vitest'
import { codesOf, evaluated, line, ownIngredient, solved } from './formulas.ts'

const pilocarpine = line('pilocarpine-hydrochloride', '1 %')
const salt = line('sodium-chloride', 'q.s.')
const target = (quantity: 'osmolality' | 'effective-osmolality', value: string) => ({
  target: { quantity, value },
})

describe('sizing to a target', () => {
  it('meets an osmolality', () => {
    const evaluation = evaluated([pilocarpine, salt], target('osmolality', '290 mOsm/kg'))
    expect(evaluation.adjuster?.status).toBe('found')
    expect(solved(evaluation).osmolality.value).toBeCloseTo(290, 6)
    expect(evaluation.lines[1]?.grams).toBeGreaterThan(0.5)
  })

  it('meets a sodium chloride equivalent and a freezing-point depression', () => {
    const byPercent = evaluated([pilocarpine, salt], {
      target: { quantity: 'sodium-chloride-equivalent', value: '0.9 %' },
    })
    expect(solved(byPercent).sodiumChlorideEquivalentPercent).toBeCloseTo(0.9, 6)
    const byDepression = evaluated([pilocarpine, salt], {
      target: { quantity: 'freezing-point-depression', value: '0.52 K' },
    })
    expect(solved(byDepression).freezingPointDepressionK).toBeCloseTo(0.52, 8)
  })

  it('meets an effective osmolality beside a solute that enters cells', () => {
    const evaluation = evaluated([line('urea', '1 %'), salt], target('effective-osmolality', '290 mOsm/kg'))
    expect(solved(evaluation).effectiveOsmolality.value).toBeCloseTo(290, 6)
    expect(solved(evaluation).osmolality.value).toBeGreaterThan(400)
  })

  it('evaluates the rounded mass, which stays within one step of the target', () => {
    const evaluation = evaluated([pilocarpine, salt], {
      ...target('osmolality', '290 mOsm/kg'),
      balance: '10 mg',
    })
    const grams = evaluation.lines[1]?.grams ?? 0
    expect(Math.abs(grams * 100 - Math.round(grams * 100))).toBeLessThan(1e-9)
    expect(Math.abs(solved(evaluation).osmolality.value - 290)).toBeLessThan(1.7)
    expect(solved(evaluation).osmolality.value).not.toBeCloseTo(290, 6)
  })

  it('sizes two adjusters in their mass ratio', () => {
    const evaluation = evaluated(
      [pilocarpine, { ...salt, share: 1 }, { ...line('mannitol', 'q.s.'), share: 3 }],
      target('osmolality', '290 mOsm/kg'),
    )
    const [, first, second] = evaluation.lines
    expect((second?.grams ?? 0) / (first?.grams ?? 1)).toBeCloseTo(3, 9)
    expect(solved(evaluation).osmolality.value).toBeCloseTo(290, 6)
  })

  it('keeps one at its cap and lets the other take the rest', () => {
    const evaluation = evaluated(
      [pilocarpine, { ...salt, cap: '0.2 %' }, line('mannitol', 'q.s.')],
      target('osmolality', '290 mOsm/kg'),
    )
    expect(evaluation.lines[1]?.grams).toBeCloseTo(0.2, 12)
    expect(solved(evaluation).osmolality.value).toBeCloseTo(290, 6)
    expect(codesOf(evaluation)).toContain('adjuster-at-its-cap')
  })

  it('settles beside an amount per kilogram of water', () => {
    const evaluation = evaluated(
      [line('potassium-chloride', '0.02 mol/kg'), salt],
      target('osmolality', '290 mOsm/kg'),
    )
    expect(solved(evaluation).osmolality.value).toBeCloseTo(290, 5)
  })
})

describe('ways of not finding it, each with its way out', () => {
  it('already above: the strength that fits and the dilution', () => {
    const evaluation = evaluated([line('mannitol', '10 %'), salt], target('osmolality', '290 mOsm/kg'))
    expect(evaluation.adjuster?.status).toBe('already-above')
    expect(codesOf(evaluation)).toContain('target-already-passed')
    const fraction = evaluation.adjuster?.largestFractionThatFits ?? 0
    expect(fraction).toBeLessThan(0.6)
    const fitting = evaluated([line('mannitol', `${(fraction * 10).toFixed(9)} %`)])
    expect(solved(fitting).osmolality.value).toBeCloseTo(290, 4)
    const diluted = evaluated([line('mannitol', '10 g')], {
      finalVolume: `${(evaluation.adjuster?.dilutionToVolumeMl ?? 0).toFixed(8)} mL`,
    })
    expect(solved(diluted).osmolality.value).toBeCloseTo(290, 4)
  })

  it('out of reach of its cap', () => {
    const evaluation = evaluated(
      [pilocarpine, { ...salt, cap: '0.1 %' }],
      target('osmolality', '290 mOsm/kg'),
    )
    expect(evaluation.adjuster?.status).toBe('unreachable')
    expect(codesOf(evaluation)).toContain('target-out-of-reach-of-cap')
    expect(evaluation.status).toBe('blocked')
  })

  it('out of reach of the volume', () => {
    const evaluation = evaluated(
      [line('edetate-disodium-dihydrate', 'q.s.')],
      target('osmolality', '9000 mOsm/kg'),
    )
    expect(evaluation.adjuster?.status).toBe('unreachable')
    expect(codesOf(evaluation)).toContain('target-out-of-reach')
  })

  it('unknown: nothing tells its osmotic effect', () => {
    const unknown = ownIngredient({ name: 'Unknown powder' })
    const evaluation = evaluated([pilocarpine, line(unknown, 'q.s.')], target('osmolality', '290 mOsm/kg'))
    expect(evaluation.adjuster?.status).toBe('cannot-size')
    expect(codesOf(evaluation)).toContain('adjuster-cannot-be-sized')
  })

  it('does not count: it enters cells and the target is effective', () => {
    const evaluation = evaluated(
      [pilocarpine, line('urea', 'q.s.')],
      target('effective-osmolality', '290 mOsm/kg'),
    )
    expect(evaluation.adjuster?.status).toBe('cannot-size')
    expect(codesOf(evaluation)).toContain('adjuster-does-not-count')
  })
})

describe('what each method would weigh', () => {
  it('answers by its own convention, and all near each other for a saline-like solution', () => {
    const { methods } = evaluated([pilocarpine, salt], {
      target: { quantity: 'sodium-chloride-equivalent', value: '0.9 %' },
    })
    const gramsOf = (id: string) => methods.find(({ method }) => method === id)?.adjusterGrams ?? Number.NaN
    expect(gramsOf('sodium-chloride-equivalent')).toBeCloseTo(0.9 - 0.24, 10)
    for (const { method, adjusterGrams } of methods) {
      expect(adjusterGrams, method).toBeGreaterThan(0.6)
      expect(adjusterGrams, method).toBeLessThan(0.73)
    }
  })

  it('names what is missing and leaves the number out', () => {
    const own = ownIngredient({ name: 'Half known', molarMass: 300, equivalent: 0.2, ions: [1, -1] })
    const { methods } = evaluated([line(own, '1 %')])
    const freezing = methods.find(({ method }) => method === 'freezing-point')
    expect(freezing?.osmolalityMilliosmPerKg).toBeNull()
    expect(freezing?.missing).toEqual([{ code: 'missing-depression', key: 'line-1' }])
  })

  it('names the ingredient that makes the difference', () => {
    const { methods } = evaluated([
      line('magnesium-sulfate-heptahydrate', '2 %'),
      line('sodium-chloride', '0.3 %'),
    ])
    const ideal = methods.find(({ method }) => method === 'vant-hoff')
    expect(ideal?.differsBy).toMatchObject({ key: 'line-1', reason: 'differs-ideal-count' })
  })
})
