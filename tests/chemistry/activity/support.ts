import { compileActivityModel, type ActivityModel } from '../../../src/chemistry/activity/model.ts'
import type { ElectrolyteParameters } from '../../../src/library/electrolytes.ts'
import { loadLibrary } from '../../../src/library/library.ts'
import type { SpeciesRecord } from '../../../src/library/types.ts'

export const library = loadLibrary()

export function speciesOf(ids: readonly string[]): readonly SpeciesRecord[] {
  return ids.map((id) => {
    const record = library.species.get(id)
    if (!record) throw new Error(`${id} is not among the species`)
    return record
  })
}

export const modelOf = (
  ids: readonly string[],
  celsius = 25,
  parameters: ElectrolyteParameters = library.electrolytes,
): ActivityModel => compileActivityModel(speciesOf(ids), parameters, celsius)

/** A repeatable sequence in [0, 1). */
export function sequence(seed: number): () => number {
  let state = seed
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return state / 4294967296
  }
}
