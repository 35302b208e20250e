import { findingOf } from '../finding.ts'
import type { Finding, LineAnswer } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'

/**
 * Says where total and effective osmolality differ, and who is to blame: as a warning where the total would be
 * taken for isotonic and the effective part is not, else as a remark.
 */
export function tonicityRemarks({ plan, solution, lines }: RemarkContext): Finding[] {
  const { conventions, library } = plan
  const total = solution.osmolality.value
  const effective = solution.effectiveOsmolality.value
  const passing = total - effective
  if (total <= 0 || passing < total * conventions.notIsotonicFraction.value) return []
  const blamed = lines.filter((line) => passingOf(line) > 0).toSorted((a, b) => passingOf(b) - passingOf(a))
  const [first] = blamed
  if (!first) return []
  const low = conventions.isosmoticLowMilliosmPerKg.value
  const code = total >= low && effective < low ? 'isosmotic-not-isotonic' : 'total-and-effective-differ'
  return [
    findingOf(library, code, {
      values: { ingredient: first.ingredient.name, total, effective, passing },
      ingredients: blamed.map(({ ingredient }) => ingredient.id),
      lineKeys: blamed.map(({ key }) => key),
    }),
  ]
}

const passingOf = ({ osmolalityShareMilliosmPerKg, effectiveOsmolalityShareMilliosmPerKg }: LineAnswer) =>
  (osmolalityShareMilliosmPerKg ?? 0) - (effectiveOsmolalityShareMilliosmPerKg ?? 0)

/** Solutes counted as staying outside red cells although no source says so. */
export function reflectionRemarks({ plan, state, lines }: RemarkContext): Finding[] {
  if (!state) return []
  const unknown = new Set(state.shares.filter(({ reflection }) => reflection === null).map(({ key }) => key))
  const named = lines.filter(({ key }) => unknown.has(key))
  if (named.length === 0) return []
  const share = named.reduce((sum, line) => sum + (line.osmolalityShareMilliosmPerKg ?? 0), 0)
  return [
    findingOf(plan.library, 'reflection-unknown', {
      values: { ingredient: namesOf(named), share },
      ingredients: [...new Set(named.map(({ ingredient }) => ingredient.id))],
      lineKeys: named.map(({ key }) => key),
    }),
  ]
}

/** The names of lines, each once. */
export const namesOf = (lines: readonly LineAnswer[]): string =>
  [...new Set(lines.map(({ ingredient }) => ingredient.name))].join(', ')
