import { findingOf } from '../finding.ts'
import { weighed, type Lowered } from '../lowering.ts'
import type { AdjusterAnswer, Finding } from '../types.ts'
import type { Portion } from '../model.ts'
import type { Plan } from './plan.ts'
import { massesAt } from './shares.ts'
import { sizeTo, type Sized } from './size.ts'
import { countsEffective, inTargetUnit, targetReading, type Target } from './target.ts'
import { fractionSizing, sizingOf } from './trial.ts'

export interface Adjusted {
  readonly answer: AdjusterAnswer
  /** Masses of the adjusters after rounding; empty when none was found. */
  readonly lowered: readonly Lowered[]
  readonly findings: readonly Finding[]
  /** The model has no answer for this adjuster or for the other solutes. */
  readonly modelRefused: boolean
}

/** Sizes the q.s. lines on the electrolyte model; each way of failing is its own finding with its way out. */
export function adjust(fixed: readonly Portion[], target: Target, plan: Plan): Adjusted {
  const wanted = targetReading(target, plan.scale, plan.conventions)
  if (wanted === null) return failed('cannot-size', 'target-beyond-scale', null, target, plan)
  if (
    countsEffective(target) &&
    plan.adjusters.every(({ ingredient }) => ingredient.reflection?.value === 0)
  ) {
    return failed('cannot-size', 'adjuster-does-not-count', null, target, plan)
  }
  const sized = sizeTo(sizingOf(fixed, target, wanted, plan))
  if (sized.status === 'found') return found(sized.size, sized.without, target, plan)
  if (sized.status === 'already-above') return alreadyAbove(sized.without, fixed, target, wanted, plan)
  return outOfReach(sized, target, plan)
}

function found(size: number, without: number, target: Target, plan: Plan): Adjusted {
  const masses = massesAt(plan.adjusters, size)
  const lowered = plan.adjusters.map((line, index) => weighed(line, masses[index] ?? 0, plan.balance))
  const capped = plan.adjusters.filter(
    ({ capGrams }, index) => capGrams !== null && masses[index] === capGrams,
  )
  return {
    modelRefused: false,
    lowered,
    answer: {
      ...answerOf('found', without, target, plan),
      gramsByKey: Object.fromEntries(lowered.map(({ key, grams }) => [key, grams])),
    },
    findings: capped.map(({ key, ingredient, capGrams }) =>
      findingOf(plan.library, 'adjuster-at-its-cap', {
        values: { ingredient: ingredient.name, grams: capGrams ?? 0 },
        ingredients: [ingredient.id],
        lineKeys: [key],
      }),
    ),
  }
}

function alreadyAbove(
  without: number,
  fixed: readonly Portion[],
  target: Target,
  wanted: number,
  plan: Plan,
): Adjusted {
  const fitting = sizeTo(fractionSizing(fixed, target, wanted, plan))
  const fraction = fitting.status === 'found' ? fitting.size : null
  const dilution = fraction === null ? null : plan.setting.volumeMl / fraction
  const values = {
    ...targetValues(without, target, plan),
    fractionPercent: fraction === null ? 'an unknown' : fraction * 100,
    volumeMl: dilution ?? 'an unknown',
  }
  return {
    modelRefused: false,
    lowered: [],
    answer: {
      ...answerOf('already-above', without, target, plan),
      largestFractionThatFits: fraction,
      dilutionToVolumeMl: dilution,
    },
    findings: [about('target-already-passed', values, plan)],
  }
}

type Failure = Exclude<Sized, { readonly status: 'found' | 'already-above' }>

function outOfReach(sized: Failure, target: Target, plan: Plan): Adjusted {
  if (sized.status === 'unreachable') {
    const grams = massesAt(plan.adjusters, sized.size).reduce((sum, mass) => sum + mass, 0)
    const capped = plan.adjusters.every(({ capGrams }) => capGrams !== null)
    const highest = inTargetUnit(sized.highest, target, plan.scale, plan.conventions)
    const values = {
      ...targetValues(sized.without, target, plan),
      grams,
      highest: highest ?? 'beyond the scale',
    }
    const code = capped ? 'target-out-of-reach-of-cap' : 'target-out-of-reach'
    return {
      ...failed('unreachable', code, sized.without, target, plan),
      findings: [about(code, values, plan)],
    }
  }
  if (sized.status === 'not-converged') {
    return failed('not-converged', 'adjuster-not-converged', sized.without, target, plan)
  }
  if (sized.code === 'adjuster-does-not-count') {
    return failed('cannot-size', sized.code, sized.without, target, plan)
  }
  return {
    ...failed('cannot-size', 'adjuster-cannot-be-sized', sized.without, target, plan),
    modelRefused: true,
  }
}

function failed(
  status: AdjusterAnswer['status'],
  code: string,
  without: number | null,
  target: Target,
  plan: Plan,
): Adjusted {
  return {
    modelRefused: false,
    lowered: [],
    answer: answerOf(status, without, target, plan),
    findings: [about(code, targetValues(without, target, plan), plan)],
  }
}

function targetValues(without: number | null, target: Target, plan: Plan): Record<string, string | number> {
  const inUnit = without === null ? null : inTargetUnit(without, target, plan.scale, plan.conventions)
  return {
    target: target.value,
    unit: target.unit,
    without: inUnit ?? 'unknown',
    ingredient: plan.adjusters.map(({ ingredient }) => ingredient.name).join(' and '),
  }
}

const about = (code: string, values: Readonly<Record<string, string | number>>, plan: Plan): Finding =>
  findingOf(plan.library, code, {
    values,
    ingredients: plan.adjusters.map(({ ingredient }) => ingredient.id),
    lineKeys: plan.adjusters.map(({ key }) => key),
    blocks: code !== 'adjuster-at-its-cap',
  })

function answerOf(
  status: AdjusterAnswer['status'],
  without: number | null,
  target: Target,
  plan: Plan,
): AdjusterAnswer {
  return {
    status,
    lineKeys: plan.adjusters.map(({ key }) => key),
    gramsByKey: {},
    target,
    without: without === null ? null : inTargetUnit(without, target, plan.scale, plan.conventions),
    largestFractionThatFits: null,
    dilutionToVolumeMl: null,
  }
}
