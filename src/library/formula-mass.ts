import rawWeights from '../../data/species/atomic-weights.json'
import * as v from 'valibot'
import type { Read } from '../quantity/amount.ts'
import type { GramsPerMole } from '../quantity/brand.ts'
import { gramsPerMole } from '../quantity/mint.ts'

/** Atoms per formula unit by element symbol. */
export type ElementCounts = ReadonlyMap<string, number>

const weightsSchema = v.strictObject({
  unit: v.literal('g/mol'),
  source: v.string(),
  kind: v.literal('tabulated'),
  weights: v.record(v.string(), v.pipe(v.number(), v.gtValue(0))),
})
const weights = new Map(Object.entries(v.parse(weightsSchema, rawWeights).weights))

export const atomicWeightFiles: Readonly<Record<string, unknown>> = { 'atomic-weights': rawWeights }

const longestFormula = 120
const largestCount = 10_000

const refuse = (text: string, reason: string): Read<never> => ({
  ok: false,
  refusal: {
    code: 'molecular-formula-unreadable',
    message: `The molecular formula "${text.slice(0, longestFormula)}" cannot be read: ${reason}.`,
    wayOut: 'Write elements, whole counts and brackets, crystal water after a raised dot: "CaCl2·2H2O".',
  },
})

const tokens = /([A-Z][a-z]?)(\d*)|([([])|([)\]])(\d*)/y

/** One part between raised dots, without its multiplier. Answers the reason when it cannot be read. */
function countPart(text: string): Map<string, number> | string {
  const stack: { readonly close: string; readonly counts: Map<string, number> }[] = [
    { close: '', counts: new Map() },
  ]
  tokens.lastIndex = 0
  while (tokens.lastIndex < text.length) {
    const at = tokens.lastIndex
    const match = tokens.exec(text)
    const top = stack.at(-1)
    if (!match || !top) return `"${text[at] ?? ''}" is not an element, a count or a bracket`
    const [, symbol, symbolCount, open, close, closeCount] = match
    const count = Number(symbolCount || closeCount || 1)
    if (count < 1 || count > largestCount) return `the count ${count} is out of range`
    if (symbol) {
      if (!weights.has(symbol)) return `"${symbol}" is not an element of the table`
      top.counts.set(symbol, (top.counts.get(symbol) ?? 0) + count)
    } else if (open) {
      stack.push({ close: open === '(' ? ')' : ']', counts: new Map() })
    } else {
      stack.pop()
      const outer = stack.at(-1)
      if (!outer || top.close !== close) return 'the brackets do not match'
      for (const [element, inner] of top.counts) {
        outer.counts.set(element, (outer.counts.get(element) ?? 0) + inner * count)
      }
    }
  }
  const [whole, ...unclosed] = stack
  if (!whole || unclosed.length > 0) return 'a bracket is not closed'
  return whole.counts.size > 0 ? whole.counts : 'a part is empty'
}

/**
 * Counts the atoms of a molecular formula. Brackets, raised dots and halves ("·0.5H2O") are read;
 * charges are refused, since what is weighed is neutral.
 *
 * @example countAtoms('CaCl2·2H2O').get('O') → 2
 */
export function countAtoms(text: string): Read<ElementCounts> {
  const formula = text.trim()
  if (formula === '') return refuse(text, 'it is empty')
  if (formula.length > longestFormula) return refuse(text, 'it is too long')
  if (/[+\-−–^]/.test(formula)) return refuse(text, 'a charge is written, and what is weighed is neutral')
  const total = new Map<string, number>()
  for (const part of formula.split('·')) {
    const [, multiplierText = '', body = ''] = /^(\d+(?:\.\d+)?)?(.*)$/.exec(part.trim()) ?? []
    const multiplier = multiplierText === '' ? 1 : Number(multiplierText)
    if (!(multiplier > 0 && multiplier <= largestCount)) return refuse(text, 'a multiplier is out of range')
    const counts = countPart(body)
    if (typeof counts === 'string') return refuse(text, counts)
    for (const [element, count] of counts) total.set(element, (total.get(element) ?? 0) + count * multiplier)
  }
  return { ok: true, value: total }
}

/**
 * Molar mass from a molecular formula, crystal water included: M = Σ n·A, g/mol.
 * Refused: charges, unknown symbols, brackets that do not match, more than 120 characters.
 * Source: IupacAtomicWeights.
 *
 * @example molarMassOf('NaCl') → 58.44
 */
export function molarMassOf(text: string): Read<GramsPerMole> {
  const atoms = countAtoms(text)
  if (!atoms.ok) return atoms
  let total = 0
  for (const [element, count] of atoms.value) total += count * (weights.get(element) ?? Number.NaN)
  return { ok: true, value: gramsPerMole(total) }
}
