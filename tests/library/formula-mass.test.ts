import { array, assert, constantFrom, property } from 'fast-check'
import { describe, expect, it } from 'vitest'
import { countAtoms, molarMassOf } from '../../src/library/formula-mass.ts'

const mass = (text: string) => {
  const read = molarMassOf(text)
  if (!read.ok) throw new Error(read.refusal.message)
  return read.value
}
const reasonOf = (text: string) => {
  const read = molarMassOf(text)
  return read.ok ? null : read.refusal.message
}

describe('molar mass from a molecular formula', () => {
  it('matches hand sums of atomic weights', () => {
    expect(mass('NaCl')).toBeCloseTo(58.44, 2)
    expect(mass('H2O')).toBeCloseTo(18.015, 3)
    expect(mass('CaCl2·2H2O')).toBeCloseTo(40.078 + 2 * 35.45 + 2 * 18.015, 3)
    expect(mass('C4H7Cl3O·0.5H2O')).toBeCloseTo(mass('C4H7Cl3O') + mass('H2O') / 2, 9)
    expect(mass('C22H43N5O13·2H2SO4')).toBeCloseTo(mass('C22H43N5O13') + 2 * mass('H2SO4'), 9)
    expect(mass('(C17H23NO3)2·H2SO4·H2O')).toBeCloseTo(694.84, 1)
    expect(mass('KAl(SO4)2·12H2O')).toBeCloseTo(474.37, 1)
    expect(mass('[Na2(CO3)]2')).toBeCloseTo(2 * mass('Na2CO3'), 9)
  })

  it('counts atoms through brackets and crystal water', () => {
    const atoms = countAtoms('CaCl2·2H2O')
    expect(atoms.ok && atoms.value.get('O')).toBe(2)
    const nested = countAtoms('Mg3[Al(OH)2]4')
    expect(nested.ok && [...nested.value]).toEqual([
      ['Mg', 3],
      ['Al', 4],
      ['O', 8],
      ['H', 8],
    ])
  })

  it('refuses what it cannot read, with the reason', () => {
    expect(reasonOf('')).toMatch(/empty/)
    expect(reasonOf('   ')).toMatch(/empty/)
    expect(reasonOf('Na+')).toMatch(/charge/)
    expect(reasonOf('SO4-2')).toMatch(/charge/)
    expect(reasonOf('PO4^3')).toMatch(/charge/)
    expect(reasonOf('Xx2')).toMatch(/not an element/)
    expect(reasonOf('nacl')).toMatch(/not an element, a count or a bracket/)
    expect(reasonOf('Ca(OH')).toMatch(/not closed/)
    expect(reasonOf('Ca(OH]2')).toMatch(/do not match/)
    expect(reasonOf('CaOH)2')).toMatch(/do not match/)
    expect(reasonOf('Na0Cl')).toMatch(/out of range/)
    expect(reasonOf('NaCl·')).toMatch(/empty/)
    expect(reasonOf('NaCl·0H2O')).toMatch(/out of range/)
    expect(reasonOf('C'.repeat(121))).toMatch(/too long/)
    expect(reasonOf('C99999')).toMatch(/out of range/)
  })

  it('never throws and never answers anything but a positive finite mass', () => {
    const piece = constantFrom(
      'Na',
      'Cl',
      'C',
      'H',
      '2',
      '0',
      '(',
      ')',
      '[',
      ']',
      '·',
      '.',
      'x',
      '+',
      ' ',
      '½',
    )
    assert(
      property(array(piece, { maxLength: 30 }), (pieces) => {
        const read = molarMassOf(pieces.join(''))
        if (read.ok) expect(read.value).toBeGreaterThan(0)
        if (read.ok) expect(Number.isFinite(read.value)).toBe(true)
      }),
      { numRuns: 200 },
    )
  })
})
