import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import type { Severity } from '../../src/evaluation/types.ts'
import { electrolyteFailures } from './failures/electrolytes.ts'
import { formulaOf, type Failure } from './failures/row.ts'
import { routeFailures } from './failures/routes.ts'
import { substanceFailures } from './failures/substances.ts'
import { library } from './formulas.ts'

const failures = [...electrolyteFailures, ...substanceFailures, ...routeFailures]
const named = failures.map((each) => [each.failure, each] as const)

const caughtBy = ({ caught }: Failure) =>
  Object.entries(caught).flatMap(([severity, codes]) =>
    codes.map((code): readonly [string, Severity] => [code, severity as Severity]),
  )

describe('what has gone wrong in practice', () => {
  it('is twenty-six failures that a formula shows; the one left is of the paper', () => {
    expect(new Set(failures.map(({ failure }) => failure)).size).toBe(26)
  })

  it.each(named)('%s: caught', (_, each) => {
    const { findings } = evaluate(formulaOf(each.wrong), library)
    const severities = new Map(findings.map(({ code, severity }) => [code, severity]))
    const caught = caughtBy(each)
    expect(caught.length).toBeGreaterThan(0)
    expect(caught.map(([code]) => [code, severities.get(code)])).toEqual(caught)
  })

  it.each(named)('%s: its sound neighbour is let through', (_, each) => {
    const { status, findings } = evaluate(formulaOf({ ...each.wrong, ...each.sound }), library)
    const codes = findings.map(({ code }) => code)
    expect(status, codes.join()).toBe('ok')
    expect(caughtBy(each).filter(([code]) => codes.includes(code))).toEqual([])
    const stops = findings.filter(({ severity }) => severity === 'stop')
    expect(stops.map(({ code }) => code)).toEqual([])
  })
})
