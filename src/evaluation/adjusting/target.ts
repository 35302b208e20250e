import type { Conventions } from '../../library/conventions.ts'
import type { TargetQuantity } from '../../formula/types.ts'
import type { MethodTarget } from '../methods/common.ts'
import type { SodiumChlorideScale } from '../methods/scale.ts'

/** The formula's target, read. */
export interface Target {
  readonly quantity: TargetQuantity
  readonly value: number
  readonly unit: string
}

export const targetUnits: Readonly<Record<TargetQuantity, string>> = {
  osmolality: 'mOsm/kg',
  'effective-osmolality': 'mOsm/kg',
  'sodium-chloride-equivalent': '%',
  'freezing-point-depression': 'K',
}

/** Only what stays outside a red cell counts towards an effective target. */
export const countsEffective = ({ quantity }: Target) => quantity === 'effective-osmolality'

/** The target as the osmometer reading that meets it, mOsm/kg; null beyond the sodium chloride scale. */
export function targetReading(
  target: Target,
  scale: SodiumChlorideScale,
  conventions: Conventions,
): number | null {
  if (target.quantity === 'sodium-chloride-equivalent') return scale.osmolalityOf(target.value)
  if (target.quantity === 'freezing-point-depression') {
    return (target.value / conventions.cryoscopicConstant.value) * 1000
  }
  return target.value
}

/** A reading in mOsm/kg in the unit of the target; null beyond the sodium chloride scale. */
export function inTargetUnit(
  readingMilliosmPerKg: number,
  target: Target,
  scale: SodiumChlorideScale,
  conventions: Conventions,
): number | null {
  if (target.quantity === 'sodium-chloride-equivalent') return scale.percentOf(readingMilliosmPerKg)
  if (target.quantity === 'freezing-point-depression') {
    return (readingMilliosmPerKg / 1000) * conventions.cryoscopicConstant.value
  }
  return readingMilliosmPerKg
}

/** The same target for the classical methods, which weigh effective osmolality by reflection coefficients. */
export const methodTarget = (target: Target): MethodTarget => ({
  quantity: target.quantity === 'effective-osmolality' ? 'osmolality' : target.quantity,
  value: target.value,
})
