import { describe, expect, it } from 'vitest'
import { bringCalculation } from '../../../src/app/offline/bringCalculation.ts'
import { blockedSentence } from '../../../src/app/state/blocked.ts'
import { runningAnswer } from '../../../src/app/state/runningAnswer.ts'
import { createPageStore, currentEvaluation } from '../../../src/app/state/store.ts'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import type { Formula } from '../../../src/formula/types.ts'
import { loadLibrary } from '../../../src/library/library.ts'
import { openingOnly } from '../../../src/library/opening.ts'

const clock = { now: () => 0, nextFrame: (run: () => void) => run() }

const saline = (amount: string): Formula => ({
  format: 'evenwater.formula',
  version: 1,
  title: '',
  route: 'intravenous-peripheral',
  finalVolume: '100 mL',
  lines: [{ key: 'a', ingredient: 'sodium-chloride', amount }],
})

const opened = () =>
  createPageStore({
    library: openingOnly(),
    formula: saline('0.9 %'),
    drafts: {},
    paper: 'A4',
    calculation: 'coming',
  })

describe('a page whose calculating part comes later', () => {
  it('says that it calculates, then evaluates what was written meanwhile', async () => {
    const store = opened()
    expect(runningAnswer(store.getState()).words).toBe('calculating')
    store.setState({ formula: saline('0.45 %'), revision: 1 })
    await bringCalculation(store, clock, async () => ({ evaluate, loadLibrary }))
    const state = store.getState()
    expect(state.library).toBe(loadLibrary())
    expect(currentEvaluation(state)?.formula).toEqual(saline('0.45 %'))
    expect(runningAnswer(state).number).toMatch(/^1[34]\d mOsm\/kg$/)
  })

  it('says why there are no numbers when it cannot be had, or when its data are broken', async () => {
    const loads = [
      () => Promise.reject(new Error('no network')),
      async () => ({
        evaluate,
        loadLibrary: () => {
          throw new Error('data/cautions: ph stands twice')
        },
      }),
    ]
    for (const load of loads) {
      const store = opened()
      await bringCalculation(store, clock, load)
      expect(blockedSentence(store.getState())).toMatch(/could not be loaded.*(no network|stands twice)/)
      expect(currentEvaluation(store.getState())).toBeNull()
      expect(runningAnswer(store.getState()).words).toBe('no figure: blocked')
    }
  })
})

describe('the opening of the library', () => {
  it('is that of the whole library, and refuses the rest instead of answering it as empty', () => {
    const opening = openingOnly()
    const whole = loadLibrary()
    expect(opening.ingredients).toBe(whole.ingredients)
    expect(opening.moieties).toBe(whole.moieties)
    expect(opening.stocks).toBe(whole.stocks)
    expect(() => opening.cautions).toThrow(/"cautions" of the library is still being loaded/)
    expect(() => evaluate(saline('0.9 %'), opening)).toThrow(/still being loaded/)
  })
})
