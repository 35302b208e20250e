import type { Library } from '../library/library.ts'
import { lineKeyOf } from './stocks/keys.ts'
import type { Finding, Severity } from './types.ts'

export interface About {
  readonly values?: Readonly<Record<string, string | number>>
  readonly ingredients?: readonly string[]
  readonly lineKeys?: readonly string[]
  /** No number may be printed until it is cleared. */
  readonly blocks?: boolean
}

/** A finding of the given code; its severity and source stand with its words in data/findings. */
export function findingOf(library: Library, code: string, about: About = {}): Finding {
  const text = library.findings.get(code)
  if (!text) throw new Error(`data/findings has no words for ${code}`)
  return {
    code,
    severity: text.severity,
    source: text.source,
    values: about.values ?? {},
    ingredients: about.ingredients ?? [],
    lineKeys: about.lineKeys ?? [],
    blocks: about.blocks ?? false,
  }
}

const rank: Readonly<Record<Severity, number>> = { stop: 0, warn: 1, note: 2 }

/** Stops first, then warnings, then notes; within these by the place of the line in the formula. */
export function inOrder(findings: readonly Finding[], lineKeys: readonly string[]): readonly Finding[] {
  const place = new Map(lineKeys.map((key, index) => [key, index]))
  const placeOf = ({ lineKeys: [first] }: Finding) =>
    first === undefined ? lineKeys.length : (place.get(lineKeyOf(first)) ?? lineKeys.length)
  return findings.toSorted((a, b) => rank[a.severity] - rank[b.severity] || placeOf(a) - placeOf(b))
}
