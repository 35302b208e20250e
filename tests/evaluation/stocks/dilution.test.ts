import { describe, expect, it } from 'vitest'
import { alligate, dilute, mixedStrength } from '../../../src/evaluation/stocks/dilution.ts'

/* Rows W61, W81, W82, W84, W85, W86 of the worked examples: Ansel and Stoklosa, Pharmaceutical Calculations (from
   memory), and public exercises for W61. */
describe('dilution', () => {
  it('W81: 500 mL of 15 % made up to 1500 mL is 5 %', () => {
    expect(dilute(15, 5, 1500)).toEqual({ status: 'found', stockMl: 500, diluentMl: 1000, fold: 3 })
  })
  it('W82: 50 mL of 1:20 made up to 1000 mL is 1:400', () => {
    expect(dilute(1 / 20, 1 / 400, 1000)).toMatchObject({ status: 'found' })
    const found = dilute(1 / 20, 1 / 400, 1000)
    expect(found.status === 'found' ? found.stockMl : 0).toBeCloseTo(50, 9)
  })
  it('W84: 1800 g of 28 % to 10 % gives 5040 g', () => {
    const found = dilute(28, 10, 5040)
    expect(found.status === 'found' ? found.stockMl : 0).toBeCloseTo(1800, 9)
  })
  it('refuses to concentrate', () => {
    expect(dilute(5, 10, 100)).toEqual({ status: 'refused', because: 'stock is weaker' })
    expect(dilute(10, 10, 100).status).toBe('found')
    expect(dilute(10, 0, 100)).toEqual({ status: 'refused', because: 'not above zero' })
  })
})

describe('alligation', () => {
  it('W85: 95 % and 50 % to 70 % in 20 to 25 parts', () => {
    expect(alligate([95, 50], 70)).toEqual({ status: 'found', parts: [20, 25] })
  })
  it('W86: 50, 20 and 5 % to 10 % in 5, 5 and 50 parts', () => {
    expect(alligate([50, 20, 5], 10)).toEqual({ status: 'found', parts: [5, 5, 50] })
  })
  it('W61: 500 mL at 40 %, 100 mL at 90 % and 400 mL of water make 29 %', () => {
    expect(
      mixedStrength([
        [500, 40],
        [100, 90],
        [400, 0],
      ]),
    ).toBeCloseTo(29, 12)
  })
  it('takes a strength that is there, and refuses one outside', () => {
    expect(alligate([10, 5], 10)).toEqual({ status: 'found', parts: [1, 0] })
    expect(alligate([10, 5], 11)).toEqual({ status: 'refused', because: 'not between' })
    expect(alligate([10, 5], 4)).toEqual({ status: 'refused', because: 'not between' })
  })
  it('the mixture has the wanted strength', () => {
    const found = alligate([50, 20, 5], 10)
    if (found.status !== 'found') throw new Error('refused')
    expect(mixedStrength(found.parts.map((part, index) => [part, [50, 20, 5][index]!] as const))).toBeCloseTo(
      10,
      12,
    )
  })
})
