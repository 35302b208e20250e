import type { ChemistryProblem } from '../chemistry/types.ts'
import type { Interval } from '../quantity/interval.ts'
import type { Formula } from '../formula/types.ts'
import type { Adjusted } from './adjusting/adjust.ts'
import type { Plan } from './adjusting/plan.ts'
import { labelOsmolarity } from './answers/electrolytes.ts'
import { intervalAround } from './answers/interval.ts'
import { bareLine } from './answers/lines.ts'
import { conventionalDepression } from './answers/solution.ts'
import { assembled } from './assembled.ts'
import { blockedEvaluation, type Standing } from './blocked.ts'
import { findingOf } from './finding.ts'
import { methodInput, methodSizing } from './finish.ts'
import { weighed, type Lowered } from './lowering.ts'
import { additiveAnswer, additiveMethods, type AdditiveAnswer } from './methods/answer.ts'
import { sizeByMethod } from './methods/adjust.ts'
import { refusedElectrolyteAnswer } from './methods/electrolyte.ts'
import { equivalentAt } from './methods/equivalentAt.ts'
import { sodiumChlorideEquivalentMethod } from './methods/sodiumChlorideEquivalent.ts'
import { sumOf } from './methods/sum.ts'
import { portionsOf, quick, solve, type Portion } from './model.ts'
import { problemFindings } from './problems.ts'
import type {
  AdjusterAnswer,
  Evaluation,
  Finding,
  LineAnswer,
  MethodAnswer,
  SolutionAnswer,
} from './types.ts'

/** Why the electrolyte model does not carry the headline. */
export interface Refusal {
  readonly problems?: readonly ChemistryProblem[]
  /** The failed sizing, where it is the adjuster that the model does not know. */
  readonly sizing?: Adjusted
}

/**
 * The answer where the electrolyte model refuses: the sodium chloride equivalents carry the headline and a finding
 * says so. What only the model could tell stays empty; where equivalents are missing too, the formula is blocked.
 */
export function evaluateByEquivalents(
  formula: Formula,
  plan: Plan,
  standing: Standing,
  findings: readonly Finding[],
  { problems = problemsOf(plan, standing), sizing }: Refusal,
): Evaluation {
  const { library } = plan
  const refused = problemFindings(problems, standing.read, library, false)
  const block = (known: Standing) => {
    const adjuster = sizing?.answer ?? known.adjuster
    const methods = separateAnswers(plan, known, problems)
    const last =
      sizing && problems.length === 0
        ? sizing.findings
        : [findingOf(library, 'no-method-answers', { blocks: true })]
    const all = [...findings, ...refused.map(blocking), ...last]
    return blockedEvaluation(formula, library, { ...known, adjuster, methods }, all)
  }
  const sized = sizedByEquivalents(plan, standing)
  if (sized === null) return block(standing)
  const complete = { ...standing, ...sized }
  const portions = portionsOf(plan, complete.lowered)
  const masses = new Map(complete.lowered.map((line) => [line.key, line]))
  const bare = complete.read.map((line) => bareLine(line, masses.get(line.key)))
  const first = additiveAnswer(sodiumChlorideEquivalentMethod, methodInput(bare, portions, plan))
  const osmolality = first.answer.osmolalityMilliosmPerKg
  if (osmolality === null) return block(complete)
  const lines = withEquivalentShares(bare, first, osmolality)
  const input = methodInput(lines, portions, plan)
  const additive = additiveMethods.map((method) => additiveAnswer(method, input))
  const notice = findingOf(library, 'headline-by-equivalents')
  return assembled(
    { formula, plan, standing: complete, findings: [...findings, ...refused, notice] },
    {
      headline: 'sodium-chloride-equivalent',
      solution: solutionByEquivalents(lines, portions, first, osmolality, plan),
      state: null,
      lines,
      methods: [
        ...additive.map(({ answer }) => answer),
        refusedElectrolyteAnswer(problems[0]?.keys[0] ?? ''),
      ],
      additive,
      uncertainty: [],
    },
  )
}

const refusedBy = (problems: readonly ChemistryProblem[]) =>
  refusedElectrolyteAnswer(problems[0]?.keys[0] ?? '')

/** What each method can say by itself, without a headline to compare with; no osmolality while a mass is missing. */
function separateAnswers(
  plan: Plan,
  { lowered }: Standing,
  problems: readonly ChemistryProblem[],
): readonly MethodAnswer[] {
  const portions = portionsOf(plan, lowered)
  const complete = portions.length === plan.solutes.length + plan.adjusters.length
  const input = methodInput([], portions, plan)
  const answers = additiveMethods.map((method) => additiveAnswer(method, input).answer)
  const shown = complete ? answers : answers.map(withoutOsmolality)
  return [...shown, refusedBy(problems)]
}

