import { describe, expect, it } from 'vitest'
import { saturationOf } from '../../../src/chemistry/saturation.ts'
import type { ThermalState } from '../../../src/chemistry/types.ts'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import { emptyFormula } from '../../../src/formula/document.ts'
import { loadLibrary } from '../../../src/library/library.ts'

const library = loadLibrary()
const codesOf = (...lines: (readonly [string, string])[]) =>
  evaluate(
    {
      ...emptyFormula(),
      finalVolume: '100 mL',
      lines: lines.map(([ingredient, amount], index) => ({ key: `k${index}`, ingredient, amount })),
    },
    library,
  ).findings.map(({ code }) => code)

describe('saturationOf', () => {
  it('gypsum at the square root of its constant reads index 0', () => {
    const gypsum = library.solids.find(({ id }) => id === 'calcium-sulfate-dihydrate')!
    const root = 10 ** (gypsum.logK.value / 2)
    const state = {
      celsius: 25,
      waterActivity: 1,
      species: { 'Ca+2': root, 'SO4-2': root },
      activityCoefficients: { 'Ca+2': 1, 'SO4-2': 1 },
    } as unknown as ThermalState
    expect(saturationOf(gypsum, state)?.index).toBeCloseTo(0, 12)
    expect(saturationOf(gypsum, { ...state, species: {} })).toBeNull()
  })

  it('is not told at a temperature for which no enthalpy is known', () => {
    const solid = library.solids.find(({ id }) => id === 'octacalcium-phosphate')!
    const state = {
      celsius: 37,
      waterActivity: 1,
      species: {},
      activityCoefficients: {},
    } as unknown as ThermalState
    expect(saturationOf(solid, state)).toBeNull()
  })

  /* Gypsum dissolves to about 2.0 to 2.1 g/L of CaSO4 in water at 25 °C (common practice: 2.4 g/L of the dihydrate is a
     saturated solution to within some percent). */
  it('calcium sulfate solution passes saturation between 1.8 and 2.3 g/L', () => {
    const mixed = (gramsCaSO4: number) => {
      const mmol = (gramsCaSO4 / 136.14) * 1000
      return codesOf(
        ['calcium-chloride-dihydrate', `${mmol} mmol/L`],
        ['sodium-sulfate-anhydrous', `${mmol} mmol/L`],
      )
    }
    expect(mixed(1.5)).not.toContain('solid-supersaturated')
    // With the sodium chloride that this mixture makes, gypsum is somewhat more soluble than in water.
    expect(mixed(3)).toContain('solid-supersaturated')
  })
})

describe('precipitation remarks', () => {
  it('silver with chloride, zinc with phosphate, aluminium in neutral solution', () => {
    expect(codesOf(['silver-nitrate', '0.1 %'], ['sodium-chloride', '0.1 %'])).toContain(
      'solid-supersaturated',
    )
    expect(codesOf(['silver-nitrate', '0.1 %'])).not.toContain('solid-supersaturated')
    expect(
      codesOf(['zinc-sulfate-heptahydrate', '0.25 %'], ['sodium-phosphate-dibasic-anhydrous', '0.5 %']),
    ).toContain('solid-supersaturated')
  })

  it('the free base of a local anaesthetic above its border, a note near it, nothing well below', () => {
    const at = (pH: number) =>
      evaluate(
        {
          ...emptyFormula(),
          finalVolume: '100 mL',
          pH,
          lines: [{ key: 'k', ingredient: 'bupivacaine-hydrochloride-monohydrate', amount: '0.5 %' }],
        },
        library,
      ).findings.map(({ code }) => code)
    expect(at(7.2)).toContain('free-form-above-solubility')
    expect(at(6.5)).toContain('free-form-near-solubility')
    expect(at(5)).not.toContain('free-form-near-solubility')
  })
})
