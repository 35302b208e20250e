import * as v from 'valibot'
import raw from '../../data/devices/volumetric.json'
import { datumSchema } from './schema.ts'

const millilitres = datumSchema(v.pipe(v.number(), v.gtValue(0)))

const device = v.strictObject({
  id: v.string(),
  name: v.string(),
  kind: v.picklist(['flask', 'pipette']),
  capacityMl: v.pipe(v.number(), v.gtValue(0)),
  /** Largest error of a full measure, mL. */
  tolerance: millilitres,
  /** Least volume it may be used for, mL. */
  smallestMl: millilitres,
})

/** A vessel that measures one volume. */
export type VolumetricDevice = v.InferOutput<typeof device>

let loaded: readonly VolumetricDevice[] | undefined

/** The volumetric glassware of data/devices. Throws when the file is malformed. */
export const loadDevices = (): readonly VolumetricDevice[] => (loaded ??= v.parse(v.array(device), raw))
