import { readAmount } from '../quantity/readAmount.ts'
import { alignLines } from './align.ts'
import { placeInWords } from './places.ts'
import { isPlainObject } from './plainObject.ts'
import type { Formula, FormulaLine } from './types.ts'

/** Rewritten: in other words the same amount, such as 500 mg and 0.5 g. */
export type AmountDifference = 'same' | 'rewritten' | 'changed'

export interface LineInPlace {
  readonly line: FormulaLine
  /** From 1. */
  readonly place: number
}

export interface LineDifference {
  readonly ingredient: FormulaLine['ingredient']
  readonly before: LineInPlace | null
  readonly after: LineInPlace | null
  readonly amount: AmountDifference
  /** True for a line that stands elsewhere among the lines that both have. */
  readonly moved: boolean
  /** What else of the line is not the same: its share, its cap or its note. */
  readonly others: readonly string[]
}

/** A field outside of the lines; null where it is not there. */
export interface FieldDifference {
  /** Such as "The final volume" or "The order (lot)". */
  readonly place: string
  readonly before: string | null
  readonly after: string | null
}

export interface FormulaDifference {
  readonly lines: readonly LineDifference[]
  readonly fields: readonly FieldDifference[]
}

/**
 * How two amounts as typed differ. Two that can be read are the same amount when kind and value agree to one part
 * in 10¹²; one that cannot be read is only the same as its own text.
 * @example compareAmounts('500 mg', '0.5 g') → 'rewritten'
 */
export function compareAmounts(before: string, after: string): AmountDifference {
  if (before.trim() === after.trim()) return 'same'
  const one = readAmount(before)
  const other = readAmount(after)
  if (!one.ok || !other.ok || one.value.kind !== other.value.kind) return 'changed'
  const gap = Math.abs(one.value.value - other.value.value)
  return gap <= 1e-12 * Math.abs(one.value.value) ? 'rewritten' : 'changed'
}

/** What has changed from one formula to another: only lines and fields that are not the same. */
export function differenceOf(before: Formula, after: Formula): FormulaDifference {
  const aligned = alignLines([before, after]).map(({ ingredient, lines }) => ({
    ingredient,
    before: inPlace(before, lines[0] ?? null),
    after: inPlace(after, lines[1] ?? null),
  }))
  const moved = movedPlaces(
    aligned.flatMap((row) => (row.before && row.after ? [[row.before.place, row.after.place] as const] : [])),
  )
  const lines = aligned
    .map((row): LineDifference => ({
      ...row,
      amount: compareAmounts(row.before?.line.amount ?? '', row.after?.line.amount ?? ''),
      moved: row.before !== null && row.after !== null && moved.has(row.before.place),
      others: otherFields(row.before?.line ?? null, row.after?.line ?? null),
    }))
    .filter(isDifferent)
  return { lines, fields: fieldDifferences(before, after) }
}

const isDifferent = ({ before, after, amount, moved, others }: LineDifference) =>
  before === null || after === null || amount !== 'same' || moved || others.length > 0

function inPlace({ lines }: Formula, line: FormulaLine | null): LineInPlace | null {
  return line && { line, place: lines.indexOf(line) + 1 }
}

const lineFields = ['share', 'cap', 'note'] as const

const otherFields = (before: FormulaLine | null, after: FormulaLine | null) =>
  before && after ? lineFields.filter((field) => before[field] !== after[field]) : []

/**
 * Of lines in both formulas, the places before of the fewest that have to be moved to get the new order: all but a
 * longest run that rises in both.
 */
function movedPlaces(pairs: readonly (readonly [before: number, after: number])[]): ReadonlySet<number> {
  const inOrder = pairs.toSorted(([one], [other]) => one - other)
  const runs: (readonly number[])[] = []
  inOrder.forEach(([, after], index) => {
    const shorter = runs.filter((run) => (inOrder[run.at(-1) ?? 0]?.[1] ?? Infinity) < after)
    const longest = shorter.reduce<readonly number[]>(
      (best, run) => (run.length > best.length ? run : best),
      [],
    )
    runs.push([...longest, index])
  })
  const kept = runs.reduce<readonly number[]>((best, run) => (run.length > best.length ? run : best), [])
  return new Set(inOrder.flatMap(([before], index) => (kept.includes(index) ? [] : [before])))
}

const notCompared: ReadonlySet<string> = new Set(['format', 'version', 'lines'])

function fieldDifferences(before: Formula, after: Formula): readonly FieldDifference[] {
  const one = leavesOf(before)
  const other = leavesOf(after)
  return [...new Set([...one.keys(), ...other.keys()])].flatMap((key) => {
    const was = one.get(key)
    const is = other.get(key)
    if (was?.text === is?.text) return []
    const path = was?.path ?? is?.path ?? []
    return [{ place: placeInWords(path), before: was?.text ?? null, after: is?.text ?? null }]
  })
}

interface Leaf {
  readonly path: readonly (string | number)[]
  readonly text: string
}

/** Every single text or number outside of the lines, by its place. */
function leavesOf(formula: Formula): ReadonlyMap<string, Leaf> {
  const leaves = new Map<string, Leaf>()
  const walk = (value: unknown, path: readonly (string | number)[]) => {
    if (Array.isArray(value)) value.forEach((part, index) => walk(part, [...path, index + 1]))
    else if (isPlainObject(value)) Object.entries(value).forEach(([key, part]) => walk(part, [...path, key]))
    else if (value !== undefined) leaves.set(path.join('.'), { path, text: String(value) })
  }
  for (const [key, value] of Object.entries(formula)) if (!notCompared.has(key)) walk(value, [key])
  return leaves
}
