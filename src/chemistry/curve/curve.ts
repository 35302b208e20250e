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

/** Growth of that osmotic coefficient with ln m. */
export function limitingGrowth(
  molality: number,
  shape: { readonly strengthPerMolal: number; readonly chargeProduct: number },
  slope: number,
): number {
  if (shape.chargeProduct === 0) return 0
  const root = Math.sqrt(shape.strengthPerMolal * molality)
  return (-slope * shape.chargeProduct * root) / (2 * (1 + b * root) ** 2)
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

const mostSteps = 12
/** A Newton step this small, in parts of the molality, leaves less than rounding behind. */
const lastStep = 1e-9

/** Osmolality and its slope at a molality, to out[0], out[1]. */
export type Sloped = (molality: number, out: Float64Array) => void

const sloped = new Float64Array(2)

/** Inverts an increasing osmolality by Newton's steps; null where they do not settle at once. */
export function invertQuickly(osmolality: number, initial: number, curve: Sloped): number | null {
  let molality = initial
  for (let round = 0; round < mostSteps; round += 1) {
    curve(molality, sloped)
    const step = (osmolality - sloped[0]!) / sloped[1]!
    molality += step
    if (!(molality > 0 && sloped[1]! > 0)) return null
    if (Math.abs(step) <= lastStep * molality) return molality
  }
  return null
}
