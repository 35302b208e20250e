import { describe, expect, it } from 'vitest'
import { evaluated, codesOf, library, line, ownIngredient } from './formulas.ts'

const saline = line('sodium-chloride', '0.9 %')

describe('what cannot be read blocks, and says how to write it', () => {
  const cases: readonly (readonly [code: string, evaluation: ReturnType<typeof evaluated>])[] = [
    ['volume-unreadable', evaluated([saline], { finalVolume: 'a lot' })],
    ['volume-unreadable', evaluated([saline], { finalVolume: '0 mL' })],
    ['temperature-unreadable', evaluated([saline], { temperature: 'warm' })],
    ['target-unreadable', evaluated([saline], { target: { quantity: 'osmolality', value: '290' } })],
    ['balance-unreadable', evaluated([saline], { balance: '1 mL' })],
    ['excess-unreadable', evaluated([saline], { batch: { units: 2, excess: '5 g' } })],
    ['batch-unusable', evaluated([saline], { batch: { units: 0 } })],
    ['amount-unreadable', evaluated([line('sodium-chloride', '1,234 g')])],
    ['amount-unusable', evaluated([line('sodium-chloride', '5 mL')])],
    ['amount-unusable', evaluated([line('mannitol', '5 mEq')])],
    ['ingredient-unknown', evaluated([line('sodium-chlorid', '1 %')])],
    ['ingredient-unknown-nothing-near', evaluated([line('qqqqqqqq', '1 %')])],
    ['no-ingredients', evaluated([])],
    ['target-missing', evaluated([line('sodium-chloride', 'q.s.')])],
    ['share-unusable', evaluated([{ ...saline, share: -1 }])],
  ]
  for (const [code, evaluation] of cases) {
    it(code, () => {
      expect(codesOf(evaluation)).toContain(code)
      expect(evaluation.status).toBe('blocked')
      expect(evaluation.solution).toBeNull()
      expect(
        evaluation.methods.every(({ osmolalityMilliosmPerKg }) => osmolalityMilliosmPerKg === null),
      ).toBe(true)
    })
  }

  it('names near matches of an unknown ingredient', () => {
    const [finding] = evaluated([line('sodium-chlorid', '1 %')]).findings
    expect(String(finding?.values['near'])).toContain('sodium-chloride')
  })

  it('reports every unreadable line, not the first alone', () => {
    const evaluation = evaluated([line('sodium-chloride', 'x'), line('mannitol', 'y')])
    expect(codesOf(evaluation).filter((code) => code === 'amount-unreadable')).toHaveLength(2)
  })
})

