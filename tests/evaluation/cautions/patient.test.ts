import { describe, expect, it } from 'vitest'
import type { PatientData, RouteId } from '../../../src/formula/types.ts'
import { tellFinding } from '../../../src/worksheet/tell.ts'
import { evaluated, line } from '../formulas.ts'
import { library } from './contexts.ts'

type Lines = Readonly<Record<string, string>>

const raised = (route: RouteId, lines: Lines, patient: PatientData) =>
  evaluated(
    Object.entries(lines).map(([id, amount]) => line(id, amount)),
    { route, finalVolume: '1000 mL', pH: 6.5, patient },
  ).findings

const codes = (route: RouteId, lines: Lines, patient: PatientData) =>
  raised(route, lines, patient).map(({ code }) => code)

const saline = { 'sodium-chloride': '0.9 %' }

describe('a load by weight, a step either side, as the order is typed', () => {
  const propyleneGlycol = { ...saline, 'propylene-glycol': '10 mg/mL' }

  /* mg/kg in a day = 10 mg/mL × mL ÷ kg */
  it.each([
    ['propylene-glycol-for-a-newborn', { ageYears: 0.07, weightKg: 3, doseVolume: '0.3 mL' }, false],
    ['propylene-glycol-for-a-newborn', { ageYears: 0.07, weightKg: 3, doseVolume: '0.301 mL' }, true],
    ['propylene-glycol-for-a-newborn', { ageYears: 0.07, weightKg: 2.99, doseVolume: '0.3 mL' }, true],
    ['propylene-glycol-for-a-newborn', { ageYears: 0.08, weightKg: 3, doseVolume: '0.301 mL' }, false],
    ['propylene-glycol-under-five-years', { ageYears: 2, weightKg: 12, doseVolume: '60 mL' }, false],
    ['propylene-glycol-under-five-years', { ageYears: 2, weightKg: 12, doseVolume: '60.1 mL' }, true],
    ['propylene-glycol-under-five-years', { ageYears: 2, weightKg: 12, infusionRate: '2.5 mL/h' }, false],
    ['propylene-glycol-under-five-years', { ageYears: 2, weightKg: 12, infusionRate: '2.51 mL/h' }, true],
    ['propylene-glycol-from-five-years', { ageYears: 8, weightKg: 24, infusionRate: '50 mL/h' }, false],
    ['propylene-glycol-from-five-years', { ageYears: 8, weightKg: 24, infusionRate: '50.1 mL/h' }, true],
  ] as const)('%s of %o: %s', (code, patient, speaks) => {
    expect(codes('enteral', propyleneGlycol, patient).includes(code)).toBe(speaks)
  })

  /* 100 mmol/L boric acid is 1.081 mg boron in a mL. */
  it.each([
    [1.99, '0.925 mL', '0.926 mL'],
    [2, '2.775 mL', '2.777 mL'],
    [11.99, '2.775 mL', '2.777 mL'],
    [12, '6.475 mL', '6.477 mL'],
    [17.99, '6.475 mL', '6.477 mL'],
    [18, '9.25 mL', '9.26 mL'],
  ])('boron at %d years: silent at %s, told at %s', (ageYears, within, beyond) => {
    const boron = (doseVolume: string) =>
      codes('ophthalmic', { 'boric-acid': '100 mmol/L' }, { ageYears, weightKg: 10, doseVolume })
    expect(boron(within)).not.toContain('boron-in-a-day')
    expect(boron(beyond)).toContain('boron-in-a-day')
  })

  it.each([
    ['sodium-per-dose', { 'sodium-chloride': '0.1 mol/L' }, '9.99 mL', '10 mL'],
    ['sodium-per-day', { 'sodium-chloride': '0.1 mol/L' }, '169.9 mL', '170 mL'],
    ['potassium-per-dose', { ...saline, 'potassium-chloride': '100 mEq/L' }, '9.99 mL', '0.01 L'],
  ] as const)('%s counts the volume that is given', (code, lines, within, beyond) => {
    const told = (doseVolume: string) => codes('enteral', lines, { ageYears: 30, weightKg: 70, doseVolume })
    expect(told(within)).not.toContain(code)
    expect(told(beyond)).toContain(code)
  })

  it('counts sodium of every line', () => {
    const lines = { 'sodium-citrate-dihydrate': '20 mmol/L', 'sodium-benzoate': '40 mmol/L' }
    const told = (doseVolume: string) => codes('enteral', lines, { ageYears: 30, weightKg: 70, doseVolume })
    expect(told('9.99 mL')).not.toContain('sodium-per-dose')
    expect(told('10 mL')).toContain('sodium-per-dose')
  })
})

