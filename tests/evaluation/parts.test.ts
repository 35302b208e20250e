import { describe, expect, it } from 'vitest'
import { largestSize, massesAt, type Adjuster } from '../../src/evaluation/adjusting/shares.ts'
import { sizeTo, type Trial } from '../../src/evaluation/adjusting/size.ts'
import { nonFinitePath } from '../../src/evaluation/answers/finite.ts'
import { intervalAround, preparationParts } from '../../src/evaluation/answers/interval.ts'
import { pHAt } from '../../src/evaluation/answers/pHAt.ts'
import { equivalentAt } from '../../src/evaluation/methods/equivalentAt.ts'
import { classEquivalent } from '../../src/evaluation/methods/lIso.ts'
import { sodiumChlorideScale } from '../../src/evaluation/methods/scale.ts'
import type { SolutionState } from '../../src/chemistry/types.ts'
import type { SingleDatum, TabulatedEquivalent } from '../../src/library/types.ts'

const e = (value: number): SingleDatum => ({
  value,
  unit: 'g NaCl/g',
  kind: 'tabulated',
  source: 'common-practice',
  confidence: 'medium',
  fromMemory: false,
})
const table = (...rows: readonly (readonly [number, number])[]): readonly TabulatedEquivalent[] =>
  rows.map(([atPercent, value]) => ({ atPercent, e: e(value) }))

describe('equivalentAt', () => {
  const rows = table([2, 0.23], [1, 0.24], [4, 0.2])

  it('reads between tabulated concentrations', () => {
    expect(equivalentAt(rows, 1.5)?.e).toBeCloseTo(0.235, 12)
    expect(equivalentAt(rows, 3)?.e).toBeCloseTo(0.215, 12)
    expect(equivalentAt(rows, 2)).toMatchObject({ e: 0.23, side: 'inside' })
  })

  it('takes the nearest end outside and says on which side', () => {
    expect(equivalentAt(rows, 0.1)).toMatchObject({ e: 0.24, side: 'below' })
    expect(equivalentAt(rows, 9)).toMatchObject({ e: 0.2, side: 'above' })
  })

  it('has no answer without a table', () => {
    expect(equivalentAt([], 1)).toBeNull()
  })
})

it('classEquivalent: E = 17·L_iso/M', () => {
  expect(classEquivalent(3.4, 187, 17)).toBeCloseTo(0.30909, 5)
})

describe('massesAt', () => {
  const adjusters: readonly Adjuster[] = [
    { key: 'a', share: 1, capGrams: 2 },
    { key: 'b', share: 2, capGrams: null },
  ]

  it('keeps the ratio until a cap, then the other takes the rest', () => {
    expect(massesAt(adjusters, 1)).toEqual([1, 2])
    expect(massesAt(adjusters, 3)).toEqual([2, 6])
  })

  it('has an end only where every adjuster has one', () => {
    expect(largestSize(adjusters)).toBe(Infinity)
    expect(largestSize([{ key: 'a', share: 2, capGrams: 3 }])).toBe(1.5)
  })
})

