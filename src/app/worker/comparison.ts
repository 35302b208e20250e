import type { ComparisonWish } from '../../evaluation/buffers/compare.ts'
import { idleComparison, type PageStore } from '../state/store.ts'
import type { ComparisonOrder, ComparisonReport } from './messages.ts'

export interface ComparisonActions {
  startComparison(wish: ComparisonWish): void
  cancelComparison(): void
}

/** The comparison of buffers, in a worker; a change of the formula makes what it found out of date, and it says so. */
export function comparisonActions(store: PageStore, makeWorker: () => Worker): ComparisonActions {
  let worker: Worker | null = null
  const stop = () => {
    worker?.terminate()
    worker = null
  }
  const fail = () => {
    stop()
    store.setState({ comparison: { ...idleComparison, kind: 'failed' } })
  }
  return {
    cancelComparison() {
      stop()
      store.setState({ comparison: idleComparison })
    },
    startComparison(wish) {
      stop()
      const { formula, revision, library } = store.getState()
      const total = library.bufferSystems.length
      store.setState({ comparison: { kind: 'running', options: [], total, revision } })
      worker = makeWorker()
      worker.addEventListener('message', ({ data }: MessageEvent<ComparisonReport>) => {
        const { comparison } = store.getState()
        if (data.kind === 'compared') {
          store.setState({ comparison: { ...comparison, options: [...comparison.options, data.option] } })
        } else if (data.kind === 'finished') {
          stop()
          store.setState({ comparison: { ...comparison, kind: 'done' } })
        } else fail()
      })
      worker.addEventListener('error', fail)
      const order: ComparisonOrder = { kind: 'compare', formula, wish }
      worker.postMessage(order)
    },
  }
}
