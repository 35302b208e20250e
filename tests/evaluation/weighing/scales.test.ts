import { describe, expect, it } from 'vitest'
import {
  chooseScale,
  isBelowLeast,
  scaleOf,
  type ScaleData,
} from '../../../src/evaluation/weighing/scales.ts'
import { loadConventions } from '../../../src/library/conventions.ts'
import { loadDeviceData } from '../../../src/library/devices.ts'
import { evaluated, line } from '../formulas.ts'

const { rules } = loadDeviceData()

const scale = (data: Partial<ScaleData>) =>
  scaleOf(
    {
      name: '',
      readabilityG: 0.0001,
      repeatabilityG: null,
      sensitivityG: null,
      allowedErrorPercent: null,
      capacityG: null,
      ...data,
    },
    rules,
  )

describe('the least weighable mass', () => {
  it('is 820 readabilities where the repeatability is not known or small', () => {
    // USP <41>: s below 0.41 d counts as 0.41 d; d = 0.1 mg gives 82 mg.
    expect(scale({}).leastWeighableG).toBeCloseTo(0.082, 12)
    expect(scale({ repeatabilityG: 0.00004 }).leastWeighableG).toBeCloseTo(0.082, 12)
    expect(scale({ readabilityG: 1 }).leastWeighableG).toBeCloseTo(
      loadConventions().leastWeighableReadabilities.value,
      9,
    )
  })

  it('is 2000 standard deviations where the repeatability is larger', () => {
    // Practice: s = 0.08 mg gives 160 mg.
    expect(scale({ repeatabilityG: 0.00008 })).toMatchObject({ basis: 'repeatability' })
    expect(scale({ repeatabilityG: 0.00008 }).leastWeighableG).toBeCloseTo(0.16, 12)
  })

  it('follows from sensitivity and allowed error for a prescription balance', () => {
    // Class III, 6 mg: 120 mg at 5 % (public course page), 600 mg at 1 % (W55).
    const prescription = { readabilityG: 0.001, sensitivityG: 0.006 }
    expect(scale({ ...prescription, allowedErrorPercent: 5 }).leastWeighableG).toBeCloseTo(0.12, 12)
    expect(scale({ ...prescription, allowedErrorPercent: 1 }).leastWeighableG).toBeCloseTo(0.6, 12)
  })

  it('follows from the error that is allowed where one is', () => {
    expect(scale({ allowedErrorPercent: 1 }).leastWeighableG).toBeCloseTo(0.0082, 12)
  })

  it('is where dilution begins; with nothing but a readability that is 5 % of error', () => {
    expect(scale({ name: 'own' }).dilutedBelowG).toBeCloseTo(0.082, 12)
    expect(scale({}).dilutedBelowG).toBeCloseTo(0.00164, 12)
  })

  it('is itself not below', () => {
    expect(isBelowLeast(0.082, scale({}))).toBe(false)
    expect(isBelowLeast(0.0819, scale({}))).toBe(true)
  })
})

describe('the balance for a mass', () => {
  const fine = scale({ name: 'fine', capacityG: 200 })
  const coarse = scale({ name: 'coarse', readabilityG: 0.01, capacityG: 3000 })
  const prescription = scale({
    name: 'prescription',
    readabilityG: 0.001,
    sensitivityG: 0.006,
    allowedErrorPercent: 5,
    capacityG: 120,
  })
  const all = [fine, coarse, prescription]
  const chosen = (grams: number) => chooseScale(grams, all, rules)?.name

  it('is the coarsest that errs by no more than a thousandth', () => {
    expect(chosen(0.1)).toBe('fine')
    expect(chosen(8)).toBe('prescription')
    expect(chosen(9)).toBe('coarse')
  })

  it('is the one with the smallest error where none reaches that', () => {
    expect(chosen(0.05)).toBe('fine')
    expect(chooseScale(0.13, [coarse, prescription], rules)?.name).toBe('prescription')
  })

  it('takes the mass, or there is none', () => {
    expect(chosen(2500)).toBe('coarse')
    expect(chosen(3001)).toBeUndefined()
  })
})

describe('a formula with a bench', () => {
  const balances = [
    { name: 'analytical', readability: '0.1 mg', capacity: '200 g' },
    { name: 'top pan', readability: '10 mg', capacity: '3 kg' },
  ]

  it('rounds each line to its own balance', () => {
    const { lines, weighingPlan } = evaluated(
      [line('mannitol', '0.123456 %'), line('sodium-chloride', '9.00412 %')],
      { bench: { balances } },
    )
    expect(lines.map(({ grams }) => grams)).toEqual([0.1235, 9])
    expect(weighingPlan?.lines.map(({ scale: used }) => used?.name)).toEqual(['analytical', 'top pan'])
    expect(weighingPlan?.lines[0]?.roundingPercent).toBeCloseTo((0.1235 / 0.123456 - 1) * 100, 9)
  })

  it('keeps the balance of the formula beside them', () => {
    const both = evaluated([line('mannitol', '0.123456 %')], { bench: { balances }, balance: '0.01 mg' })
    expect(both.weighingPlan?.lines[0]?.scale?.name).toBe('analytical')
    expect(
      evaluated([line('mannitol', '0.0123456 %')], { bench: { balances }, balance: '0.01 mg' }).lines[0]
        ?.grams,
    ).toBe(0.01235)
  })

  it('stops where no balance takes the mass or a reading is no mass', () => {
    const codes = (bench: object) => evaluated([line('mannitol', '400 g')], { finalVolume: '4 L', ...bench })
    const heavy = codes({ bench: { balances: balances.slice(0, 1) } })
    expect(heavy.findings.map(({ code }) => code)).toContain('above-capacity')
    expect(codes({ bench: { balances } }).findings.map(({ code }) => code)).not.toContain('above-capacity')
    const unread = codes({ bench: { balances: [{ name: 'x', readability: '1 mL' }] } })
    expect(unread.status).toBe('blocked')
    expect(unread.findings.map(({ code }) => code)).toContain('bench-unreadable')
  })
})