describe('a rate, a step either side', () => {
  it.each([
    ['potassium-faster-than-10-an-hour', 'intravenous-peripheral', '40 mmol/L', '250 mL/h', '251 mL/h'],
    ['potassium-faster-than-20-an-hour', 'intravenous-central', '80 mmol/L', '250 mL/hr', '251 mL/hr'],
    ['potassium-faster-than-40-an-hour', 'intravenous-central', '160 mmol/L', '250 mL per hour', '0.251 L/h'],
  ] as const)('%s', (code, route, potassium, within, beyond) => {
    const told = (infusionRate: string) =>
      codes(
        route,
        { ...saline, 'potassium-chloride': potassium },
        { ageYears: 60, weightKg: 70, infusionRate },
      )
    expect(told(within)).not.toContain(code)
    expect(told(beyond)).toContain(code)
  })

  it.each([
    ['calcium-gluconate-too-fast', { 'calcium-gluconate-monohydrate': '10 mg/mL' }, 40, 1200],
    ['calcium-gluconate-too-fast-for-a-child', { 'calcium-gluconate-monohydrate': '10 mg/mL' }, 10, 600],
    ['magnesium-sulfate-too-fast', { 'magnesium-sulfate-heptahydrate': '10 %' }, 40, 90],
  ] as const)('%s', (code, lines, ageYears, limit) => {
    const told = (rate: number) =>
      codes(
        'intravenous-central',
        { ...saline, ...lines },
        { ageYears, weightKg: 30, infusionRate: `${rate} mL/h` },
      )
    expect(told(limit)).not.toContain(code)
    expect(told(limit + 1)).toContain(code)
  })
})

describe('the loads of a day', () => {
  const loads = (route: RouteId, lines: Lines, patient: PatientData) =>
    raised(route, lines, patient).find(({ code }) => code === 'loads-of-a-day')

  it('are told per kg for one dose, with excipients, ions and the osmotic load', () => {
    /* 154 mmol/L and 9 mg/mL in 30 mL for 1.2 kg */
    const finding = loads(
      'intravenous-peripheral',
      { ...saline, 'benzyl-alcohol': '0.9 %' },
      { ageYears: 0.02, weightKg: 1.2, doseVolume: '30 mL' },
    )
    expect(finding?.values['details']).toContain(
      'Na+ 3.85 mmol/kg; Benzyl alcohol 225 mg/kg; osmotic load 9.',
    )
    expect(finding && tellFinding(finding, library).message).toContain('30 mL, one dose a day')
  })

  it('are told for 24 h at the rate, with potassium in an hour', () => {
    /* 20 mmol/L at 125 mL/h for 70 kg: 60 mmol in a day, 2.5 in an hour */
    const finding = loads(
      'intravenous-peripheral',
      { ...saline, 'potassium-chloride': '20 mmol/L' },
      { ageYears: 60, weightKg: 70, infusionRate: '125 mL/h' },
    )
    expect(finding?.values['details']).toContain('K+ 0.857 mmol/kg;')
    expect(finding?.values['details']).toContain('K+ 0.0357 mmol/kg in an hour')
    expect(finding?.values['volume']).toBe('3,000 mL')
  })

  it('count the phosphate of every line', () => {
    const finding = loads(
      'intravenous-central',
      { 'potassium-phosphate-monobasic': '10 mmol/L', 'sodium-phosphate-dibasic-anhydrous': '5 mmol/L' },
      { ageYears: 1, weightKg: 10, doseVolume: '100 mL' },
    )
    expect(finding?.values['details']).toContain('phosphate 0.15 mmol/kg')
  })

  it('need a weight and a volume', () => {
    const without = [{ ageYears: 60, weightKg: 70 }, { ageYears: 60, doseVolume: '100 mL' }, {}]
    for (const patient of without) {
      expect(loads('intravenous-peripheral', saline, patient)).toBeUndefined()
    }
  })
})

describe('a patient of whom something is missing', () => {
  it('is told which checks did not run, and which text could not be read', () => {
    const lines = { ...saline, 'propylene-glycol': '10 mg/mL' }
    const unread = { ageYears: 2, weightKg: 12, doseVolume: 'a cup', infusionRate: '5 mL' }
    expect(codes('enteral', lines, unread)).toEqual(
      expect.arrayContaining(['dose-volume-unreadable', 'infusion-rate-unreadable']),
    )
    const note = raised('enteral', lines, { ageYears: 2 }).find(
      ({ code }) => code === 'checks-need-patient-data',
    )
    expect(note?.values['data']).toContain('weight')
    expect(note?.values['data']).toContain('dose volume')
    expect(codes('enteral', lines, { ageYears: 2 })).toContain('child-without-a-weight')
  })
})
