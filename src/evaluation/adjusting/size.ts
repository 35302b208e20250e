import { findRoot } from '../../numeric/roots.ts'

/** What a trial of one size reads: mOsm/kg on the target's count, or why the model has no answer. */
export type Trial =
  | { readonly status: 'read'; readonly milliosmPerKg: number }
  | { readonly status: 'refused'; readonly code: string }

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
  /** A size expected to come near, > 0. */
  readonly guess: number
  /** No size beyond it makes sense: cap or volume. */
  readonly largest: number
  readonly trial: (size: number) => Trial
}

const indifferent = 1e-9

/**
 * The size at which the reading meets the wanted value: bracketed from zero upwards, then a bracketed root. Every
 * way of not finding it has its own name.
 */
export function sizeTo({ wanted, guess, largest, trial }: Sizing): Sized {
  const empty = trial(0)
  if (empty.status === 'refused') return { status: 'cannot-size', without: null, code: empty.code }
  const without = empty.milliosmPerKg
  if (without === wanted) return { status: 'found', size: 0, without }
  if (without > wanted) return { status: 'already-above', without }
  const bracket = bracketFrom(without, { wanted, guess, largest, trial })
  if (bracket.status !== 'bracketed') return { ...bracket, without }
  const found = findRoot(
    (size) => {
      const reading = trial(size)
      return reading.status === 'read' ? reading.milliosmPerKg - wanted : Number.NaN
    },
    bracket.low,
    bracket.high,
    { relativeTolerance: 1e-11 },
  )
  if (found.status !== 'converged') return { status: 'not-converged', without }
  return { status: 'found', size: found.root, without }
}

type Bracket =
  | { readonly status: 'bracketed'; readonly low: number; readonly high: number }
  | { readonly status: 'unreachable'; readonly highest: number; readonly size: number }
  | { readonly status: 'cannot-size'; readonly code: string }

/** Walks up by the slope seen so far, a little too far each time, until the wanted value lies between. */
function bracketFrom(without: number, { wanted, guess, largest, trial }: Sizing): Bracket {
  let low = 0
  let atLow = without
  let next = Math.min(guess, largest)
  for (let round = 0; round < 60; round++) {
    const reading = trial(next)
    if (reading.status === 'refused') return beyondModel(low, atLow, reading.code)
    const { milliosmPerKg } = reading
    if (milliosmPerKg >= wanted) return { status: 'bracketed', low, high: next }
    if (round === 0 && milliosmPerKg - without <= indifferent) {
      return { status: 'cannot-size', code: 'adjuster-does-not-count' }
    }
    if (next >= largest) return { status: 'unreachable', highest: milliosmPerKg, size: next }
    const slope = (milliosmPerKg - atLow) / (next - low)
    low = next
    atLow = milliosmPerKg
    next = Math.min(
      largest,
      slope > 0 ? next + Math.min(next * 3, (1.02 * (wanted - atLow)) / slope) : next * 2,
    )
  }
  return { status: 'unreachable', highest: atLow, size: low }
}

/** The model stopped answering on the way up: at once, the adjuster itself is unknown; later, it is out of reach. */
function beyondModel(low: number, atLow: number, code: string): Bracket {
  return low === 0 ? { status: 'cannot-size', code } : { status: 'unreachable', highest: atLow, size: low }
}
