import type { AmountKind, Read } from './amount.ts'
import type { DegreesCelsius, Grams, Millilitres } from './brand.ts'
import type { Locale } from './locale.ts'
import { degreesCelsius, grams, millilitres } from './mint.ts'
import { add, rationalOf, toNumber } from './rational.ts'
import { isQuantitySufficient, kindWords, readWritten } from './readAmount.ts'
import { accept, quote, refuse } from './refusal.ts'
import { tokenize } from './tokens.ts'

function readKind(text: string, kind: AmountKind, example: string, locale: Locale): Read<number> {
  const trimmed = text.trim()
  const wayOut = `Write ${kindWords[kind]}, such as ${example}.`
  if (isQuantitySufficient(trimmed)) {
    return refuse('unit-of-the-wrong-kind', `“q.s.” has no size; ${kindWords[kind]} is needed.`, wayOut)
  }
  const read = readWritten(trimmed, locale)
  if (!read.ok) return read
  if (read.value.kind === kind) return accept(toNumber(read.value.value))
  const message = `${quote(trimmed)} is ${kindWords[read.value.kind]}; ${kindWords[kind]} is needed.`
  return refuse('unit-of-the-wrong-kind', message, wayOut)
}

/**
 * A volume in mL; sums and products allowed. Refuses as `readAmount` does, and unit-of-the-wrong-kind.
 * @example readVolume('1 L') → { ok: true, value: 1000 }
 */
export function readVolume(text: string, locale: Locale = 'en'): Read<Millilitres> {
  const read = readKind(text, 'volume', '100 mL', locale)
  return read.ok ? accept(millilitres(read.value)) : read
}

/**
 * A mass in g; sums and products allowed. Refuses as `readAmount` does, and unit-of-the-wrong-kind.
 * @example readMass('2 * 0.25 g') → { ok: true, value: 0.5 }
 */
export function readMass(text: string, locale: Locale = 'en'): Read<Grams> {
  const read = readKind(text, 'mass', '2.5 g', locale)
  return read.ok ? accept(grams(read.value)) : read
}

const finestReadabilityG = 1e-9
const coarsestReadabilityG = 1000

/**
 * The smallest step of a balance in g, from 1 ng to 1 kg.
 * @example readReadability('1 mg') → { ok: true, value: 0.001 }
 */
export function readReadability(text: string, locale: Locale = 'en'): Read<Grams> {
  const read = readKind(text, 'mass', '1 mg', locale)
  if (!read.ok) return read
  if (read.value < finestReadabilityG || read.value > coarsestReadabilityG) {
    return refuse(
      'absurd-size',
      `No balance reads to ${quote(text)}.`,
      'Write the step of the display, such as 1 mg.',
    )
  }
  return accept(grams(read.value))
}

const celsiusSpelling = /\s*(°\s?C|º\s?C|℃|C|deg C|degC)$/
const kelvinSpelling = /\s*K$/
const coldest = 0
const hottest = 100

/** Temperature words are not units of an amount, so the number is read alone. */
function readBareNumber(text: string, locale: Locale): Read<string> {
  const tokens = tokenize(text.trim(), locale)
  if (!tokens.ok) return tokens
  const [number, ...rest] = tokens.value
  if (number?.type !== 'number' || rest.length > 0) {
    return refuse('malformed-number', `${quote(text)} is not one number.`, 'Write one number and its unit.')
  }
  return accept(number.digits)
}

/**
 * A temperature of the solution in °C, from 0 to 100 °C; K is converted.
 * @example readTemperature('298.15 K') → { ok: true, value: 25 }
 */
export function readTemperature(text: string, locale: Locale = 'en'): Read<DegreesCelsius> {
  const trimmed = text.trim()
  const isKelvin = kelvinSpelling.test(trimmed)
  const spelling = isKelvin ? kelvinSpelling : celsiusSpelling
  if (!spelling.test(trimmed)) {
    return refuse(
      'unit-missing',
      `${quote(trimmed)} has no unit of temperature.`,
      'Write °C or K, such as 25 °C.',
    )
  }
  const digits = readBareNumber(trimmed.replace(spelling, ''), locale)
  if (!digits.ok) return digits
  const celsius = toNumber(add(rationalOf(digits.value), rationalOf(isKelvin ? '-273.15' : '0')))
  if (celsius < coldest || celsius > hottest) {
    return refuse(
      'absurd-size',
      `${quote(trimmed)} is not between ${coldest} and ${hottest} °C.`,
      'Write the temperature of the solution, such as 25 °C.',
    )
  }
  return accept(degreesCelsius(celsius))
}

/** What a formula can be adjusted to, and the unit of the value that is read. */
export type TargetKind =
  | 'osmolality' // mOsm/kg
  | 'effective-osmolality' // mOsm/kg
  | 'sodium-chloride-equivalent' // % w/v
  | 'freezing-point-depression' // K

interface TargetNotation {
  readonly spellings: RegExp
  /** Factor by matched unit, where it is not one. */
  readonly thousand?: RegExp
  readonly example: string
  readonly most: number
}

const osmolalityNotation: TargetNotation = {
  spellings: /\s*m?osm(ol)?\s*(\/|per)\s*kg(\s*(of\s*)?(water|H2O))?$/i,
  thousand: /^osm/i,
  example: '290 mOsm/kg',
  most: 10_000,
}

const targets: Record<TargetKind, TargetNotation> = {
  osmolality: osmolalityNotation,
  'effective-osmolality': osmolalityNotation,
  'sodium-chloride-equivalent': {
    spellings: /\s*%\s*(\(w\/v\)|w\/v|NaCl|sodium chloride)?$/,
    example: '0.9 %',
    most: 26,
  },
  'freezing-point-depression': { spellings: /\s*(K|°\s?C|º\s?C|℃|C)$/, example: '0.52 K', most: 20 },
}

/**
 * The value of a target in the unit of its kind. Refuses a unit of another kind, zero, and what no aqueous
 * solution reaches (10,000 mOsm/kg, 26 % sodium chloride, 20 K).
 * @example readTarget('osmolality', '0.29 Osm/kg') → { ok: true, value: 290 }
 */
export function readTarget(quantity: TargetKind, text: string, locale: Locale = 'en'): Read<number> {
  const { spellings, thousand, example, most } = targets[quantity]
  const trimmed = text.trim()
  const wayOut = `Write the target as ${example}.`
  const unit = spellings.exec(trimmed)?.[0].trim()
  if (unit === undefined) {
    const code = /^[\d.,\s]*$/.test(trimmed) ? 'unit-missing' : 'unit-of-the-wrong-kind'
    return refuse(code, `${quote(trimmed)} is not written in the unit of this target.`, wayOut)
  }
  const digits = readBareNumber(trimmed.replace(spellings, ''), locale)
  if (!digits.ok) return digits
  const value = toNumber(rationalOf(digits.value)) * (thousand?.test(unit) ? 1000 : 1)
  if (value === 0) return refuse('zero', 'The target is zero.', wayOut)
  if (value > most) return refuse('absurd-size', `${quote(trimmed)} is too large to be meant.`, wayOut)
  return accept(value)
}
