import type { CautionLine } from './context.ts'

/** Names of figures that were needed and not known. */
export type Need =
  | 'age'
  | 'weight'
  | 'dose volume'
  | 'infusion rate'
  | 'pH'
  | 'osmolality'
  | 'osmolarity'
  | 'sodium chloride equivalent'
  | 'buffer capacity'
  | 'final volume'
  | 'strength'

export type Values = Readonly<Record<string, string | number>>

/** What a condition came to. `unknown` when it hangs on figures that are not known. */
export interface Outcome {
  readonly truth: boolean | 'unknown'
  /** What was found, for the words of the caution. */
  readonly values: Values
  readonly lines: readonly CautionLine[]
  readonly needs: readonly Need[]
}

export const outcome = (
  truth: Outcome['truth'],
  values: Values = {},
  lines: readonly CautionLine[] = [],
  needs: readonly Need[] = [],
): Outcome => ({ truth, values, lines, needs })

export const unknown = (needs: readonly Need[], lines: readonly CautionLine[] = []): Outcome =>
  outcome('unknown', {}, lines, needs)

/** Texts under one name stand side by side; of two numbers the later holds. */
function withValues(first: Values, second: Values): Values {
  const merged: Record<string, string | number> = { ...first }
  for (const [name, value] of Object.entries(second)) {
    const earlier = merged[name]
    merged[name] =
      typeof earlier === 'string' && typeof value === 'string' && !earlier.split(', ').includes(value)
        ? `${earlier}, ${value}`
        : value
  }
  return merged
}

const joined = (parts: readonly Outcome[], truth: Outcome['truth']): Outcome => ({
  truth,
  values: parts.reduce<Values>((values, part) => withValues(values, part.values), {}),
  lines: [...new Set(parts.flatMap(({ lines }) => lines))],
  needs: [...new Set(parts.flatMap(({ needs }) => needs))],
})

const whose = (parts: readonly Outcome[], truth: Outcome['truth']) =>
  parts.filter((part) => part.truth === truth)

/** False as soon as one part is; unknown when the rest hangs on something. */
export function allOf(parts: readonly Outcome[]): Outcome {
  if (whose(parts, false).length > 0) return outcome(false)
  return joined(parts, whose(parts, 'unknown').length > 0 ? 'unknown' : true)
}

/** True as soon as one part is, and then with what those found that are. */
export function anyOf(parts: readonly Outcome[]): Outcome {
  const holding = whose(parts, true)
  if (holding.length > 0) return joined(holding, true)
  const open = whose(parts, 'unknown')
  return open.length > 0 ? joined(open, 'unknown') : outcome(false)
}

/** What is negated tells nothing about itself. */
export const notOf = (part: Outcome): Outcome =>
  part.truth === 'unknown' ? unknown(part.needs) : outcome(!part.truth)

/** Holds unless the part is known to hold. */
export const unlessOf = (part: Outcome): Outcome => outcome(part.truth !== true)
