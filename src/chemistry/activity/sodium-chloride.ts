import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { SpeciesRecord } from '../../library/types.ts'
import { volumeGrowth } from '../water/volume.ts'
import { compileActivityModel, type ActivityModel } from './model.ts'
import { waterDensity } from './debye-hueckel.ts'

interface Parts {
  readonly species: ReadonlyMap<string, SpeciesRecord>
  readonly electrolytes: ElectrolyteParameters
}

const molarMass = 58.443
const made = new WeakMap<ElectrolyteParameters, (percent: number) => number>()

/**
 * Osmolality at freezing of sodium chloride solutions by % w/v at 20 °C: the yardstick of every tabulated equivalent.
 * @example sodiumChlorideOsmolality(parts)(0.9) → 0.2867
 */
export function sodiumChlorideOsmolality(parts: Parts): (percentWeightInVolume: number) => number {
  const known = made.get(parts.electrolytes)
  if (known) return known
  const ions = ['Na+', 'Cl-'].flatMap((id) => parts.species.get(id) ?? [])
  const model: ActivityModel = compileActivityModel(ions, parts.electrolytes, 0)
  const volume = ions.reduce((sum, ion) => sum + (ion.volume?.value ?? 0), 0)
  const osmolality = (percent: number) => {
    const molPerLitre = (percent * 10) / molarMass
    const litres = (molPerLitre * (volume + 2 * volumeGrowth(molPerLitre))) / 1000
    const molality = molPerLitre / ((1 - litres) * (waterDensity(20) / 1000))
    return model.osmotic(Float64Array.of(molality, molality)).osmolalityOsmPerKg
  }
  made.set(parts.electrolytes, osmolality)
  return osmolality
}
