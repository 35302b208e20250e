import { describe, expect, it } from 'vitest'
import { csvCell, csvOf } from '../../../src/app/transfer/csv.ts'
import { evaluated, library, line } from '../../evaluation/formulas.ts'

describe('a cell', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '  =1', '\t=1', '\n=1', '＝1', '－1', '\tx'])(
    'that begins like a formula, “%s”, is text',
    (text) => {
      expect(csvCell(text).replace(/^"/, '')).toMatch(/^'/)
    },
  )

  it('stands in quotes where it must', () => {
    expect(csvCell('a, "b"')).toBe('"a, ""b"""')
    expect(csvCell('two\nlines')).toBe('"two\nlines"')
    expect(csvCell('plain')).toBe('plain')
  })

  it('never shows a number that is not known', () => {
    expect(csvCell(null)).toBe('not known')
    expect(csvCell(Number.NaN)).toBe('not known')
    expect(csvCell(-0.5)).toBe('-0.5')
  })
})

describe('the table', () => {
  it('holds every line and the results, for the volume of the formula', () => {
    const evaluation = evaluated([line('sodium-chloride', '0.9 %'), line('mannitol', '1 %')], {
      title: '=HYPERLINK("x")',
      finalVolume: '200 mL',
    })
    const text = csvOf(evaluation, library) ?? ''
    const rows = text.split('\r\n')
    expect(rows[0]).toBe('\uFEFFformula,"\'=HYPERLINK(""x"")"')
    expect(rows).toContain('"amounts of the lines are for, mL",200')
    const salt = rows.find((row) => row.startsWith('1,Sodium chloride'))
    expect(salt).toContain('sodium-chloride,0.9 %,no,1.8,1.8,by mass')
    const osmolality = evaluation.solution?.osmolality
    expect(rows).toContain(
      ['osmolality', osmolality?.value, 'mOsm/kg', osmolality?.low, osmolality?.high]
        .map((cell) => csvCell(cell ?? null))
        .join(','),
    )
  })

  it('is not written while the formula is blocked', () => {
    expect(csvOf(evaluated([line('sodium-chloride', '0,9 %')]), library)).toBeNull()
  })
})
