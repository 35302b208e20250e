import { normalPair, type Uniform } from './random.ts'

export interface Sampled {
  readonly draws: number
  readonly mean: number
  readonly standardDeviation: number
  /** 2.5 % and 97.5 % quantiles. */
  readonly low: number
  readonly high: number
}

/** Draws that have been made so far; `step` makes some more, so that long work can be shown and stopped. */
export interface Sampling {
  readonly done: number
  step(count: number): void
  result(): Sampled | null
}

/**
 * Samples an answer over standard normal inputs. Null until there are 100 draws; an answer that is not finite is
 * refused by throwing, since it would hide in the mean.
 */
export function startSampling(
  inputs: number,
  evaluate: (deviates: Float64Array) => number,
  uniform: Uniform,
): Sampling {
  const deviates = new Float64Array(inputs)
  const answers: number[] = []
  return {
    get done() {
      return answers.length
    },
    step(count) {
      for (let draw = 0; draw < count; draw += 1) {
        for (let at = 0; at < inputs; at += 2) normalPair(uniform, deviates, at)
        const answer = evaluate(deviates)
        if (!Number.isFinite(answer)) throw new RangeError('A draw gave no finite answer.')
        answers.push(answer)
      }
    },
    result: () => (answers.length < 100 ? null : summary(answers)),
  }
}

function summary(answers: readonly number[]): Sampled {
  const sorted = Float64Array.from(answers).sort()
  const draws = sorted.length
  const mean = sorted.reduce((sum, answer) => sum + answer, 0) / draws
  const variance = sorted.reduce((sum, answer) => sum + (answer - mean) ** 2, 0) / (draws - 1)
  return {
    draws,
    mean,
    standardDeviation: Math.sqrt(variance),
    low: quantile(sorted, 0.025),
    high: quantile(sorted, 0.975),
  }
}

/** Linear between the order statistics. @example quantile of 1, 2, 3 at 0.5 → 2 */
export function quantile(sorted: Float64Array, share: number): number {
  const place = share * (sorted.length - 1)
  const below = Math.floor(place)
  const [low, high] = [sorted[below], sorted[Math.min(below + 1, sorted.length - 1)]]
  if (low === undefined || high === undefined) throw new RangeError('There is nothing to take a quantile of.')
  return low + (place - below) * (high - low)
}
