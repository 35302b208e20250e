export interface Scale {
  readonly maximum: number
  readonly ticks: readonly number[]
  /** Pixel of a value; values beyond the ends are put at the ends. */
  place(value: number): number
}

const steps = [1, 2, 5, 10]

/** The smallest of 1, 2, 5 × 10ⁿ that is not below `least`. */
export function roundStep(least: number): number {
  const decade = 10 ** Math.floor(Math.log10(least))
  const step = steps.find((candidate) => candidate * decade >= least * (1 - 1e-9)) ?? 10
  return step * decade
}

/** A straight axis from zero to a little beyond `reach`, with a round tick about every `pixelsPerTick`. */
export function zeroScale(reach: number, left: number, right: number, pixelsPerTick = 96): Scale {
  return spanScale(0, reach * 1.06, left, right, pixelsPerTick)
}

/** A straight axis over exactly `low` to `high`. */
export function spanScale(low: number, high: number, left: number, right: number, pixelsPerTick = 96): Scale {
  const width = Math.max(1, right - left)
  const range = high - low > 0 ? high - low : 1
  const step = roundStep(range / Math.max(2, Math.floor(width / pixelsPerTick)))
  const ticks: number[] = []
  for (let index = Math.ceil(low / step - 1e-9); index * step <= low + range * (1 + 1e-9); index += 1) {
    ticks.push(Number((index * step).toPrecision(12)))
  }
  return {
    maximum: low + range,
    ticks,
    place: (value) => left + (Math.min(Math.max(value, low), low + range) - low) * (width / range),
  }
}
