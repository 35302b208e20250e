import { waterMolarMass, waterOf } from '../../chemistry/water/volume.ts'
import { waterIn } from '../../chemistry/water/water.ts'
import { findRoot } from '../../numeric/roots.ts'
import type { Plan } from '../adjusting/plan.ts'
import type { Lowered, ReadLine } from '../lowering.ts'
import { compositionOf, type Portion } from '../model.ts'
import { bulkOf } from './stock.ts'

/** Water is made up for to within this share of the volume: the spread of measured volumes. */
const sparedShare = 0.005

/** Masses of what is dissolved, by key. */
type Masses = ReadonlyMap<string, number>

/** Water that the final volume needs around the given masses, less what they bring along, kg; null where it does not fit. */
function missingWater(masses: Masses, lowered: readonly Lowered[], plan: Plan): number | null {
  const lines = [...plan.solutes, ...plan.adjusters, ...plan.fills]
  const portions: Portion[] = lines.flatMap(({ key, ingredient }) => {
    const grams = masses.get(key)
    return grams === undefined || grams <= 0 ? [] : [{ key, ingredient, grams }]
  })
  const water = waterIn(compositionOf(portions, plan.setting), plan.library.species)
  if ('code' in water) return null
  return water.waterKg - waterBrought(lines, masses, lowered, plan)
}

/** Water of stocks, of crystals and of articles that are solutions themselves, kg. */
function waterBrought(
  lines: readonly ReadLine[],
  masses: Masses,
  lowered: readonly Lowered[],
  plan: Plan,
): number {
  const measured = new Set<string>()
  let kilograms = 0
  for (const { key, ingredient, stock } of lines) {
    const grams = masses.get(key) ?? 0
    if (stock) {
      if (measured.has(stock.lineKey) || grams <= 0) continue
      measured.add(stock.lineKey)
      kilograms += (grams / stock.gramsPerMl) * (bulkOf(stock.stock, plan.library)?.waterKgPerMl ?? 0)
      continue
    }
    const molarMass = ingredient.molarMass?.value
    if (molarMass) kilograms += ((grams / molarMass) * waterOf(ingredient) * waterMolarMass) / 1000
    const article = lowered.find((mass) => mass.key === key)?.articleGrams
    if (ingredient.article && article) kilograms += Math.max(0, article - grams) / 1000
  }
  return kilograms
}

const massesOf = (lowered: readonly Lowered[]): Map<string, number> =>
  new Map(lowered.map(({ key, grams }) => [key, grams]))

/** The parts of the filling vehicle at a volume. */
function fillAt(plan: Plan, millilitres: number): readonly Lowered[] {
  return plan.fills.map(({ key, stock }) => {
    const grams = millilitres * (stock?.gramsPerMl ?? 0)
    return {
      key,
      gramsExact: grams,
      grams,
      articleGrams: null,
      millilitres,
      belowLeastWeighable: false,
      belowReadability: false,
    }
  })
}

/**
 * Volume of the vehicle that brings the given masses to the final volume, from the balance of water: water of the
 * finished solution = water of the vehicle + water that everything else brings. Null where there is no room for it.
 */
export function filled(lowered: readonly Lowered[], plan: Plan): readonly Lowered[] | null {
  const { volumeMl } = plan.setting
  const gap = (millilitres: number): number => {
    const masses = massesOf([...lowered, ...fillAt(plan, millilitres)])
    return missingWater(masses, lowered, plan) ?? Number.NaN
  }
  const root = findRoot(gap, 0, 1.2 * volumeMl, { relativeTolerance: 1e-10 })
  return root.status === 'converged' && root.root > 0 ? fillAt(plan, root.root) : null
}

/** Whether stocks and other liquids bring more water than the final volume holds. */
export function isOverfull(lowered: readonly Lowered[], plan: Plan): boolean {
  if (!plan.solutes.some(({ stock }) => stock)) return false
  const missing = missingWater(massesOf(lowered), lowered, plan)
  return missing === null || missing < (-sparedShare * plan.setting.volumeMl) / 1000
}
