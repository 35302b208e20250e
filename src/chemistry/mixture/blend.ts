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
  const rest = (osmolality: number) => {
    let sum = -1
    for (const member of members) sum += member.shareAt(osmolality)
    return sum
  }
  let low = guessOsmPerKg * 0.95
  let high = guessOsmPerKg * 1.05
  for (let round = 0; round < 60 && rest(low) < 0; round += 1) low *= 0.7
  for (let round = 0; round < 60 && rest(high) > 0; round += 1) high *= 1.4
  const found = findRoot(rest, low, high, { relativeTolerance: 1e-12 })
  return found.status === 'converged'
    ? { status: 'blended', osmolalityOsmPerKg: found.root }
    : { status: 'not-converged' }
}
