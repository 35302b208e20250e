import { describe, expect, it } from 'vitest'
import type { AmountKind } from '../../src/quantity/amount.ts'
import type { Locale } from '../../src/quantity/locale.ts'
import { longestAmountText, readAmount } from '../../src/quantity/readAmount.ts'

const valueOf = (text: string, locale?: Locale) => {
  const read = readAmount(text, locale)
  if (!read.ok) throw new Error(`${text}: ${read.refusal.message}`)
  return [read.value.kind, read.value.value]
}

const refusalOf = (text: string, locale?: Locale) => {
  const read = readAmount(text, locale)
  if (read.ok) throw new Error(`${text} was read as ${read.value.kind} ${read.value.value}`)
  return read.refusal
}

const taken: readonly (readonly [string, AmountKind, number])[] = [
  ['1 %', 'percent', 1],
  ['1%', 'percent', 1],
  ['0.9 percent', 'percent', 0.9],
  ['1 % w/v', 'mass-per-volume', 0.01],
  ['1 % (w/v)', 'mass-per-volume', 0.01],
  ['1 % m/v', 'mass-per-volume', 0.01],
  ['2 % v/v', 'volume-per-volume', 0.02],
  ['5 % w/w', 'mass-per-mass', 0.05],
  ['10 mg/mL', 'mass-per-volume', 0.01],
  ['10 mg / ml', 'mass-per-volume', 0.01],
  ['1 g/100 mL', 'mass-per-volume', 0.01],
  ['5 mg per 10 mL', 'mass-per-volume', 0.0005],
  ['5 mg in 10 mL', 'mass-per-volume', 0.0005],
  ['9 g/L', 'mass-per-volume', 0.009],
  ['2 mL/100 mL', 'volume-per-volume', 0.02],
  ['10 mg/g', 'mass-per-mass', 0.01],
  ['0.154 mol/L', 'moles-per-volume', 0.154],
  ['150 mmol/L', 'moles-per-volume', 0.15],
  ['10 mM', 'moles-per-volume', 0.01],
  ['0.5 M', 'moles-per-volume', 0.5],
  ['20 µM', 'moles-per-volume', 0.00002],
  ['0.1 mol/kg', 'moles-per-water-mass', 0.1],
  ['1000 units', 'units', 1000],
  ['5000 units/mL', 'units-per-volume', 5000],
  ['100 mmol/kg', 'moles-per-water-mass', 0.1],
  ['4 mEq/mL', 'equivalents-per-volume', 4],
  ['20 mEq/L', 'equivalents-per-volume', 0.02],
  ['2.5 g', 'mass', 2.5],
  ['50 mcg', 'mass', 0.00005],
  ['50 µg', 'mass', 0.00005],
  ['50 μg', 'mass', 0.00005],
  ['50ug', 'mass', 0.00005],
  ['35 mg', 'mass', 0.035],
  ['3 ng', 'mass', 3e-9],
  ['1.5 kg', 'mass', 1500],
  ['5 mL', 'volume', 5],
  ['1 L', 'volume', 1000],
  ['50 microL', 'volume', 0.05],
  ['10 mmol', 'moles', 10],
  ['0.01 mol', 'moles', 10],
  ['20 mEq', 'equivalents', 20],
  ['0.02 Eq', 'equivalents', 20],
  ['1:1000', 'ratio', 0.001],
  ['1 : 1000', 'ratio', 0.001],
  ['1 in 1000', 'ratio', 0.001],
  ['1:3', 'ratio', 1 / 3],
  ['1:1', 'ratio', 1],
  ['1:1000 w/v', 'mass-per-volume', 0.001],
  ['2 * 0.25 g', 'mass', 0.5],
  ['0.25 g * 2', 'mass', 0.5],
  ['2x250mg', 'mass', 0.5],
  ['2 x 250 mg + 50 mg', 'mass', 0.55],
  ['0.1 g + 0.2 g', 'mass', 0.3],
  ['0.2 g + 100 mg', 'mass', 0.3],
  ['3 × 0.5 %', 'percent', 1.5],
  ['2 × 3 × 10 mL', 'volume', 60],
  ['1 % w/v + 5 mg/mL', 'mass-per-volume', 0.015],
  ['.5 g', 'mass', 0.5],
  ['2.5\u00A0g', 'mass', 2.5],
  ['2.5\u2009g', 'mass', 2.5],
  ['2.5\u202Fg', 'mass', 2.5],
  ['  2.5 g  ', 'mass', 2.5],
  ['q.s.', 'quantity-sufficient', 0],
  ['qs', 'quantity-sufficient', 0],
  ['QS', 'quantity-sufficient', 0],
  ['q.s. to', 'quantity-sufficient', 0],
  ['q.s. ad', 'quantity-sufficient', 0],
]

