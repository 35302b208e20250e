/*
 * Unsymmetrical mixing of like-charged ions (Pitzer 1975). J(x) = (1/x)∫₀^∞ (1 + q + q²/2 − e^q) y² dy with
 * q = −(x/y)e^(−y). J and its slope are integrated once on a grid of √x and interpolated; source key Pitzer1991.
 */

const gridStep = 0.05
/** Of √x: ions of charge four up to an ionic strength of ten. */
const gridEnd = 12
const count = Math.round(gridEnd / gridStep) + 1

/** 1 + q + q²/2 − e^q, without loss of digits near zero. */
const core = (q: number) =>
  q > -0.02
    ? (-(q * q * q) / 6) * (1 + (q / 4) * (1 + (q / 5) * (1 + q / 6)))
    : 1 + q + (q * q) / 2 - Math.exp(q)

/** q·(1 + q − e^q). */
const slopeCore = (q: number) =>
  q > -0.02 ? (-(q * q * q) / 2) * (1 + (q / 3) * (1 + (q / 4) * (1 + q / 5))) : q * (1 + q - Math.exp(q))

/** J and dJ/dx at x > 0 by Simpson's rule, to out[0], out[1]. y = s² thins the points where the integrand is steep. */
function integrate(x: number, out: Float64Array): void {
  const steps = 800
  const width = Math.sqrt(40) / steps
  let value = 0
  let slope = 0
  for (let index = 1; index < steps; index += 1) {
    const s = index * width
    const y = s * s
    const q = -(x / y) * Math.exp(-y)
    const weight = y * y * 2 * s * (index % 2 === 1 ? 4 / 3 : 2 / 3)
    value += core(q) * weight
    slope += slopeCore(q) * weight
  }
  out[0] = (value * width) / x
  out[1] = ((slope - value) * width) / (x * x)
}

interface Grid {
  readonly values: Float64Array
  /** dJ/d√x. */
  readonly slopes: Float64Array
}

/* Filled on first use and never changed after. */
let made: Grid | undefined

function grid(): Grid {
  if (made) return made
  const values = new Float64Array(count)
  const slopes = new Float64Array(count)
  const out = new Float64Array(2)
  for (let index = 1; index < count; index += 1) {
    const root = index * gridStep
    integrate(root * root, out)
    values[index] = out[0]!
    slopes[index] = out[1]! * 2 * root
  }
  made = { values, slopes }
  return made
}

/**
 * J(x) and dJ/dx for x ≥ 0, to out[0], out[1].
 * @example mixingIntegral(1, out) → out[0] 0.116437, out[1] 0.160527
 */
export function mixingIntegral(x: number, out: Float64Array): void {
  const { values, slopes } = grid()
  const root = Math.sqrt(x)
  const index = Math.floor(root / gridStep)
  if (index >= count - 1) {
    integrate(x, out)
    return
  }
  const t = root / gridStep - index
  if (index === 0) {
    // J falls like x² towards zero, too steeply for a cubic in √x.
    out[0] = values[1]! * t ** 4
    out[1] = (2 * values[1]! * t * t) / (gridStep * gridStep)
    return
  }
  const a = values[index]!
  const p = slopes[index]! * gridStep
  const rise = values[index + 1]! - a
  const q = slopes[index + 1]! * gridStep
  const c = 3 * rise - 2 * p - q
  const d = p + q - 2 * rise
  out[0] = a + t * (p + t * (c + t * d))
  out[1] = (p + t * (2 * c + 3 * t * d)) / gridStep / (2 * root)
}
