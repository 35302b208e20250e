import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { nonFinitePath } from '../../src/evaluation/answers/finite.ts'
import type { Evaluation } from '../../src/evaluation/types.ts'
import { routeIds } from '../../src/formula/types.ts'
import { answer } from '../../src/worksheet/answer.ts'
import { evaluated, formulaOf, library, line, type WrittenLine } from '../evaluation/formulas.ts'

const ids = [...library.ingredients.keys()].filter((id) => id !== 'water-for-injection').toSorted()

const amount = fc
  .tuple(fc.integer({ min: 1, max: 400 }), fc.constantFrom('%', 'mg/mL', 'mmol/L', 'mg'))
  .map(([size, unit]) => `${unit === '%' ? size / 100 : size / 10} ${unit}`)
const anyLine: fc.Arbitrary<WrittenLine> = fc
  .tuple(fc.constantFrom(...ids), amount)
  .map(([ingredient, written]) => line(ingredient, written))
const lines = fc.uniqueArray(anyLine, {
  minLength: 1,
  maxLength: 6,
  selector: ({ ingredient }) => ingredient,
})
const pH = fc.option(
  fc.integer({ min: 40, max: 90 }).map((tenths) => tenths / 10),
  { nil: undefined },
)

const frame = fc.record({
  pH,
  route: fc.constantFrom(...routeIds),
  balance: fc.constantFrom(undefined, '1 mg', '10 mg'),
  finalVolume: fc.constantFrom('10 mL', '100 mL', '1 L'),
})

function rest({ pH, route, balance, finalVolume }: typeof frame extends fc.Arbitrary<infer T> ? T : never) {
  return {
    route,
    finalVolume,
    ...(pH === undefined ? {} : { pH }),
    ...(balance === undefined ? {} : { balance }),
  }
}

const runs = { numRuns: 120 }

const total = (evaluation: Evaluation, of: (line: Evaluation['lines'][number]) => number | null) =>
  evaluation.lines.reduce((sum, entry) => sum + (of(entry) ?? 0), 0)

describe('random formulas of the library', () => {
  it('give a finite answer or a named block, and print as JSON', () => {
    fc.assert(
      fc.property(lines, frame, (written, setting) => {
        const evaluation = evaluated(written, rest(setting))
        expect(nonFinitePath(evaluation)).toBeNull()
        if (evaluation.status === 'blocked') {
          expect(evaluation.solution).toBeNull()
          expect(evaluation.findings.some(({ blocks }) => blocks)).toBe(true)
        } else expect(evaluation.solution).not.toBeNull()
        expect(JSON.stringify(answer(evaluation, library))).not.toMatch(/NaN|Infinity|undefined/)
      }),
      runs,
    )
  })

  it('conserve mass: what is weighed is what was ordered', () => {
    fc.assert(
      fc.property(lines, (written) => {
        const evaluation = evaluated(written)
        for (const entry of evaluation.lines) {
          expect(entry.grams).toBe(entry.gramsExact)
          const molarMass = entry.ingredient.molarMass?.value
          if (molarMass) expect((entry.millimoles ?? 0) * molarMass).toBeCloseTo((entry.grams ?? 0) * 1000, 6)
        }
      }),
      runs,
    )
  })

  it('have shares that sum to the whole', () => {
    fc.assert(
      fc.property(lines, frame, (written, setting) => {
        const evaluation = evaluated(written, rest(setting))
        if (!evaluation.solution) return
        const { osmolality, effectiveOsmolality } = evaluation.solution
        const near = (value: number, whole: number) =>
          expect(Math.abs(value - whole)).toBeLessThan(1e-8 * (1 + whole))
        near(
          total(evaluation, (entry) => entry.osmolalityShareMilliosmPerKg),
          osmolality.value,
        )
        near(
          total(evaluation, (entry) => entry.effectiveOsmolalityShareMilliosmPerKg),
          effectiveOsmolality.value,
        )
        if (evaluation.headline === 'electrolyte')
          near(
            total(evaluation, (entry) => entry.shareOfParticlesPercent),
            100,
          )
        expect(effectiveOsmolality.value).toBeLessThanOrEqual(osmolality.value * (1 + 1e-12))
        expect(osmolality.low).toBeLessThanOrEqual(osmolality.value)
        expect(osmolality.high).toBeGreaterThanOrEqual(osmolality.value)
      }),
      runs,
    )
  })

  it('do not depend on the order of the lines', () => {
    fc.assert(
      fc.property(lines, frame, fc.integer({ min: 1, max: 5 }), (written, setting, turn) => {
        const keyed = formulaOf(written, rest(setting))
        const turned = {
          ...keyed,
          lines: keyed.lines.map((_, index) => keyed.lines[(index + turn) % keyed.lines.length]!),
        }
        const first = evaluate(keyed, library)
        const second = evaluate(turned, library)
        expect(second.status).toBe(first.status)
        if (!first.solution || !second.solution) return
        expect(second.solution.osmolality.value).toBeCloseTo(first.solution.osmolality.value, 6)
        expect(second.solution.pH ?? -1).toBeCloseTo(first.solution.pH ?? -1, 6)
        expect(new Set(second.findings.map(({ code }) => code))).toEqual(
          new Set(first.findings.map(({ code }) => code)),
        )
      }),
      runs,
    )
  })

  it('never lose osmolality by more sodium chloride', () => {
    fc.assert(
      fc.property(lines, fc.integer({ min: 1, max: 100 }), (written, more) => {
        const others = written.filter(({ ingredient }) => ingredient !== 'sodium-chloride')
        const withSalt = (percent: number) =>
          evaluated([...others, line('sodium-chloride', `${percent} %`)], { pH: 7 })
        const less = withSalt(0.3)
        const greater = withSalt(0.3 + more / 100)
        if (!less.solution || !greater.solution) return
        expect(greater.solution.osmolality.value).toBeGreaterThan(less.solution.osmolality.value)
      }),
      runs,
    )
  })

  it('are adjusted to their target, or say why not', () => {
    fc.assert(
      fc.property(lines, frame, fc.integer({ min: 150, max: 600 }), (written, setting, wanted) => {
        const others = written.filter(({ ingredient }) => ingredient !== 'sodium-chloride')
        const evaluation = evaluated([...others, line('sodium-chloride', 'q.s.')], {
          ...rest(setting),
          target: { quantity: 'osmolality', value: `${wanted} mOsm/kg` },
        })
        if (!evaluation.solution || evaluation.headline !== 'electrolyte') return
        const salt = evaluation.lines.at(-1)
        const step = Math.abs((salt?.grams ?? 0) - (salt?.gramsExact ?? 0))
        // What rounding can do: a gram of sodium chloride adds at most two ions of each formula unit to its water.
        const water = ((evaluation.solution.waterKgPerL ?? 0) * (evaluation.volumeMl ?? 0)) / 1000
        const mostPerGram = (2 * 1000) / 58.44 / water
        const slack = 1e-6 + 1.1 * step * mostPerGram
        expect(Math.abs(evaluation.solution.osmolality.value - wanted)).toBeLessThanOrEqual(slack)
      }),
      runs,
    )
  })
})
