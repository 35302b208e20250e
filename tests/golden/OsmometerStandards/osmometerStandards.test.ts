import { describe, expect, it } from 'vitest'
import { evaluated, library, line, solved } from '../../evaluation/formulas.ts'
import content from './rows.json'

const { source, rows, fitted } = content
/* Sodium chloride at 0 °C is fitted to some of them; the others are the check. */
const role = (osmolality: number) => (fitted.includes(osmolality) ? 'fitted' : 'check')

describe(`reference solutions of the pharmacopoeias (${source})`, () => {
  const molarMass = library.ingredients.get('sodium-chloride')?.molarMass?.value ?? Number.NaN

  for (const { gramsPerKgWater, osmolality, depressionKelvin } of rows) {
    it(`${role(osmolality)}: ${gramsPerKgWater} g sodium chloride per kg of water reads ${osmolality} mOsm/kg within 0.3 %`, () => {
      const amount = `${(gramsPerKgWater / molarMass).toFixed(8)} mol/kg`
      const solution = solved(evaluated([line('sodium-chloride', amount)]))
      expect(Math.abs(solution.osmolality.value / osmolality - 1)).toBeLessThan(0.003)
      expect(Math.abs(solution.freezingPointDepressionK / depressionKelvin - 1)).toBeLessThan(0.003)
    })
  }
})
