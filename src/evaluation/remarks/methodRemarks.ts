import { findingOf } from '../finding.ts'
import type { AdditiveAnswer } from '../methods/answer.ts'
import type { Finding, LineAnswer } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'
import { namesOf } from './tonicity.ts'

/**
 * Methods far apart, with who makes the difference. The ideal count of labels lies above every measurement by its
 * nature and stands aside.
 */
export function spreadRemarks({ plan, methods, solution, lines }: RemarkContext): Finding[] {
  const known = methods.flatMap((method) =>
    method.osmolalityMilliosmPerKg === null || method.method === 'vant-hoff'
      ? []
      : [{ method, value: method.osmolalityMilliosmPerKg }],
  )
  const lowest = known.toSorted((a, b) => a.value - b.value)[0]
  const highest = known.toSorted((a, b) => b.value - a.value)[0]
  const headline = solution.osmolality.value
  if (!lowest || !highest || headline <= 0) return []
  const span = highest.value - lowest.value
  if (span < headline * plan.conventions.methodsDisagreeFraction.value) return []
  const farthest = headline - lowest.value > highest.value - headline ? lowest : highest
  const line = lines.find(({ key }) => key === farthest.method.differsBy?.key)
  return [
    findingOf(plan.library, 'methods-disagree', {
      values: {
        low: lowest.value,
        high: highest.value,
        lowMethod: lowest.method.method,
        highMethod: highest.method.method,
        headline,
        ingredient: line?.ingredient.name ?? 'no single ingredient',
      },
      ingredients: line ? [line.ingredient.id] : [],
      lineKeys: line ? [line.key] : [],
    }),
  ]
}

/** Methods that have no answer, grouped by what they lack. */
export function missingRemarks({ plan, methods, lines }: RemarkContext): Finding[] {
  const byCode = new Map<string, Set<string>>()
  for (const { missing } of methods) {
    for (const { code, key } of missing) {
      if (!code.startsWith('missing-')) continue
      byCode.set(code, (byCode.get(code) ?? new Set()).add(key))
    }
  }
  return [...byCode].map(([code, keys]) =>
    grouped(
      code,
      lines.filter(({ key }) => keys.has(key)),
      plan.library,
    ),
  )
}

function grouped(
  code: string,
  lines: readonly LineAnswer[],
  library: RemarkContext['plan']['library'],
): Finding {
  return findingOf(library, code, {
    values: { ingredient: namesOf(lines) },
    ingredients: [...new Set(lines.map(({ ingredient }) => ingredient.id))],
    lineKeys: lines.map(({ key }) => key),
  })
}

/** Equivalents read beyond their table, and figures from memory that stand behind the methods. */
export function equivalentRemarks({ plan, additive, lines }: RemarkContext): Finding[] {
  const outside = keysOf(additive, (contribution) => contribution.outsideTable === true)
  const remembered = keysOf(additive, (contribution) => contribution.fromMemory)
  const findings: Finding[] = []
  const named = (keys: ReadonlySet<string>) => lines.filter(({ key }) => keys.has(key))
  if (outside.size > 0) findings.push(grouped('equivalent-beyond-table', named(outside), plan.library))
  if (remembered.size > 0) findings.push(grouped('from-memory-data', named(remembered), plan.library))
  return findings
}

type Known = Extract<AdditiveAnswer['sum']['parts'][number]['contribution'], { readonly status: 'known' }>

function keysOf(additive: readonly AdditiveAnswer[], holds: (contribution: Known) => boolean): Set<string> {
  const keys = new Set<string>()
  for (const { sum, answer } of additive) {
    if (answer.method === 'l-iso') continue
    for (const { line, contribution } of sum.parts) {
      if (contribution.status === 'known' && holds(contribution)) keys.add(line.key)
    }
  }
  return keys
}
