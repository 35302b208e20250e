import { percentOfParticles } from '../words/figures.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'

export interface ParticleView {
  readonly key: string
  readonly order: number
  readonly name: string
  /** Percent of all particles; null where it is not known. */
  readonly formal: number | null
  readonly counted: number | null
  readonly formalText: string
  readonly countedText: string
}

export const particleViews = viewOf(
  (state) => [currentEvaluation(state)] as const,
  (evaluation): readonly ParticleView[] =>
    (evaluation?.lines ?? []).flatMap((line, order) => {
      const { key, shareFormalPercent: formal, shareOfParticlesPercent: counted } = line
      if (formal === null && counted === null) return []
      const text = (value: number | null) => (value === null ? 'unknown' : percentOfParticles(value))
      return [
        {
          key,
          order,
          name: line.ingredient.name,
          formal,
          counted,
          formalText: text(formal),
          countedText: text(counted),
        },
      ]
    }),
)
