import { readAmount } from '../../quantity/readAmount.ts'
import type { Condition, Limit, Selector, StrengthOf } from '../../library/conditions.ts'
import { amountIn, type PerMillilitre } from './amounts.ts'
import type { CautionContext, CautionLine } from './context.ts'
import { crossed, crosses } from './limits.ts'
import { readMetric } from './metrics.ts'
import { outcome, unknown, type Need, type Outcome } from './outcome.ts'
import { selected } from './selectors.ts'
import { amountText, named } from './words.ts'
import { asShown } from './shown.ts'

type Case<Key extends string> = Extract<Condition, { readonly [key in Key]: unknown }>

export function linePresent(selector: Selector, { lines }: CautionContext): Outcome {
  const found = selected(lines, selector)
  return found.length > 0 ? outcome(true, { ingredient: named(found) }, found) : outcome(false)
}

const perThousand = (value: number | null) => (value === null ? null : value / 1000)

export const perMillilitreOf = ({ concentrations }: CautionLine): PerMillilitre => ({
  milligrams: concentrations.percentWV === null ? null : concentrations.percentWV * 10,
  millimoles: perThousand(concentrations.mmolPerL),
  milliequivalents: perThousand(concentrations.mEqPerL),
})

function added(lines: readonly CautionLine[]): PerMillilitre {
  const sum = (part: keyof PerMillilitre) =>
    lines.reduce<number | null>((total, line) => {
      const content = perMillilitreOf(line)[part]
      return total === null || content === null ? null : total + content
    }, 0)
  return {
    milligrams: sum('milligrams'),
    millimoles: sum('millimoles'),
    milliequivalents: sum('milliequivalents'),
  }
}

/** Lines, each alone or all together, against a limit; the strongest is the one that is told. */
export function lineStrength(
  selector: Selector,
  limit: Limit & StrengthOf,
  context: CautionContext,
): Outcome {
  const meant = selected(context.lines, selector)
  const groups = limit.of === 'sum' && meant.length > 0 ? [meant] : meant.map((line) => [line])
  const needs: Need[] = []
  const over: { readonly lines: readonly CautionLine[]; readonly strength: number }[] = []
  for (const lines of groups) {
    const strength = amountIn(limit.unit, added(lines), context)
    if (typeof strength !== 'number') needs.push(...strength.needs)
    else if (crosses(strength, limit)) over.push({ lines, strength })
  }
  const [worst] = over.toSorted((a, b) =>
    isUpper(limit) ? b.strength - a.strength : a.strength - b.strength,
  )
  if (!worst) return needs.length > 0 ? unknown(needs, meant) : outcome(false)
  const lines = over.flatMap((each) => each.lines)
  return outcome(
    true,
    {
      ingredient: named(lines),
      strength: worst.strength,
      strengthLimit: crossed(worst.strength, limit),
    },
    lines,
  )
}

const isUpper = ({ above, atLeast, to }: Limit) => (above ?? atLeast ?? to) !== undefined

/** An ion or mass-balance component of the whole solution against a limit. */
export function ionAmount({ ion, amount }: Case<'ion'>, context: CautionContext): Outcome {
  const total = context.ionTotals[ion] === undefined ? 0 : context.ionTotals[ion]
  const { gramsPerMole } = amount
  const millimoles = perThousand(total)
  const value = amountIn(
    amount.unit,
    {
      milligrams: millimoles === null || gramsPerMole === undefined ? null : millimoles * gramsPerMole,
      millimoles,
      milliequivalents: null,
    },
    context,
  )
  if (typeof value !== 'number') return total === 0 ? outcome(false) : unknown(value.needs)
  if (!crosses(value, amount)) return outcome(false)
  return outcome(true, { amount: value, amountLimit: crossed(value, amount) })
}

/** The pH against the pKa at which a line's own ion turns into the form that dissolves badly. */
export function pHAgainstPKa(
  { line: selector, pHMinusPKa }: Case<'pHMinusPKa'>,
  context: CautionContext,
): Outcome {
  const steps = selected(context.lines, selector).flatMap((line) => {
    const step = line.ingredient.ownIonisation?.find(({ acidCharge }) => acidCharge === pHMinusPKa.acidCharge)
    return step ? [{ line, pKa: step.pKa.value }] : []
  })
  if (steps.length === 0) return outcome(false)
  const pH = readMetric(context, 'pH', 'pH')
  if (typeof pH !== 'number') {
    return unknown(
      [pH.need],
      steps.map(({ line }) => line),
    )
  }
  const beyond = steps.filter(({ pKa }) => crosses(asShown(pH - pKa, { decimals: 2 }), pHMinusPKa))
  const [first] = beyond
  if (!first) return outcome(false)
  const lines = beyond.map(({ line }) => line)
  return outcome(true, { ingredient: named(lines), pH, pKa: first.pKa }, lines)
}

/** Lines whose amount a person wrote in one of these kinds. */
export const lineOrderedIn = ({ line, orderedIn }: Case<'orderedIn'>, context: CautionContext): Outcome =>
  byText(line, context, (text) => {
    const read = readAmount(text)
    return read.ok && orderedIn.includes(read.value.kind)
  })

/** Lines whose amount a person wrote with one of these units. */
export const lineWrittenIn = ({ line, writtenIn }: Case<'writtenIn'>, context: CautionContext): Outcome =>
  byText(line, context, (text) => (text.match(/[a-zA-Z%]+/g) ?? []).some((word) => writtenIn.includes(word)))

function byText(selector: Selector, context: CautionContext, test: (text: string) => boolean): Outcome {
  const texts = new Map(context.formula.lines.map(({ key, amount }) => [key, amount.trim()]))
  const found = selected(context.lines, selector).filter(({ key }) => test(texts.get(key) ?? ''))
  if (found.length === 0) return outcome(false)
  return outcome(
    true,
    { ingredient: named(found), text: found.map(({ key }) => amountText(texts.get(key) ?? '')).join(', ') },
    found,
  )
}
