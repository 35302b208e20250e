import type { Read } from './amount.ts'
import { typedDigits, type Locale } from './locale.ts'
import { rationalOf, terminatingDecimal } from './rational.ts'
import { accept, quote, refuse } from './refusal.ts'

export type PercentBasis = 'w/v' | 'v/v' | 'w/w'

export type Token =
  | { readonly type: 'number'; /** Plain digits with a point. */ readonly digits: string }
  | { readonly type: 'word'; readonly text: string }
  | { readonly type: 'basis'; readonly basis: PercentBasis }
  | { readonly type: 'plus' | 'times' | 'per' | 'colon' | 'percent' }

const basisPattern = /\(\s*([wvm]\s*\/\s*[wvm])\s*\)|([wvm]\s*\/\s*[wvm])(?![A-Za-z])/iy
const percentPattern = /%|percent(?![A-Za-z])/iy
const wordPattern = /[A-Za-zµμ]+/y
const timesPattern = /[*×]|[xX](?![A-Za-zµμ])/y
const spacePattern = /\s+/y
const minus = /[-\u2010-\u2015\u2212\uFE63\uFF0D]/

const signs: Readonly<Record<string, 'plus' | 'per' | 'colon'>> = { '+': 'plus', '/': 'per', ':': 'colon' }

const matchAt = (pattern: RegExp, text: string, at: number) => {
  pattern.lastIndex = at
  return pattern.exec(text)
}

const basisOf = (written: string): PercentBasis | undefined => {
  const plain = written.toLowerCase().replace(/\s/g, '').replace(/m/g, 'w')
  return plain === 'w/v' || plain === 'v/v' || plain === 'w/w' ? plain : undefined
}

/** The numbers that digits with a foreign mark can mean: as a decimal, and in groups of thousands. */
function meanings(chunk: string, locale: Locale): string {
  const marks = chunk.replace(/\d/g, '')
  const lastMark = Math.max(chunk.lastIndexOf('.'), chunk.lastIndexOf(','))
  const decimal = `${chunk.slice(0, lastMark).replace(/[.,]/g, '') || '0'}.${chunk.slice(lastMark + 1)}`
  const isDecimal = marks.length === 1 || marks.at(-1) !== marks.at(-2)
  const isGrouped = /^[1-9]\d{0,2}([.,]\d{3})+$/.test(chunk) && new Set(marks).size === 1
  const meant = [isDecimal ? decimal : '', isGrouped ? chunk.replace(/[.,]/g, '') : '']
  return meant
    .filter((text) => /^\d+(\.\d+)?$/.test(text))
    .map((text) => typedDigits(terminatingDecimal(rationalOf(text)) ?? text, locale))
    .join(' or ')
}

function refuseForeignMark(chunk: string, locale: Locale): Read<never> {
  const mark = locale === 'en' ? 'comma' : 'point'
  const meant = meanings(chunk, locale)
  return refuse(
    'ambiguous-mark',
    `The ${mark} in ${quote(chunk)} is not taken: to some it is a decimal mark, to others a mark of thousands.`,
    meant ? `Write ${meant}, without marks for thousands.` : 'Write digits with one decimal mark.',
  )
}

/** Takes a number apart from the text before anything is made of it. `chunk` is digits, points and commas. */
function readDigits(chunk: string, locale: Locale): Read<string> {
  if (chunk.includes(locale === 'en' ? ',' : '.')) return refuseForeignMark(chunk, locale)
  const digits = chunk.replace(',', '.')
  const written = quote(chunk)
  if (!/^(\d+(\.\d+)?|\.\d+)$/.test(digits)) {
    return refuse('malformed-number', `${written} is not a number.`, 'Write digits with one decimal mark.')
  }
  if (/^0\d/.test(digits)) {
    return refuse(
      'lost-point',
      `${written} begins with a zero, as if a decimal mark were lost.`,
      `Write ${chunk.replace(/^0+(?=\d)/, '')}, or put the decimal mark after the zero.`,
    )
  }
  return accept(digits.startsWith('.') ? `0${digits}` : digits)
}

const refuseMinus = (isFirst: boolean) =>
  isFirst
    ? refuse('negative', 'An amount cannot be negative.', 'Write the amount without the minus sign.')
    : refuse('minus', 'A minus or a range is not an amount.', 'Write the one amount that is meant.')

function signAt(text: string, at: number): Token | undefined {
  const character = text[at] ?? ''
  const type = signs[character]
  if (type) return { type }
  return matchAt(timesPattern, text, at) ? { type: 'times' } : undefined
}

type Step = Read<{ readonly token?: Token; readonly length: number }>

function stepAt(text: string, at: number, locale: Locale): Step {
  const space = matchAt(spacePattern, text, at)
  if (space) return accept({ length: space[0].length })
  const number = matchAt(/[\d.,]+/y, text, at)
  if (number) {
    const digits = readDigits(number[0], locale)
    if (!digits.ok) return digits
    return accept({ token: { type: 'number', digits: digits.value }, length: number[0].length })
  }
  const percent = matchAt(percentPattern, text, at)
  if (percent) return accept({ token: { type: 'percent' }, length: percent[0].length })
  const basis = matchAt(basisPattern, text, at)
  const known = basis && basisOf(basis[1] ?? basis[2] ?? '')
  if (basis && known) return accept({ token: { type: 'basis', basis: known }, length: basis[0].length })
  const sign = signAt(text, at)
  if (sign) return accept({ token: sign, length: 1 })
  const word = matchAt(wordPattern, text, at)
  if (word) {
    const isPer = word[0].toLowerCase() === 'per'
    const token: Token = isPer ? { type: 'per' } : { type: 'word', text: word[0] }
    return accept({ token, length: word[0].length })
  }
  if (minus.test(text[at] ?? '')) return refuseMinus(at === 0)
  const character = String.fromCodePoint(text.codePointAt(at) ?? 0)
  return refuse(
    'unknown-character',
    `The character ${quote(character)} has no meaning in an amount.`,
    'Write a number and a unit, such as 50 mg or 1 % w/v.',
  )
}

function refuseNumbers(text: string): Read<never> | undefined {
  const exponent = /\d[eE][+-]?\d+/.exec(text)
  if (exponent) {
    return refuse(
      'exponent',
      `${quote(exponent[0])} is written with an exponent.`,
      'Write the number in full, or use a smaller or larger unit.',
    )
  }
  const spaced = /[\d.,]+\s+[\d.,]+/.exec(text)
  if (!spaced) return undefined
  return refuse(
    'space-in-number',
    `A space stands inside the number ${quote(spaced[0])}.`,
    'Write the digits together, such as 1000 mg.',
  )
}

/** Cuts typed text, already trimmed, into numbers, words and signs, or says what has no meaning in it. */
export function tokenize(text: string, locale: Locale): Read<readonly Token[]> {
  const refused = refuseNumbers(text)
  if (refused) return refused
  const tokens: Token[] = []
  let at = 0
  while (at < text.length) {
    const step = stepAt(text, at, locale)
    if (!step.ok) return step
    at += step.value.length
    if (step.value.token) tokens.push(step.value.token)
  }
  return accept(tokens)
}
