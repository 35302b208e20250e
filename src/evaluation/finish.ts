import type { Formula } from '../formula/types.ts'
import type { SolutionState } from '../chemistry/types.ts'
import type { Plan } from './adjusting/plan.ts'
import { countsEffective, methodTarget, targetReading } from './adjusting/target.ts'
import { preparationParts } from './answers/interval.ts'
import { bareLine, withShares } from './answers/lines.ts'
import { solutionAnswer } from './answers/solution.ts'
import { assembled } from './assembled.ts'
import type { Standing } from './blocked.ts'
import type { Lowered } from './lowering.ts'
import { additiveAnswer, additiveMethods, type MethodInput } from './methods/answer.ts'
import { electrolyteAnswer } from './methods/electrolyte.ts'
import type { MethodSizing } from './methods/adjust.ts'
import { portionsOf, quick, readingOf, solve, type Portion } from './model.ts'
import { standardErrorOf } from './weighing/errors.ts'
import type { AdjusterAnswer, Evaluation, Finding, LineAnswer } from './types.ts'

/** From the solved solution to the whole answer, headline by the electrolyte model. */
export function finish(
  formula: Formula,
  plan: Plan,
  standing: Standing,
  findings: readonly Finding[],
  state: SolutionState,
): Evaluation {
  const { read, lowered } = standing
  const portions = portionsOf(plan, lowered)
  const masses = new Map(lowered.map((line) => [line.key, line]))
  const reading = readingOf(state, plan.conventions)
  const lines = withShares(
    read.map((line) => bareLine(line, masses.get(line.key))),
    state,
    reading,
  )
  const parts = [...state.uncertainty, ...partsOf(lines, lowered, plan)].toSorted(
    (a, b) => b.osmolalityMilliosmPerKg - a.osmolalityMilliosmPerKg,
  )
  const solution = solutionAnswer(state, portions, parts, plan)
  const input = methodInput(lines, portions, plan)
  const additive = additiveMethods.map((method) => additiveAnswer(method, input))
  const volume = isotonicVolumeOfSolutes(portions, reading, standing.adjuster, plan)
  const methods = [
    ...additive.map(({ answer }) => answer),
    electrolyteAnswer(solution, state, lines, volume, plan),
  ]
  return assembled(
    { formula, plan, standing, findings },
    { headline: 'electrolyte', solution, state, lines, methods, additive, uncertainty: parts },
  )
}

function partsOf(lines: readonly LineAnswer[], lowered: readonly Lowered[], plan: Plan) {
  const masses = new Map(lowered.map((line) => [line.key, line]))
  const weighed = lines.flatMap(({ key, ingredient, grams, osmolalityShareMilliosmPerKg }) =>
    grams === null || osmolalityShareMilliosmPerKg === null
      ? []
      : [
          {
            key,
            name: ingredient.name,
            grams,
            osmolalityMilliosmPerKg: osmolalityShareMilliosmPerKg,
            ...standardErrorOf(masses.get(key), plan.balance.batchFactor),
          },
        ],
  )
  return preparationParts(
    weighed,
    null,
    plan.balance.batchFactor,
    plan.conventions.finalVolumeRelativeUncertainty.value,
  )
}

/** What the classical methods are asked: the same masses, the same target. */
export function methodInput(
  lines: readonly LineAnswer[],
  portions: readonly Portion[],
  plan: Plan,
): MethodInput {
  const { conventions, scale, setting } = plan
  return {
    lines: portions,
    sizing: methodSizing(portions, plan),
    context: { conventions, scale, volumeMl: setting.volumeMl },
    headline: new Map(
      lines.flatMap(({ key, osmolalityShareMilliosmPerKg: share }) =>
        share === null ? [] : [[key, share] as const],
      ),
    ),
  }
}

export function methodSizing(portions: readonly Portion[], plan: Plan): MethodSizing | null {
  const { target, adjusters } = plan
  if (!target || adjusters.length === 0) return null
  const keys = new Set(adjusters.map(({ key }) => key))
  return {
    keys,
    fixed: portions.filter(({ key }) => !keys.has(key)),
    adjusters,
    target: methodTarget(target),
    weightOf: ({ reflection }) => (countsEffective(target) ? (reflection?.value ?? 1) : 1),
  }
}

/** Volume in which the solutes without the adjuster count for 0.9 % sodium chloride, by their water activity. mL. */
function isotonicVolumeOfSolutes(
  portions: readonly Portion[],
  reading: number,
  adjuster: AdjusterAnswer | null,
  plan: Plan,
): number | null {
  const { conventions, scale, setting } = plan
  const ofSolutes = adjuster ? readingWithout(portions, adjuster, plan) : reading
  const percent = ofSolutes === null ? null : scale.percentOf(ofSolutes)
  if (percent === null) return null
  return (setting.volumeMl * percent) / conventions.isotonicSodiumChloridePercent.value
}

/** Reading of the solutes alone: known from the sizing, unless that counted what stays outside cells alone. */
function readingWithout(
  portions: readonly Portion[],
  { without }: AdjusterAnswer,
  plan: Plan,
): number | null {
  const { target, adjusters, setting, library, conventions, scale } = plan
  if (target && !countsEffective(target)) {
    return without === null ? null : targetReading({ ...target, value: without }, scale, conventions)
  }
  const keys = new Set(adjusters.map(({ key }) => key))
  const fixed = portions.filter(({ key }) => !keys.has(key))
  const result = solve(fixed, setting, library, quick)
  return result.status === 'refused' ? null : readingOf(result.state, conventions)
}
