import { describe, expect, it } from 'vitest'
import { writeFormula } from '../../../src/formula/document.ts'
import { pageWith } from './fixtures.ts'

const amountCell = (key: string) => ({ kind: 'amount', key }) as const
const field = (name: 'pH' | 'batchUnits' | 'finalVolume') => ({ kind: 'field', field: name }) as const

describe('typing in a cell', () => {
  it('is one step of undo, whatever the number of keys', () => {
    const { store, actions, amount } = pageWith([['sodium-chloride', '1 %']])
    actions.beginCell(amountCell('k0'))
    for (const text of ['2', '2.', '2.5', '2.5 ', '2.5 %']) actions.typeInCell(amountCell('k0'), text)
    actions.leaveCell()
    expect(amount(0)).toBe('2.5 %')
    expect(store.getState().past).toHaveLength(1)
    actions.undo()
    expect(amount(0)).toBe('1 %')
    actions.redo()
    expect(amount(0)).toBe('2.5 %')
  })

  it('starts a new step when the hand comes back to the cell', () => {
    const { store, actions, amount } = pageWith([['sodium-chloride', '1 %']])
    for (const text of ['2 %', '3 %']) {
      actions.beginCell(amountCell('k0'))
      actions.typeInCell(amountCell('k0'), text)
      actions.leaveCell()
    }
    expect(store.getState().past).toHaveLength(2)
    actions.undo()
    expect(amount(0)).toBe('2 %')
  })

  it('is taken back by restoring, without a trace in undo or redo', () => {
    const { store, actions, amount } = pageWith([['sodium-chloride', '1 %']])
    actions.beginCell(amountCell('k0'))
    actions.typeInCell(amountCell('k0'), '7 %')
    actions.restoreCell()
    expect(amount(0)).toBe('1 %')
    expect(store.getState().past).toHaveLength(0)
    expect(store.getState().future).toHaveLength(0)
  })

  it('keeps in the document whatever amount was typed, readable or not', () => {
    const { store, actions, amount } = pageWith([['sodium-chloride', '1 %']])
    actions.beginCell(amountCell('k0'))
    actions.typeInCell(amountCell('k0'), '1,234')
    expect(amount(0)).toBe('1,234')
    expect(store.getState().drafts).toEqual({})
  })

  it('holds text that no document can hold as a draft, which blocks until it is mended', () => {
    const { store, actions, amount } = pageWith([['sodium-chloride', '1 %']])
    actions.beginCell(amountCell('k0'))
    actions.typeInCell(amountCell('k0'), 'x'.repeat(10_000))
    expect(amount(0)).toBe('1 %')
    expect(Object.keys(store.getState().drafts)).toEqual(['amount k0'])
    actions.typeInCell(amountCell('k0'), '2 %')
    expect(store.getState().drafts).toEqual({})
    expect(amount(0)).toBe('2 %')
  })
})

describe('fields of numbers', () => {
  it('take a plain number and nothing else', () => {
    for (const [text, pH] of [
      ['6.8', 6.8],
      ['', undefined],
      ['0', 0],
    ] as const) {
      const { store, actions } = pageWith()
      actions.typeInCell(field('pH'), text)
      expect(store.getState().formula.pH, text).toBe(pH)
      expect(store.getState().drafts, text).toEqual({})
    }
    for (const text of ['6,8', 'six', '-1', '14.1', '1e1', 'NaN', ' . ', '6.8 7']) {
      const { store, actions } = pageWith()
      actions.typeInCell(field('pH'), text)
      expect(store.getState().formula.pH, text).toBeUndefined()
      expect(store.getState().drafts, text).toEqual({ pH: text })
    }
  })

  it('count containers in whole numbers', () => {
    const { store, actions } = pageWith()
    actions.typeInCell(field('batchUnits'), '12')
    expect(store.getState().formula.batch).toEqual({ units: 12 })
    actions.typeInCell(field('batchUnits'), '12.5')
    expect(store.getState().drafts).toEqual({ batchUnits: '12.5' })
    actions.typeInCell(field('batchUnits'), '1')
    expect(store.getState().formula.batch).toBeUndefined()
  })

  it('are cleared of unreadable text by the first undo', () => {
    const { store, actions } = pageWith()
    actions.typeInCell(field('pH'), '7')
    actions.typeInCell(field('pH'), '7x')
    actions.undo()
    expect(store.getState().drafts).toEqual({})
  })
})

describe('lines', () => {
  it('are added, moved and removed, each undone to the same bytes', () => {
    const { store, actions } = pageWith([
      ['sodium-chloride', '1 %'],
      ['mannitol', '2 %'],
      ['urea', '1 g'],
    ])
    const before = writeFormula(store.getState().formula)
    const deeds = [
      () => actions.addLine('glycerin'),
      () =>
        actions.addPasted({
          lines: [
            { name: 'Boric acid', amount: '1 %' },
            { name: 'nothing known', amount: '' },
          ],
          leftOut: [],
        }),
      () => actions.moveLine('k0', 1),
      () => actions.removeLine('k1'),
      () => actions.setIngredient('k2', 'mannitol'),
      () => actions.nameIngredient('k2', 'no such thing'),
      () => actions.setRoute('nasal'),
      () => actions.setTargetQuantity('freezing-point-depression'),
      () => actions.setTargetQuantity('none'),
      () => actions.acknowledge('some-code', 'because'),
      () => actions.startNew(),
    ]
    for (const deed of deeds) {
      deed()
      expect(writeFormula(store.getState().formula)).not.toBe(before)
      actions.undo()
      expect(writeFormula(store.getState().formula)).toBe(before)
      expect(store.getState().past).toHaveLength(0)
    }
  })

  it('take a name that is known exactly, and keep any other as it was written', () => {
    const { store, actions } = pageWith()
    actions.addPasted({
      lines: [
        { name: 'SODIUM CHLORIDE', amount: 'q.s.' },
        { name: 'sodium chlorid', amount: '1 %' },
      ],
      leftOut: ['the column “Lot”'],
    })
    expect(store.getState().notice).toBe(
      'Pasted: 2 lines. 1 is in doubt, kept as it stood and marked. Left out: the column “Lot”.',
    )
    expect(store.getState().formula.lines.map((line) => line.ingredient)).toEqual([
      'sodium-chloride',
      'sodium chlorid',
    ])
  })

  it('do not leave the list at its ends', () => {
    const { store, actions } = pageWith([['sodium-chloride', '1 %']])
    actions.moveLine('k0', -1)
    actions.moveLine('k0', 1)
    expect(store.getState().past).toHaveLength(0)
  })

  it('are never more than a document holds, and what did not fit is said', () => {
    const { store, actions } = pageWith()
    actions.addPasted({
      lines: Array.from({ length: 600 }, () => ({ name: 'urea', amount: '1 g' })),
      leftOut: [],
    })
    expect(store.getState().formula.lines).toHaveLength(500)
    expect(store.getState().notice).toContain('500')
  })
})
