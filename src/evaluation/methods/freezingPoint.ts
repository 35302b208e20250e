import {
  percentOf,
  type AdditiveMethod,
  type Contribution,
  type MethodContext,
  type MethodLine,
  type MethodTarget,
} from './common.ts'
import { datumFigure, figure } from './figures.ts'

/** Σ ΔTf(1 %)·c: the depressions of the single solutes, taken as proportional to strength, add up; 0.52 K is isotonic. */
export const freezingPointMethod: AdditiveMethod = {
  id: 'freezing-point',
  unit: 'K',
  sumName: 'freezing-point depression',
  contribution,
  osmolality: osmolalityOfDepression,
  closing: depressionClosing,
  targetOnScale: depressionTarget,
  isotonic: ({ conventions }) => conventions.isotonicDepressionKelvin.value,
}

function contribution(line: MethodLine, context: MethodContext): Contribution {
  const depression = line.ingredient.freezingPointDepression1Percent
  if (!depression) return { status: 'missing', code: 'missing-depression' }
  const percent = percentOf(line, context)
  return {
    status: 'known',
    value: percent * depression.value,
    reason: 'differs-depression',
    fromMemory: depression.fromMemory,
    step: {
      key: line.key,
      subject: line.ingredient.name,
      rule: 'c·ΔTf(1 %)',
      inputs: [figure('c', percent, '% w/v'), datumFigure('ΔTf(1 %)', depression)],
      result: figure('ΔTf', percent * depression.value, 'K'),
    },
  }
}

/** ΔTf / 1.86 K·kg/Osm, in mOsm/kg. */
export function osmolalityOfDepression(kelvin: number, { conventions }: MethodContext): number {
  return (kelvin / conventions.cryoscopicConstant.value) * 1000
}

export function depressionClosing(kelvin: number, context: MethodContext) {
  return [
    {
      key: 'osmolality',
      rule: '1000·ΔTf / Kf',
      inputs: [figure('ΔTf', kelvin, 'K'), datumFigure('Kf', context.conventions.cryoscopicConstant)],
      result: figure('osmolality', osmolalityOfDepression(kelvin, context), 'mOsm/kg'),
    },
  ]
}

/** A target as a depression: an osmolality by 1.86 K·kg/Osm, sodium chloride by 0.9 % = 0.52 K. */
export function depressionTarget(target: MethodTarget, { conventions }: MethodContext): number {
  if (target.quantity === 'freezing-point-depression') return target.value
  if (target.quantity === 'osmolality') return (target.value / 1000) * conventions.cryoscopicConstant.value
  return (
    (target.value / conventions.isotonicSodiumChloridePercent.value) *
    conventions.isotonicDepressionKelvin.value
  )
}
