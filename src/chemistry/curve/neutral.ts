import type { NeutralCurve } from '../../library/curves.ts'
import { invert, invertQuickly, type OsmoticCurve } from './curve.ts'

/**
 * Curve of a molecular solute: its freezing fit below, its 25 °C fit at and above 25 °C, in between in proportion.
 */
export function neutralCurve({ freezing, at25 }: NeutralCurve, celsius: number): OsmoticCurve {
  const warm = Math.min(1, Math.max(0, celsius / 25))
  const mixed = (place: 0 | 1 | 2) =>
    (1 - warm) * freezing.coefficients[place] + warm * at25.coefficients[place]
  const [a, b, c] = [mixed(0), mixed(1), mixed(2)]
  const osmolalityAt = (m: number) => m * (1 + m * (a + m * (b + m * c)))
  const withSlope = (m: number, out: Float64Array) => {
    out[0] = m * (1 + m * (a + m * (b + m * c)))
    out[1] = 1 + m * (2 * a + m * (3 * b + m * 4 * c))
  }
  // Of osmolalities asked for one after another each is near the last.
  let ratio = 1
  return {
    osmolalityAt,
    molalityAt(osmolality) {
      if (osmolality <= 0) return 0
      const found = invertQuickly(osmolality, osmolality * ratio, withSlope)
      if (found !== null) ratio = found / osmolality
      return found ?? invert(osmolality, osmolality, osmolalityAt)
    },
  }
}
