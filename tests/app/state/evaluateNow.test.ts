import { describe, expect, it } from 'vitest'
import type { Evaluation } from '../../../src/evaluation/types.ts'
import type { Formula } from '../../../src/formula/types.ts'
import { keepEvaluated } from '../../../src/app/state/evaluateNow.ts'
import { currentEvaluation } from '../../../src/app/state/store.ts'
import { pageWith } from './fixtures.ts'

/** An answer that carries nothing but the formula it was made from. */
const answerFor = (formula: Formula) => ({ formula, status: 'ok' }) as unknown as Evaluation

function setUp(msPerRun: number) {
  const page = pageWith([['sodium-chloride', '1 %']])
  const frames: (() => void)[] = []
  let now = 0
  let runs = 0
  keepEvaluated(
    page.store,
    (formula) => {
      runs += 1
      now += msPerRun
      return answerFor(formula)
    },
    { now: () => now, nextFrame: (run) => frames.push(run) },
  )
  const type = (text: string) => page.actions.typeInCell({ kind: 'amount', key: 'k0' }, text)
  return { ...page, frames, type, runs: () => runs }
}

describe('keeping the evaluation in step', () => {
  it('runs at once while a run takes less than a frame', () => {
    const { store, type, runs, frames } = setUp(3)
    type('2 %')
    expect(runs()).toBe(2)
    expect(frames).toHaveLength(0)
    expect(currentEvaluation(store.getState())?.formula).toBe(store.getState().formula)
  })

  it('runs once for each frame when it takes longer, and shows nothing out of date meanwhile', () => {
    const { store, type, runs, frames } = setUp(40)
    type('2 %')
    type('3 %')
    expect(runs()).toBe(1)
    expect(currentEvaluation(store.getState())).toBeNull()
    expect(frames).toHaveLength(1)
    frames[0]?.()
    expect(runs()).toBe(2)
    expect(currentEvaluation(store.getState())?.formula).toBe(store.getState().formula)
  })

  it('gives nothing while a field cannot be read, and comes back when it is mended', () => {
    const { store, actions, runs } = setUp(1)
    const pH = { kind: 'field', field: 'pH' } as const
    actions.typeInCell(pH, 'six')
    expect(currentEvaluation(store.getState())).toBeNull()
    expect(runs()).toBe(1)
    actions.typeInCell(pH, '6')
    expect(currentEvaluation(store.getState())?.formula.pH).toBe(6)
  })

  it('says that the calculation broke, and shows no number', () => {
    const { store, actions } = pageWith()
    let broken = true
    keepEvaluated(
      store,
      (formula) => {
        if (broken) throw new Error('division by nothing')
        return answerFor(formula)
      },
      { now: () => 0, nextFrame: (run) => run() },
    )
    expect(store.getState().failure).toContain('division by nothing')
    expect(currentEvaluation(store.getState())).toBeNull()
    broken = false
    actions.setRoute('nasal')
    expect(store.getState().failure).toBeNull()
  })
})
