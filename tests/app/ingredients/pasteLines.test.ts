import { describe, expect, it } from 'vitest'
import { isTable, readPastedLines } from '../../../src/app/ingredients/pasteLines.ts'

describe('rows pasted from a spreadsheet', () => {
  it('are told from the text of one cell', () => {
    expect(isTable('2 * 0.25 g')).toBe(false)
    expect(isTable('10 mg\n')).toBe(false)
    expect(isTable('Sodium chloride\t0.9 %')).toBe(true)
    expect(isTable('a\r\nb')).toBe(true)
  })

  it('give name and amount as they stood, without the heading row and empty rows', () => {
    expect(readPastedLines('Ingredient\tAmount\r\nPilocarpine HCl\t1 %\r\n\r\nSalt\tq.s.\r\n')).toEqual([
      { name: 'Pilocarpine HCl', amount: '1 %' },
      { name: 'Salt', amount: 'q.s.' },
    ])
  })

  it('join amount and unit that stood in two columns', () => {
    expect(readPastedLines('Glycerin\t2.6\t%')).toEqual([{ name: 'Glycerin', amount: '2.6 %' }])
  })

  it('leave a missing amount empty and never make one up', () => {
    expect(readPastedLines('Mannitol\nUrea\t')).toEqual([
      { name: 'Mannitol', amount: '' },
      { name: 'Urea', amount: '' },
    ])
  })

  it('are bounded', () => {
    expect(readPastedLines('a\t1 g\n'.repeat(5000))).toHaveLength(1000)
    expect(readPastedLines(`${'x'.repeat(20_000)}\t1 g`)[0]?.name).toHaveLength(10_000)
  })
})
