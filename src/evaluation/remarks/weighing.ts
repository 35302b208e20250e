import { findingOf } from '../finding.ts'
import { triturationOf } from '../weighing/plan.ts'
import type { Lowered } from '../lowering.ts'
import type { Ingredient } from '../../library/types.ts'
import type { Finding } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'

/** What the balance cannot show, cannot weigh well, or changes by its steps. Masses are those of the batch. */
export function weighingRemarks(context: RemarkContext): Finding[] {
  const ingredients = new Map(context.read.map(({ key, ingredient }) => [key, ingredient]))
  const each = context.lowered.flatMap((line) => {
    const ingredient = ingredients.get(line.key)
    if (!ingredient) return []
    return [...volumeRemarks(line, ingredient, context), ...lineRemarks(line, ingredient, context)]
  })
  return [...each, ...leastWeighable(context, ingredients)]
}

function volumeRemarks(line: Lowered, { id, name }: Ingredient, { plan }: RemarkContext): Finding[] {
  if (line.measured !== null || line.millilitres === null) return []
  const values = { ingredient: name, volume: line.millilitres * plan.balance.batchFactor }
  return [findingOf(plan.library, 'not-measurable', { values, ingredients: [id], lineKeys: [line.key] })]
}

function lineRemarks(line: Lowered, ingredient: Ingredient, context: RemarkContext): Finding[] {
  const { plan } = context
  const { balance, library, conventions } = plan
  const grams = (line.articleGrams ?? line.grams) * balance.batchFactor
  const { scale, aliquot } = line
  const about = { ingredients: [ingredient.id], lineKeys: [line.key] }
  if (!scale) {
    const isTooHeavy = balance.scales.length > 0 && line.millilitres === null && grams > 0
    const values = { ingredient: ingredient.name, grams }
    return isTooHeavy ? [findingOf(library, 'above-capacity', { ...about, values })] : []
  }
  const change = line.gramsExact === 0 ? 0 : line.grams / line.gramsExact - 1
  const values = {
    ingredient: ingredient.name,
    grams,
    readabilityG: scale.readabilityG,
    leastG: scale.leastWeighableG,
    multiple: grams > 0 ? Math.ceil(scale.leastWeighableG / grams) : 0,
    changePercent: change * 100,
  }
  const changes = Math.abs(change) > conventions.roundingWorthMentionFraction.value
  const diluted = { ...values, leastG: scale.dilutedBelowG }
  if (aliquot) return [findingOf(library, 'measured-by-aliquot', { ...about, values: diluted })]
  const trituration = triturationOf(line, context.lowered, plan)
  if (trituration) {
    const diluent = context.read.find(({ key }) => key === trituration.diluentKey)?.ingredient.name ?? ''
    const told = { ...about, values: { ...diluted, diluent } }
    return [findingOf(library, 'measured-by-trituration', told)]
  }
  if (line.belowReadability) return [findingOf(library, 'below-readability', { ...about, values })]
  return changes ? [findingOf(library, 'rounding-changes-strength', { ...about, values })] : []
}

/** One remark for all lines of a balance that are weighable, but not well, and that no dilution measures. */
function leastWeighable(
  { plan, lowered }: RemarkContext,
  ingredients: ReadonlyMap<string, Ingredient>,
): Finding[] {
  const below = lowered.filter(
    (line) => line.belowLeastWeighable && !line.belowReadability && line.aliquot === undefined,
  )
  const leasts = [...new Set(below.map(({ scale }) => scale?.leastWeighableG ?? 0))]
  return leasts.map((leastG) => {
    const lines = below.filter(({ scale }) => scale?.leastWeighableG === leastG)
    const named = lines.flatMap(({ key }) => ingredients.get(key) ?? [])
    return findingOf(plan.library, 'below-least-weighable', {
      values: { ingredient: named.map(({ name }) => name).join(', '), leastG },
      ingredients: named.map(({ id }) => id),
      lineKeys: lines.map(({ key }) => key),
    })
  })
}
