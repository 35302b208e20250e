import { comparingBuffers } from '../../evaluation/buffers/compare.ts'
import { evaluate } from '../../evaluation/evaluate.ts'
import { headlineSampler } from '../../evaluation/sampling.ts'
import { loadLibrary } from '../../library/library.ts'
import { seededUniform } from '../../numeric/random.ts'
import { startSampling } from '../../numeric/sample.ts'
import type {
  CalculationOrder,
  ComparisonOrder,
  ComparisonReport,
  SamplingOrder,
  SamplingReport,
} from './messages.ts'

/* Long calculations beside the page, with the same functions; they tell how far they are. */

const drawsPerReport = 500

const tellSampling = (report: SamplingReport) => self.postMessage(report)
const tellComparison = (report: ComparisonReport) => self.postMessage(report)

function sample({ formula, draws, seed }: SamplingOrder): void {
  const library = loadLibrary()
  const sampler = headlineSampler(evaluate(formula, library), library)
  if (!sampler) return tellSampling({ kind: 'impossible' })
  const sampling = startSampling(sampler.inputs.length, sampler.evaluate, seededUniform(seed))
  while (sampling.done < draws) {
    sampling.step(Math.min(drawsPerReport, draws - sampling.done))
    tellSampling({ kind: 'progress', done: sampling.done })
  }
  const result = sampling.result()
  return tellSampling(result ? { kind: 'done', result } : { kind: 'impossible' })
}

function compare({ formula, wish }: ComparisonOrder): void {
  const library = loadLibrary()
  const evaluation = evaluate(formula, library)
  if (evaluation.status !== 'ok') return tellComparison({ kind: 'impossible' })
  const total = library.bufferSystems.length
  for (const option of comparingBuffers(evaluation, wish, library)) {
    tellComparison({ kind: 'compared', option, total })
  }
  return tellComparison({ kind: 'finished' })
}

self.addEventListener('message', ({ data }: MessageEvent<CalculationOrder>) => {
  if (data.kind === 'sample') sample(data)
  else compare(data)
})
