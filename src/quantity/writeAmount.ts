import type { Amount, AmountKind } from './amount.ts'
import { expressNumber } from './express.ts'
import { typedDigits, type Locale } from './locale.ts'
import { divide, rationalOfNumber, terminatingDecimal, toNumber, type Rational } from './rational.ts'
import { readWritten } from './readAmount.ts'

/** A unit and how many of the canonical unit it holds, as a power of ten. */
type Notation = readonly [unit: string, canonicalPerUnit: number]

const massNotation = (grams: number): Notation =>
  grams >= 1 ? ['g', 1] : grams >= 1e-3 ? ['mg', 1e-3] : ['mcg', 1e-6]

const notations: Record<Exclude<AmountKind, 'quantity-sufficient' | 'ratio'>, (value: number) => Notation> = {
  mass: massNotation,
  volume: () => ['mL', 1],
  moles: () => ['mmol', 1],
  equivalents: () => ['mEq', 1],
  'mass-per-volume': (value) => {
    const [unit, factor] = massNotation(value)
    return [`${unit}/mL`, factor]
  },
  'volume-per-volume': () => ['% v/v', 1e-2],
  'mass-per-mass': () => ['% w/w', 1e-2],
  'moles-per-volume': () => ['mol/L', 1],
  'equivalents-per-volume': () => ['mEq/mL', 1],
  'moles-per-water-mass': () => ['mol/kg', 1],
  units: () => ['units', 1],
  'units-per-volume': () => ['units/mL', 1],
  percent: () => ['%', 1],
}

/** Digits of a decimal that ends; every double and its products with powers of ten do. */
function digitsOf(value: Rational): string {
  const digits = terminatingDecimal(value)
  if (digits === undefined) throw new RangeError('The decimals of this value do not end.')
  return digits
}

function writeRatio(value: number): string {
  const one = { numerator: 1n, denominator: 1n }
  const parts = toNumber(divide(one, rationalOfNumber(value)))
  const isExact = toNumber(divide(one, rationalOfNumber(parts))) === value
  return isExact ? `1:${digitsOf(rationalOfNumber(parts))}` : `${digitsOf(rationalOfNumber(value))}:1`
}

function writeValue({ kind, value }: Amount): string {
  if (kind === 'quantity-sufficient') return 'q.s.'
  if (!Number.isFinite(value) || value <= 0) throw new RangeError(`${value} is not an amount of ${kind}.`)
  if (kind === 'ratio') return writeRatio(value)
  const [unit, factor] = notations[kind](value)
  return `${digitsOf(divide(rationalOfNumber(value), rationalOfNumber(factor)))} ${unit}`
}

/**
 * Writes an amount so that `readAmount` gives back the same kind and the same value, bit for bit. The notation
 * that was typed is kept, tidied (leading zero, mcg, × for products); an amount without such text is written in
 * the usual unit of its kind. Throws a RangeError for a value that `readAmount` cannot have made.
 * @example writeAmount({ kind: 'mass', value: 0.00005, text: '50µg' }) → '50 mcg'
 */
export function writeAmount(amount: Amount, locale: Locale = 'en'): string {
  return typedDigits(keptNotation(amount) ?? writeValue(amount), locale)
}

/** The tidied text, where the text says what the amount says. */
function keptNotation({ kind, value, text }: Amount): string | undefined {
  for (const locale of ['en', 'decimal-comma'] as const) {
    const read = readWritten(text.trim(), locale)
    if (read.ok && read.value.kind === kind && toNumber(read.value.value) === value) return read.value.written
  }
  return undefined
}

/**
 * The same in safe expression for print: large numbers grouped.
 * @example printAmount({ kind: 'units', value: 10000, text: '10000 units' }) → '10,000 units'
 */
export const printAmount = (amount: Amount): string =>
  writeAmount(amount).replaceAll(/\d+(\.\d+)?/g, (digits) => expressNumber(Number(digits)))
