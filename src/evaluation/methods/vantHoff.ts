import {
  molarityOf,
  type AdditiveMethod,
  type Contribution,
  type MethodContext,
  type MethodLine,
} from './common.ts'
import { datumFigure, figure } from './figures.ts'
import type { Ingredient } from '../../library/types.ts'
import type { TraceStep } from '../types.ts'

/**
 * Σ ν·c·1000: every ion and molecule that the formula promises counts as free and ideal, as on labels. The method
 * does not tell a litre of solution from a kilogram of water.
 */
export const vantHoffMethod: AdditiveMethod = {
  id: 'vant-hoff',
  unit: 'mOsm/L',
  sumName: 'ideal osmolarity',
  contribution,
  osmolality: (sum) => sum,
  closing: (sum) => [
    {
      key: 'osmolality',
      rule: 'read as mOsm/kg: dilute solution, 1 L taken as 1 kg of water',
      inputs: [figure('osmolarity', sum, 'mOsm/L')],
      result: figure('osmolality', sum, 'mOsm/kg'),
    },
  ],
  targetOnScale: (target, context) => {
    const { conventions } = context
    if (target.quantity === 'osmolality') return target.value
    const percent =
      target.quantity === 'sodium-chloride-equivalent'
        ? target.value
        : (target.value / conventions.isotonicDepressionKelvin.value) *
          conventions.isotonicSodiumChloridePercent.value
    return idealSodiumChloride(percent, context)
  },
  isotonic: (context) =>
    idealSodiumChloride(context.conventions.isotonicSodiumChloridePercent.value, context),
}

/** mOsm/L of sodium chloride with two free ions. */
const idealSodiumChloride = (percent: number, { scale }: MethodContext) =>
  (2 * percent * 10 * 1000) / scale.molarMass

/** Ions and molecules that one formula unit gives by its label, ν; null where the formula is not known. */
export const formalParticles = ({ releases }: Ingredient): number | null =>
  releases ? releases.reduce((sum, { count }) => sum + count, 0) : null

function contribution(line: MethodLine, context: MethodContext): Contribution {
  const count = formalParticles(line.ingredient)
  if (count === null) return { status: 'missing', code: 'missing-particle-count' }
  const molarity = molarityOf(line, context)
  if (molarity === null) return { status: 'missing', code: 'missing-molar-mass' }
  const value = count * molarity * 1000
  return {
    status: 'known',
    value,
    reason: 'differs-ideal-count',
    fromMemory: false,
    step: {
      key: line.key,
      subject: line.ingredient.name,
      rule: '1000·ν·c',
      inputs: [figure('ν', count, '1'), figure('c', molarity, 'mol/L')],
      result: figure('osmolarity', value, 'mOsm/L'),
    },
  }
}

/**
 * The same sum with the measured i where the library has one and ν elsewhere; empty where no i is known or a
 * solute has neither.
 */
export function measuredTrace(lines: readonly MethodLine[], context: MethodContext): readonly TraceStep[] {
  if (!lines.some(({ ingredient }) => ingredient.measuredI)) return []
  const steps: TraceStep[] = []
  let sum = 0
  for (const line of lines) {
    const step = measuredStep(line, context)
    if (!step || step.result.value === null) return []
    sum += step.result.value
    steps.push(step)
  }
  const result = figure('osmolarity with measured i', sum, 'mOsm/L')
  return [...steps, { key: 'measured-sum', rule: 'Σ 1000·i·c', inputs: [], result }]
}

function measuredStep(line: MethodLine, context: MethodContext): TraceStep | null {
  const molarity = molarityOf(line, context)
  const count = formalParticles(line.ingredient)
  const { measuredI } = line.ingredient
  const factor = measuredI?.value ?? count
  if (molarity === null || factor === null) return null
  return {
    key: `measured-${line.key}`,
    subject: line.ingredient.name,
    rule: measuredI ? '1000·i·c' : '1000·ν·c, no measured i',
    inputs: [
      measuredI ? datumFigure('i', measuredI) : figure('ν', count, '1'),
      figure('c', molarity, 'mol/L'),
    ],
    result: figure('osmolarity', factor * molarity * 1000, 'mOsm/L'),
  }
}
