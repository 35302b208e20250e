import type { Condition } from '../../library/conditions.ts'
import { beyondRoute } from './beyond.ts'
import type { CautionContext } from './context.ts'
import {
  ionAmount,
  lineOrderedIn,
  lineWrittenIn,
  linePresent,
  lineStrength,
  pHAgainstPKa,
} from './lineConditions.ts'
import { crossed, crosses } from './limits.ts'
import { readMetric } from './metrics.ts'
import { allOf, anyOf, notOf, outcome, unknown, unlessOf, type Outcome } from './outcome.ts'
import { isSelected, selected } from './selectors.ts'
import { againstUsual } from './usual.ts'
import { named } from './words.ts'

/** What a trigger tree comes to in a context: pure, and `unknown` where it hangs on what is not known. */
export function judge(condition: Condition, context: CautionContext): Outcome {
  if ('line' in condition) return ofLines(condition, context)
  if ('all' in condition) return everyPart(condition.all, context)
  if ('any' in condition) return anyOf(condition.any.map((part) => judge(part, context)))
  if ('not' in condition) return notOf(judge(condition.not, context))
  if ('unless' in condition) return unlessOf(judge(condition.unless, context))
  if ('route' in condition) return outcome(condition.route.includes(context.routeId))
  if ('everyLine' in condition) return everyLine(condition, context)
  if ('together' in condition) return together(condition, context)
  if ('ion' in condition) return ionAmount(condition, context)
  if ('measure' in condition) return measured(condition, context)
  return beyondRoute(condition, context)
}

/** Most rules begin with the lines that they are about, and most formulas have none of them. */
function ofLines(condition: Case<'line'>, context: CautionContext): Outcome {
  if (!context.lines.some(({ ingredient }) => isSelected(ingredient, condition.line))) return outcome(false)
  if ('pHMinusPKa' in condition) return pHAgainstPKa(condition, context)
  if ('usual' in condition) return againstUsual(condition, context)
  if ('orderedIn' in condition) return lineOrderedIn(condition, context)
  if ('writtenIn' in condition) return lineWrittenIn(condition, context)
  return condition.strength
    ? lineStrength(condition.line, condition.strength, context)
    : linePresent(condition.line, context)
}

type Case<Key extends string> = Extract<Condition, { readonly [key in Key]: unknown }>

/** One part that fails decides: what stands behind it, and may be costly, is not asked. */
function everyPart(parts: readonly Condition[], context: CautionContext): Outcome {
  const outcomes: Outcome[] = []
  for (const part of parts) {
    const result = judge(part, context)
    if (result.truth === false) return outcome(false)
    outcomes.push(result)
  }
  return allOf(outcomes)
}

/** Nothing but these, and at least one. */
function everyLine({ everyLine: selector }: Case<'everyLine'>, { lines }: CautionContext): Outcome {
  const holds = lines.length > 0 && lines.every(({ ingredient }) => isSelected(ingredient, selector))
  return holds ? outcome(true, { ingredient: named(lines) }, lines) : outcome(false)
}

/** Two different ingredients, one of each kind: whatever is of both kinds needs a partner. */
function together({ together: [first, second] }: Case<'together'>, { lines }: CautionContext): Outcome {
  const ones = selected(lines, first)
  if (ones.length === 0) return outcome(false)
  const others = selected(lines, second)
  const meeting = ones.filter(({ ingredient }) =>
    others.some((other) => other.ingredient.id !== ingredient.id),
  )
  const met = others.filter(({ ingredient }) =>
    meeting.some((other) => other.ingredient.id !== ingredient.id),
  )
  if (meeting.length === 0) return outcome(false)
  return outcome(true, { ingredient: named(meeting), other: named(met) }, [...new Set([...meeting, ...met])])
}

const camelCase = (name: string) => name.replaceAll(/-(\w)/g, (_, letter: string) => letter.toUpperCase())

function measured({ measure, is }: Case<'measure'>, context: CautionContext): Outcome {
  const value = readMetric(context, measure, is.unit)
  if (typeof value !== 'number') return unknown([value.need])
  if (!crosses(value, is)) return outcome(false)
  const name = camelCase(measure)
  return outcome(true, { [name]: value, [`${name}Limit`]: crossed(value, is) })
}