describe('lowering', () => {
  const gramsOf = (amount: string, ingredient = 'sodium-chloride', rest = {}) =>
    evaluated([line(ingredient, amount)], rest).lines[0]?.grams

  it('knows every notation', () => {
    expect(gramsOf('0.9 %')).toBeCloseTo(0.9, 12)
    expect(gramsOf('9 mg/mL')).toBeCloseTo(0.9, 12)
    expect(gramsOf('0.154 mol/L')).toBeCloseTo(0.154 * 5.844, 10)
    expect(gramsOf('154 mmol/L')).toBeCloseTo(0.154 * 5.844, 10)
    expect(gramsOf('2 mEq/mL', 'calcium-chloride-dihydrate')).toBeCloseTo(100 * 0.147008, 6)
    expect(gramsOf('50 mcg')).toBeCloseTo(5e-5, 15)
    expect(gramsOf('1:1000')).toBeCloseTo(0.1, 12)
    expect(gramsOf('2 * 0.25 g')).toBeCloseTo(0.5, 12)
  })

  it('takes a liquid named by volume by its density and does not weigh it', () => {
    const [glycerin] = evaluated([line('ethanol', '5 mL')], { balance: '1 g' }).lines
    const density = library.ingredients.get('ethanol')?.density?.value ?? Number.NaN
    expect(glycerin?.millilitres).toBe(5)
    expect(glycerin?.grams).toBeCloseTo(5 * density, 10)
  })

  it('rounds to the balance before evaluating and keeps the exact mass', () => {
    const [rounded] = evaluated([line('sodium-chloride', '0.8567 %')], { balance: '1 mg' }).lines
    expect(rounded).toMatchObject({ gramsExact: 0.8567, grams: 0.857 })
  })

  it('rounds what is weighed for the batch', () => {
    const rest = { balance: '10 mg', batch: { units: 3 } }
    const [rounded] = evaluated([line('sodium-chloride', '0.8567 %')], rest).lines
    expect((rounded?.grams ?? 0) * 3).toBeCloseTo(2.57, 12)
  })

  it('weighs an article that is not the pure substance by its content', () => {
    const [acid] = evaluated([line('phosphoric-acid', '0.5 %')], { balance: '10 mg' }).lines
    const fraction = library.ingredients.get('phosphoric-acid')?.article?.massFraction.value ?? Number.NaN
    expect(acid?.articleGrams).toBeCloseTo(Math.round((0.5 / fraction) * 100) / 100, 12)
    expect(acid?.grams).toBeCloseTo((acid?.articleGrams ?? 0) * fraction, 12)
  })

  it('takes water for the vehicle, q.s. or not, and gives it no share', () => {
    const evaluation = evaluated([saline, line('water-for-injection', 'q.s.')])
    expect(evaluation.status).toBe('ok')
    expect(evaluation.adjuster).toBeNull()
    expect(evaluation.lines[1]).toMatchObject({ isAdjuster: false, osmolalityShareMilliosmPerKg: null })
  })

  it('adds up one ingredient on two lines and says so', () => {
    const split = evaluated([line('sodium-chloride', '0.4 %'), line('sodium-chloride', '0.5 %')])
    const whole = evaluated([saline])
    expect(codesOf(split)).toContain('ingredient-repeated')
    expect(split.solution?.osmolality.value).toBeCloseTo(whole.solution?.osmolality.value ?? 0, 9)
  })

  it('finds the mass of an amount per kilogram of water', () => {
    const evaluation = evaluated([line('sodium-chloride', '0.154 mol/kg')])
    const { grams } = evaluation.lines[0] ?? {}
    const water = (evaluation.solution?.waterKgPerL ?? 0) / 10
    expect(((grams ?? 0) / 58.44 / water).toFixed(8)).toBe('0.15400000')
  })
})

describe('the balance', () => {
  const weighing = (amount: string) => evaluated([line('sodium-chloride', amount)], { balance: '1 mg' })

  it('dilutes what is below its step and evaluates the aliquot', () => {
    const evaluation = weighing('0.4 mg')
    const [aliquot] = evaluation.aliquots
    expect(codesOf(evaluation)).toContain('measured-by-aliquot')
    expect(evaluation.lines[0]?.grams).toBeCloseTo(aliquot?.plan?.doseGrams ?? 0, 15)
    expect(Math.abs((evaluation.lines[0]?.grams ?? 0) / 0.0004 - 1)).toBeLessThan(0.04)
  })

  it('stops below its step where no dilution fits, and keeps the mass', () => {
    const evaluation = evaluated([line('sodium-chloride', '0.4 mg')], {
      balance: '1 mg',
      finalVolume: '5 mL',
    })
    expect(evaluation.findings.find(({ code }) => code === 'below-readability')?.severity).toBe('stop')
    expect(evaluation.lines[0]?.grams).toBeCloseTo(0.0004, 12)
  })

  it('remarks below 820 steps and not at 820', () => {
    expect(codesOf(weighing('819 mg'))).toContain('below-least-weighable')
    expect(codesOf(weighing('820 mg'))).not.toContain('below-least-weighable')
  })

  it('warns where rounding changes the strength', () => {
    const small = { balance: '1 mg', finalVolume: '5 mL' }
    expect(codesOf(evaluated([line('sodium-chloride', '1.4 mg')], small))).toContain(
      'rounding-changes-strength',
    )
    expect(codesOf(weighing('900.4 mg'))).not.toContain('rounding-changes-strength')
  })
})

it('takes a line with its own record', () => {
  const own = ownIngredient({ name: 'House drug', molarMass: 300, equivalent: 0.2, ions: [1, -1] })
  const evaluation = evaluated([line(own, '1 %')])
  expect(evaluation.methods[0]?.osmolalityMilliosmPerKg).toBeGreaterThan(50)
})
