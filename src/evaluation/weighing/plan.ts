import type { UncertaintyPart } from '../../chemistry/types.ts'
import type { Formula } from '../../formula/types.ts'
import { loadDeviceData } from '../../library/devices.ts'
import type { Plan } from '../adjusting/plan.ts'
import { combined } from '../answers/interval.ts'
import type { Lowered } from '../lowering.ts'
import { batchPartsOf, type BatchParts } from './batchParts.ts'
import { largestErrorOf } from './errors.ts'
import type { Measured } from './measures.ts'
import type { Scale } from './scales.ts'
import { designTrituration, type TriturationPlan } from './trituration.ts'

/** How one line is weighed or measured for the batch. */
export interface LineWeighing {
  readonly key: string
  readonly scale: Scale | null
  /** Null where no measure of the bench reads the volume; absent where none was asked. */
  readonly measured?: Measured | null
  /** What rounding does to the mass, percent; null for a mass of zero. */
  readonly roundingPercent: number | null
  /** Largest error of weighing, measuring or diluting, percent. */
  readonly errorPercent: number | null
  /** Rounding and error by root sum of squares, percent. */
  readonly combinedPercent: number | null
  readonly trituration?: Trituration
}

export interface Trituration extends TriturationPlan {
  /** Line whose substance is the diluent. */
  readonly diluentKey: string
}

export interface WeighingPlan {
  readonly batch: BatchParts | null
  readonly lines: readonly LineWeighing[]
  /** Diluent that enters the batch with the aliquots, mL. */
  readonly carriedMl: number
  /** Standard uncertainty of the osmolality from weighing, measuring and filling, by root sum of squares, mOsm/kg. */
  readonly preparationMilliosmPerKg: number
}

export function weighingPlanOf(
  plan: Plan,
  lowered: readonly Lowered[],
  uncertainty: readonly UncertaintyPart[],
  formula: Formula,
): WeighingPlan {
  const { setting, library } = plan
  const preparation = uncertainty.filter(
    ({ kind, key }) => kind === 'amount' || (kind === 'every-amount' && key === ''),
  )
  return {
    batch: batchPartsOf(formula.batch, setting.volumeMl, library).parts,
    lines: lowered.map((line) => weighingOf(line, lowered, plan)),
    carriedMl: lowered.reduce((sum, { aliquot }) => sum + (aliquot?.carriedMl ?? 0), 0),
    preparationMilliosmPerKg: combined(preparation),
  }
}

function weighingOf(line: Lowered, all: readonly Lowered[], plan: Plan): LineWeighing {
  const { batchFactor } = plan.balance
  const { key, scale, measured, gramsExact } = line
  const trituration = triturationOf(line, all, plan)
  const taken = trituration ? trituration.doseGrams / batchFactor : line.grams
  const rounding = gramsExact === 0 ? null : (taken / gramsExact - 1) * 100
  const largest = trituration ? trituration.errorPercent / 100 : largestErrorOf(line, batchFactor)
  return {
    key,
    scale: scale ?? null,
    ...(measured === undefined ? {} : { measured }),
    roundingPercent: rounding,
    errorPercent: largest === null ? null : largest * 100,
    combinedPercent: largest === null ? null : Math.hypot(rounding ?? 0, largest * 100),
    ...(trituration ? { trituration } : {}),
  }
}

/** A solid of the formula takes in what can neither be weighed nor diluted; its heaviest other solid is the diluent. */
export function triturationOf(line: Lowered, all: readonly Lowered[], plan: Plan): Trituration | null {
  const { batchFactor } = plan.balance
  if (!line.scale || !line.isDiluted || line.aliquot) return null
  const solids = new Set(
    [...plan.solutes, ...plan.adjusters]
      .filter(({ ingredient }) => ingredient.state === 'solid' && !ingredient.article)
      .map(({ key }) => key),
  )
  const diluent = all
    .filter(({ key, isDiluted }) => key !== line.key && solids.has(key) && !isDiluted)
    .toSorted((a, b) => b.grams - a.grams)[0]
  if (!diluent || !solids.has(line.key)) return null
  const factor = loadDeviceData().rules.largestTriturationFactor.value
  const design = designTrituration(line.gramsExact * batchFactor, line.scale, factor)
  if (!design || design.carriedGrams > diluent.grams * batchFactor) return null
  return { ...design, diluentKey: diluent.key }
}
