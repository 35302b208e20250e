import type { Interval } from '../../quantity/interval.ts'
import type { SolutionState, ThermalState, UncertaintyPart } from '../../chemistry/types.ts'
import type { Plan } from '../adjusting/plan.ts'
import { effectiveReadingOf, readingOf, type Portion } from '../model.ts'
import type { SolutionAnswer } from '../types.ts'
import { labelOsmolarity } from './electrolytes.ts'
import { combined, intervalAround } from './interval.ts'
import { pHAt } from './pHAt.ts'

/** The solved solution in the trade's quantities. */
export function solutionAnswer(
  state: SolutionState,
  portions: readonly Portion[],
  parts: readonly UncertaintyPart[],
  plan: Plan,
): SolutionAnswer {
  const { conventions, scale, setting } = plan
  const reading = readingOf(state, conventions)
  const standardUncertainty = combined(parts)
  const { '5': at5, '25': at25, '37': at37 } = state.states
  const percent = scale.percentOf(reading)
  return {
    osmolality: intervalAround(reading, standardUncertainty),
    osmolality25: at25.osmolalityOsmPerKg * 1000,
    osmolality37: at37.osmolalityOsmPerKg * 1000,
    osmolarityMilliosmPerL: reading * state.waterKgPerLitre,
    effectiveOsmolality: effectiveInterval(state, reading, standardUncertainty, plan),
    freezingPointDepressionK: (reading / 1000) * conventions.cryoscopicConstant.value,
    conventionalDepressionK: percent === null ? null : conventionalDepression(percent, plan),
    sodiumChlorideEquivalentPercent: percent,
    osmoticCoefficient: state.shares.length === 0 ? null : at25.osmoticCoefficient,
    waterActivity: at25.waterActivity,
    osmoticPressureKPa37: osmoticPressure(at37, plan),
    labelOsmolarityMilliosmPerL: labelOsmolarity(portions, setting.volumeMl).milliosmPerL,
    ionicStrength: at25.ionicStrength,
    pH: typeof setting.pH === 'number' ? setting.pH : pHAt(setting.temperatureCelsius, state),
    pH5: at5.pH,
    pH25: at25.pH,
    pH37: at37.pH,
    pHIsSolved: state.pHSolved,
    densityGPerMl: state.densityGPerMl,
    waterKgPerL: state.waterKgPerLitre,
    redCellRelativeVolume: redCellVolume(effectiveReadingOf(state, conventions), plan),
  }
}

/**
 * Volume of a red cell in the solution against that in plasma, by Boyle and van 't Hoff: V/V₀ = b + (1 − b)·290/O with
 * the effective osmolality O and the fixed fraction b. Null where the cell bursts, since there is no volume then.
 *
 * @example redCellVolume(290, plan) → 1
 */
export function redCellVolume(effective: number, { conventions, scale }: RedCellSetting): number | null {
  const { redCellFixedFraction: fixed, plasmaOsmolality, haemolysisOnsetPercent } = conventions
  const bursting = scale.osmolalityOf(haemolysisOnsetPercent.value)
  if (bursting === null || effective < bursting) return null
  return fixed.value + ((1 - fixed.value) * plasmaOsmolality.value) / effective
}

type RedCellSetting = Pick<Plan, 'conventions' | 'scale'>

/** 0.9 % sodium chloride = 0.52 K, in proportion. */
export const conventionalDepression = (sodiumChloridePercent: number, { conventions }: Plan): number =>
  (sodiumChloridePercent / conventions.isotonicSodiumChloridePercent.value) *
  conventions.isotonicDepressionKelvin.value

/** Π = O·ρ(water)·R·T, kPa. */
function osmoticPressure({ osmolalityOsmPerKg, celsius }: ThermalState, { conventions }: Plan): number {
  const { waterDensity37, gasConstant } = conventions
  return osmolalityOsmPerKg * waterDensity37.value * gasConstant.value * (celsius + 273.15)
}

/**
 * The part outside red cells, with what the reflection coefficients leave open. A solute that counts whole cannot
 * count for more, so its uncertainty reaches down alone; one whose coefficient nobody knows reaches down to nothing.
 */
function effectiveInterval(
  state: SolutionState,
  reading: number,
  standardUncertainty: number,
  plan: Plan,
): Interval {
  const value = effectiveReadingOf(state, plan.conventions)
  const scale = reading / state.states.freezing.osmolalityOsmPerKg
  const common = reading > 0 ? ((standardUncertainty * value) / reading) ** 2 : 0
  let [downwards, upwards, unknown] = [common, common, 0]
  for (const { reflection, osmolalityOsmPerKg } of state.shares) {
    const share = osmolalityOsmPerKg * scale
    if (reflection === null) unknown += share
    else {
      const variance = (share * (reflection.uncertainty ?? 0)) ** 2
      downwards += variance
      if (reflection.value < 1) upwards += variance
    }
  }
  const down = intervalAround(value, Math.sqrt(downwards))
  return { ...down, low: down.low - unknown, high: intervalAround(value, Math.sqrt(upwards)).high }
}
