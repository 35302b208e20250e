import { findRoot } from '../../numeric/roots.ts'

/** What a trial of one size reads: mOsm/kg on the target's count, or why the model has no answer. */
export type Trial =
  | { readonly status: 'read'; readonly milliosmPerKg: number }
  | {
      readonly status: 'refused'
      readonly code: string
      /** True where the size does not matter: nothing is known of the adjuster. */
      readonly forWantOfData?: boolean
    }

export type Sized =
  | { readonly status: 'found'; readonly size: number; readonly without: number }
  | { readonly status: 'already-above'; readonly without: number }
  | {
      readonly status: 'unreachable'
      readonly without: number
      readonly highest: number
      readonly size: number
    }
  | { readonly status: 'cannot-size'; readonly without: number | null; readonly code: string }
  | { readonly status: 'not-converged'; readonly without: number }

export interface Sizing {
  /** mOsm/kg. */
  readonly wanted: number
  /** A size expected to bring about so many mOsm/kg, > 0. */
  readonly guess: (missingMilliosmPerKg: number) => number
  /** No size beyond it makes sense: cap or volume. */
  readonly largest: number
  readonly trial: (size: number) => Trial
}

/* Readings this close, in parts of the wanted one, are the same. */
const close = 1e-10

/**
 * The size at which the reading meets the wanted value: bracketed from zero upwards, then a bracketed root. Every
 * way of not finding it has its own name.
 */
export function sizeTo(sizing: Sizing): Sized {
  const { wanted } = sizing
  const trial = remembering(sizing.trial)
  const empty = trial(0)
  if (empty.status === 'refused') return { status: 'cannot-size', without: null, code: empty.code }
  const without = empty.milliosmPerKg
  if (without === wanted) return { status: 'found', size: 0, without }
  if (without > wanted) return { status: 'already-above', without }
  const bracket = bracketFrom(without, { ...sizing, trial })
  if (bracket.status !== 'bracketed') return { ...bracket, without }
  const excess = (size: number) => {
    const reading = trial(size)
    if (reading.status === 'refused') return Number.NaN
    const over = reading.milliosmPerKg - wanted
    return Math.abs(over) < close * wanted ? 0 : over
  }
  const found = findRoot(excess, bracket.low, bracket.high, { relativeTolerance: 1e-12 })
  if (found.status !== 'converged') return { status: 'not-converged', without }
  return { status: 'found', size: found.root, without }
}

/** The bracket hands its ends on to the root: each size is solved once. */
function remembering(trial: Sizing['trial']): Sizing['trial'] {
  const known = new Map<number, Trial>()
  return (size) => {
    const earlier = known.get(size)
    if (earlier) return earlier
    const made = trial(size)
    known.set(size, made)
    return made
  }
}

type Bracket =
  | { readonly status: 'bracketed'; readonly low: number; readonly high: number }
  | { readonly status: 'unreachable'; readonly highest: number; readonly size: number }
  | { readonly status: 'cannot-size'; readonly code: string }

/**
 * Walks up by the slope seen so far, a little too far each time, until the wanted value lies between. Where the model
 * refuses, the walk goes on in halves below that size.
 */
function bracketFrom(without: number, { wanted, guess, largest, trial }: Sizing): Bracket {
  let [low, atLow] = [0, without]
  let next = Math.min(guess(wanted - without), largest)
  let refused: { readonly size: number; readonly code: string } | null = null
  for (let round = 0; round < 60; round++) {
    const reading = trial(next)
    if (reading.status === 'refused') {
      refused = { size: next, code: reading.code }
      if (reading.forWantOfData || (low === 0 && round > 20))
        return { status: 'cannot-size', code: refused.code }
      next = (low + next) / 2
    } else {
      const { milliosmPerKg } = reading
      if (milliosmPerKg >= wanted) return { status: 'bracketed', low, high: next }
      if (low === 0 && milliosmPerKg - without <= close * wanted) {
        return { status: 'cannot-size', code: 'adjuster-does-not-count' }
      }
      if (next >= largest) return { status: 'unreachable', highest: milliosmPerKg, size: next }
      const slope = (milliosmPerKg - atLow) / (next - low)
      ;[low, atLow] = [next, milliosmPerKg]
      const further = slope > 0 ? next + stepUp(next, wanted - atLow, slope) : next * 2
      next = refused ? Math.min(further, (low + refused.size) / 2) : Math.min(further, largest)
    }
    if (refused && low > 0 && refused.size - low < narrow * low) break
  }
  return { status: 'unreachable', highest: atLow, size: low }
}

/* The edge of what the model answers is found to this part of a size. */
const narrow = 1e-3

/** A hair beyond the straight line, so that a nearly straight reading is bracketed at once; never more than fourfold. */
const stepUp = (size: number, missing: number, slope: number) =>
  Math.min(size * 3, (1.02 * missing) / slope + 1e-4 * size)
