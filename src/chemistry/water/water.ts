import { loadEstimates } from '../../library/estimates.ts'
import { waterDensity } from '../activity/debye-hueckel.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import type { ChemistryProblem, Composition, Dissolved } from '../types.ts'
import { partialVolume, specificVolume, volumeGrowth, waterMolarMass, waterOf } from './volume.ts'

/** The temperature at which vessels are calibrated and volumes are read. */
export const volumeCelsius = 20

export interface Water {
  readonly waterKg: number
  readonly kgPerLitre: number
  /** Relative standard uncertainty of the water. */
  readonly relativeUncertainty: number
  readonly densityGPerMl: number
  /** mol of formula units per kg of water by key; grams per kg for ingredients without a molar mass. */
  readonly molality: ReadonlyMap<string, number>
  readonly estimatedKeys: readonly string[]
}

interface Occupied {
  /** Litres, grams and kilograms of water per unit of amount (mol or g). */
  readonly litres: number
  readonly variance: number
  readonly squares: number
  readonly grams: number
  readonly waterKg: number
  readonly estimated: boolean
}

/**
 * Water in the solution at 20 °C: V = Σ n·Vφ + m(water)/ρ(water), crystal water counted as water. Amounts given per kg
 * of water are solved in closed form with it.
 */
export function waterIn(
  composition: Composition,
  species: ReadonlyMap<string, SpeciesRecord>,
): Water | ChemistryProblem {
  const occupied = composition.dissolved.map(({ ingredient }) => occupiedBy(ingredient, species))
  let growth = 0
  let answer = balance(composition, occupied, growth)
  // The growth of volumes with ionic strength needs the water, which needs the growth: two rounds settle it.
  for (let round = 0; round < 3 && answer; round += 1) {
    growth = volumeGrowth(ionicStrengthOf(composition, occupied, answer.waterKg)) / 1000
    answer = balance(composition, occupied, growth)
  }
  if (!answer || answer.waterKg <= 0) {
    const keys = composition.dissolved.map(({ key }) => key)
    return { code: 'solutes-exceed-volume', values: {}, keys, fatal: true }
  }
  return describe(composition, occupied, answer)
}

/* It follows from the two alone, and is asked for at every keystroke. */
const spaces = new WeakMap<ReadonlyMap<string, SpeciesRecord>, WeakMap<Ingredient, Occupied>>()

function occupiedBy(ingredient: Ingredient, species: ReadonlyMap<string, SpeciesRecord>): Occupied {
  let known = spaces.get(species)
  if (!known) {
    known = new WeakMap()
    spaces.set(species, known)
  }
  let space = known.get(ingredient)
  if (!space) {
    space = spaceOf(ingredient, species)
    known.set(ingredient, space)
  }
  return space
}

function spaceOf(ingredient: Ingredient, species: ReadonlyMap<string, SpeciesRecord>): Occupied {
  const molarMass = ingredient.molarMass?.value
  const partial = partialVolume(ingredient, species)
  if (partial && molarMass !== undefined) {
    const water = waterOf(ingredient)
    return {
      litres: partial.cm3PerMol / 1000,
      variance: (partial.uncertainty / 1000) ** 2,
      squares: partial.chargeSquares,
      grams: molarMass,
      waterKg: (water * waterMolarMass) / 1000,
      estimated: partial.basis === 'estimate',
    }
  }
  const { value, uncertainty } = specificVolume(ingredient)
  return {
    litres: value / 1000,
    variance: (uncertainty / 1000) ** 2,
    squares: 0,
    grams: 1,
    waterKg: 0,
    estimated: !ingredient.displacement,
  }
}

/** Amount in mol (or g where there is no molar mass); per-water amounts need the water. */
function amountOf({ amount, ingredient }: Dissolved, waterKg: number): number {
  if (amount.kind === 'moles') return amount.mol
  if (amount.kind === 'per-water') return amount.molPerKg * waterKg
  return ingredient.molarMass ? amount.g / ingredient.molarMass.value : amount.g
}

const kgPerLitre = waterDensity(volumeCelsius) / 1000

function balance(
  composition: Composition,
  occupied: readonly Occupied[],
  growth: number,
): { waterKg: number } | null {
  let fixedLitres = 0
  let litresPerKg = 1 / kgPerLitre
  let crystalKg = 0
  let crystalPerKg = 0
  composition.dissolved.forEach((item, index) => {
    const space = occupied[index]
    if (!space) return
    const litres = space.litres + growth * space.squares
    if (item.amount.kind === 'per-water') {
      litresPerKg += item.amount.molPerKg * litres
      crystalPerKg += item.amount.molPerKg * space.waterKg
    } else {
      const amount = amountOf(item, 0)
      fixedLitres += amount * litres
      crystalKg += amount * space.waterKg
    }
  })
  const waterKg = (composition.volumeLitres - fixedLitres) / litresPerKg
  return waterKg > crystalKg + crystalPerKg * waterKg ? { waterKg } : null
}

function ionicStrengthOf(composition: Composition, occupied: readonly Occupied[], waterKg: number): number {
  return composition.dissolved.reduce(
    (sum, item, index) => sum + (amountOf(item, waterKg) / waterKg) * (occupied[index]?.squares ?? 0) * 0.5,
    0,
  )
}

function describe(
  composition: Composition,
  occupied: readonly Occupied[],
  { waterKg }: { waterKg: number },
): Water {
  const molality = new Map<string, number>()
  const estimatedKeys: string[] = []
  let grams = waterKg * 1000
  let variance = 0
  composition.dissolved.forEach((item, index) => {
    const space = occupied[index]
    if (!space) return
    const amount = amountOf(item, waterKg)
    molality.set(item.key, amount / waterKg)
    grams += amount * (space.grams - space.waterKg * 1000)
    variance += amount * amount * space.variance
    if (space.estimated && amount > 0) estimatedKeys.push(item.key)
  })
  const { volumeLitres } = composition
  return {
    waterKg,
    kgPerLitre: waterKg / volumeLitres,
    relativeUncertainty: Math.sqrt(variance) / waterKg + loadEstimates().waterOfVolume.value,
    densityGPerMl: grams / (volumeLitres * 1000),
    molality,
    estimatedKeys,
  }
}
