import { debyeHueckelSlope } from '../../../src/chemistry/activity/debye-hueckel.ts'
import { compileActivityModel } from '../../../src/chemistry/activity/model.ts'
import type { SpeciationParts } from '../../../src/chemistry/speciation/types.ts'
import { loadElectrolytes } from '../../../src/library/electrolytes.ts'
import { equilibria, species } from './parts.ts'

export const electrolytes = loadElectrolytes()

/** Speciation with the electrolyte model of this program. */
export const realParts: SpeciationParts = {
  species,
  equilibria,
  activity: (records, celsius) => compileActivityModel(records, electrolytes, celsius),
  debyeHueckelSlope,
}