const withoutOsmolality = (answer: MethodAnswer): MethodAnswer => ({
  ...answer,
  osmolalityMilliosmPerKg: null,
  trace: [],
})

const blocking = (finding: Finding): Finding => ({ ...finding, blocks: true })

/** Why the model refused, asked again without the adjuster. */
function problemsOf(plan: Plan, { lowered }: Standing): readonly ChemistryProblem[] {
  const result = solve(portionsOf(plan, lowered), plan.setting, plan.library, quick)
  return result.status === 'refused' ? result.problems : []
}

/** Adjuster masses by equivalents where the model could not size them; null where neither can. */
function sizedByEquivalents(
  plan: Plan,
  { lowered, adjuster }: Standing,
): { readonly lowered: readonly Lowered[]; readonly adjuster: AdjusterAnswer | null } | null {
  const sizing = methodSizing(portionsOf(plan, lowered), plan)
  if (sizing === null || adjuster?.status === 'found') return { lowered, adjuster }
  const { conventions, scale, setting, target } = plan
  const context = { conventions, scale, volumeMl: setting.volumeMl }
  const { parts } = sumOf(sodiumChlorideEquivalentMethod, sizing.fixed, context)
  const sized = sizeByMethod(sodiumChlorideEquivalentMethod, parts, sizing, context)
  if (sized.status === 'missing' || !target) return null
  const masses = plan.adjusters.map((line, index) => weighed(line, sized.masses[index] ?? 0, plan.balance))
  return {
    lowered: [...lowered, ...masses],
    adjuster: {
      status: 'found',
      lineKeys: plan.adjusters.map(({ key }) => key),
      gramsByKey: Object.fromEntries(masses.map(({ key, grams }) => [key, grams])),
      target,
      without: null,
      largestFractionThatFits: null,
      dilutionToVolumeMl: null,
    },
  }
}

function withEquivalentShares(
  lines: readonly LineAnswer[],
  { sum }: AdditiveAnswer,
  osmolality: number,
): readonly LineAnswer[] {
  const parts = new Map(sum.parts.map(({ line, contribution }) => [line.key, contribution]))
  return lines.map((line) => {
    const part = parts.get(line.key)
    if (part?.status !== 'known' || !sum.sum) return line
    const share = (part.value / sum.sum) * osmolality
    return {
      ...line,
      osmolalityShareMilliosmPerKg: share,
      effectiveOsmolalityShareMilliosmPerKg: share * (line.ingredient.reflection?.value ?? 1),
    }
  })
}

function solutionByEquivalents(
  lines: readonly LineAnswer[],
  portions: readonly Portion[],
  first: AdditiveAnswer,
  osmolality: number,
  plan: Plan,
): SolutionAnswer {
  const percent = first.sum.sum ?? 0
  const interval = intervalAround(osmolality, equivalentUncertainty(portions, percent, osmolality, plan))
  const effective = lines.reduce((sum, line) => sum + (line.effectiveOsmolalityShareMilliosmPerKg ?? 0), 0)
  const { pH, volumeMl } = plan.setting
  return {
    osmolality: interval,
    osmolality25: null,
    osmolality37: null,
    osmolarityMilliosmPerL: null,
    effectiveOsmolality: effectiveAround(effective, interval),
    freezingPointDepressionK: (osmolality / 1000) * plan.conventions.cryoscopicConstant.value,
    conventionalDepressionK: conventionalDepression(percent, plan),
    sodiumChlorideEquivalentPercent: percent,
    osmoticCoefficient: null,
    waterActivity: null,
    osmoticPressureKPa37: null,
    labelOsmolarityMilliosmPerL: labelOsmolarity(portions, volumeMl).milliosmPerL,
    ionicStrength: null,
    pH: typeof pH === 'number' ? pH : null,
    pH5: null,
    pH25: null,
    pH37: null,
    pHIsSolved: false,
    densityGPerMl: null,
    waterKgPerL: null,
    redCellRelativeVolume: null,
  }
}

const effectiveAround = (effective: number, total: Interval): Interval =>
  intervalAround(effective, total.value > 0 ? (total.standardUncertainty * effective) / total.value : 0)

/** Standard uncertainty from those of the equivalents; one without its own counts as any tabulated figure does. */
function equivalentUncertainty(
  portions: readonly Portion[],
  percent: number,
  osmolality: number,
  { conventions, setting }: Plan,
): number {
  let variance = 0
  for (const { ingredient, grams } of portions) {
    const concentration = (grams / setting.volumeMl) * 100
    const entry = equivalentAt(ingredient.sodiumChlorideEquivalents, concentration)?.from[0]
    const uncertainty = entry?.e.uncertainty ?? conventions.equivalentUncertainty.value
    variance += (concentration * uncertainty) ** 2
  }
  return percent > 0 ? (osmolality * Math.sqrt(variance)) / percent : 0
}
