import type { Finding } from '../types.ts'
import type { CautionContext } from './context.ts'
import type { Need } from './outcome.ts'
import type { Judged } from './raise.ts'

const ofPatient: readonly Need[] = ['age', 'weight', 'dose volume', 'infusion rate']
const ofSolution: readonly Need[] = [
  'pH',
  'osmolality',
  'osmolarity',
  'sodium chloride equivalent',
  'final volume',
  'strength',
]

/**
 * Checks that hang on something unknown, told once for the patient and once for the solution: silence would look like
 * an all-clear. Notes are not worth asking for, and a blocked formula says itself what is missing.
 */
export function unansweredChecks(judged: readonly Judged[], context: CautionContext): Finding[] {
  const open = judged.filter(
    ({ caution, outcome }) => outcome.truth === 'unknown' && caution.severity !== 'note',
  )
  return [
    ...told('checks-need-patient-data', ofPatient, open),
    ...(context.solution ? told('checks-need-solution-data', ofSolution, open) : []),
  ]
}

function told(code: string, kinds: readonly Need[], open: readonly Judged[]): Finding[] {
  const hanging = open.filter(({ outcome }) => outcome.needs.some((need) => kinds.includes(need)))
  if (hanging.length === 0) return []
  const needed = kinds.filter((kind) => hanging.some(({ outcome }) => outcome.needs.includes(kind)))
  return [
    {
      code,
      severity: 'note',
      values: { data: needed.join(', '), count: hanging.length },
      ingredients: [],
      lineKeys: [],
      source: 'project',
      blocks: false,
    },
  ]
}
