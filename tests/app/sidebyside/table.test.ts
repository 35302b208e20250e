import { describe, expect, it } from 'vitest'
import { columnsOf } from '../../../src/app/sidebyside/columns.ts'
import { ingredientRows, resultRows } from '../../../src/app/sidebyside/table.ts'
import type { Formula } from '../../../src/formula/types.ts'
import { formulaOf, library, line } from '../../evaluation/formulas.ts'

const columns = (...formulas: readonly Formula[]) =>
  columnsOf(
    formulas.map((formula, index) => ({ id: `${index}`, name: `${index}`, formula, unreadable: false })),
    library,
  )
const marks = (rows: ReturnType<typeof resultRows>, label: string) =>
  rows.find((row) => row.label === label)?.cells.map(({ mark }) => mark)

const salt = formulaOf([line('sodium-chloride', '0.9 %')])

describe('formulas side by side', () => {
  it('mark another amount and a missing line, and not the same amount in other words', () => {
    const rows = ingredientRows(
      columns(
        salt,
        formulaOf([line('sodium-chloride', '0.45 %')]),
        formulaOf([line('sodium-chloride', '0.90 %')]),
        formulaOf([line('mannitol', '5 %')]),
      ),
      library,
    )
    expect(marks(rows, 'Sodium chloride')).toEqual(['same', 'differs', 'same', 'differs'])
    expect(rows[0]?.cells[0]?.beneath).toMatch(/900 mg · 100 % of particles · 28\d mOsm\/kg/)
  })

  it('say that overlapping intervals are no difference that is known', () => {
    const rows = resultRows(
      columns(
        salt,
        formulaOf([line('sodium-chloride', '0.905 %')]),
        formulaOf([line('sodium-chloride', '0.45 %')]),
      ),
    )
    expect(marks(rows, 'osmolality, mOsm/kg')).toEqual(['same', 'within', 'differs'])
  })

  it('give no figure for a blocked formula, and its reason', () => {
    const [good, blocked] = columns(salt, formulaOf([line('sodium-chloride', '0,9 %')]))
    expect(good?.blocked).toBeNull()
    expect(blocked?.evaluation).toBeNull()
    expect(blocked?.blocked).toContain('No numbers')
  })
})
