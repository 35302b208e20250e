import type { Read } from './amount.ts'
import type { Locale } from './locale.ts'
import { roundedDecimal, roundedToPlace, shifted } from './rational.ts'
import { accept, refuse } from './refusal.ts'

/** How many digits are shown. Neither: twelve significant digits, enough to hide binary noise only. */
export interface NumberFormat {
  readonly significant?: number
  readonly decimals?: number
  readonly locale?: Locale
  /** For the box of a measured weight alone, where 0.120 g says what the balance showed. Needs `decimals`. */
  readonly keepTrailingZeros?: boolean
}

/** What stands where a value is missing. */
export const notKnown = 'not known'

const thousandsMarks: Record<Locale, string> = { en: ',', 'decimal-comma': '\u202F' }
const decimalMarks: Record<Locale, string> = { en: '.', 'decimal-comma': ',' }
const usualSignificant = 12
const mostDigits = 15

/** A count of digits outside of these is a slip of the caller, not of the person. */
function checkedDigits(count: number, least: number): number {
  if (Number.isInteger(count) && count >= least && count <= mostDigits) return count
  throw new RangeError(`${count} digits cannot be shown; ${least} to ${mostDigits} can.`)
}

/** The decimal place at which the value is rounded, as a power of ten. */
function placeOf(value: number, { significant, decimals }: NumberFormat): number {
  if (decimals !== undefined) return -checkedDigits(decimals, 0)
  const digits = checkedDigits(significant ?? usualSignificant, 1)
  const magnitude = value === 0 ? 0 : Number(value.toExponential().split('e')[1])
  return magnitude - digits + 1
}

const grouped = (digits: string, mark: string) => digits.replace(/\B(?=(\d{3})+$)/g, mark)

/**
 * A finite number as text that is hard to misread: leading zero, no trailing zero, no exponent, thousands
 * marked from 1,000 on, a true minus sign, never "-0". Halves are rounded away from zero. A value that is not
 * finite is refused (number-missing).
 * @example tryExpressNumber(1234.5) → { ok: true, value: '1,234.5' }
 */
export function tryExpressNumber(value: number | null | undefined, format: NumberFormat = {}): Read<string> {
  if (value === null || value === undefined || !Number.isFinite(value)) {
    return refuse(
      'number-missing',
      'There is no number to show.',
      'Clear what keeps it from being calculated.',
    )
  }
  const locale = format.locale ?? 'en'
  const digits = roundedDecimal(value, placeOf(value, format))
  const [whole = '', part = ''] = digits.replace('-', '').split('.')
  const decimals = format.keepTrailingZeros ? part.padEnd(format.decimals ?? 0, '0') : part
  const text = grouped(whole, thousandsMarks[locale]) + (decimals ? decimalMarks[locale] + decimals : '')
  return accept(digits.startsWith('-') ? `\u2212${text}` : text)
}

/**
 * As `tryExpressNumber`, with the words "not known" where there is no number.
 * @example expressNumber(0.30000000000000004) → '0.3'
 */
export function expressNumber(value: number | null | undefined, format: NumberFormat = {}): string {
  const text = tryExpressNumber(value, format)
  return text.ok ? text.value : notKnown
}

/**
 * Number, space, unit.
 * @example expressQuantity(290, 'mOsm/kg') → '290 mOsm/kg'
 */
export function expressQuantity(
  value: number | null | undefined,
  unit: string,
  format: NumberFormat = {},
): string {
  const text = tryExpressNumber(value, format)
  return text.ok ? `${text.value} ${unit}` : notKnown
}

/** Each with the power of ten by which a number of grams grows. */
const massUnits: readonly (readonly [string, number])[] = [
  ['g', 0],
  ['mg', 3],
  ['mcg', 6],
]

/**
 * A mass in the unit a person reads it in: g from 1 g up, mg from 1 mg up, mcg below. The unit is chosen after
 * rounding, so that 999.96 mg to four digits is 1 g. `decimals` count in the unit that is shown.
 * @example expressMass(0.00005) → '50 mcg'
 */
export function expressMass(grams: number | null | undefined, format: NumberFormat = {}): string {
  if (grams === null || grams === undefined || !Number.isFinite(grams)) return notKnown
  const significant = format.significant ?? usualSignificant
  const [unit, power] = massUnits.find(([, power]) => {
    const inUnit = shifted(grams, power)
    const shown = roundedToPlace(inUnit, placeOf(inUnit, { significant }))
    return grams === 0 || Math.abs(shown) >= 1
  }) ?? ['mcg', 6]
  return expressQuantity(shifted(grams, power), unit, format)
}

/**
 * A volume, always in mL.
 * @example expressVolume(1000) → '1,000 mL'
 */
export const expressVolume = (millilitres: number | null | undefined, format: NumberFormat = {}) =>
  expressQuantity(millilitres, 'mL', format)

/**
 * Biological units, in words.
 * @example expressUnits(10000) → '10,000 units'
 */
export const expressUnits = (count: number | null | undefined, format: NumberFormat = {}) =>
  expressQuantity(count, count === 1 ? 'unit' : 'units', format)
