import { pHAlone } from '../../evaluation/buffers/acidity.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { PublishedVehicle } from '../../library/vehicles.ts'
import { decimals, significant } from '../words/figures.ts'

export interface VehicleView {
  readonly id: string
  readonly words: string
  readonly parts: readonly { readonly name: string; readonly strength: string }[]
  readonly source: string
  /** What the model makes of it. */
  readonly modelled: string
  readonly note: string
}

/** A published buffer as it stands in its source. */
export function vehicleView(vehicle: PublishedVehicle, library: Library): VehicleView {
  const { id, title, pH, celsius, gramsPerLitre, note } = vehicle
  const memory = pH.fromMemory ? ' (from memory)' : ''
  return {
    id,
    words: title,
    parts: gramsPerLitre.map(({ ingredient, grams }) => ({
      name: library.ingredients.get(ingredient)?.name ?? ingredient,
      strength: `${significant(grams, 4)} g/L`,
    })),
    source: `Published pH ${decimals(pH.value, 2)} at ${celsius} °C: ${library.sources.get(pH.source)?.title ?? pH.source}${memory}.`,
    modelled: modelledPH(vehicle, library),
    note: [note, pH.note].filter((text) => text !== undefined).join(' '),
  }
}

/** The pH by the balance of charges at the temperature of the published one. */
function modelledPH({ gramsPerLitre, celsius }: PublishedVehicle, library: Library): string {
  const portions = gramsPerLitre.flatMap(({ ingredient: id, grams }) => {
    const ingredient = library.ingredients.get(id)
    return ingredient ? [{ key: id, ingredient, grams }] : []
  })
  const pH = pHAlone(portions, celsius, library)
  return pH === null ? 'The model has no pH for it.' : `The model gives pH ${decimals(pH, 2)} there.`
}

/** The lines of a vehicle added to a formula; the pH is left to the model. */
export function withVehicle(formula: Formula, { gramsPerLitre, id }: PublishedVehicle): Formula {
  const { pH: _stated, ...rest } = formula
  return {
    ...rest,
    lines: [
      ...formula.lines,
      ...gramsPerLitre.map(({ ingredient, grams }) => ({
        key: `${id} ${ingredient}`,
        ingredient,
        amount: `${Number(grams.toPrecision(6))} g/L`,
      })),
    ],
  }
}
