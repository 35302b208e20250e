import {
  molarityOf,
  type AdditiveMethod,
  type Contribution,
  type MethodContext,
  type MethodLine,
} from './common.ts'
import { datumFigure, figure } from './figures.ts'
import { depressionClosing, depressionTarget, osmolalityOfDepression } from './freezingPoint.ts'
import type { TraceStep } from '../types.ts'

/** ΔTf = L_iso·c with one average L_iso for each ionic class; the equivalent follows as E = 17·L_iso/M. */
export const lIsoMethod: AdditiveMethod = {
  id: 'l-iso',
  unit: 'K',
  sumName: 'freezing-point depression',
  contribution,
  osmolality: osmolalityOfDepression,
  closing: depressionClosing,
  targetOnScale: depressionTarget,
  isotonic: ({ conventions }) => conventions.isotonicDepressionKelvin.value,
}

function contribution(line: MethodLine, context: MethodContext): Contribution {
  const { electrolyteClass } = line.ingredient
  if (!electrolyteClass) return { status: 'missing', code: 'missing-ionic-class' }
  const molarity = molarityOf(line, context)
  if (molarity === null) return { status: 'missing', code: 'missing-molar-mass' }
  const lIso = context.conventions.lIso[electrolyteClass]
  const step: TraceStep = {
    key: line.key,
    subject: line.ingredient.name,
    rule: `L_iso·c, ${electrolyteClass}`,
    inputs: [datumFigure('L_iso', lIso), figure('c', molarity, 'mol/L')],
    result: figure('ΔTf', lIso.value * molarity, 'K'),
  }
  return {
    status: 'known',
    value: lIso.value * molarity,
    reason: 'differs-class-average',
    fromMemory: lIso.fromMemory,
    step,
  }
}

/**
 * E = 17·L_iso/M, g NaCl/g.
 *
 * @example classEquivalent(3.4, 187, 17) → 0.30909
 */
export const classEquivalent = (lIso: number, molarMass: number, seventeen: number) =>
  (seventeen * lIso) / molarMass
