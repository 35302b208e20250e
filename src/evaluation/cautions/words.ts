import { expressNumber } from '../../quantity/express.ts'
import { readAmount } from '../../quantity/readAmount.ts'
import { printAmount } from '../../quantity/writeAmount.ts'
import type { Band } from '../../library/routes.ts'
import type { CautionLine } from './context.ts'

/** The names of lines, each once, as they stand in the formula. */
export const named = (lines: readonly CautionLine[]): string =>
  [...new Set(lines.map(({ ingredient }) => ingredient.name))].join(', ')

/**
 * A band in words.
 * @example bandText({ low: 280, high: 320 }, 'mOsm/kg') → '280 to 320 mOsm/kg'
 */
export function bandText({ low, high }: Band, unit: string): string {
  const figure = (value: number) => (unit === 'pH' ? expressNumber(value) : `${expressNumber(value)} ${unit}`)
  if (low === undefined) return high === undefined ? 'any' : `at most ${figure(high)}`
  return high === undefined ? `at least ${figure(low)}` : `${expressNumber(low)} to ${figure(high)}`
}

/**
 * An amount in the notation that a person chose, in safe expression; what cannot be read stays as it was typed.
 * @example amountText('5.0µg') → '5 mcg'
 */
export function amountText(typed: string): string {
  const read = readAmount(typed)
  if (!read.ok) return typed
  return printAmount(read.value)
}