const refused: readonly (readonly [string, string])[] = [
  ['', 'empty'],
  ['   ', 'empty'],
  ['1,234', 'ambiguous-mark'],
  ['1,234 mg', 'ambiguous-mark'],
  ['0,5 g', 'ambiguous-mark'],
  ['1,234.5 mg', 'ambiguous-mark'],
  ['-1 g', 'negative'],
  ['−1 g', 'negative'],
  ['–1 g', 'negative'],
  ['5 - 10 mg', 'minus'],
  ['5 mg − 1 mg', 'minus'],
  ['5', 'unit-missing'],
  ['2 * 3', 'unit-missing'],
  ['1 g /', 'unit-missing'],
  ['1 g / 4', 'unit-missing'],
  ['5 / mL', 'unit-missing'],
  ['10 quux', 'unknown-unit'],
  ['10 Mg', 'unknown-unit'],
  ['10 cc', 'unknown-unit'],
  ['10 gr', 'unknown-unit'],
  ['290 mOsm/kg', 'unknown-unit'],
  ['3 g%', 'text-left-over'],
  ['5 mg%', 'text-left-over'],
  ['1 mol/g', 'unit-of-the-wrong-kind'],
  ['1 mEq/kg', 'unit-of-the-wrong-kind'],
  ['1 mL/g', 'unit-of-the-wrong-kind'],
  ['1 g/mol', 'unit-of-the-wrong-kind'],
  ['10 mM/L', 'unit-of-the-wrong-kind'],
  ['10 mg/kg', 'dose-per-body-mass'],
  ['0 g', 'zero'],
  ['0.000 %', 'zero'],
  ['0 * 5 g', 'zero'],
  ['NaN', 'number-missing'],
  ['NaN g', 'number-missing'],
  ['Infinity g', 'number-missing'],
  ['∞ g', 'unknown-character'],
  ['1e999', 'exponent'],
  ['1e3 mg', 'exponent'],
  ['1E-3 g', 'exponent'],
  ['1.2.3 g', 'malformed-number'],
  ['5. g', 'malformed-number'],
  ['.', 'malformed-number'],
  ['05 g', 'lost-point'],
  ['1 000 mg', 'space-in-number'],
  ['1\u202F000 mg', 'space-in-number'],
  ['5 mg of it', 'text-left-over'],
  ['1 % w/v daily', 'text-left-over'],
  ['5 mg 3 mL', 'text-left-over'],
  ['5 mg * 3 mL', 'product-of-quantities'],
  ['5 mg + 3 mL', 'mixed-kinds'],
  ['1 % + 1 % w/v', 'mixed-kinds'],
  ['5 mg +', 'number-missing'],
  ['+ 5 mg', 'number-missing'],
  ['2 x', 'number-missing'],
  ['mg', 'number-missing'],
  ['1:0', 'ratio-with-zero'],
  ['0:1000', 'ratio-with-zero'],
  ['1000:1', 'ratio-above-one'],
  ['1:', 'ratio-incomplete'],
  ['1 g/0 mL', 'nothing-below'],
  ['10000000 kg', 'absurd-size'],
  ['0.0000001 ng', 'absurd-size'],
  [`${'9'.repeat(190)} g`, 'absurd-size'],
  [`0.${'0'.repeat(190)}1 g`, 'absurd-size'],
  ['1'.repeat(longestAmountText + 1), 'too-long'],
  ['constructor', 'number-missing'],
  ['5 constructor', 'unknown-unit'],
  ['5 __proto__', 'unknown-character'],
  ['(2 g)', 'unknown-character'],
  ['½ g', 'unknown-character'],
  ['5\u200B g', 'unknown-character'],
  ['5 g <script>', 'unknown-character'],
  ['q.s. to 100 mL', 'volume-after-quantity-sufficient'],
]

describe('readAmount', () => {
  it.each(taken)('takes %s as %s of %d', (text, kind, value) => {
    expect(valueOf(text)).toEqual([kind, value])
  })

  it.each(refused)('refuses “%s”: %s', (text, code) => {
    const refusal = refusalOf(text)
    expect(refusal.code).toBe(code)
    expect(refusal.message).toMatch(/^[^\s].*[.:]$/)
    expect(refusal.wayOut).toMatch(/\.$/)
    expect(refusal.message).not.toMatch(/undefined|NaN\b(?!”)|\[object/)
  })

  it('keeps the text as typed, trimmed', () => {
    expect(readAmount(' 2 x 250 mg ')).toEqual({
      ok: true,
      value: { kind: 'mass', value: 0.5, text: '2 x 250 mg' },
    })
  })

  it.each([
    ['1,234 mg', 'Write 1.234 or 1234, '],
    ['1,000 mg', 'Write 1 or 1000, '],
    ['0,5 g', 'Write 0.5, '],
    ['12,5 g', 'Write 12.5, '],
    ['1.234,5 mg', 'Write 1234.5, '],
    ['1,234,567 mg', 'Write 1234567, '],
    [',5 g', 'Write 0.5, '],
    ['5, g', 'Write digits '],
    ['3 g%', 'Write it per 100 mL'],
  ])('says how to write %s', (text, wayOut) => {
    expect(refusalOf(text).wayOut).toContain(wayOut)
  })

  it('names a character that cannot be seen', () => {
    expect(refusalOf('5\u200B g').message).toContain('U+200B')
  })

  it('takes a text of the greatest length', () => {
    const text = `${'1 mg + '.repeat(28)}1 mg`
    expect(text.length).toBe(longestAmountText)
    expect(valueOf(text)).toEqual(['mass', 0.029])
  })
})

describe('readAmount in a document with decimal commas', () => {
  it.each([
    ['0,5 g', 'mass', 0.5],
    [',5 g', 'mass', 0.5],
    ['1,234 mg', 'mass', 0.001234],
    ['2 x 0,25 g', 'mass', 0.5],
    ['q.s.', 'quantity-sufficient', 0],
  ] as const)('takes %s', (text, kind, value) => {
    expect(valueOf(text, 'decimal-comma')).toEqual([kind, value])
  })

  it.each([
    ['1.234 mg', 'ambiguous-mark'],
    ['0.5 g', 'ambiguous-mark'],
    ['1.234,5 mg', 'ambiguous-mark'],
    ['1,2,3 g', 'malformed-number'],
    ['5, g', 'malformed-number'],
  ] as const)('refuses %s', (text, code) => {
    expect(refusalOf(text, 'decimal-comma').code).toBe(code)
  })

  it('says how to write a point, with decimal commas', () => {
    expect(refusalOf('1.234 mg', 'decimal-comma').wayOut).toContain('Write 1,234 or 1234, ')
  })
})
