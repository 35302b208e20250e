import type { ChemistryProblem } from '../chemistry/types.ts'
import type { Library } from '../library/library.ts'
import { findingOf } from './finding.ts'
import type { ReadLine } from './lowering.ts'
import type { Finding } from './types.ts'

/**
 * The chemistry room's problems as findings with the names of their ingredients; one that several solutes have is
 * told once.
 */
export function problemFindings(
  problems: readonly ChemistryProblem[],
  read: readonly ReadLine[],
  library: Library,
  blocks: boolean,
): Finding[] {
  return grouped(problems).map(({ code, values, keys }) => {
    const lines = read.filter(({ key }) => keys.includes(key))
    const names = [...new Set(lines.map(({ ingredient }) => ingredient.name))].join(', ')
    const known = library.findings.has(code)
    return findingOf(library, known ? code : 'model-problem', {
      values: {
        ...values,
        ...(names === '' ? {} : { ingredient: names, ingredients: names }),
        ...(known ? {} : { problem: code }),
      },
      ingredients: [...new Set(lines.map(({ ingredient }) => ingredient.id))],
      lineKeys: lines.map(({ key }) => key),
      blocks,
    })
  })
}

/** Problems that differ in their ingredients alone become one. */
function grouped(problems: readonly ChemistryProblem[]): readonly ChemistryProblem[] {
  const groups = new Map<string, ChemistryProblem>()
  for (const problem of problems) {
    const { ingredient: _, ...others } = problem.values
    const group = `${problem.code} ${JSON.stringify(others)}`
    const known = groups.get(group)
    groups.set(group, known ? { ...known, keys: [...known.keys, ...problem.keys] } : problem)
  }
  return [...groups.values()]
}
