import type { Limit } from '../../library/conditions.ts'

/**
 * Whether a figure crosses a limit. Ends of a between belong to it.
 * @example crosses(320.5, { below: 280, above: 320 }) → true
 */
export function crosses(value: number, { above, atLeast, below, atMost, from, to }: Limit): boolean {
  if (from !== undefined && to !== undefined) return value >= from && value <= to
  return (
    (above !== undefined && value > above) ||
    (atLeast !== undefined && value >= atLeast) ||
    (below !== undefined && value < below) ||
    (atMost !== undefined && value <= atMost)
  )
}

/** The bound that was crossed. */
export function crossed(value: number, limit: Limit): number {
  const { above, atLeast, below, atMost, from, to } = limit
  if (above !== undefined && value > above) return above
  return below ?? atLeast ?? atMost ?? to ?? from ?? above ?? value
}