describe('sizeTo', () => {
  const from =
    (read: (size: number) => number) =>
    (size: number): Trial => ({
      status: 'read',
      milliosmPerKg: read(size),
    })
  const base = { wanted: 290, guess: () => 0.1, largest: 100 }

  it('finds the size on a curved reading', () => {
    const sized = sizeTo({ ...base, trial: from((x) => 100 + 300 * x - 20 * x * x) })
    if (sized.status !== 'found') throw new Error(sized.status)
    expect(100 + 300 * sized.size - 20 * sized.size ** 2).toBeCloseTo(290, 8)
    expect(sized.without).toBe(100)
  })

  it('adds nothing where the target is met already', () => {
    expect(sizeTo({ ...base, trial: from((x) => 290 + x) })).toMatchObject({ status: 'found', size: 0 })
  })

  it('tells the ways of failing apart', () => {
    expect(sizeTo({ ...base, trial: from((x) => 300 + x) }).status).toBe('already-above')
    expect(sizeTo({ ...base, trial: from((x) => 100 + Math.tanh(x)) })).toMatchObject({
      status: 'unreachable',
    })
    expect(sizeTo({ ...base, trial: from(() => 100) })).toMatchObject({
      status: 'cannot-size',
      code: 'adjuster-does-not-count',
    })
    expect(sizeTo({ ...base, trial: () => ({ status: 'refused', code: 'x' }) })).toMatchObject({
      status: 'cannot-size',
      without: null,
    })
    const broken = (x: number): Trial =>
      x > 0.2 && x < 0.9
        ? { status: 'refused', code: 'hole' }
        : { status: 'read', milliosmPerKg: x < 0.5 ? 100 + x : 400 }
    expect(sizeTo({ ...base, guess: () => 1, trial: broken }).status).toBe('not-converged')
  })

  it('walks on below a size that the model refuses', () => {
    const upTo =
      (limit: number) =>
      (x: number): Trial =>
        x > limit ? { status: 'refused', code: 'no-room' } : { status: 'read', milliosmPerKg: 100 + 300 * x }
    expect(sizeTo({ ...base, guess: () => 5, trial: upTo(0.7) })).toMatchObject({ status: 'found' })
    const short = sizeTo({ ...base, guess: () => 5, trial: upTo(0.5) })
    if (short.status !== 'unreachable') throw new Error(short.status)
    expect(short.size).toBeGreaterThan(0.499)
    expect(short.highest).toBeLessThanOrEqual(250)
  })

  it('keeps to the largest size', () => {
    expect(sizeTo({ ...base, largest: 0.5, trial: from((x) => 100 + 300 * x) })).toMatchObject({
      status: 'unreachable',
      highest: 250,
      size: 0.5,
    })
  })
})

describe('sodiumChlorideScale', () => {
  const exact = (percent: number) => 340 * percent - 25 * percent ** 1.5 + 4 * percent ** 2
  const scale = sodiumChlorideScale(58.44, exact)

  it('agrees with the exact rule between its nodes, both ways', () => {
    for (const percent of [0.0003, 0.01, 0.123, 0.9, 3.3, 11.1, 25]) {
      expect(scale.osmolalityOf(percent)).toBeCloseTo(exact(percent), 3)
      expect(scale.percentOf(exact(percent))).toBeCloseTo(percent, 6)
    }
  })

  it('has no answer beyond its ends', () => {
    expect(scale.percentOf(1e6)).toBeNull()
    expect(scale.osmolalityOf(-1)).toBeNull()
    expect(scale.osmolalityOf(40)).toBeNull()
    expect(
      sodiumChlorideScale(58.44, (percent) => (percent > 10 ? null : percent)).osmolalityOf(11),
    ).toBeNull()
  })
})

describe('pHAt', () => {
  const states = (at5: number | null, at25: number | null, at37: number | null) =>
    ({
      states: {
        '5': { celsius: 5, pH: at5 },
        '25': { celsius: 25, pH: at25 },
        '37': { celsius: 37, pH: at37 },
      },
    }) as unknown as SolutionState

  it('reads the parabola through the three temperatures', () => {
    expect(pHAt(20, states(7.4, 7, 6.76))).toBeCloseTo(7.1, 10)
    expect(pHAt(25, states(7.4, 7, 6.76))).toBe(7)
  })

  it('has no answer outside 0 to 40 °C or without a pH', () => {
    expect(pHAt(60, states(7.4, 7, 6.76))).toBeNull()
    expect(pHAt(20, states(7.4, null, 6.76))).toBeNull()
  })
})

describe('intervals', () => {
  it('reaches 1.96 standard uncertainties to both sides', () => {
    expect(intervalAround(290, 5).low).toBeCloseTo(280.20018, 5)
    expect(intervalAround(290, 5).high).toBeCloseTo(299.79982, 5)
  })

  it('counts the balance by its step and the volume by its fraction', () => {
    const parts = preparationParts(
      [{ key: 'a', name: 'A', grams: 0.9, osmolalityMilliosmPerKg: 286 }],
      0.01,
      2,
      0.002,
    )
    expect(parts[0]?.osmolalityMilliosmPerKg).toBeCloseTo((286 * 0.01) / Math.sqrt(12) / 2 / 0.9, 10)
    expect(parts[1]?.osmolalityMilliosmPerKg).toBeCloseTo(0.572, 10)
  })
})

it('nonFinitePath names the first number that is not finite', () => {
  expect(nonFinitePath({ a: [1, { b: Number.NaN }] })).toBe('a.1.b')
  expect(nonFinitePath({ a: null, b: 'x', c: [0] })).toBeNull()
})
