import type { NeutralCurve, PhiCurve } from '../../library/curves.ts'
import { invert, type OsmoticCurve } from './curve.ts'

const phi = ({ coefficients: [a1, a2, a3] }: PhiCurve, m: number) => 1 + m * (a1 + m * (a2 + m * a3))

/**
 * Curve of a molecular solute: its freezing fit below, its 25 °C fit at and above 25 °C, in between in proportion.
 */
export function neutralCurve(curve: NeutralCurve, celsius: number): OsmoticCurve {
  const warm = Math.min(1, Math.max(0, celsius / 25))
  const osmolalityAt = (m: number) => m * ((1 - warm) * phi(curve.freezing, m) + warm * phi(curve.at25, m))
  return {
    osmolalityAt,
    molalityAt: (osmolality) => (osmolality <= 0 ? 0 : invert(osmolality, osmolality, osmolalityAt)),
  }
}
