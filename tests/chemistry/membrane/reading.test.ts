import { describe, expect, it } from 'vitest'
import { deepestDepression, osmolalityAtDepression } from '../../../src/chemistry/activity/freezing.ts'
import type { SolutionState } from '../../../src/chemistry/types.ts'
import { redCellVolume } from '../../../src/evaluation/answers/solution.ts'
import {
  effectiveReadingOf,
  isBeyondOsmometer,
  quick,
  readingOf,
  reflectionOf,
  solve,
} from '../../../src/evaluation/model.ts'
import { loadConventions } from '../../../src/library/conventions.ts'
import { evaluated, library, line, solved } from '../../evaluation/formulas.ts'

const conventions = loadConventions()

function stateOf(grams: Readonly<Record<string, number>>): SolutionState {
  const portions = Object.entries(grams).map(([id, mass]) => {
    const ingredient = library.ingredients.get(id)
    if (!ingredient) throw new Error(`${id} is no ingredient`)
    return { key: id, ingredient, grams: mass }
  })
  const setting = { volumeMl: 100, pH: 'solve', temperatureCelsius: 25 } as const
  const result = solve(portions, setting, library, quick)
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
  return result.state
}

const frozen = (state: SolutionState, osmolality: number): SolutionState => ({
  ...state,
  states: { ...state.states, freezing: { ...state.states.freezing, osmolalityOsmPerKg: osmolality } },
})

describe('reading of a freezing-point osmometer', () => {
  const saline = stateOf({ 'sodium-chloride': 0.9 })

  it('0.9 % sodium chloride reads 286 ± 1.5 mOsm/kg', () => {
    expect(Math.abs(readingOf(saline, conventions) - 286)).toBeLessThan(1.5)
  })

  it('is 1000 × ΔTf / 1.86: 998.8 for 1 osmol/kg', () => {
    expect(readingOf(frozen(saline, 1), conventions)).toBeCloseTo((1.8578 / 1.86) * 1000, 1)
  })

  it('goes on without a jump beyond the reach of the ice relation, and says that it does', () => {
    const deepest = osmolalityAtDepression(deepestDepression)
    const at = (osmolality: number) => frozen(saline, osmolality)
    expect(isBeyondOsmometer(at(deepest * 0.999))).toBe(false)
    expect(isBeyondOsmometer(at(deepest))).toBe(true)
    const [below, above] = [
      readingOf(at(deepest - 1e-6), conventions),
      readingOf(at(deepest + 1e-6), conventions),
    ]
    expect(above).toBeGreaterThan(below)
    expect(above - below).toBeLessThan(0.01)
  })
})

describe('across the membrane of a red cell', () => {
  it('sodium chloride stays outside, whole', () => {
    const saline = stateOf({ 'sodium-chloride': 0.9 })
    expect(saline.shares.map(reflectionOf)).toEqual([1])
    expect(effectiveReadingOf(saline, conventions)).toBeCloseTo(readingOf(saline, conventions), 9)
    expect(effectiveReadingOf(stateOf({}), conventions)).toBe(0)
  })

  it('urea goes in: an isosmotic solution of it holds nothing out', () => {
    const urea = stateOf({ urea: 1.63 })
    expect(readingOf(urea, conventions)).toBeGreaterThan(250)
    const part = effectiveReadingOf(urea, conventions) / readingOf(urea, conventions)
    expect(part).toBeCloseTo(urea.shares[0]?.reflection?.value ?? NaN, 9)
    expect(part).toBeLessThan(0.2)
  })

  it('of both, the salt counts alone, but for what the membrane holds back of the other', () => {
    const both = stateOf({ 'sodium-chloride': 0.45, urea: 0.8 })
    const scale = readingOf(both, conventions) / both.states.freezing.osmolalityOsmPerKg
    const worked = both.shares.reduce(
      (sum, { key, osmolalityOsmPerKg, reflection }) =>
        sum + (key === 'urea' ? (reflection?.value ?? 1) : 1) * osmolalityOsmPerKg,
      0,
    )
    expect(effectiveReadingOf(both, conventions)).toBeCloseTo(scale * worked, 9)
  })
})

describe('volume of a red cell', () => {
  const scale = { osmolalityOf: (percent: number) => percent * 318 } as Parameters<
    typeof redCellVolume
  >[1]['scale']

  it('is its own in plasma, 0.4 + 0.6·290/O elsewhere, and none where the cell bursts', () => {
    expect(redCellVolume(290, { conventions, scale })).toBe(1)
    expect(redCellVolume(580, { conventions, scale })).toBeCloseTo(0.7, 12)
    expect(redCellVolume(200, { conventions, scale })).toBeCloseTo(1.27, 12)
    expect(redCellVolume(150, { conventions, scale })).toBeNull()
  })

  it('is near 1 in 0.9 % sodium chloride through the whole evaluation', () => {
    const { redCellRelativeVolume } = solved(evaluated([line('sodium-chloride', '0.9 %')]))
    expect(redCellRelativeVolume).toBeCloseTo(1, 1)
  })
})
