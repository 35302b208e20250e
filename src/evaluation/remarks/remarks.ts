import type { Answered, Question } from '../assembled.ts'
import { findingOf } from '../finding.ts'
import { isBeyondOsmometer } from '../model.ts'
import type { Finding } from '../types.ts'
import { equivalentRemarks, missingRemarks, spreadRemarks } from './methodRemarks.ts'
import type { RemarkContext } from './remarkContext.ts'
import { freeFormRemarks, saturationRemarks } from './saturation.ts'
import { namesOf, reflectionRemarks, tonicityRemarks } from './tonicity.ts'
import { weighingRemarks } from './weighing.ts'

/** The program's own remarks on an answered formula; cautions of the trade come from data and stand beside them. */
export function remarksOn({ plan, standing }: Question, answered: Answered): Finding[] {
  const context: RemarkContext = {
    plan,
    read: standing.read,
    lowered: standing.lowered,
    lines: answered.lines,
    solution: answered.solution,
    state: answered.state,
    additive: answered.additive,
    methods: answered.methods,
  }
  return [
    ...weighingRemarks(context),
    ...tonicityRemarks(context),
    ...reflectionRemarks(context),
    ...spreadRemarks(context),
    ...missingRemarks(context),
    ...equivalentRemarks(context),
    ...scaleRemarks(context),
    ...saturationRemarks(context),
    ...freeFormRemarks(context),
  ]
}

/** Figures that have no answer for this formula, each with its reason. */
function scaleRemarks({ plan, solution, state, lines, lowered }: RemarkContext): Finding[] {
  const findings: Finding[] = []
  if (state && isBeyondOsmometer(state)) {
    findings.push(
      findingOf(plan.library, 'beyond-osmometer', { values: { osmolality: solution.osmolality.value } }),
    )
  }
  if (solution.sodiumChlorideEquivalentPercent === null) {
    findings.push(
      findingOf(plan.library, 'beyond-sodium-chloride-scale', {
        values: { highestPercent: plan.scale.highestPercent, osmolality: solution.osmolality.value },
      }),
    )
  }
  if (solution.labelOsmolarityMilliosmPerL === null) {
    const dissolved = new Set(lowered.map(({ key }) => key))
    const without = lines.filter(
      (line) => dissolved.has(line.key) && (line.particlesFormal === null || line.millimoles === null),
    )
    findings.push(
      findingOf(plan.library, 'label-osmolarity-unknown', {
        values: { ingredient: namesOf(without) },
        ingredients: without.map(({ ingredient }) => ingredient.id),
        lineKeys: without.map(({ key }) => key),
      }),
    )
  }
  return findings
}
