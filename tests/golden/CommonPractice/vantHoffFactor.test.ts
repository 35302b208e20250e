import { describe, expect, it } from 'vitest'
import { solveSolution } from '../../../src/chemistry/solution.ts'
import { library } from '../support/salts.ts'

/** Particles per formula unit that a dilute solution of an ingredient of the library shows, at its freezing point. */
function factorOf(
  id: string,
  molPerKg: number,
): { readonly effective: number; readonly formal: number | null } {
  const ingredient = library.ingredients.get(id)
  if (!ingredient) throw new Error(`${id} is no ingredient`)
  const dissolved = [{ key: id, ingredient, amount: { kind: 'per-water', molPerKg } as const }]
  const result = solveSolution({ volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved }, library)
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
  const share = result.state.shares[0]
  return { effective: share?.effectiveI ?? NaN, formal: share?.particlesFormal ?? null }
}

/* Common practice, no source: whole numbers are the most there can be, the real value is found by experiment. */
const practice = [
  { id: 'ethanol', formal: 1, low: 0.98, high: 1.02, says: '1.0' },
  { id: 'dextrose-anhydrous', formal: 1, low: 0.98, high: 1.02, says: '1.0' },
  { id: 'sodium-chloride', formal: 2, low: 1.83, high: 1.95, says: 'about 1.9' },
  { id: 'potassium-chloride', formal: 2, low: 1.83, high: 1.95, says: 'about 1.9' },
  {
    id: 'magnesium-sulfate-heptahydrate',
    formal: 2,
    low: 1,
    high: 1.5,
    says: 'between 1 and 2, far below 2',
  },
  { id: 'calcium-chloride-dihydrate', formal: 3, low: 2, high: 2.8, says: 'between 2 and 3' },
  { id: 'sodium-sulfate-anhydrous', formal: 3, low: 2.15, high: 2.5, says: 'about 2.3' },
  { id: 'potassium-sulfate', formal: 3, low: 2.15, high: 2.5, says: 'about 2.3' },
  { id: 'sodium-phosphate-dibasic-anhydrous', formal: 3, low: 2.15, high: 2.5, says: 'about 2.3' },
  { id: 'sodium-carbonate-anhydrous', formal: 3, low: 2.15, high: 2.55, says: 'about 2.3' },
] as const

describe('van ’t Hoff factor of dilute solutions, as common practice has it', () => {
  for (const { id, formal, low, high, says } of practice) {
    it.each([0.06, 0.1, 0.15])(`${id} at %d mol/kg: ${says}`, (molality) => {
      const factor = factorOf(id, molality)
      expect(factor.formal).toBe(formal)
      expect(factor.effective).toBeGreaterThan(low)
      expect(factor.effective).toBeLessThan(high)
    })
  }

  it.each([0.03, 0.05, 0.1])(
    'trisodium phosphate at %d mol/kg: between 3 and 4, well below 4',
    (molality) => {
      const { effective, formal } = factorOf('trisodium-phosphate-dodecahydrate', molality)
      expect(formal).toBe(4)
      expect(effective).toBeGreaterThan(3)
      expect(effective).toBeLessThan(3.6)
    },
  )

  it.each(['sodium-chloride', 'calcium-chloride-dihydrate', 'sodium-sulfate-anhydrous', 'ethanol'])(
    '%s reaches its whole number on dilution, but for the ions of water',
    (id) => {
      const { effective, formal } = factorOf(id, 1e-5)
      expect(effective / (formal ?? NaN)).toBeCloseTo(1, 2)
    },
  )
})
