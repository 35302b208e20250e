import type { MethodAnswer } from '../types.ts'
import { sizeByMethod, type MethodSizing } from './adjust.ts'
import type { AdditiveMethod, MethodContext, MethodLine } from './common.ts'
import { largestDifference, type HeadlineShares } from './compare.ts'
import { freezingPointMethod } from './freezingPoint.ts'
import { isotonicVolume } from './isotonicVolume.ts'
import { lIsoMethod } from './lIso.ts'
import { sodiumChlorideEquivalentMethod } from './sodiumChlorideEquivalent.ts'
import { sumOf, type MethodSum } from './sum.ts'
import { measuredTrace, vantHoffMethod } from './vantHoff.ts'

export const additiveMethods: readonly AdditiveMethod[] = [
  sodiumChlorideEquivalentMethod,
  freezingPointMethod,
  lIsoMethod,
  vantHoffMethod,
]

export interface MethodInput {
  /** Every solute with its mass in the evaluated volume. */
  readonly lines: readonly MethodLine[]
  /** Null without a q.s. line. */
  readonly sizing: MethodSizing | null
  readonly context: MethodContext
  readonly headline: HeadlineShares
}

export interface AdditiveAnswer {
  readonly answer: MethodAnswer
  readonly sum: MethodSum
}

/** One classical method in full: osmolality, adjuster, isotonic volume of the other solutes, arithmetic. */
export function additiveAnswer(method: AdditiveMethod, input: MethodInput): AdditiveAnswer {
  const { lines, sizing, context, headline } = input
  const sum = sumOf(method, lines, context)
  const osmolality = sum.sum === null ? null : method.osmolality(sum.sum, context)
  const fixed = sizing ? sum.parts.filter(({ line }) => !sizing.keys.has(line.key)) : sum.parts
  const sized = sizing && sizeByMethod(method, fixed, sizing, context)
  const volume = isotonicVolume(method, fixed, context)
  const missing = [...sum.missing]
  if (sum.sum !== null && osmolality === null) missing.push({ code: 'beyond-sodium-chloride-scale', key: '' })
  if (sized?.status === 'missing' && sized.code !== 'missing-for-adjuster') {
    missing.push({ code: sized.code, key: sizing?.adjusters[0]?.key ?? '' })
  }
  const measured = method.id === 'vant-hoff' ? measuredTrace(lines, context) : []
  return {
    sum,
    answer: {
      method: method.id,
      osmolalityMilliosmPerKg: osmolality,
      adjusterGrams: sized?.status === 'sized' ? sized.grams : null,
      isotonicVolumeMl: volume.millilitres,
      differsBy: largestDifference(sum, osmolality, headline),
      missing,
      trace: [...sum.trace, ...measured, ...volume.trace],
    },
  }
}
