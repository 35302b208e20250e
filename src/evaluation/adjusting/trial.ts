import { effectiveReadingOf, quick, readingOf, solve, type Portion } from '../model.ts'
import { formalParticles } from '../methods/vantHoff.ts'
import { massesAt } from './shares.ts'
import type { Plan } from './plan.ts'
import type { Sizing, Trial } from './size.ts'
import { countsEffective, type Target } from './target.ts'

/** What a mixture reads on the count of the target. */
export function trialOf(portions: readonly Portion[], target: Target, plan: Plan): Trial {
  const result = solve(portions, plan.setting, plan.library, quick)
  if (result.status === 'refused') {
    const code = result.problems[0]?.code ?? 'model-problem'
    return { status: 'refused', code, forWantOfData: code === 'no-osmotic-data' }
  }
  const read = countsEffective(target) ? effectiveReadingOf : readingOf
  return { status: 'read', milliosmPerKg: read(result.state, plan.conventions) }
}

/** Portions of the adjusters at a common size. */
export function adjusterPortions(plan: Plan, size: number): readonly Portion[] {
  const masses = massesAt(plan.adjusters, size)
  return plan.adjusters.map(({ key, ingredient }, index) => ({ key, ingredient, grams: masses[index] ?? 0 }))
}

/** The sizing problem of the adjusters on top of given solutes. */
export function sizingOf(fixed: readonly Portion[], target: Target, wanted: number, plan: Plan): Sizing {
  return {
    wanted,
    guess: (missing) => (missing / 1000) * (plan.setting.volumeMl / 1000) * gramsPerOsmole(plan),
    largest: largestSizeOf(plan),
    trial: (size) => trialOf([...fixed, ...adjusterPortions(plan, size)], target, plan),
  }
}

/* Ions of dilute salts count for this much of their number, and a solute without a formula is taken for a salt. */
const usualCoefficient = 0.93
const usualGramsPerOsmole = 30

/** Size that brings one osmole into the volume, roughly. */
function gramsPerOsmole({ adjusters }: Plan): number {
  const osmolesPerSize = adjusters.reduce((sum, { ingredient, share }) => {
    const count = formalParticles(ingredient)
    const molarMass = ingredient.molarMass?.value
    const perGram = count && molarMass ? (count * usualCoefficient) / molarMass : 1 / usualGramsPerOsmole
    return sum + share * perGram
  }, 0)
  return 1 / osmolesPerSize
}

/* A solute weighs at most a few times the water it displaces: beyond this nothing is left to dissolve it. */
const densestGPerMl = 3

function largestSizeOf({ adjusters, setting }: Plan): number {
  const byVolume = setting.volumeMl * densestGPerMl
  return Math.max(...adjusters.map(({ share, capGrams }) => Math.min(capGrams ?? byVolume, byVolume) / share))
}

/** The common fraction of given solutes that meets the wanted reading without any adjuster. */
export const fractionSizing = (
  fixed: readonly Portion[],
  target: Target,
  wanted: number,
  plan: Plan,
): Sizing => ({
  wanted,
  guess: () => 0.5,
  largest: 1,
  trial: (fraction) =>
    trialOf(
      fixed.map((portion) => ({ ...portion, grams: portion.grams * fraction })),
      target,
      plan,
    ),
})
