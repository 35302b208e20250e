import type { DeviceData, VolumetricDevice } from '../../library/devices.ts'
import type { MeasureKind } from '../../formula/types.ts'
import { roundToReadability } from '../../quantity/readability.ts'

/** A flask, graduate, pipette or syringe. */
export interface Measure {
  readonly name: string
  readonly kind: MeasureKind
  readonly capacityMl: number
  /** Largest error of a measure, mL. */
  readonly toleranceMl: number
  /** Least volume it may be used for, mL. */
  readonly smallestMl: number
  /** Step of its marks, mL; null: it measures its capacity alone. */
  readonly graduationMl: number | null
}

export const measureOf = (device: VolumetricDevice): Measure => ({
  name: device.name,
  kind: device.kind,
  capacityMl: device.capacityMl,
  toleranceMl: device.tolerance.value,
  smallestMl: device.smallestMl.value,
  graduationMl: null,
})

export interface MeasureData {
  readonly name: string
  readonly kind: MeasureKind
  readonly capacityMl: number
  readonly graduationMl: number | null
  readonly toleranceMl: number | null
}

/**
 * A measure of one's own with the limits of its kind. Its error, where it states none, is that of class A glassware
 * of the same size or a fraction of its capacity; null where neither is known.
 */
export function ownMeasure(data: MeasureData, { kinds, volumetric }: DeviceData): Measure | null {
  const { name, kind, capacityMl, graduationMl } = data
  const limits = kinds.get(kind)
  const twin = volumetric.find((device) => device.kind === kind && device.capacityMl === capacityMl)
  const fraction = limits?.toleranceFraction?.value
  const byKind =
    graduationMl === null ? twin?.tolerance.value : fraction === undefined ? undefined : fraction * capacityMl
  const toleranceMl = data.toleranceMl ?? byKind ?? (fraction === undefined ? null : fraction * capacityMl)
  if (toleranceMl === null || !limits) return null
  const smallestMl = graduationMl === null ? capacityMl : limits.smallestFraction.value * capacityMl
  return { name, kind, capacityMl, graduationMl, toleranceMl, smallestMl }
}

export interface Measured {
  readonly measure: Measure
  /** Rounded to a mark. */
  readonly millilitres: number
}

/** The measure with the smallest error in which the volume can be read; null where there is none. */
export function measureFor(millilitres: number, measures: readonly Measure[]): Measured | null {
  const readable = measures.flatMap((measure): readonly Measured[] => {
    if (measure.kind === 'flask') return []
    const { graduationMl, capacityMl, smallestMl } = measure
    const read = graduationMl === null ? capacityMl : roundToReadability(millilitres, graduationMl)
    const isHeld = read >= smallestMl && read <= capacityMl
    const isExact = graduationMl !== null || Math.abs(millilitres / capacityMl - 1) < 1e-9
    return isHeld && isExact ? [{ measure, millilitres: read }] : []
  })
  return readable.toSorted((a, b) => a.measure.toleranceMl - b.measure.toleranceMl)[0] ?? null
}
