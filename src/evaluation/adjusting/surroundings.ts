import { quick, solve, type Portion } from '../model.ts'
import { isFinding, lower, needsSurroundings, type Balance, type Surroundings } from '../lowering.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import { sizeTo } from './size.ts'
import type { Plan } from './plan.ts'
import { targetReading } from './target.ts'
import { adjusterPortions, sizingOf } from './trial.ts'

const settled = 1e-11
const mostRounds = 60

/**
 * Water and density of the finished solution, for amounts per kilogram of water or per gram of solution: repeated
 * until they reproduce themselves. Without such amounts the volume alone is enough.
 */
export function surroundingsOf(plan: Plan): Surroundings | Finding {
  const { volumeMl } = plan.setting
  let around: Surroundings = { volumeMl, waterKg: volumeMl / 1000, densityGPerMl: 1 }
  if (!plan.solutes.some(needsSurroundings)) return around
  if (plan.fills.length > 0) return unsettled(plan)
  for (let round = 0; round < mostRounds; round++) {
    const portions = portionsIn(around, plan)
    if ('code' in portions) return portions
    const result = solve(withAdjusters(portions, plan), plan.setting, plan.library, quick)
    if (result.status === 'refused') return unsettled(plan)
    const { waterKg, densityGPerMl } = result.state
    const change = Math.max(
      Math.abs(waterKg / around.waterKg - 1),
      Math.abs(densityGPerMl / around.densityGPerMl - 1),
    )
    around = { volumeMl, waterKg, densityGPerMl }
    if (change < settled) return around
  }
  return unsettled(plan)
}

const unsettled = (plan: Plan) => {
  const lines = plan.solutes.filter(needsSurroundings)
  return findingOf(plan.library, 'amount-needs-model', {
    values: { ingredient: lines.map(({ ingredient }) => ingredient.name).join(', ') },
    ingredients: lines.map(({ ingredient }) => ingredient.id),
    lineKeys: lines.map(({ key }) => key),
    blocks: true,
  })
}

/* Rounding would keep the repetition from settling; it follows when the surroundings are known. */
const unrounded: Balance = { scales: [], measures: [], batchFactor: 1, batchVolumeMl: 0 }

function portionsIn(around: Surroundings, plan: Plan): Portion[] | Finding {
  const portions: Portion[] = []
  for (const line of plan.solutes) {
    const lowered = lower(line, around, unrounded, plan.library)
    if (isFinding(lowered)) return lowered
    portions.push({ key: line.key, ingredient: line.ingredient, grams: lowered.grams })
  }
  return portions
}

/** With the adjusters at the size that these portions call for; none where that cannot be told. */
function withAdjusters(portions: readonly Portion[], plan: Plan): readonly Portion[] {
  if (!plan.target || plan.adjusters.length === 0) return portions
  const wanted = targetReading(plan.target, plan.scale, plan.conventions)
  if (wanted === null) return portions
  const sized = sizeTo(sizingOf(portions, plan.target, wanted, plan))
  return sized.status === 'found' ? [...portions, ...adjusterPortions(plan, sized.size)] : portions
}
