import { wholeNumber } from '../words/figures.ts'
import { idleSampling, type PageStore } from '../state/store.ts'
import type { SamplingOrder, SamplingReport } from './messages.ts'

const draws = 10_000
const seed = 20_261_201

export interface SamplingActions {
  startSampling(): void
  cancelSampling(): void
}

/** Sampling on request, in a worker; a change of the formula stops it, since its answer would belong to another. */
export function samplingActions(store: PageStore, makeWorker: () => Worker): SamplingActions {
  let worker: Worker | null = null
  const stop = () => {
    worker?.terminate()
    worker = null
  }
  const cancelSampling = () => {
    stop()
    store.setState({ sampling: idleSampling })
  }
  store.subscribe((state, before) => {
    if (state.revision !== before.revision && state.sampling !== idleSampling) cancelSampling()
  })
  return {
    cancelSampling,
    startSampling() {
      stop()
      store.setState({ sampling: { kind: 'running', done: 0, total: draws, sentence: '' } })
      worker = makeWorker()
      worker.addEventListener('message', ({ data }: MessageEvent<SamplingReport>) => {
        store.setState({ sampling: stateOf(data) })
        if (data.kind !== 'progress') stop()
      })
      worker.addEventListener('error', () => {
        stop()
        store.setState({ sampling: failed })
      })
      const order: SamplingOrder = { kind: 'sample', formula: store.getState().formula, draws, seed }
      worker.postMessage(order)
    },
  }
}

const failed = {
  kind: 'failed',
  done: 0,
  total: draws,
  sentence: 'The sampling broke and gives no figure; the interval above stands by itself.',
} as const

function stateOf(report: SamplingReport) {
  if (report.kind === 'progress')
    return { kind: 'running', done: report.done, total: draws, sentence: '' } as const
  if (report.kind === 'impossible') return failed
  const { mean, low, high } = report.result
  const sentence = `10,000 draws: mean ${wholeNumber(mean)}, 95 of 100 from ${wholeNumber(low)} to ${wholeNumber(high)} mOsm/kg.`
  return { kind: 'done', done: draws, total: draws, sentence } as const
}
