import type { AmountKind, Read } from './amount.ts'
import {
  divide,
  isZero,
  multiply,
  rationalOf,
  rationalOfNumber,
  terminatingDecimal,
  type Rational,
} from './rational.ts'
import { accept, quote, refuse } from './refusal.ts'
import type { PercentBasis } from './tokens.ts'
import type { Dimension, TradeUnit } from './units.ts'

/** One written quantity: exact canonical value and how it is written in this house. */
export interface WrittenQuantity {
  readonly kind: AmountKind
  readonly value: Rational
  readonly written: string
}

/** The number and unit below the line: the "100 mL" of "1 g/100 mL". */
export interface Below {
  /** Undefined: one. */
  readonly digits: string | undefined
  readonly unit: TradeUnit
}

const hundred: Rational = { numerator: 100n, denominator: 1n }

/** Digits as written back: no trailing zero. */
export const plainDigits = (digits: string) => terminatingDecimal(rationalOf(digits)) ?? digits

const wholeKinds: Partial<Record<Dimension, AmountKind>> = {
  mass: 'mass',
  volume: 'volume',
  moles: 'moles',
  equivalents: 'equivalents',
  molarity: 'moles-per-volume',
  biological: 'units',
}

const perVolumeKinds: Partial<Record<Dimension, AmountKind>> = {
  mass: 'mass-per-volume',
  volume: 'volume-per-volume',
  moles: 'moles-per-volume',
  equivalents: 'equivalents-per-volume',
  biological: 'units-per-volume',
}

const percentKinds: Record<PercentBasis, AmountKind> = {
  'w/v': 'mass-per-volume',
  'v/v': 'volume-per-volume',
  'w/w': 'mass-per-mass',
}

function kindOfQuotient(above: TradeUnit, below: TradeUnit): AmountKind | undefined {
  if (below.dimension === 'volume') return perVolumeKinds[above.dimension]
  if (above.dimension === 'moles' && below.symbol === 'kg') return 'moles-per-water-mass'
  if (above.dimension === 'mass' && below.symbol === 'g') return 'mass-per-mass'
  return undefined
}

function refuseQuotient(above: TradeUnit, below: TradeUnit): Read<never> {
  const pair = `${above.symbol}/${below.symbol}`
  if (above.dimension === 'mass' && below.symbol === 'kg') {
    return refuse(
      'dose-per-body-mass',
      `${pair} is read as a dose per body mass and says nothing about the solution.`,
      'Write the strength of the solution, such as 10 mg/mL or 5 % w/w.',
    )
  }
  return refuse(
    'unit-of-the-wrong-kind',
    `${pair} is not a strength.`,
    'Write per mL or per L, such as 10 mg/mL, or mol/kg for moles in a kilogram of water.',
  )
}

/** "2.5 g", "10 mM". */
export function wholeAmount(digits: string, unit: TradeUnit): Read<WrittenQuantity> {
  const kind = wholeKinds[unit.dimension]
  if (!kind) return refuseQuotient(unit, unit)
  const value = multiply(rationalOf(digits), rationalOfNumber(unit.factor))
  return accept({ kind, value, written: `${plainDigits(digits)} ${unit.symbol}` })
}

/** "10 mg/mL", "1 g per 100 mL", "0.1 mol/kg". */
export function quotient(digits: string, above: TradeUnit, below: Below): Read<WrittenQuantity> {
  const kind = kindOfQuotient(above, below.unit)
  if (!kind) return refuseQuotient(above, below.unit)
  const amountBelow = rationalOf(below.digits ?? '1')
  if (isZero(amountBelow)) {
    return refuse(
      'nothing-below',
      'Nothing stands below the line: the volume is zero.',
      'Write a volume above zero.',
    )
  }
  const over = multiply(rationalOf(digits), rationalOfNumber(above.factor))
  const value = divide(over, multiply(amountBelow, rationalOfNumber(below.unit.factor)))
  const count = plainDigits(below.digits ?? '1')
  const under = count === '1' ? below.unit.symbol : `${count} ${below.unit.symbol}`
  return accept({ kind, value, written: `${plainDigits(digits)} ${above.symbol}/${under}` })
}

/** "1 %" keeps its number; "1 % w/v" is grams in 100 mL. */
export function percentage(digits: string, basis: PercentBasis | undefined): WrittenQuantity {
  const value = rationalOf(digits)
  const written = `${plainDigits(digits)} %`
  if (!basis) return { kind: 'percent', value, written }
  return { kind: percentKinds[basis], value: divide(value, hundred), written: `${written} ${basis}` }
}

/** "1:1000", "1 in 1000", "1:1000 w/v". */
export function ratio(part: string, whole: string, basis: PercentBasis | undefined): Read<WrittenQuantity> {
  const written = `${plainDigits(part)}:${plainDigits(whole)}`
  const above = rationalOf(part)
  const below = rationalOf(whole)
  if (isZero(above) || isZero(below)) {
    return refuse('ratio-with-zero', `${quote(written)} has a zero in it.`, 'Write a ratio such as 1:1000.')
  }
  const value = divide(above, below)
  if (value.numerator > value.denominator) {
    return refuse(
      'ratio-above-one',
      `${quote(written)} asks for more parts than the whole holds.`,
      'Write the small number first, such as 1:1000.',
    )
  }
  if (!basis) return accept({ kind: 'ratio', value, written })
  return accept({ kind: percentKinds[basis], value, written: `${written} ${basis}` })
}
