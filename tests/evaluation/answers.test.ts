import { describe, expect, it } from 'vitest'
import { codesOf, evaluated, formulaOf, library, line, ownIngredient, solved } from './formulas.ts'
import { evaluate } from '../../src/evaluation/evaluate.ts'

describe('the solution', () => {
  const evaluation = evaluated([line('sodium-chloride', '0.6 %'), line('potassium-chloride', '0.2 %')])
  const solution = solved(evaluation)

  it('splits the reading into shares that sum to it', () => {
    const sum = evaluation.lines.reduce(
      (total, { osmolalityShareMilliosmPerKg }) => total + (osmolalityShareMilliosmPerKg ?? 0),
      0,
    )
    expect(sum).toBeCloseTo(solution.osmolality.value, 9)
    const particles = evaluation.lines.reduce(
      (total, { shareOfParticlesPercent }) => total + (shareOfParticlesPercent ?? 0),
      0,
    )
    expect(particles).toBeCloseTo(100, 9)
  })

  it('keeps osmolality and osmolarity apart by the water in a litre', () => {
    expect(solution.osmolarityMilliosmPerL).toBeCloseTo(
      solution.osmolality.value * (solution.waterKgPerL ?? 0),
      9,
    )
  })

  it('keeps convention and physics apart', () => {
    expect(solution.freezingPointDepressionK).toBeCloseTo(solution.osmolality.value * 0.00186, 9)
    expect(solution.conventionalDepressionK).toBeCloseTo(
      ((solution.sodiumChlorideEquivalentPercent ?? 0) * 0.52) / 0.9,
      9,
    )
  })

  it('gives the osmotic pressure at 37 °C', () => {
    const kilopascal = (solution.osmolality37 ?? 0) / 1000
    expect(solution.osmoticPressureKPa37).toBeCloseTo(kilopascal * 0.99333 * 8.314462618 * 310.15, 6)
  })
})

describe('electrolytes', () => {
  it('totals ions in mmol and mEq', () => {
    const { electrolytes } = evaluated([
      line('calcium-chloride-dihydrate', '2 mmol/L'),
      line('sodium-chloride', '100 mmol/L'),
    ])
    const of = (ion: string) => electrolytes.find((entry) => entry.ion === ion)
    expect(of('Ca+2')?.mmolPerMl).toBeCloseTo(0.002, 9)
    expect(of('Ca+2')?.mEqPerMl).toBeCloseTo(0.004, 9)
    expect(of('Cl-')?.mEqPerMl).toBeCloseTo(0.104, 9)
  })

  it('counts phosphate in mmol alone, whatever its form', () => {
    const { electrolytes } = evaluated([
      line('sodium-phosphate-monobasic-monohydrate', '10 mmol/L'),
      line('sodium-phosphate-dibasic-anhydrous', '20 mmol/L'),
    ])
    const phosphate = electrolytes.find(({ ion }) => ion === 'phosphate')
    expect(phosphate?.mmolPerMl).toBeCloseTo(0.03, 9)
    expect(phosphate?.mEqPerMl).toBeNull()
    expect(electrolytes.find(({ ion }) => ion === 'Na+')?.mEqPerMl).toBeCloseTo(0.05, 9)
  })

  it('leaves neutral solutes out', () => {
    expect(evaluated([line('mannitol', '5 %')]).electrolytes).toEqual([])
  })
})

describe('not the same thing', () => {
  it('isosmotic but not isotonic names the solute', () => {
    const evaluation = evaluated([line('urea', '1.6 %')])
    const finding = evaluation.findings.find(({ code }) => code === 'isosmotic-not-isotonic')
    expect(finding).toMatchObject({ severity: 'warn', ingredients: ['urea'] })
    expect(solved(evaluation).effectiveOsmolality.value).toBeLessThan(30)
  })

  it('stays silent where both are the same', () => {
    const codes = codesOf(evaluated([line('sodium-chloride', '0.9 %')]))
    expect(codes).not.toContain('isosmotic-not-isotonic')
    expect(codes).not.toContain('total-and-effective-differ')
  })

  it('remarks a part that passes where the rest still holds', () => {
    const codes = codesOf(evaluated([line('sodium-chloride', '0.9 %'), line('urea', '0.3 %')]))
    expect(codes).toContain('total-and-effective-differ')
  })

  it('lets the interval of an unknown reflection reach down to nothing', () => {
    const own = ownIngredient({ name: 'Nobody knows', molarMass: 200, equivalent: 0.3, ions: [1, -1] })
    const evaluation = evaluated([line(own, '3 %')])
    expect(codesOf(evaluation)).toContain('reflection-unknown')
    expect(solved(evaluation).effectiveOsmolality.low).toBeLessThan(15)
  })
})

describe('findings', () => {
  it('stand in the order stop, warn, note and then of the lines', () => {
    const evaluation = evaluated(
      [line('mannitol', '0.4 mg'), line('urea', '1.6 %'), line('sodium-chloride', '0.4 mg')],
      {
        balance: '1 mg',
        finalVolume: '1 mL',
      },
    )
    const rank = { stop: 0, warn: 1, note: 2 }
    const ranks = evaluation.findings.map(({ severity }) => rank[severity])
    expect(ranks).toEqual(ranks.toSorted((a, b) => a - b))
    const below = evaluation.findings.filter(({ code }) => code === 'below-readability')
    expect(below.map(({ lineKeys }) => lineKeys[0])).toEqual(['line-1', 'line-3'])
  })

  it('tell of equivalents read far beyond their table and of figures from memory', () => {
    const codes = codesOf(evaluated([line('dibucaine-hydrochloride', '9 %')]))
    expect(codes).toContain('equivalent-beyond-table')
    expect(codes).toContain('from-memory-data')
  })
})

describe('the front door', () => {
  it('is deterministic and leaves the formula alone', () => {
    const formula = formulaOf([line('pilocarpine-hydrochloride', '1 %'), line('sodium-chloride', 'q.s.')], {
      target: { quantity: 'osmolality', value: '290 mOsm/kg' },
    })
    const before = JSON.stringify(formula)
    expect(JSON.stringify(evaluate(formula, library))).toBe(JSON.stringify(evaluate(formula, library)))
    expect(JSON.stringify(formula)).toBe(before)
  })

  it('traces every weighing and every method', () => {
    const evaluation = evaluated([
      line('pilocarpine-hydrochloride', '1 %'),
      line('sodium-chloride', '0.66 %'),
    ])
    expect(evaluation.trace.map(({ key }) => key)).toEqual(['line-1', 'line-2'])
    for (const { method, trace } of evaluation.methods) expect(trace.length, method).toBeGreaterThan(2)
  })
})
