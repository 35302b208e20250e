/**
 * The sodium chloride solution as a yardstick: strength against osmolality at freezing, both ways. Beyond
 * `highestPercent` it has no answer.
 */
export interface SodiumChlorideScale {
  readonly molarMass: number
  readonly highestPercent: number
  /** mOsm/kg of sodium chloride of this % w/v. */
  osmolalityOf(percent: number): number | null
  /** % w/v of the sodium chloride solution of this osmolality in mOsm/kg. */
  percentOf(osmolalityMilliosmPerKg: number): number | null
}

/* Osmolality is smooth in the square root of the strength, where the limiting law bends it. */
const step = 0.05
const highestRoot = 5.45

/**
 * A scale from an exact but slow rule; between its nodes cubic interpolation over √%, wrong by less than
 * 0.0005 mOsm/kg.
 */
export function sodiumChlorideScale(
  molarMass: number,
  exact: (percent: number) => number | null,
): SodiumChlorideScale {
  const nodes: number[] = []
  for (let index = 0; index * step <= highestRoot; index++) {
    const value = exact((index * step) ** 2)
    if (value === null) break
    nodes.push(value)
  }
  const highest = (nodes.length - 1) * step
  const at = (root: number) => interpolated(nodes, root / step)
  return {
    molarMass,
    highestPercent: highest ** 2,
    osmolalityOf: (percent) => (percent < 0 || percent > highest ** 2 ? null : at(Math.sqrt(percent))),
    percentOf: (osmolality) => {
      const root = inverse(nodes, at, osmolality)
      return root === null ? null : root ** 2
    },
  }
}

/** Cubic through the four nodes around `place`, which counts in nodes. */
function interpolated(nodes: readonly number[], place: number): number {
  const first = Math.max(0, Math.min(nodes.length - 4, Math.floor(place) - 1))
  const t = place - first
  const [a = 0, b = 0, c = 0, d = 0] = [nodes[first], nodes[first + 1], nodes[first + 2], nodes[first + 3]]
  return (
    (-a * (t - 1) * (t - 2) * (t - 3)) / 6 +
    (b * t * (t - 2) * (t - 3)) / 2 -
    (c * t * (t - 1) * (t - 3)) / 2 +
    (d * t * (t - 1) * (t - 2)) / 6
  )
}

/** √% at which the scale reads `value`; null outside it. */
function inverse(nodes: readonly number[], at: (root: number) => number, value: number): number | null {
  const last = nodes.at(-1)
  if (last === undefined || !(value >= 0) || value > last) return null
  let low = 0
  let high = nodes.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((nodes[middle] ?? 0) <= value) low = middle
    else high = middle
  }
  return refined(at, value, low * step, high * step)
}

/* Regula falsi with halving of the idle side (Illinois): the bracket is one node wide, a few rounds suffice. */
function refined(at: (root: number) => number, value: number, from: number, to: number): number {
  let [low, high] = [from, to]
  let [atLow, atHigh] = [at(low) - value, at(high) - value]
  for (let round = 0; round < 60; round++) {
    if (atHigh === atLow) return low
    const next = high - (atHigh * (high - low)) / (atHigh - atLow)
    const atNext = at(next) - value
    if (Math.abs(next - high) < 1e-15 || atNext === 0) return next
    if (atNext * atHigh < 0) [low, atLow] = [high, atHigh]
    else atLow /= 2
    high = next
    atHigh = atNext
  }
  return high
}
