import { describe, expect, it } from 'vitest'
import { solveSolution } from '../../src/chemistry/solution.ts'
import { library } from '../evaluation/formulas.ts'

function osmolality(ids: readonly string[]): number {
  const dissolved = ids.map((id) => {
    const ingredient = library.ingredients.get(id)
    if (!ingredient) throw new Error(`${id} is no ingredient`)
    return { key: id, ingredient, amount: { kind: 'per-water', molPerKg: 0.01 } as const }
  })
  const result = solveSolution({ volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved }, library)
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
  return result.state.states.freezing.osmolalityOsmPerKg
}

describe('two ingredients that give the same molecule, one of them alone with its ionisation', () => {
  it('are solved in either order', () => {
    const straight = osmolality(['caffeine-anhydrous', 'caffeine-citrate'])
    const turned = osmolality(['caffeine-citrate', 'caffeine-anhydrous'])
    expect(straight / turned).toBeCloseTo(1, 10)
  })
})
