/**
 * A fraction of whole numbers, kept exact. What a person types is decimal: 0.1 + 0.2 is 0.3 here. The
 * denominator is positive.
 */
export interface Rational {
  readonly numerator: bigint
  readonly denominator: bigint
}

/**
 * A finite number in plain decimal digits that read back to the same number: never an exponent.
 * @example plainDecimal(5e-7) → '0.0000005'
 */
export function plainDecimal(value: number): string {
  const [mantissa = '', exponentText = '0'] = String(Math.abs(value)).split('e')
  const [whole = '', part = ''] = mantissa.split('.')
  const digits = whole + part
  const point = whole.length + Number(exponentText)
  const padded =
    point <= 0
      ? `0.${'0'.repeat(-point)}${digits}`
      : point >= digits.length
        ? digits + '0'.repeat(point - digits.length)
        : `${digits.slice(0, point)}.${digits.slice(point)}`
  return value < 0 ? `-${padded}` : padded
}

/** The exact value of decimal digits such as "12", "0.25", ".5" or "-3.1". */
export function rationalOf(decimalText: string): Rational {
  const [whole = '', part = ''] = decimalText.split('.')
  return {
    numerator: BigInt(whole + part === '' ? '0' : `${whole}${part}`),
    denominator: 10n ** BigInt(part.length),
  }
}

/** The exact value of the shortest decimal digits of a finite number. */
export const rationalOfNumber = (value: number): Rational => rationalOf(plainDecimal(value))

export const add = (a: Rational, b: Rational): Rational => ({
  numerator: a.numerator * b.denominator + b.numerator * a.denominator,
  denominator: a.denominator * b.denominator,
})

export const multiply = (a: Rational, b: Rational): Rational => ({
  numerator: a.numerator * b.numerator,
  denominator: a.denominator * b.denominator,
})

/** For positive `b` only; the callers refuse a zero before. */
export const divide = (a: Rational, b: Rational): Rational => ({
  numerator: a.numerator * b.denominator,
  denominator: a.denominator * b.numerator,
})

export const isZero = (a: Rational) => a.numerator === 0n

/** Nearest whole multiple of `step`, halves away from zero. */
export function roundToStep(value: Rational, step: Rational): Rational {
  const { numerator, denominator } = divide(value, step)
  const size = numerator < 0n ? -numerator : numerator
  const count = (2n * size + denominator) / (2n * denominator)
  return multiply({ numerator: numerator < 0n ? -count : count, denominator: 1n }, step)
}

/**
 * A finite number rounded to a power of ten as it is written, halves away from zero: the same as
 * `toNumber(roundToStep(rationalOfNumber(value), 10^place))`, by its digits alone.
 * @example roundedToPlace(2.675, -2) → 2.68
 */
export function roundedToPlace(value: number, place: number): number {
  const { digits, point } = digitsOf(value)
  return roundedDigits(value, digits, point, place)
}

/**
 * The same to a count of digits from the first that is not zero.
 * @example roundedToDigits(0.0123456, 3) → 0.0123
 */
export function roundedToDigits(value: number, count: number): number {
  const { digits, point } = digitsOf(value)
  let first = 0
  while (first < digits.length && digits.charCodeAt(first) === zero) first += 1
  return first === digits.length ? 0 : roundedDigits(value, digits, point, point - first - count)
}

const zero = '0'.charCodeAt(0)

/** The shortest digits that read back to the number, and how many of them stand before the point. */
function digitsOf(value: number): { readonly digits: string; readonly point: number } {
  const [mantissa = '', exponentText = '0'] = String(Math.abs(value)).split('e')
  const at = mantissa.indexOf('.')
  const point = (at < 0 ? mantissa.length : at) + Number(exponentText)
  return { digits: at < 0 ? mantissa : mantissa.slice(0, at) + mantissa.slice(at + 1), point }
}

function roundedDigits(value: number, digits: string, point: number, place: number): number {
  const kept = point - place
  // A negative zero is written without its sign.
  if (kept >= digits.length) return value === 0 ? 0 : value
  if (kept < 0) return 0
  if (kept > safeDigits) return toNumber(roundToStep(rationalOfNumber(value), powerOfTen(place)))
  const count = Number(digits.slice(0, kept)) + (digits.charAt(kept) >= '5' ? 1 : 0)
  if (count === 0) return 0
  const size = Number(`${count}e${place}`)
  return value < 0 ? -size : size
}

/**
 * Plain digits of a finite number rounded so, without trailing zeros.
 * @example roundedDecimal(1234.5, 0) → '1235'
 */
export function roundedDecimal(value: number, place: number): string {
  // A double holds fifteen digits as they were rounded; more are kept exact, and so is what could overflow.
  if (Math.abs(value) < Math.min(10 ** (safeDigits + place), largestQuick))
    return plainDecimal(roundedToPlace(value, place))
  return terminatingDecimal(roundToStep(rationalOfNumber(value), powerOfTen(place))) ?? ''
}

/**
 * A finite number times a power of ten, moved digit by digit: what the exact product rounds to.
 * @example shifted(0.07, 3) → 70
 */
export function shifted(value: number, power: number): number {
  const [mantissa = '', exponentText = '0'] = String(value).split('e')
  return Number(`${mantissa}e${Number(exponentText) + power}`)
}

/** So many digits make a whole number that a double holds. */
const safeDigits = 15
const largestQuick = 1e300

export const powerOfTen = (power: number): Rational =>
  power >= 0
    ? { numerator: 10n ** BigInt(power), denominator: 1n }
    : { numerator: 1n, denominator: 10n ** BigInt(-power) }

/**
 * Plain digits of a value whose decimals end, without trailing zeros; undefined where they do not end (1/3).
 * @example terminatingDecimal(rationalOf('1.50')) → '1.5'
 */
export function terminatingDecimal(value: Rational): string | undefined {
  const { numerator, denominator } = reduce(value)
  const twos = timesDivisible(denominator, 2n)
  const fives = timesDivisible(denominator, 5n)
  if (denominator !== 2n ** BigInt(twos) * 5n ** BigInt(fives)) return undefined
  const decimals = Math.max(twos, fives)
  const scaled = (numerator * 10n ** BigInt(decimals)) / denominator
  const digits = (scaled < 0n ? -scaled : scaled).toString().padStart(decimals + 1, '0')
  const whole = digits.slice(0, digits.length - decimals)
  const sign = scaled < 0n ? '-' : ''
  return decimals === 0 ? sign + whole : `${sign}${whole}.${digits.slice(-decimals)}`
}

/** Correctly rounded where the decimals end; otherwise the quotient of the two. */
export function toNumber(value: Rational): number {
  const digits = terminatingDecimal(value)
  if (digits !== undefined) return Number(digits)
  const { numerator, denominator } = reduce(value)
  return Number(numerator) / Number(denominator)
}

function reduce({ numerator, denominator }: Rational): Rational {
  let a = numerator < 0n ? -numerator : numerator
  let b = denominator
  while (b !== 0n) [a, b] = [b, a % b]
  return a === 0n ? { numerator, denominator } : { numerator: numerator / a, denominator: denominator / a }
}

function timesDivisible(value: bigint, by: bigint): number {
  let rest = value
  let times = 0
  while (rest % by === 0n) {
    rest /= by
    times += 1
  }
  return times
}
