import type { Datum, TabulatedEquivalent } from '../../library/types.ts'

export interface EquivalentReading {
  /** g NaCl per g. */
  readonly e: number
  /** The entries it was read between; one where the nearest end was taken. */
  readonly from: readonly TabulatedEquivalent[]
  /** Below the lowest or above the highest tabulated concentration. */
  readonly side: 'inside' | 'below' | 'above'
}

/**
 * Sodium chloride equivalent at a concentration: linear between the tabulated concentrations, outside them the
 * nearest end. % w/v → g NaCl/g. Null for an empty table.
 *
 * @example equivalentAt([{ atPercent: 1, e: 0.24 }, { atPercent: 2, e: 0.23 }], 1.5).e → 0.235
 */
export function equivalentAt(
  table: readonly TabulatedEquivalent[],
  percentWeightInVolume: number,
): EquivalentReading | null {
  let below: TabulatedEquivalent | undefined
  let above: TabulatedEquivalent | undefined
  for (const entry of table) {
    const { atPercent } = entry
    if (atPercent <= percentWeightInVolume && (!below || atPercent > below.atPercent)) below = entry
    if (atPercent >= percentWeightInVolume && (!above || atPercent < above.atPercent)) above = entry
  }
  if (below && above) return between(below, above, percentWeightInVolume)
  if (above) return { e: above.e.value, from: [above], side: 'below' }
  if (below) return { e: below.e.value, from: [below], side: 'above' }
  return null
}

function between(
  below: TabulatedEquivalent,
  above: TabulatedEquivalent,
  percentWeightInVolume: number,
): EquivalentReading {
  const width = above.atPercent - below.atPercent
  if (width === 0) return { e: below.e.value, from: [below], side: 'inside' }
  const part = (percentWeightInVolume - below.atPercent) / width
  return { e: below.e.value + part * (above.e.value - below.e.value), from: [below, above], side: 'inside' }
}

/** The datum that stands for a reading in the trace: from memory if any of its entries is. */
export const isFromMemory = (reading: EquivalentReading) =>
  reading.from.some(({ e }: { readonly e: Datum }) => e.fromMemory)
