import { expect, it } from 'vitest'
import { statistics, type Deviation } from './salts.ts'

/** A row that is beyond the limit, named with the number it has and the cause. */
export interface Named {
  readonly label: string
  /** Per cent, signed: this program against the table. */
  readonly percent: number
  readonly cause: string
}

/** Every row beyond the limit is named, with its number, and nothing else is. */
export function expectNamed(beyond: readonly Deviation[], named: readonly Named[]): void {
  it('names every row beyond the limit, with its number', () => {
    const rounded = (rows: readonly Deviation[]) =>
      Object.fromEntries(rows.map(({ label, percent }) => [label, percent.toFixed(1)]))
    expect(rounded(beyond)).toEqual(rounded(named))
    expect(named.every(({ cause }) => cause.length > 20)).toBe(true)
  })
}

export function expectStatistics(deviations: readonly Deviation[], median: number, p95: number): void {
  it(`half within ${median} %, 95 of 100 within ${p95} %, of ${deviations.length} rows`, () => {
    const found = statistics(deviations)
    expect(found.median).toBeLessThanOrEqual(median)
    expect(found.p95).toBeLessThanOrEqual(p95)
  })
}
