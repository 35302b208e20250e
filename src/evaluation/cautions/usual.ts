import { expressNumber } from '../../quantity/express.ts'
import type { Condition, Usual } from '../../library/conditions.ts'
import type { UsualStrength } from '../../library/usual-strengths.ts'
import { amountIn } from './amounts.ts'
import type { CautionContext, CautionLine } from './context.ts'
import { perMillilitreOf } from './lineConditions.ts'
import { outcome, type Outcome } from './outcome.ts'
import { asShown } from './shown.ts'
import { selected } from './selectors.ts'
import { named } from './words.ts'

interface Departure {
  readonly line: CautionLine
  readonly text: string
}

/** Strengths that a person wrote, against the range in which the ingredient is ordinarily used. */
export function againstUsual(
  { line: selector, usual }: Extract<Condition, { readonly usual: unknown }>,
  context: CautionContext,
): Outcome {
  const departures = selected(context.lines, selector).flatMap((line): readonly Departure[] => {
    const text = line.isAdjuster ? null : departureOf(line, usual, context)
    return text === null ? [] : [{ line, text }]
  })
  if (departures.length === 0) return outcome(false)
  const lines = departures.map(({ line }) => line)
  return outcome(
    true,
    { ingredient: named(lines), details: departures.map(({ text }) => text).join('; ') },
    lines,
  )
}

/**
 * Against the ranges of this route or of all routes. Where there are none, a strength above every other range still
 * tells: what is made of a vial is not ten times the vial.
 */
function departureOf(line: CautionLine, usual: Usual, context: CautionContext): string | null {
  const ranges = rangesOf(context.usualStrengths, line.ingredient.id)
  const here = ranges.filter(({ routes }) => !routes || routes.includes(context.routeId))
  const { timesAbove, timesBelow, outside } = usual
  const isFarAbove = ({ unit, to }: UsualStrength) =>
    isBeyond(line, unit, to, context, (ratio) =>
      outside ? ratio > 1 : timesAbove !== undefined && ratio >= timesAbove,
    )
  const isFarBelow = ({ unit, from }: UsualStrength) =>
    isBeyond(line, unit, from, context, (ratio) =>
      outside ? ratio < 1 : timesBelow !== undefined && ratio <= 1 / timesBelow,
    )
  const upper = here.length > 0 ? here : ranges
  if (upper.length > 0 && upper.every(isFarAbove)) return told(line, upper, context)
  if (here.length > 0 && here.every(isFarBelow)) return told(line, here, context)
  return null
}

/* By ingredient, once for each table. */
const tables = new WeakMap<readonly UsualStrength[], Map<string, readonly UsualStrength[]>>()

function rangesOf(all: readonly UsualStrength[], id: string): readonly UsualStrength[] {
  let table = tables.get(all)
  if (!table) {
    table = new Map()
    for (const range of all) table.set(range.ingredient, [...(table.get(range.ingredient) ?? []), range])
    tables.set(all, table)
  }
  return table.get(id) ?? []
}

function isBeyond(
  line: CautionLine,
  unit: UsualStrength['unit'],
  end: number,
  context: CautionContext,
  test: (ratio: number) => boolean,
): boolean {
  const strength = amountIn(unit, perMillilitreOf(line), context)
  return typeof strength === 'number' && test(asShown(strength / end, { significant: 4 }))
}

function told(line: CautionLine, ranges: readonly UsualStrength[], context: CautionContext): string {
  const [first] = ranges
  const strength = first ? amountIn(first.unit, perMillilitreOf(line), context) : null
  const range = ranges
    .map(({ from, to, unit }) =>
      from === to
        ? `${expressNumber(from)} ${unit}`
        : `${expressNumber(from)} to ${expressNumber(to)} ${unit}`,
    )
    .join(' or ')
  const own = typeof strength === 'number' && first ? `${expressNumber(strength)} ${first.unit}` : 'not known'
  return `${line.ingredient.name} is at ${own}, usually ${range}`
}
