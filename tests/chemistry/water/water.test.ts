import { describe, expect, it } from 'vitest'
import { partialVolume, volumeGrowth, waterMolarMass, waterOf } from '../../../src/chemistry/water/volume.ts'
import { waterIn } from '../../../src/chemistry/water/water.ts'
import { waterDensity } from '../../../src/chemistry/activity/debye-hueckel.ts'
import type { Dissolved } from '../../../src/chemistry/types.ts'
import { library, ownIngredient } from '../../evaluation/formulas.ts'

function ingredientOf(id: string) {
  const ingredient = library.ingredients.get(id)
  if (!ingredient) throw new Error(`${id} is no ingredient`)
  return ingredient
}

const item = (id: string, amount: Dissolved['amount']): Dissolved => ({
  key: id,
  ingredient: ingredientOf(id),
  amount,
})

function waterOfLitre(dissolved: readonly Dissolved[], volumeLitres = 1) {
  const water = waterIn({ volumeLitres, pH: 'solve', temperatureCelsius: 25, dissolved }, library.species)
  if ('code' in water) throw new Error(water.code)
  return water
}

describe('volume of a formula unit', () => {
  it('sums over the ions where they are tabulated: −1.52 and 18.05 cm³/mol for sodium chloride', () => {
    const volume = partialVolume(ingredientOf('sodium-chloride'), library.species)
    expect(volume).toMatchObject({ basis: 'species', chargeSquares: 2 })
    expect(volume?.cm3PerMol).toBeCloseTo(16.53, 10)
    expect(volume?.uncertainty).toBeCloseTo(Math.hypot(0.5, 0.5), 10)
  })

  it('leaves crystal water to the water', () => {
    const dihydrate = ingredientOf('calcium-chloride-dihydrate')
    const anhydrous = ingredientOf('calcium-chloride-anhydrous')
    expect(waterOf(dihydrate)).toBe(2)
    const volumeOf = (ingredient: typeof dihydrate) => partialVolume(ingredient, library.species)?.cm3PerMol
    expect(volumeOf(dihydrate)).toBe(volumeOf(anhydrous))
  })

  it('takes a typical specific volume, with a wide uncertainty, where nothing is known', () => {
    const unknown = ownIngredient({ name: 'unknown', molarMass: 200, equivalent: 0.2 })
    expect(partialVolume(unknown, library.species)).toEqual({
      cm3PerMol: 140,
      uncertainty: 16,
      chargeSquares: 0,
      basis: 'estimate',
    })
    const { molarMass: _, ...weightless } = unknown
    expect(partialVolume(weightless, library.species)).toBeNull()
  })

  it('grows with ionic strength: by 0.298 cm³ per mol and unit of Σ ν z² at 0.15 mol/kg', () => {
    expect(volumeGrowth(0)).toBe(0)
    expect(volumeGrowth(0.15)).toBeCloseTo((1.874 / 2.4) * Math.log(1 + 1.2 * Math.sqrt(0.15)), 12)
    expect(volumeGrowth(0.15)).toBeCloseTo(0.2976, 3)
  })
})

describe('water per litre', () => {
  it('of nothing is the density of water at 20 °C', () => {
    const water = waterOfLitre([])
    expect(water.kgPerLitre).toBeCloseTo(waterDensity(20) / 1000, 12)
    expect(water.densityGPerMl).toBeCloseTo(0.9982, 4)
  })

  it('of 0.9 % sodium chloride is 0.9955 kg and weighs 1.0046 g/mL, as published densities have it', () => {
    const molarMass = ingredientOf('sodium-chloride').molarMass?.value ?? NaN
    const water = waterOfLitre([item('sodium-chloride', { kind: 'moles', mol: 9 / molarMass })])
    expect(water.kgPerLitre).toBeCloseTo(0.9956, 3)
    expect(water.densityGPerMl).toBeCloseTo(1.0046, 3)
    expect(water.densityGPerMl).toBeCloseTo(water.kgPerLitre + 0.009, 10)
  })

  it('counts crystal water as water: hydrates of one salt give one solution', () => {
    const of = (id: string) => waterOfLitre([item(id, { kind: 'moles', mol: 0.1 })])
    const [dihydrate, anhydrous] = [of('calcium-chloride-dihydrate'), of('calcium-chloride-anhydrous')]
    expect(dihydrate.kgPerLitre).toBeCloseTo(anhydrous.kgPerLitre, 12)
    expect(dihydrate.densityGPerMl).toBeCloseTo(anhydrous.densityGPerMl, 4)
  })

  it('per kilogram of water is what it was asked to be, beside amounts per volume', () => {
    const water = waterOfLitre([
      item('sodium-chloride', { kind: 'per-water', molPerKg: 0.1 }),
      item('dextrose-monohydrate', { kind: 'moles', mol: 0.2 }),
    ])
    expect(water.molality.get('sodium-chloride')).toBeCloseTo(0.1, 12)
    expect(water.molality.get('dextrose-monohydrate')).toBeCloseTo(0.2 / water.waterKg, 12)
  })

  it('does not depend on how much is made', () => {
    const made = (litres: number) =>
      waterOfLitre([item('magnesium-sulfate-heptahydrate', { kind: 'moles', mol: 0.3 * litres })], litres)
    expect(made(0.01).kgPerLitre).toBeCloseTo(made(50).kgPerLitre, 12)
  })

  it('refuses solutes that leave no room for water', () => {
    const answer = waterIn(
      {
        volumeLitres: 0.1,
        pH: 'solve',
        temperatureCelsius: 25,
        dissolved: [item('sucrose', { kind: 'moles', mol: 1 })],
      },
      library.species,
    )
    expect(answer).toMatchObject({ code: 'solutes-exceed-volume', fatal: true, keys: ['sucrose'] })
  })

  it('is less sure where a volume is estimated', () => {
    const estimated = { ...item('sodium-chloride', { kind: 'mass', g: 50 }), key: 'own' }
    const own = { ...estimated, ingredient: ownIngredient({ name: 'own', molarMass: 300, equivalent: 0.2 }) }
    const water = waterOfLitre([own])
    expect(water.estimatedKeys).toEqual(['own'])
    expect(water.relativeUncertainty).toBeCloseTo((50 * 0.08) / 1000 / water.waterKg + 0.0003, 8)
    expect(waterOfLitre([]).relativeUncertainty).toBeCloseTo(0.0003, 12)
    expect(waterMolarMass).toBe(18.0153)
  })
})
