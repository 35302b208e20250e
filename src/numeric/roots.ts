export interface RootOptions {
  /** Width of the bracket, relative to its larger end, at which the root is taken. Default 1e-12. */
  readonly relativeTolerance?: number
  readonly absoluteTolerance?: number
  readonly maximumIterations?: number
}

export type RootResult =
  | { readonly status: 'converged'; readonly root: number; readonly iterations: number }
  | { readonly status: 'no-bracket'; readonly atLow: number; readonly atHigh: number }
  | { readonly status: 'not-finite'; readonly at: number }
  | { readonly status: 'not-converged'; readonly low: number; readonly high: number }

/**
 * Root of a continuous function between two ends of opposite sign, by the bracketed secant with the Illinois
 * weighting, bisecting whenever three secant steps together have not halved the bracket. Answers why it has none.
 *
 * @example findRoot((x) => x * x - 2, 0, 2) → { status: 'converged', root: 1.41421356… }
 */
export function findRoot(
  f: (x: number) => number,
  low: number,
  high: number,
  { relativeTolerance = 1e-12, absoluteTolerance = 0, maximumIterations = 200 }: RootOptions = {},
): RootResult {
  let [a, b] = [low, high]
  let [fa, fb] = [f(a), f(b)]
  if (!Number.isFinite(fa)) return { status: 'not-finite', at: a }
  if (!Number.isFinite(fb)) return { status: 'not-finite', at: b }
  if (fa === 0) return { status: 'converged', root: a, iterations: 0 }
  if (fb === 0) return { status: 'converged', root: b, iterations: 0 }
  if (fa > 0 === fb > 0) return { status: 'no-bracket', atLow: fa, atHigh: fb }
  let width = Math.abs(b - a)
  for (let iteration = 1; iteration <= maximumIterations; iteration += 1) {
    const slow = iteration % 3 === 0 && Math.abs(b - a) > width / 2
    if (iteration % 3 === 0) width = Math.abs(b - a)
    const secant = b - (fb * (b - a)) / (fb - fa)
    const x = slow || !Number.isFinite(secant) ? (a + b) / 2 : secant
    const fx = f(x)
    if (!Number.isFinite(fx)) return { status: 'not-finite', at: x }
    if (fx > 0 === fb > 0) fa /= 2
    else [a, fa] = [b, fb]
    const step = Math.abs(x - b)
    ;[b, fb] = [x, fx]
    const tolerance = absoluteTolerance + relativeTolerance * Math.max(Math.abs(a), Math.abs(b))
    if (fx === 0 || Math.abs(b - a) <= tolerance || step <= tolerance / 4) {
      return { status: 'converged', root: b, iterations: iteration }
    }
  }
  return { status: 'not-converged', low: Math.min(a, b), high: Math.max(a, b) }
}
