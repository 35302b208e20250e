import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import { tellFinding } from '../../../src/worksheet/tell.ts'
import { library } from './contexts.ts'
import { formulaOfOrdinary, ordinary } from './ordinary.ts'

describe('ordinary published formulas', () => {
  it('are more than forty, over fourteen routes', () => {
    expect(ordinary.length).toBeGreaterThan(40)
    expect(new Set(ordinary.map(({ route }) => route)).size).toBeGreaterThanOrEqual(14)
  })

  it.each(ordinary.map((each) => [each.name, each] as const))('%s raises no stop', (_, each) => {
    const evaluation = evaluate(formulaOfOrdinary(each), library)
    expect(evaluation.status, JSON.stringify(evaluation.findings)).toBe('ok')
    const { findings } = evaluation
    const stops = findings.filter(({ severity }) => severity === 'stop')
    expect(stops.map((finding) => tellFinding(finding, library).message)).toEqual([])
    for (const finding of findings) {
      const { message, wayOut } = tellFinding(finding, library)
      expect(`${message} ${wayOut}`).not.toMatch(/[{}]|undefined|NaN/)
    }
  })
})
