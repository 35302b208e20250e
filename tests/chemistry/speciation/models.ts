import type { SpeciesRecord } from '../../../src/library/types.ts'

/** Every activity coefficient is one: the limit in which textbook formulas hold. */
export const idealActivity = (species: readonly SpeciesRecord[]) => ({
  species,
  lnGamma: (_molalities: Float64Array, out: Float64Array) => {
    out.fill(0)
  },
})

/** Activity from charge and ionic strength alone, by a function of the root of the ionic strength. */
const chargeActivity =
  (perSquareOfCharge: (root: number) => number) => (species: readonly SpeciesRecord[]) => {
    const squares = Float64Array.from(species, (record) => record.charge ** 2)
    return {
      species,
      lnGamma: (molalities: Float64Array, out: Float64Array) => {
        let strength = 0
        for (let i = 0; i < squares.length; i++) strength += 0.5 * (squares[i] ?? 0) * (molalities[i] ?? 0)
        const unit = perSquareOfCharge(Math.sqrt(strength))
        for (let i = 0; i < squares.length; i++) out[i] = unit * (squares[i] ?? 0)
      },
    }
  }

/** Davies: good for dilute solutions. */
export const daviesActivity = chargeActivity((root) => -1.1745 * (root / (1 + root) - 0.3 * root * root))

/** Debye–Hückel with a finite size: well behaved at any strength. */
export const sizedActivity = chargeActivity((root) => (-1.1745 * root) / (1 + 1.5 * root))
