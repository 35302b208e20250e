import { describe, expect, it } from 'vitest'
import { routeIds } from '../../src/formula/types.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { molarMassOf } from '../../src/library/formula-mass.ts'

const library = loadLibrary()
const { ingredients, species } = library
const componentsOf = (id: string) =>
  (ingredients.get(id)?.releases ?? []).map((released) => species.get(released.species)?.component)

describe('buffer systems', () => {
  it('name forms that are in the library and hold their component', () => {
    for (const { id, component, acidForms, baseForms } of library.bufferSystems) {
      for (const form of [...acidForms, ...baseForms]) {
        expect(ingredients.has(form), `${id}: ${form}`).toBe(true)
        expect(componentsOf(form), `${id}: ${form}`).toContain(component)
        expect(ingredients.get(form)?.molarMass, `${id}: ${form}`).toBeDefined()
      }
    }
  })
  it('say of every route whether they are used there', () => {
    for (const { id, routes } of library.bufferSystems) {
      expect(Object.keys(routes).toSorted(), id).toEqual([...routeIds].toSorted())
    }
  })
  it('have conflicts with tags that some ingredient carries', () => {
    const tags = new Set([...ingredients.values()].flatMap((ingredient) => ingredient.tags))
    const strange = library.bufferSystems.flatMap(({ conflicts }) =>
      conflicts.filter(({ tag }) => !tags.has(tag)),
    )
    expect(strange).toEqual([])
  })
  it('are ranked by rules of their own ids, once each', () => {
    const ids = library.rankingRules.map(({ id }) => id)
    expect(new Set(ids).size).toBe(ids.length)
  })
})

describe('solids', () => {
  it('are electroneutral and made of known species', () => {
    for (const { id, ions, protonsTaken } of library.solids) {
      const charge = ions.reduce(
        (sum, ion) => sum + (species.get(ion.species)?.charge ?? Number.NaN) * ion.count,
        0,
      )
      expect(charge - protonsTaken, id).toBe(0)
    }
  })
})

describe('intrinsic solubilities', () => {
  it('belong to ions that ingredients give, with the mass of their formula', () => {
    const given = new Set(
      [...ingredients.values()].flatMap(({ releases = [] }) => releases.map((each) => each.species)),
    )
    for (const { id, ions, formula, molarMass } of library.intrinsicSolubilities) {
      expect(
        ions.some((ion) => given.has(ion)),
        id,
      ).toBe(true)
      const mass = molarMassOf(formula)
      expect(mass.ok ? molarMass.value / mass.value : 0, id).toBeCloseTo(1, 3)
    }
  })
})

describe('stocks', () => {
  it('hold ingredients of the library and share no id with them', () => {
    for (const { id, contains } of library.stocks.values()) {
      expect(ingredients.has(id), id).toBe(false)
      for (const { ingredient } of contains)
        expect(ingredients.has(ingredient), `${id}: ${ingredient}`).toBe(true)
    }
  })
})
