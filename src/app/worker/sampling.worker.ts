import { evaluate } from '../../evaluation/evaluate.ts'
import { headlineSampler } from '../../evaluation/sampling.ts'
import { loadLibrary } from '../../library/library.ts'
import { seededUniform } from '../../numeric/random.ts'
import { startSampling } from '../../numeric/sample.ts'
import type { SamplingOrder, SamplingReport } from './messages.ts'

/* Samples the headline of a formula beside the page, with the same functions; tells how far it is. */

const drawsPerReport = 500

const tell = (report: SamplingReport) => self.postMessage(report)

self.addEventListener('message', ({ data }: MessageEvent<SamplingOrder>) => {
  const library = loadLibrary()
  const sampler = headlineSampler(evaluate(data.formula, library), library)
  if (!sampler) return tell({ kind: 'impossible' })
  const sampling = startSampling(sampler.inputs.length, sampler.evaluate, seededUniform(data.seed))
  while (sampling.done < data.draws) {
    sampling.step(Math.min(drawsPerReport, data.draws - sampling.done))
    tell({ kind: 'progress', done: sampling.done })
  }
  const result = sampling.result()
  return tell(result ? { kind: 'done', result } : { kind: 'impossible' })
})
