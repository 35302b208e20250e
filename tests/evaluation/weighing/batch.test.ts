import { describe, expect, it } from 'vitest'
import { batchFactorOf, batchPartsOf, excessOf } from '../../../src/evaluation/weighing/batchParts.ts'
import { measureFor, ownMeasure, type MeasureData } from '../../../src/evaluation/weighing/measures.ts'
import { loadDeviceData } from '../../../src/library/devices.ts'
import { codesOf, evaluated, library, line } from '../formulas.ts'

const data = loadDeviceData()

describe('excess volume', () => {
  it.each([
    [0.5, 0.1, 0.12],
    [10, 0.5, 0.7],
    [30, 0.8, 1.2],
    [50, 1, 1.5],
    [1000, 20, 30],
  ])('of %d mL is that of the table', (label, mobile, viscous) => {
    expect(excessOf(label, 'mobile', data.labelExcess).millilitres).toBeCloseTo(mobile, 12)
    expect(excessOf(label, 'viscous', data.labelExcess).millilitres).toBeCloseTo(viscous, 12)
  })

  it('of a size between is that of the next larger one, and said', () => {
    expect(excessOf(3, 'mobile', data.labelExcess)).toEqual({ millilitres: 0.3, takenMl: 5 })
    expect(excessOf(40, 'mobile', data.labelExcess).millilitres).toBeCloseTo(1, 12)
    const between = evaluated([line('mannitol', '5 %')], {
      finalVolume: '3 mL',
      batch: { units: 10, overfill: 'mobile' },
    })
    expect(codesOf(between)).toContain('label-size-not-listed')
  })
})

describe('a batch', () => {
  const batch = {
    units: 20,
    overfill: 'mobile',
    holdUp: '8 mL',
    samples: '2 * 10 mL',
    excess: '5 mL',
  } as const

  it('is units times label volume and excess, hold-up, samples and extra', () => {
    const { parts } = batchPartsOf(batch, 10, library)
    expect(parts?.totalMl).toBeCloseTo(20 * 10.5 + 8 + 20 + 5, 9)
    expect(parts && batchFactorOf(parts)).toBeCloseTo(24.3, 9)
  })

  it('scales every mass', () => {
    const evaluation = evaluated([line('mannitol', '5 %')], { finalVolume: '10 mL', batch })
    expect(evaluation.batchVolumeMl).toBeCloseTo(243, 9)
    expect((evaluation.lines[0]?.grams ?? 0) * evaluation.batchFactor).toBeCloseTo(12.15, 9)
  })

  it('is blocked by a part that cannot be read', () => {
    const unread = evaluated([line('mannitol', '5 %')], { batch: { ...batch, holdUp: '3 mg' } })
    expect(unread.status).toBe('blocked')
    expect(codesOf(unread)).toContain('batch-part-unreadable')
  })
})

describe('a measure of one’s own', () => {
  const own = (rest: Partial<MeasureData> & Pick<MeasureData, 'kind' | 'capacityMl'>) =>
    ownMeasure({ name: rest.kind, graduationMl: null, toleranceMl: null, ...rest }, data)

  it('has the limits of its kind', () => {
    expect(own({ kind: 'graduate', capacityMl: 10, graduationMl: 0.1 })).toMatchObject({ smallestMl: 2 })
    expect(own({ kind: 'syringe', capacityMl: 1, graduationMl: 0.01 })?.smallestMl).toBeCloseTo(0.1, 12)
    expect(own({ kind: 'flask', capacityMl: 100 })).toMatchObject({ smallestMl: 100, toleranceMl: 0.08 })
  })

  it('without a known error is not used, and that is said', () => {
    expect(own({ kind: 'pipette', capacityMl: 3 })).toBeNull()
    const measures = [{ name: 'odd', kind: 'pipette', capacity: '3 mL' }] as const
    expect(codesOf(evaluated([line('mannitol', '5 %')], { bench: { measures } }))).toContain(
      'measure-without-tolerance',
    )
  })

  it('is chosen by its error among those that read the volume', () => {
    const graduate = own({ kind: 'graduate', capacityMl: 10, graduationMl: 0.2 })
    const syringe = own({ kind: 'syringe', capacityMl: 5, graduationMl: 0.1, toleranceMl: 0.05 })
    const measures = [graduate, syringe].flatMap((measure) => measure ?? [])
    expect(measureFor(3.14, measures)).toMatchObject({ millilitres: 3.1, measure: { kind: 'syringe' } })
    expect(measureFor(6.14, measures)).toMatchObject({ millilitres: 6.2, measure: { kind: 'graduate' } })
    expect(measureFor(0.1, measures)).toBeNull()
  })

  it('rounds what is poured before it is evaluated', () => {
    const measures = [
      { name: 'graduate', kind: 'graduate', capacity: '10 mL', graduation: '0.5 mL' },
    ] as const
    const [ethanol] = evaluated([line('ethanol', '5.2 mL')], { bench: { measures } }).lines
    expect(ethanol?.millilitres).toBe(5)
    expect((ethanol?.grams ?? 0) / (ethanol?.gramsExact ?? 1)).toBeCloseTo(5 / 5.2, 12)
    expect(codesOf(evaluated([line('ethanol', '0.2 mL')], { bench: { measures } }))).toContain(
      'not-measurable',
    )
  })
})
