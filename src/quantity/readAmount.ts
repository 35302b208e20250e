import type { Amount, AmountKind, Read } from './amount.ts'
import { readExpression } from './expression.ts'
import { keptAs } from './kept.ts'
import type { Locale } from './locale.ts'
import type { WrittenQuantity } from './notation.ts'
import { isZero, toNumber } from './rational.ts'
import { accept, quote, refuse } from './refusal.ts'
import { tokenize } from './tokens.ts'

export const longestAmountText = 200

/** Outside of these no amount of any kind, in its canonical unit, is meant. */
const largest = 1e9
const smallest = 1e-15

const quantitySufficient = /^q\.?\s?s\.?(\s*(to|ad))?$/i

export const isQuantitySufficient = (text: string) => quantitySufficient.test(text.trim())

/** The written quantity of trimmed text, exact, with its size checked. */
export const readWritten = (text: string, locale: Locale): Read<WrittenQuantity> =>
  keptAs(written, mostKept, `${locale} ${text}`, () => readAnew(text, locale))

/* The same text is read again at every keystroke in another line, and always reads the same. */
const written = new Map<string, Read<WrittenQuantity>>()
const mostKept = 400

function readAnew(text: string, locale: Locale): Read<WrittenQuantity> {
  if (text === '') {
    return refuse('empty', 'Nothing is written.', 'Write a number and a unit, such as 50 mg or 1 % w/v.')
  }
  if (text.length > longestAmountText) {
    return refuse(
      'too-long',
      `The text is longer than ${longestAmountText} characters.`,
      'Write the amount alone and keep remarks in the note.',
    )
  }
  const tokens = tokenize(text, locale)
  if (!tokens.ok) return tokens
  const read = readExpression(tokens.value)
  if (!read.ok) return read
  if (isZero(read.value.value)) {
    return refuse('zero', 'The amount is zero.', 'Write an amount above zero, or remove the line.')
  }
  const size = toNumber(read.value.value)
  if (size > largest || size < smallest) {
    const way = size > largest ? 'large' : 'small'
    return refuse(
      'absurd-size',
      `${quote(text)} is too ${way} to be meant.`,
      'Check the number and the unit.',
    )
  }
  return read
}

/**
 * Reads what a person types as an amount, in the notation of the trade. Canonical units are those of
 * `AmountKind`. Nothing is guessed: ambiguous text is refused with the reason and the way to write it.
 * Sums and products are exact: 0.1 g + 0.2 g is 0.3 g.
 *
 * Refusals: empty, too-long, ambiguous-mark, malformed-number, lost-point, exponent, negative, minus,
 * unknown-character, number-missing, unit-missing, unknown-unit, unit-of-the-wrong-kind,
 * dose-per-body-mass, space-in-number, nothing-below, ratio-with-zero, ratio-above-one, ratio-incomplete,
 * product-of-quantities, mixed-kinds, text-left-over, zero, absurd-size, volume-after-quantity-sufficient.
 * @example readAmount('2 x 250 mg') → { ok: true, value: { kind: 'mass', value: 0.5, text: '2 x 250 mg' } }
 */
export function readAmount(text: string, locale: Locale = 'en'): Read<Amount> {
  const trimmed = text.trim()
  if (isQuantitySufficient(trimmed)) return accept({ kind: 'quantity-sufficient', value: 0, text: trimmed })
  if (/^q\.?\s?s\.?(\s|$)/i.test(trimmed)) {
    return refuse(
      'volume-after-quantity-sufficient',
      'Only “q.s.” can stand here; the volume belongs to the whole formula.',
      'Write q.s. and set the final volume above the lines.',
    )
  }
  const read = readWritten(trimmed, locale)
  if (!read.ok) return read
  return accept({ kind: read.value.kind, value: toNumber(read.value.value), text: trimmed })
}

/** Words for the kinds, for messages. */
export const kindWords: Readonly<Record<AmountKind, string>> = {
  'quantity-sufficient': 'a quantity sufficient',
  mass: 'a mass',
  volume: 'a volume',
  moles: 'an amount of substance',
  equivalents: 'equivalents',
  'mass-per-volume': 'a mass per volume',
  'volume-per-volume': 'a volume per volume',
  'mass-per-mass': 'a mass per mass',
  'moles-per-volume': 'moles per volume',
  'equivalents-per-volume': 'equivalents per volume',
  'moles-per-water-mass': 'moles per kilogram of water',
  units: 'units of activity',
  'units-per-volume': 'units per volume',
  percent: 'a percentage',
  ratio: 'a ratio',
}
