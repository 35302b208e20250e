import { describe, expect, it } from 'vitest'
import { readAmount } from '../../src/quantity/readAmount.ts'
import { resolveAmount, type SubstanceFacts } from '../../src/quantity/resolveAmount.ts'

const sodiumChloride: SubstanceFacts = {
  molarMass: 58.443,
  percentBasis: 'w/v',
  isLiquid: false,
  equivalentsPerMole: 1,
}
const calciumChlorideDihydrate: SubstanceFacts = {
  molarMass: 147.014,
  percentBasis: 'w/v',
  isLiquid: false,
  equivalentsPerMole: 2,
}
const dextrose: SubstanceFacts = { ...sodiumChloride, molarMass: 180.156, equivalentsPerMole: null }
const liquid: SubstanceFacts = {
  molarMass: 92.094,
  percentBasis: 'v/v',
  isLiquid: true,
  densityGPerMl: 1.25,
  equivalentsPerMole: null,
}
const polymer: SubstanceFacts = { percentBasis: 'w/v', isLiquid: false, equivalentsPerMole: null }

function resolve(text: string, facts: SubstanceFacts, volumeMl = 100) {
  const amount = readAmount(text)
  if (!amount.ok) throw new Error(amount.refusal.message)
  return resolveAmount(amount.value, facts, volumeMl)
}

const close = (value: number) => expect.closeTo(value, 10)

describe('resolveAmount', () => {
  it('turns milliequivalents into mass by the positive charge of the formula unit', () => {
    const value = { grams: close(1.47014), mmol: 10 }
    expect(
      resolveAmount({ kind: 'equivalents', value: 20, text: '20 mEq' }, calciumChlorideDihydrate, 1000),
    ).toEqual({
      ok: true,
      value,
    })
    expect(resolve('0.2 mEq/mL', calciumChlorideDihydrate)).toEqual({ ok: true, value })
  })

  it.each([
    ['1 %', 1],
    ['1 % w/v', 1],
    ['10 mg/mL', 1],
    ['1:100', 1],
    ['2.5 g', 2.5],
    ['0.1 mol/L', 0.58443],
    ['10 mmol', 0.58443],
    ['10 mEq', 0.58443],
  ])('%s of sodium chloride in 100 mL', (text, grams) => {
    expect(resolve(text, sodiumChloride)).toEqual({
      ok: true,
      value: { grams: close(grams), mmol: close((grams / 58.443) * 1000) },
    })
  })

  it.each([
    ['2 %', 2],
    ['2 % v/v', 2],
    ['1:50', 2],
    ['2 mL', 2],
    ['2.5 g', 2],
    ['2.5 % w/v', 2],
  ])('%s of a liquid in 100 mL is measured by volume', (text, millilitres) => {
    expect(resolve(text, liquid)).toEqual({
      ok: true,
      value: {
        grams: close(1.25 * millilitres),
        mmol: close((1250 * millilitres) / 92.094),
        millilitres: close(millilitres),
      },
    })
  })

  it('leaves out what a missing fact would be needed for', () => {
    expect(resolve('1 %', polymer)).toEqual({ ok: true, value: { grams: 1 } })
    expect(resolve('2.5 g', { ...polymer, isLiquid: true })).toEqual({ ok: true, value: { grams: 2.5 } })
  })

  it('keeps moles per kilogram of water as they are', () => {
    expect(resolve('0.1 mol/kg', sodiumChloride)).toEqual({ ok: true, value: { molPerKg: 0.1 } })
  })

  it('needs the density of the solution for a mass per mass', () => {
    const value = { grams: close(5.2), mmol: close((5.2 / 58.443) * 1000) }
    expect(resolve('5 % w/w', { ...sodiumChloride, solutionDensityGPerMl: 1.04 })).toEqual({
      ok: true,
      value,
    })
  })

  it.each([
    ['q.s.', sodiumChloride, 'quantity-sufficient-without-size'],
    ['20 mEq', dextrose, 'equivalents-of-a-neutral-solute'],
    ['20 mEq', { ...dextrose, equivalentsPerMole: 0 }, 'equivalents-of-a-neutral-solute'],
    ['0.2 mEq/mL', dextrose, 'equivalents-of-a-neutral-solute'],
    ['10 mmol', polymer, 'molar-mass-missing'],
    ['0.1 mol/L', polymer, 'molar-mass-missing'],
    ['0.1 mol/kg', polymer, 'molar-mass-missing'],
    ['2 % v/v', sodiumChloride, 'volume-of-a-solid'],
    ['5 mL', sodiumChloride, 'volume-of-a-solid'],
    ['5 mL', { ...liquid, densityGPerMl: undefined }, 'density-missing'],
    ['5 %', { ...liquid, densityGPerMl: undefined }, 'density-missing'],
    ['101 %', liquid, 'more-than-the-whole'],
    ['101 % w/w', sodiumChloride, 'more-than-the-whole'],
    ['5 % w/w', sodiumChloride, 'solution-density-missing'],
  ] as const)('refuses %s: case %#', (text, facts, code) => {
    expect(resolve(text, facts)).toMatchObject({ ok: false, refusal: { code } })
  })

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('refuses a final volume of %d mL', (volumeMl) => {
    expect(resolve('1 %', sodiumChloride, volumeMl)).toMatchObject({
      ok: false,
      refusal: { code: 'volume-missing' },
    })
  })
})
