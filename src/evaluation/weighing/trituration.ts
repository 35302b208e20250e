import { roundToReadability } from '../../quantity/readability.ts'
import type { Scale } from './scales.ts'

/** One mixing of a powder: weigh it, mix with diluent, weigh a portion of the mixture. */
export interface TriturationStep {
  readonly weighGrams: number
  readonly diluentGrams: number
  readonly portionGrams: number
}

/** How a mass that cannot be weighed is measured in a solid diluent. */
export interface TriturationPlan {
  readonly steps: readonly TriturationStep[]
  /** What the last portion holds. */
  readonly doseGrams: number
  /** Diluent that enters the preparation with the dose. */
  readonly carriedGrams: number
  /** Root sum of squares of all weighings, percent of the dose. */
  readonly errorPercent: number
}

/**
 * A trituration with the smallest whole multiple and the smallest portions that can be weighed: in one step up to
 * `largestFactor`, in two equal ones beyond, never in three. Null when that does not reach the dose.
 * Mass balance: dose = weighed × portion / mixture.
 * @example designTrituration(0.004, { dilutedBelowG: 0.12, … }, 50).steps[0] → { weighGrams: 0.12, diluentGrams: 3.48, portionGrams: 0.12 }
 */
export function designTrituration(
  neededGrams: number,
  scale: Scale,
  largestFactor: number,
): TriturationPlan | null {
  const least = scale.dilutedBelowG
  const factor = Math.ceil((least / neededGrams) * (1 - 1e-12))
  if (factor <= largestFactor) return planOf(neededGrams, [factor], scale)
  const root = Math.ceil(Math.sqrt(least / neededGrams))
  return root <= largestFactor ? planOf(neededGrams, [root, root], scale) : null
}

function planOf(neededGrams: number, factors: readonly number[], scale: Scale): TriturationPlan {
  const onBalance = (grams: number) => roundToReadability(grams, scale.readabilityG)
  const least = onBalance(Math.ceil(scale.dilutedBelowG / scale.readabilityG - 1e-9) * scale.readabilityG)
  const parts: number[] = []
  const steps: TriturationStep[] = []
  const total = factors.reduce((product, factor) => product * factor, 1)
  let weighGrams = onBalance(neededGrams * total)
  /** Share of the active substance in what is weighed. */
  let content = 1
  for (const [index, factor] of factors.entries()) {
    const isLast = index === factors.length - 1
    const mixture = onBalance(least * factor)
    const portion = isLast ? (neededGrams * mixture) / (weighGrams * content) : least
    const step = {
      weighGrams,
      diluentGrams: onBalance(mixture - weighGrams),
      portionGrams: onBalance(portion),
    }
    content *= weighGrams / (weighGrams + step.diluentGrams)
    parts.push(scale.errorG / step.weighGrams, scale.errorG / step.portionGrams)
    steps.push(step)
    weighGrams = step.portionGrams
  }
  const portionGrams = steps.at(-1)?.portionGrams ?? 0
  const doseGrams = portionGrams * content
  return {
    steps,
    doseGrams,
    carriedGrams: portionGrams - doseGrams,
    errorPercent: Math.hypot(...parts) * 100,
  }
}
