import { describe, expect, it } from 'vitest'
import {
  balanceColumns,
  measureColumns,
  newBalance,
  newMeasure,
  withCell,
} from '../../../src/app/batch/benchColumns.ts'
import { batchCommand, fieldCommand, fieldRefusal, fieldText } from '../../../src/app/state/fields.ts'
import { apply } from '../../../src/formula/commands.ts'
import { emptyFormula, readFormula } from '../../../src/formula/document.ts'

const column = (field: string) => balanceColumns.find((one) => one.field === field)

describe('a cell of the bench', () => {
  it('is written into the device, a percent as a number, an empty one left out', () => {
    const device = { ...newBalance }
    expect(withCell(device, 'capacity', '200 g')).toEqual({ ...device, capacity: '200 g' })
    expect(withCell(device, 'allowedErrorPercent', '5')).toEqual({ ...device, allowedErrorPercent: 5 })
    expect(withCell({ ...device, capacity: '200 g' }, 'capacity', '')).toEqual(device)
  })

  it('is refused where it is no size of its kind', () => {
    expect(column('readability')?.refusal('1 mL')).not.toBeNull()
    expect(column('readability')?.refusal('')).not.toBeNull()
    expect(column('repeatability')?.refusal('')).toBeNull()
    expect(column('allowedErrorPercent')?.refusal('0')).not.toBeNull()
    expect(column('name')?.refusal('')).not.toBeNull()
    expect(measureColumns[2]?.refusal('10 mg')).not.toBeNull()
  })

  it('begins with devices that a document takes', () => {
    const bench = { balances: [newBalance], measures: [newMeasure] }
    expect(readFormula({ ...emptyFormula(), bench }).ok).toBe(true)
  })
})

describe('the parts of a batch', () => {
  it('are written and taken out one by one', () => {
    let formula = emptyFormula()
    for (const [field, text] of [
      ['batchHoldUp', '5 mL'],
      ['batchSamples', '2 * 5 mL'],
      ['batchUnits', '12'],
    ] as const) {
      const command = fieldCommand(formula, field, text)
      if (command) formula = apply(formula, command).formula
      expect(fieldText(formula, field)).toBe(text)
    }
    formula = apply(formula, batchCommand(formula, { overfill: 'viscous' })).formula
    expect(formula.batch).toEqual({ units: 12, overfill: 'viscous', holdUp: '5 mL', samples: '2 * 5 mL' })
    expect(apply(formula, batchCommand(formula, { overfill: '' })).formula.batch).not.toHaveProperty(
      'overfill',
    )
  })

  it('leave no batch behind when nothing is left of them', () => {
    const one = apply(emptyFormula(), batchCommand(emptyFormula(), { holdUp: '5 mL' })).formula
    expect(apply(one, batchCommand(one, { holdUp: '' })).formula).not.toHaveProperty('batch')
  })

  it('are refused where they are no volume', () => {
    const odd = apply(emptyFormula(), batchCommand(emptyFormula(), { holdUp: '5 mg' })).formula
    expect(fieldRefusal(odd, 'batchHoldUp', undefined)).toContain('volume')
  })
})
