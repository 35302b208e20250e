import { findRoot } from '../../numeric/roots.ts'

/**
 * A member of the mixture: alone in water at `1 / shareAt(O)` times its present concentration it has the osmolality
 * O, so it takes up that share of the water.
 */
export interface Member {
  shareAt(osmolalityOsmPerKg: number): number
}

export type Blended =
  { readonly status: 'blended'; readonly osmolalityOsmPerKg: number } | { readonly status: 'not-converged' }

/**
 * Zdanovskii–Stokes–Robinson: each solute keeps the share of the water in which it alone would have the mixture's
 * water activity, Σ mᵢ/mᵢ*(O) = 1. Each share falls as O rises, so the root is single.
 */
export function blend(members: readonly Member[], guessOsmPerKg: number): Blended {
  if (members.length === 0) return { status: 'blended', osmolalityOsmPerKg: 0 }
  const sumAt = (osmolality: number) => {
    let sum = 0
    for (const member of members) sum += member.shareAt(osmolality)
    return sum
  }
  const near = closeBy(sumAt, guessOsmPerKg)
  return near === null ? bracketed(sumAt, guessOsmPerKg) : { status: 'blended', osmolalityOsmPerKg: near }
}

const mostSteps = 12
/** A miss this small is closed by the step that follows it. */
const closed = 1e-12
/** Farther from the guess than this the bracket decides. */
const farthest = 1.5

/** The shares together fall nearly as 1/O: a secant in the logarithms from the guess. Null where it strays. */
function closeBy(sumAt: (osmolality: number) => number, guess: number): number | null {
  let osmolality = guess
  let power = 1
  let before = 0
  let step = 0
  for (let round = 0; round < mostSteps; round += 1) {
    const miss = Math.log(sumAt(osmolality))
    if (step !== 0) power = (before - miss) / step
    step = miss / power
    before = miss
    osmolality *= Math.exp(step)
    if (!(power > 0 && osmolality < guess * farthest && osmolality > guess / farthest)) return null
    if (Math.abs(miss) <= closed) return osmolality
  }
  return null
}

function bracketed(sumAt: (osmolality: number) => number, guess: number): Blended {
  const rest = (osmolality: number) => sumAt(osmolality) - 1
  let low = guess * 0.95
  let high = guess * 1.05
  for (let round = 0; round < 60 && rest(low) < 0; round += 1) low *= 0.7
  for (let round = 0; round < 60 && rest(high) > 0; round += 1) high *= 1.4
  const found = findRoot(rest, low, high, { relativeTolerance: 1e-12 })
  return found.status === 'converged'
    ? { status: 'blended', osmolalityOsmPerKg: found.root }
    : { status: 'not-converged' }
}
