/*
 * Unsymmetrical mixing of like-charged ions (Pitzer 1975). J(x) = (1/x)∫₀^∞ (1 + q + q²/2 − e^q) y² dy with
 * q = −(x/y)e^(−y). The integral is taken once on a grid and interpolated; its source key is Pitzer1991.
 */

const gridStep = 0.02
const gridEnd = 12

function integral(x: number): number {
  if (x <= 0) return 0
  // y = s² thins the grid where the integrand is steep.
  const steps = 600
  const end = Math.sqrt(40)
  const width = end / steps
  let sum = 0
  for (let index = 0; index < steps; index += 1) {
    const s = (index + 0.5) * width
    const y = s * s
    const q = -(x / y) * Math.exp(-y)
    const core = Math.abs(q) < 1e-4 ? -(q * q * q) / 6 : 1 + q + (q * q) / 2 - Math.exp(q)
    sum += core * y * y * 2 * s
  }
  return (sum * width) / x
}

/* Filled on first use and never changed after. */
let values: Float64Array | undefined
let slopes: Float64Array | undefined

function grid(): { values: Float64Array; slopes: Float64Array } {
  if (values && slopes) return { values, slopes }
  const count = Math.round(gridEnd / gridStep) + 2
  values = Float64Array.from({ length: count }, (_, index) => integral(index * gridStep))
  slopes = new Float64Array(count)
  for (let index = 0; index < count; index += 1) {
    const before = values[Math.max(0, index - 1)] ?? 0
    const after = values[Math.min(count - 1, index + 1)] ?? 0
    const span = index === 0 || index === count - 1 ? 1 : 2
    slopes[index] = (after - before) / (span * gridStep)
  }
  return { values, slopes }
}

/** Hermite interpolation of J and of its derivative at x; writes them to out[0], out[1]. */
export function mixingIntegral(x: number, out: Float64Array): void {
  const table = grid()
  const clipped = Math.min(x, gridEnd)
  const index = Math.floor(clipped / gridStep)
  const t = clipped / gridStep - index
  const [a, b] = [table.values[index] ?? 0, table.values[index + 1] ?? 0]
  const [p, q] = [(table.slopes[index] ?? 0) * gridStep, (table.slopes[index + 1] ?? 0) * gridStep]
  const c = 3 * (b - a) - 2 * p - q
  const d = 2 * (a - b) + p + q
  out[0] = a + t * (p + t * (c + t * d))
  out[1] = (p + t * (2 * c + 3 * t * d)) / gridStep
}
