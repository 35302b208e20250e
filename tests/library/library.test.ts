import { performance } from 'node:perf_hooks'
import { describe, expect, it } from 'vitest'
import { loadIngredients } from '../../src/library/ingredients.ts'
import { loadLibrary } from '../../src/library/library.ts'

describe('the library', () => {
  it('is loaded once and carries a mark of its content', () => {
    expect(loadLibrary()).toBe(loadLibrary())
    expect(loadLibrary().version).toMatch(/^[0-9a-f]{8}$/)
  })

  it('knows sodium chloride to the last figure', () => {
    const salt = loadLibrary().ingredients.get('sodium-chloride')
    expect(salt?.molarMass?.value).toBe(58.44)
    expect(salt?.sodiumChlorideEquivalents.map(({ e }) => e.value)).toEqual([1])
    expect(salt?.freezingPointDepression1Percent?.value).toBe(0.58)
    expect(salt?.releases).toEqual([
      { species: 'Na+', count: 1, charge: 1 },
      { species: 'Cl-', count: 1, charge: -1 },
    ])
  })

  it('keeps rivals of a contested figure with their sources', () => {
    const citrate = loadLibrary().ingredients.get('sodium-citrate-dihydrate')
    const [atOne] = citrate?.sodiumChlorideEquivalents ?? []
    expect(atOne?.e.value).toBe(0.31)
    expect(atOne?.e.alternatives?.map(({ value }) => value)).toContain(0.38)
    expect(atOne?.e.uncertainty).toBeGreaterThan(0.03)
  })

  it('reads every ingredient in well under 150 ms', () => {
    const times = Array.from({ length: 5 }, () => {
      const start = performance.now()
      loadIngredients()
      return performance.now() - start
    })
    expect(Math.min(...times)).toBeLessThan(150)
  })
})
