import { loadConventions } from '../library/conventions.ts'
import type { Library } from '../library/library.ts'
import type { Formula } from '../formula/types.ts'
import { fillAndAdjust } from './adjusting/fillAndAdjust.ts'
import type { Plan } from './adjusting/plan.ts'
import { surroundingsOf } from './adjusting/surroundings.ts'
import { nonFinitePath } from './answers/finite.ts'
import { blockedEvaluation, type Standing } from './blocked.ts'
import { evaluateByEquivalents } from './byEquivalents.ts'
import { finish } from './finish.ts'
import { guarded } from './guarded.ts'
import { findingOf } from './finding.ts'
import { isFinding, lower, type Lowered, type ReadLine } from './lowering.ts'
import { portionsOf, solve } from './model.ts'
import { readLines } from './order/readLines.ts'
import { readOrder, type Order } from './order/readOrder.ts'
import { problemFindings } from './problems.ts'
import type { Evaluation, Finding } from './types.ts'
import { scaleOf } from './yardstick.ts'

/**
 * The front door: a formula and the library in, everything that the page and the paper show out. Pure; the order
 * of lines changes no number; what cannot be answered blocks with a finding that says why.
 */
export function evaluate(formula: Formula, library: Library): Evaluation {
  return guarded(answered(formula, library), library)
}

function answered(formula: Formula, library: Library): Evaluation {
  const { order, findings } = readOrder(formula, library)
  const lines = readLines(formula, library, order.volumeMl)
  findings.push(...lines.findings, ...orderRemarks(formula, lines.lines, library))
  const standing: Standing = {
    volumeMl: order.volumeMl,
    batchFactor: order.batchFactor,
    read: lines.lines,
    lowered: [],
    adjuster: null,
  }
  if (order.volumeMl === null || findings.some(({ blocks }) => blocks)) {
    return blockedEvaluation(formula, library, standing, findings)
  }
  const plan = planOf(formula, library, order, order.volumeMl, lines.lines)
  return finiteOr(solved(formula, plan, standing, findings), formula, library)
}

/** What the lines as a whole lack. */
function orderRemarks(formula: Formula, lines: readonly ReadLine[], library: Library): Finding[] {
  const adjusters = lines.filter(({ part }) => part === 'adjuster')
  if (formula.lines.length === 0) return [findingOf(library, 'no-ingredients', { blocks: true })]
  const fills = new Set(lines.flatMap(({ part, stock }) => (part === 'fill' && stock ? [stock.lineKey] : [])))
  if (fills.size > 1)
    return [findingOf(library, 'several-vehicles-fill', { lineKeys: [...fills], blocks: true })]
  if (adjusters.length === 0 || formula.target) return []
  return [
    findingOf(library, 'target-missing', {
      values: { ingredient: adjusters.map(({ ingredient }) => ingredient.name).join(', ') },
      ingredients: adjusters.map(({ ingredient }) => ingredient.id),
      lineKeys: adjusters.map(({ key }) => key),
      blocks: true,
    }),
  ]
}

function planOf(
  formula: Formula,
  library: Library,
  order: Order,
  volumeMl: number,
  lines: readonly ReadLine[],
): Plan {
  const conventions = loadConventions()
  const { scales, measures, batchFactor, temperatureCelsius, target } = order
  return {
    library,
    conventions,
    scale: scaleOf(library),
    setting: { volumeMl, temperatureCelsius, pH: formula.pH ?? 'solve' },
    solutes: lines.filter(({ part }) => part === 'solute'),
    adjusters: lines.filter(({ part }) => part === 'adjuster'),
    fills: lines.filter(({ part }) => part === 'fill'),
    balance: { scales, measures, batchFactor, batchVolumeMl: volumeMl * batchFactor },
    target,
  }
}

/** Masses first, then the adjuster, then the solution that belongs to the rounded masses. */
function solved(formula: Formula, plan: Plan, standing: Standing, findings: Finding[]): Evaluation {
  const { library, setting } = plan
  const around = surroundingsOf(plan)
  if ('code' in around) return blockedEvaluation(formula, library, standing, [...findings, around])
  const lowered: Lowered[] = []
  for (const line of plan.solutes) {
    const result = lower(line, around, plan.balance, library)
    if (isFinding(result)) findings.push(result)
    else lowered.push(result)
  }
  const known = { ...standing, lowered }
  if (findings.some(({ blocks }) => blocks)) return blockedEvaluation(formula, library, known, findings)
  const { adjusted, ...filledUp } = fillAndAdjust(lowered, plan)
  if (adjusted?.modelRefused)
    return evaluateByEquivalents(formula, plan, known, findings, { sizing: adjusted })
  findings.push(...(adjusted?.findings ?? []), ...filledUp.findings)
  const complete = { ...known, lowered: filledUp.lowered, adjuster: adjusted?.answer ?? null }
  if (findings.some(({ blocks }) => blocks)) return blockedEvaluation(formula, library, complete, findings)
  const result = solve(portionsOf(plan, complete.lowered), setting, library)
  if (result.status === 'refused')
    return evaluateByEquivalents(formula, plan, complete, findings, { problems: result.problems })
  findings.push(...problemFindings(result.state.problems, standing.read, library, false))
  return finish(formula, plan, complete, findings, result.state)
}

/** The last check: a number that is not finite leaves as a named block, never as a number. */
function finiteOr(evaluation: Evaluation, formula: Formula, library: Library): Evaluation {
  const path = nonFinitePath(evaluation)
  if (path === null) return evaluation
  const finding = findingOf(library, 'non-finite-result', { values: { path }, blocks: true })
  const { volumeMl, batchFactor } = evaluation
  return blockedEvaluation(
    formula,
    library,
    { volumeMl, batchFactor, read: [], lowered: [], adjuster: null },
    [...evaluation.findings.filter(({ values }) => nonFinitePath(values) === null), finding],
  )
}
