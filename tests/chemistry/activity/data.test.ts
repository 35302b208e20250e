import { describe, expect, it } from 'vitest'
import binary from '../../../data/parameters/pitzer/binary.json'
import mixing from '../../../data/parameters/pitzer/mixing.json'
import neutral from '../../../data/parameters/pitzer/neutral.json'
import { library, modelOf } from './support.ts'

const chargeOf = (id: string): number => {
  const record = library.species.get(id)
  if (!record) throw new Error(`${id} is not among the species`)
  return record.charge
}
const unique = (keys: readonly string[]) => keys.filter((key, at) => keys.indexOf(key) !== at)

describe('interaction parameters', () => {
  it('stand once for each pair, cation first', () => {
    expect(unique(binary.map(({ cation, anion }) => `${cation} ${anion}`))).toEqual([])
    for (const { cation, anion } of binary) {
      expect(chargeOf(cation)).toBeGreaterThan(0)
      expect(chargeOf(anion)).toBeLessThan(0)
    }
  })

  it('stand once for each mixing term, like ions first', () => {
    const sets = [...mixing.theta, ...mixing.psi].map(({ ions }) => ions.toSorted().join(' '))
    expect(unique(sets)).toEqual([])
    for (const { ions } of [...mixing.theta, ...mixing.psi]) {
      const [first = 0, second = 0, third] = ions.map((ion) => Math.sign(chargeOf(ion)))
      expect(first * second, ions.join(' ')).toBe(1)
      if (third !== undefined) expect(first * third, ions.join(' ')).toBe(-1)
    }
  })

  it('stand once for each molecule with its partners, molecule first', () => {
    const sets = [...neutral.lambda, ...neutral.zeta].map(({ ions }) => ions.toSorted().join(' '))
    expect(unique(sets)).toEqual([])
    for (const { ions } of [...neutral.lambda, ...neutral.zeta]) expect(chargeOf(ions[0] ?? '')).toBe(0)
  })

  it('of sea salt are all of one set, but for potassium sulfate, whose form over temperature is its own set', () => {
    const sea = new Set(['Na+', 'K+', 'Mg+2', 'Ca+2', 'H+', 'Cl-', 'SO4-2', 'HSO4-', 'OH-', 'HCO3-', 'CO3-2'])
    const others = [...mixing.theta, ...mixing.psi]
      .filter(({ ions }) => ions.every((ion) => sea.has(ion)))
      .filter(({ source }) => source !== 'HarvieMollerWeare1984')
    expect(others).toEqual([])
    for (const cation of ['Na+', 'K+', 'Mg+2', 'Ca+2']) {
      for (const anion of ['Cl-', 'SO4-2']) {
        const source = cation === 'K+' && anion === 'SO4-2' ? 'HolmesMesmer1986' : 'HarvieMollerWeare1984'
        expect(library.electrolytes.binary.get(`${cation}|${anion}`)?.source).toBe(source)
      }
    }
  })

  it('of potassium sulfate are those of the set that is named: β1 0.6179, not 0.7793', () => {
    expect(library.electrolytes.binary.get('K+|SO4-2')?.beta1.at25).toBe(0.6179)
  })

  it('of sodium chloride do not repeat the misprint', () => {
    expect(library.electrolytes.binary.get('Na+|Cl-')?.beta1.at25).toBe(0.2664)
  })

  it.each([
    ['Na+', 'HSO3-'],
    ['Mg+2', 'H2PO4-'],
    ['Mg+2', 'HPO4-2'],
    ['Mg+2', 'SO3-2'],
  ])('of %s with %s are unphysical and not there', (cation, anion) => {
    expect(library.electrolytes.binary.has(`${cation}|${anion}`)).toBe(false)
  })

  it('that are fitted say on what', () => {
    const fitted = binary.filter((row) => 'fittedOn' in row).map(({ cation, anion }) => `${cation} ${anion}`)
    expect(fitted.toSorted()).toEqual([
      'Ag+ NO3-',
      'Ca+2 Cl-',
      'Cu+2 SO4-2',
      'K+ HPO4-2',
      'Na+ Citrate-3',
      'Na+ Cl-',
      'Na+ H2EDTA-2',
      'Na+ HCO3-',
    ])
  })

  it('of low quality or standing in for others are less sure than the rest', () => {
    for (const row of binary) {
      if ('quality' in row) expect(row.relativeUncertainty).toBeGreaterThanOrEqual(0.03)
      expect(row.relativeUncertainty).toBeGreaterThanOrEqual(0.002)
      expect(row.maximumMolality).toBeGreaterThan(0)
    }
  })

  it('give a positive, moderate φ for every pair of its range at every temperature', () => {
    for (const { cation, anion, maximumMolality } of binary) {
      const [z, y] = [chargeOf(cation), -chargeOf(anion)]
      for (const celsius of [0, 25, 37]) {
        const model = modelOf([cation, anion], celsius)
        for (const molality of [0.01, 0.1, 0.3].map((value) => Math.min(value, maximumMolality))) {
          const { osmoticCoefficient } = model.osmotic(Float64Array.of(molality * y, molality * z))
          expect(osmoticCoefficient, `${cation} ${anion} ${molality} ${celsius}`).toBeGreaterThan(0.15)
          expect(osmoticCoefficient, `${cation} ${anion} ${molality} ${celsius}`).toBeLessThan(1.2)
        }
      }
    }
  })
})
