/** Osmotic curve of one solute alone in water, at one temperature. */
export interface OsmoticCurve {
  /** mol (or g, where the solute has no molar mass) per kg of water that gives this osmolality, osmol per kg. */
  molalityAt(osmolalityOsmPerKg: number): number
  osmolalityAt(molality: number): number
}

const b = 1.2

/** Debye–Hückel osmotic coefficient of a salt alone: 1 − A·|z₊z₋|·√I/(1 + 1.2·√I). 1 for a neutral. */
export function limitingOsmoticCoefficient(
  molality: number,
  shape: { readonly strengthPerMolal: number; readonly chargeProduct: number },
  slope: number,
): number {
  if (shape.chargeProduct === 0) return 1
  const root = Math.sqrt(shape.strengthPerMolal * molality)
  return 1 - (slope * shape.chargeProduct * root) / (1 + b * root)
}

/** Inverts an increasing osmolality by safeguarded fixed point: φ varies slowly. */
export function invert(osmolality: number, initial: number, osmolalityAt: (m: number) => number): number {
  let molality = initial
  for (let round = 0; round < 60; round += 1) {
    const found = osmolalityAt(molality)
    const next = found > 0 ? (molality * osmolality) / found : molality * 2
    if (Math.abs(next - molality) <= 1e-14 * next) return next
    molality = next
  }
  return molality
}
