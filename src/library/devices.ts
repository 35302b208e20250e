import * as v from 'valibot'
import kinds from '../../data/devices/kinds.json'
import labelExcess from '../../data/devices/label-excess.json'
import volumetric from '../../data/devices/volumetric.json'
import weighing from '../../data/devices/weighing.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'

export const deviceFiles: Readonly<Record<string, unknown>> = {
  kinds,
  'label-excess': labelExcess,
  volumetric,
  weighing,
}

const above0 = v.pipe(v.number(), v.gtValue(0))
const positive = datumSchema(above0)

const device = v.strictObject({
  id: v.string(),
  name: v.string(),
  kind: v.picklist(['flask', 'pipette']),
  capacityMl: above0,
  /** Largest error of a full measure, mL. */
  tolerance: positive,
  /** Least volume it may be used for, mL. */
  smallestMl: positive,
})

/** A vessel that measures one volume. */
export type VolumetricDevice = v.InferOutput<typeof device>

const kindLimits = v.strictObject({
  kind: v.picklist(['flask', 'graduate', 'pipette', 'syringe']),
  /** Least volume over capacity, for a measure with marks. */
  smallestFraction: positive,
  /** Largest error over capacity where the device states none. */
  toleranceFraction: v.exactOptional(positive),
})

/** What any measure of a kind is good for. */
export type KindLimits = v.InferOutput<typeof kindLimits>

const weighingRules = v.strictObject({
  repeatabilityMultiple: positive,
  leastRepeatabilityReadabilities: positive,
  allowedFraction: positive,
  unnamedAllowedFraction: positive,
  aliquotRoomFraction: positive,
  largestTriturationFactor: positive,
})
export type WeighingRules = v.InferOutput<typeof weighingRules>

const excess = { mobile: positive, viscous: positive }
const labelExcessTable = v.strictObject({
  sizes: v.array(v.strictObject({ labelMl: above0, ...excess })),
  from50Ml: v.strictObject(excess),
})

/** Excess volumes by label size: mL up to 30 mL, percent from 50 mL on. */
export type LabelExcessTable = v.InferOutput<typeof labelExcessTable>

/** What is known of devices in general. */
export interface DeviceData {
  readonly volumetric: readonly VolumetricDevice[]
  readonly kinds: ReadonlyMap<KindLimits['kind'], KindLimits>
  readonly rules: WeighingRules
  readonly labelExcess: LabelExcessTable
}

let loaded: DeviceData | undefined

/** data/devices, validated once and kept. Throws when a file is malformed. */
export const loadDeviceData = (): DeviceData =>
  (loaded ??= {
    volumetric: checked(v.array(device), volumetric, 'devices/volumetric'),
    kinds: new Map(
      checked(v.array(kindLimits), kinds, 'devices/kinds').map((limits) => [limits.kind, limits]),
    ),
    rules: checked(weighingRules, weighing, 'devices/weighing'),
    labelExcess: checked(labelExcessTable, labelExcess, 'devices/label-excess'),
  })

/** The volumetric glassware of data/devices. */
export const loadDevices = (): readonly VolumetricDevice[] => loadDeviceData().volumetric
