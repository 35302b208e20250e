import type { Read } from './amount.ts'
import {
  percentage,
  plainDigits,
  quotient,
  ratio,
  wholeAmount,
  type Below,
  type WrittenQuantity,
} from './notation.ts'
import { add, multiply, rationalOf } from './rational.ts'
import { accept, quote, refuse } from './refusal.ts'
import type { PercentBasis, Token } from './tokens.ts'
import { misread, unitOf, type TradeUnit } from './units.ts'

/** A bare count in a product, or a quantity. */
type Factor = { readonly count: string } | { readonly quantity: WrittenQuantity }

class Cursor {
  readonly #tokens: readonly Token[]
  #at = 0

  constructor(tokens: readonly Token[]) {
    this.#tokens = tokens
  }

  peek(ahead = 0): Token | undefined {
    return this.#tokens[this.#at + ahead]
  }

  /** Takes the next token when it is of this type. */
  take<Type extends Token['type']>(type: Type): Extract<Token, { type: Type }> | undefined {
    const token = this.peek()
    if (token?.type !== type) return undefined
    this.#at += 1
    return token as Extract<Token, { type: Type }>
  }
}

const example = 'Write a number and a unit, such as 50 mg, 1 % w/v or 10 mg/mL.'

function readUnit(spelling: string): Read<TradeUnit> {
  const unit = unitOf(spelling)
  if (unit) return accept(unit)
  const wayOut = misread.get(spelling) ?? 'Write kg, g, mg, mcg, ng, L, mL, mol, mmol, Eq or mEq.'
  return refuse('unknown-unit', `${quote(spelling)} is not a unit that can be taken here.`, wayOut)
}

/** "in" between numbers or units means per. */
function takePer(cursor: Cursor): boolean {
  if (cursor.take('per')) return true
  const token = cursor.peek()
  return token?.type === 'word' && token.text.toLowerCase() === 'in' && cursor.take('word') !== undefined
}

const takeBasis = (cursor: Cursor): PercentBasis | undefined => cursor.take('basis')?.basis

function readBelow(cursor: Cursor): Read<Below> {
  const digits = cursor.take('number')?.digits
  const word = cursor.take('word')
  if (!word)
    return refuse('unit-missing', 'The unit below the line is missing.', 'Write per mL, per L or per 100 mL.')
  const unit = readUnit(word.text)
  return unit.ok ? accept({ digits, unit: unit.value }) : unit
}

function readWithUnit(digits: string, spelling: string, cursor: Cursor): Read<WrittenQuantity> {
  const unit = readUnit(spelling)
  if (!unit.ok) return unit
  if (!takePer(cursor)) return wholeAmount(digits, unit.value)
  const below = readBelow(cursor)
  return below.ok ? quotient(digits, unit.value, below.value) : below
}

function readRatio(part: string, cursor: Cursor): Read<WrittenQuantity> {
  const whole = cursor.take('number')
  if (!whole) return refuse('ratio-incomplete', 'The second number of the ratio is missing.', 'Write 1:1000.')
  return ratio(part, whole.digits, takeBasis(cursor))
}

const asFactor = (read: Read<WrittenQuantity>): Read<Factor> =>
  read.ok ? accept({ quantity: read.value }) : read

const isIn = (token: Token | undefined) => token?.type === 'word' && token.text.toLowerCase() === 'in'

function readFactor(cursor: Cursor): Read<Factor> {
  const number = cursor.take('number')
  if (!number) return refuse('number-missing', 'A number is missing.', example)
  const { digits } = number
  if (cursor.take('percent')) return accept({ quantity: percentage(digits, takeBasis(cursor)) })
  if (cursor.take('colon') || (isIn(cursor.peek()) && cursor.take('word'))) {
    return asFactor(readRatio(digits, cursor))
  }
  const word = cursor.take('word')
  return word ? asFactor(readWithUnit(digits, word.text, cursor)) : accept({ count: digits })
}

/** Counts times one quantity, in any order. */
function readTerm(cursor: Cursor): Read<WrittenQuantity> {
  const counts: string[] = []
  let quantity: WrittenQuantity | undefined
  do {
    const factor = readFactor(cursor)
    if (!factor.ok) return factor
    if ('count' in factor.value) counts.push(plainDigits(factor.value.count))
    else if (quantity) {
      return refuse(
        'product-of-quantities',
        'Two quantities cannot be multiplied.',
        'Write a count times one quantity, such as 2 × 250 mg.',
      )
    } else quantity = factor.value.quantity
  } while (cursor.take('times'))
  if (!quantity) return refuseLooseNumber(cursor)
  const value = counts.reduce((product, count) => multiply(product, rationalOf(count)), quantity.value)
  return accept({ ...quantity, value, written: [...counts, quantity.written].join(' × ') })
}

function refuseLooseNumber(cursor: Cursor): Read<never> {
  if (cursor.peek()?.type === 'per') {
    return refuse('unit-missing', 'The unit is missing before “per”; a number cannot be divided.', example)
  }
  return refuse('unit-missing', 'The unit is missing.', example)
}

/** Reads a sum of products; everything has to be used up. */
export function readExpression(tokens: readonly Token[]): Read<WrittenQuantity> {
  const cursor = new Cursor(tokens)
  const first = readTerm(cursor)
  if (!first.ok) return first
  let total = first.value
  while (cursor.take('plus')) {
    const next = readTerm(cursor)
    if (!next.ok) return next
    if (next.value.kind !== total.kind) {
      return refuse(
        'mixed-kinds',
        `${quote(total.written)} and ${quote(next.value.written)} are not of the same kind and cannot be added.`,
        'Write both the same way, or use two lines.',
      )
    }
    total = {
      kind: total.kind,
      value: add(total.value, next.value.value),
      written: `${total.written} + ${next.value.written}`,
    }
  }
  if (!cursor.peek()) return accept(total)
  const wayOut =
    cursor.peek()?.type === 'percent' ? 'Write it per 100 mL, such as 3 g/100 mL.' : 'Leave only the amount.'
  return refuse('text-left-over', `More follows after ${quote(total.written)}.`, wayOut)
}
