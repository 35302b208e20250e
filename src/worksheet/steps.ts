import type { Library } from '../library/library.ts'
import type { Ingredient } from '../library/types.ts'
import type { StepRule } from '../library/steps.ts'
import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { groupLines } from '../evaluation/stocks/group.ts'
import { nameOf } from './names.ts'
import { vehicleOf } from './order.ts'
import { sterileRoutes } from './routes.ts'
import { volumeText } from './say.ts'
import type { SheetSection, SheetStep } from './types.ts'

export interface StepContext {
  readonly lines: readonly LineAnswer[]
  readonly vehicle: string
  /** Final volume as printed. */
  readonly volume: string
  /** As printed beside "Put about 80 %". */
  readonly sterile: boolean
  readonly nameOf: (line: LineAnswer) => string
}

/**
 * The order of mixing from the rules of data/steps. An ingredient goes to the latest rule that takes it, so that
 * calcium which is also an active comes last; one that no rule takes goes to the rule for the rest.
 */
export function mixingSteps(rules: readonly StepRule[], context: StepContext): readonly SheetStep[] {
  const byRule = new Map<string, LineAnswer[]>()
  for (const line of context.lines) {
    const rule = ruleFor(rules, line.ingredient)
    if (rule) byRule.set(rule.id, [...(byRule.get(rule.id) ?? []), line])
  }
  return rules.flatMap((rule) => {
    const taken = byRule.get(rule.id) ?? []
    if (rule.takes === 'sterile' ? !context.sterile : rule.takes !== 'none' && taken.length === 0) return []
    return [{ text: fill(rule.text, context, taken), reason: rule.reason }]
  })
}

function ruleFor(rules: readonly StepRule[], ingredient: Ingredient): StepRule | undefined {
  if (ingredient.roles.length === 1 && ingredient.roles[0] === 'vehicle') return undefined
  const taking = rules.filter(({ takes }) => typeof takes === 'object' && matches(takes, ingredient))
  return taking.at(-1) ?? rules.find(({ takes }) => takes === 'rest')
}

function matches(
  takes: { roles: readonly string[]; tags: readonly string[] },
  ingredient: Ingredient,
): boolean {
  return (
    takes.roles.some((role) => ingredient.roles[0] === role) ||
    takes.tags.some((tag) => ingredient.tags.includes(tag))
  )
}

function fill(template: string, context: StepContext, taken: readonly LineAnswer[]): string {
  return template
    .replace('{vehicle}', context.vehicle)
    .replace('{volume}', context.volume)
    .replace('{ingredients}', listed(taken.map(context.nameOf)))
}

function listed(names: readonly string[]): string {
  const last = names.at(-1) ?? ''
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`
}

/** The steps: for a batch with its volume and tick boxes, for the recipe with the volume of one container. */
export function stepSection(evaluation: Evaluation, library: Library, ticked: boolean): SheetSection {
  const volume = ticked ? (evaluation.batchVolumeMl ?? evaluation.volumeMl) : evaluation.volumeMl
  return {
    kind: 'steps',
    heading: 'Steps',
    ticked,
    steps: mixingSteps(library.steps, {
      lines: stepLines(evaluation, library.steps),
      vehicle: vehicleOf(evaluation),
      volume: volume === null ? 'the final volume' : volumeText(volume),
      sterile: sterileRoutes.has(evaluation.formula.route),
      nameOf: (line) => (line.stock?.stock.name ?? nameOf(line)) + wayOf(line, evaluation, ticked),
    }),
  }
}

/** A solution from the shelf goes in at once, where the latest of its ingredients belongs; a filling vehicle is none. */
function stepLines({ lines }: Evaluation, rules: readonly StepRule[]): readonly LineAnswer[] {
  const placeOf = ({ ingredient }: LineAnswer) => {
    const rule = ruleFor(rules, ingredient)
    return rule ? rules.indexOf(rule) : -1
  }
  return groupLines(lines).flatMap((group) => {
    if (!group.stock) return group.lines
    return group.stock.fills ? [] : group.lines.toSorted((a, b) => placeOf(b) - placeOf(a)).slice(0, 1)
  })
}

/** In a batch a substance comes as it was measured. */
function wayOf({ key }: LineAnswer, { aliquots, weighingPlan }: Evaluation, isBatch: boolean): string {
  if (!isBatch) return ''
  const plan = aliquots.find((aliquot) => aliquot.key === key)?.plan
  if (plan) return ` (the aliquot of ${volumeText(plan.carriedMl, 5)})`
  const weighing = weighingPlan?.lines.find((line) => line.key === key)
  return weighing?.trituration ? ' (the portion of the trituration)' : ''
}
