import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { AmountKind } from '../../src/quantity/amount.ts'
import type { Locale } from '../../src/quantity/locale.ts'
import { readAmount } from '../../src/quantity/readAmount.ts'
import { printAmount, writeAmount } from '../../src/quantity/writeAmount.ts'

const rewritten = (text: string, locale: Locale = 'en') => {
  const read = readAmount(text, locale)
  if (!read.ok) throw new Error(read.refusal.message)
  return writeAmount(read.value, locale)
}

const kinds: readonly Exclude<AmountKind, 'quantity-sufficient' | 'ratio'>[] = [
  'mass',
  'volume',
  'moles',
  'equivalents',
  'mass-per-volume',
  'volume-per-volume',
  'mass-per-mass',
  'moles-per-volume',
  'equivalents-per-volume',
  'moles-per-water-mass',
  'percent',
  'units',
  'units-per-volume',
]

const positive = fc.oneof(
  fc.double({ min: 1e-15, max: 1e9, noNaN: true }),
  fc.double({ min: -15, max: 9, noNaN: true }).map((power) => Math.min(1e9, Math.max(1e-15, 10 ** power))),
)
const locales = fc.constantFrom<Locale>('en', 'decimal-comma')

const readBack = (text: string, locale: Locale) => {
  const read = readAmount(text, locale)
  if (!read.ok) throw new Error(`${text}: ${read.refusal.message}`)
  return [read.value.kind, read.value.value]
}

describe('writeAmount', () => {
  it.each([
    ['.5 g', '0.5 g'],
    ['50µg', '50 mcg'],
    ['1.50 g', '1.5 g'],
    ['10 mg per ml', '10 mg/mL'],
    ['1 g in 100ml', '1 g/100 mL'],
    ['1%', '1 %'],
    ['1 % (W/V)', '1 % w/v'],
    ['1 in 1000', '1:1000'],
    ['2x250 milligrams + 50mg', '2 × 250 mg + 50 mg'],
    ['0.25 g * 2', '2 × 0.25 g'],
    ['10 mM', '10 mmol/L'],
    ['4 meq/ml', '4 mEq/mL'],
    ['qs ad', 'q.s.'],
    ['1:3 w/v', '1:3 w/v'],
  ])('keeps and tidies the notation of %s', (text, expected) => {
    expect(rewritten(text)).toBe(expected)
  })

  it('writes the example of its docstring', () => {
    expect(writeAmount({ kind: 'mass', value: 0.00005, text: '50µg' })).toBe('50 mcg')
  })

  it('writes the decimal comma where the document has it', () => {
    expect(rewritten('0,25 g + 1,5 g', 'decimal-comma')).toBe('0,25 g + 1,5 g')
    expect(rewritten('q.s.', 'decimal-comma')).toBe('q.s.')
  })

  it('does not keep a text that says something else', () => {
    expect(writeAmount({ kind: 'mass', value: 0.2, text: '0.25 g' })).toBe('200 mg')
    expect(writeAmount({ kind: 'mass', value: 0.2, text: '0.2 %' })).toBe('200 mg')
  })

  it('reads back bit for bit from any value of any kind', () => {
    fc.assert(
      fc.property(fc.constantFrom(...kinds), positive, locales, (kind, value, locale) => {
        const text = writeAmount({ kind, value, text: '' }, locale)
        expect(readBack(text, locale)).toEqual([kind, value])
      }),
      { numRuns: 200 },
    )
  })

  it('reads back bit for bit from any ratio', () => {
    const ratios = fc.oneof(
      fc.double({ min: 1e-9, max: 1, noNaN: true }),
      fc
        .tuple(fc.integer({ min: 1, max: 100 }), fc.integer({ min: 100, max: 1_000_000 }))
        .map(([a, b]) => a / b),
    )
    fc.assert(
      fc.property(ratios, locales, (value, locale) => {
        const text = writeAmount({ kind: 'ratio', value, text: '' }, locale)
        expect(readBack(text, locale)).toEqual(['ratio', value])
      }),
      { numRuns: 200 },
    )
  })

  it('reads back bit for bit from whatever a person typed', () => {
    const number = fc.oneof(
      fc.integer({ min: 1, max: 99_999 }).map(String),
      fc
        .tuple(fc.integer({ min: 0, max: 999 }), fc.integer({ min: 1, max: 9999 }))
        .map(([a, b]) => `${a}.${b}`),
    )
    const unit = fc.constantFrom(
      ' g',
      'mg',
      ' µg',
      ' %',
      ' % w/v',
      ' mg/7 mL',
      ' mmol/L',
      ' mM',
      ' mEq per 3 mL',
      ' mL',
    )
    const term = (tail: string) =>
      fc.tuple(fc.integer({ min: 1, max: 9 }), number).map(([n, x]) => `${n} x ${x}${tail}`)
    const typed = unit.chain((tail) =>
      fc.array(term(tail), { minLength: 1, maxLength: 4 }).map((all) => all.join(' + ')),
    )
    fc.assert(
      fc.property(typed, (text) => {
        const read = readAmount(text)
        if (!read.ok) throw new Error(`${text}: ${read.refusal.message}`)
        expect(readBack(writeAmount(read.value), 'en')).toEqual([read.value.kind, read.value.value])
      }),
      { numRuns: 200 },
    )
  })

  it('refuses to write what cannot have been read', () => {
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY, 0, -1]) {
      expect(() => writeAmount({ kind: 'mass', value, text: '' })).toThrow(RangeError)
    }
  })

  it('answers any text at all without an exception', () => {
    const pieces = fc.constantFrom(
      '1',
      '.',
      ',',
      'mg',
      '%',
      '/',
      ':',
      ' ',
      '+',
      'x',
      'per',
      'w/v',
      '-',
      'e5',
      '\u00A0',
      '(',
      '0',
    )
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary' }),
          fc.array(pieces).map((all) => all.join('')),
        ),
        (text) => {
          const read = readAmount(text)
          if (!read.ok) expect(read.refusal.wayOut.length).toBeGreaterThan(5)
          else if (read.value.kind !== 'quantity-sufficient') expect(read.value.value).toBeGreaterThan(0)
        },
      ),
      { numRuns: 200 },
    )
  })

  it('groups large numbers for print, as its docstring says', () => {
    expect(printAmount({ kind: 'units', value: 10_000, text: '10000 units' })).toBe('10,000 units')
  })
})
