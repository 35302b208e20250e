import type { SolutionState } from '../../chemistry/types.ts'
import type { LineAnswer, MethodAnswer, SolutionAnswer, TraceStep } from '../types.ts'
import { datumFigure, figure } from './figures.ts'
import type { Plan } from '../adjusting/plan.ts'

/** The electrolyte model beside the classical methods. */
export function electrolyteAnswer(
  solution: SolutionAnswer,
  state: SolutionState,
  lines: readonly LineAnswer[],
  isotonicVolumeMl: number | null,
  plan: Plan,
): MethodAnswer {
  const adjusters = lines.filter(({ isAdjuster }) => isAdjuster)
  return {
    method: 'electrolyte',
    osmolalityMilliosmPerKg: solution.osmolality.value,
    adjusterGrams:
      adjusters.length === 0 ? null : adjusters.reduce((sum, { gramsExact }) => sum + (gramsExact ?? 0), 0),
    isotonicVolumeMl,
    differsBy: null,
    missing: [],
    trace: traceOf(solution, state, lines, plan),
  }
}

/** The model answered nothing; why stands in the findings. */
export const refusedElectrolyteAnswer = (key: string): MethodAnswer => ({
  method: 'electrolyte',
  osmolalityMilliosmPerKg: null,
  adjusterGrams: null,
  isotonicVolumeMl: null,
  differsBy: null,
  missing: [{ code: 'model-refused', key }],
  trace: [],
})

function traceOf(
  solution: SolutionAnswer,
  state: SolutionState,
  lines: readonly LineAnswer[],
  { conventions }: Plan,
): readonly TraceStep[] {
  const names = new Map(lines.map(({ key, ingredient }) => [key, ingredient.name]))
  const atFreezing = state.states.freezing
  const shares = state.shares.map((share): TraceStep => ({
    key: share.key,
    subject: names.get(share.key) ?? share.key,
    rule: `1000·i·m, ${basisWords[share.basis]}`,
    inputs: [figure('i = φ·ν', share.effectiveI, '1'), figure('m', share.molality, 'mol/kg')],
    result: figure('share', share.osmolalityOsmPerKg * 1000, 'mOsm/kg'),
  }))
  return [
    {
      key: 'water',
      rule: 'water in the final volume, from apparent volumes',
      inputs: [figure('water', state.waterKgPerLitre, 'kg/L')],
      result: figure('water', state.waterKg, 'kg'),
    },
    ...shares,
    {
      key: 'osmolality',
      rule: '1000·−ln(a_w) / 0.018015 at freezing',
      inputs: [figure('a_w', atFreezing.waterActivity, '1'), figure('φ', atFreezing.osmoticCoefficient, '1')],
      result: figure('osmolality', atFreezing.osmolalityOsmPerKg * 1000, 'mOsm/kg'),
    },
    {
      key: 'reading',
      rule: '1000·ΔTf / Kf, as a freezing-point osmometer shows it',
      inputs: [
        figure('ΔTf', solution.freezingPointDepressionK, 'K'),
        datumFigure('Kf', conventions.cryoscopicConstant),
      ],
      result: figure('reading', solution.osmolality.value, 'mOsm/kg'),
    },
  ]
}

const basisWords = {
  'ion-interaction': 'ion interaction',
  'tabulated-curve': 'from its tabulated values',
  'class-estimate': 'estimated from its ionic class',
} as const
