import { array, assert, constantFrom, property, record } from 'fast-check'
import { describe, expect, it } from 'vitest'
import { alignLines } from '../../src/formula/align.ts'
import { compareAmounts, differenceOf } from '../../src/formula/difference.ts'
import { emptyFormula } from '../../src/formula/document.ts'
import type { Formula } from '../../src/formula/types.ts'
import { full } from './samples.ts'

const formulaOf = (
  lines: readonly (readonly [ingredient: string, amount: string, key?: string])[],
): Formula => ({
  ...emptyFormula(),
  lines: lines.map(([ingredient, amount, key], index) => ({ key: key ?? `k${index}`, ingredient, amount })),
})

const anyFormula = array(
  record({ ingredient: constantFrom('a', 'b', 'c', 'd'), amount: constantFrom('1 g', '2 g', 'q.s.', '') }),
  { maxLength: 12 },
).map((lines) => formulaOf(lines.map(({ ingredient, amount }) => [ingredient, amount])))

describe('amounts', () => {
  it('are the same, rewritten or changed', () => {
    expect(compareAmounts('500 mg', '0.5 g')).toBe('rewritten')
    expect(compareAmounts('1 %', '1 % ')).toBe('same')
    expect(compareAmounts('1 %', '1 g')).toBe('changed')
    expect(compareAmounts('0,5 g', '0.5 g')).toBe('changed')
    expect(compareAmounts('1 mg', '1.000001 mg')).toBe('changed')
  })
})

describe('the difference of two formulas', () => {
  it('names what was added, removed, changed and moved', () => {
    const before = formulaOf([
      ['salt', '1 g', 'x'],
      ['urea', '2 g', 'y'],
      ['mannitol', '3 g', 'z'],
    ])
    const after = formulaOf([
      ['mannitol', '3 g', 'z'],
      ['salt', '1000 mg', 'x'],
      ['glycerin', '4 g', 'w'],
    ])
    const told = differenceOf(before, after).lines.map(({ ingredient, amount, moved, ...line }) => [
      ingredient,
      line.before?.place ?? null,
      line.after?.place ?? null,
      amount,
      moved,
    ])
    expect(told).toEqual([
      ['salt', 1, 2, 'rewritten', false],
      ['glycerin', null, 3, 'changed', false],
      ['urea', 2, null, 'changed', false],
      ['mannitol', 3, 1, 'same', true],
    ])
  })

  it('names the fields by their place, one by one', () => {
    const after: Formula = { ...full, title: 'Other', order: { ...full.order, lot: 'L9' } }
    delete (after as { pH?: number }).pH
    expect(differenceOf(full, after).fields).toEqual([
      { place: 'The title', before: 'Demo eye drops', after: 'Other' },
      { place: 'The pH', before: '6.8', after: null },
      { place: 'The order (lot)', before: full.order?.lot ?? null, after: 'L9' },
    ])
  })

  it('is empty only between a formula and itself, and turns around', () => {
    const shown = (formula: Formula) =>
      JSON.stringify(formula.lines.map(({ ingredient, amount }) => [ingredient, amount]))
    assert(
      property(anyFormula, anyFormula, (one, other) => {
        expect(differenceOf(one, one)).toEqual({ lines: [], fields: [] })
        const there = differenceOf(one, other).lines
        const back = differenceOf(other, one).lines
        expect(there.length === 0).toBe(shown(one) === shown(other))
        expect(there.filter((line) => line.before === null)).toHaveLength(
          back.filter((line) => line.after === null).length,
        )
        expect(there.filter((line) => line.moved)).toHaveLength(back.filter((line) => line.moved).length)
      }),
    )
  })

  it('moves no more lines than a person did', () => {
    const names = ['a', 'b', 'c', 'd', 'e', 'f']
    const before = formulaOf(names.map((name) => [name, '1 g', name]))
    const after = formulaOf(['f', 'a', 'b', 'c', 'd', 'e'].map((name) => [name, '1 g', name]))
    expect(differenceOf(before, after).lines.map(({ ingredient }) => ingredient)).toEqual(['f'])
  })
})

describe('lines side by side', () => {
  it('stand by ingredient, each line of each formula once and in a row of its own ingredient', () => {
    assert(
      property(array(anyFormula, { minLength: 1, maxLength: 4 }), (formulas) => {
        const rows = alignLines(formulas)
        formulas.forEach((formula, column) => {
          const placed = rows.flatMap((row) => row.lines[column] ?? [])
          expect(new Set(placed)).toEqual(new Set(formula.lines))
          expect(placed).toHaveLength(formula.lines.length)
        })
        for (const row of rows) {
          expect(row.lines).toHaveLength(formulas.length)
          expect(row.lines.every((line) => line === null || line.ingredient === row.ingredient)).toBe(true)
        }
      }),
    )
  })

  it('put a line that only a later formula has after the one it follows', () => {
    const rows = alignLines([
      formulaOf([
        ['a', '1 g'],
        ['c', '1 g'],
      ]),
      formulaOf([
        ['a', '1 g'],
        ['b', '1 g'],
        ['c', '1 g'],
      ]),
    ])
    expect(rows.map(({ ingredient }) => ingredient)).toEqual(['a', 'b', 'c'])
  })

  it('put formulas that have nothing in common one after the other', () => {
    const rows = alignLines([
      formulaOf([['a', '1 g']]),
      formulaOf([
        ['c', '1 g'],
        ['b', '1 g'],
      ]),
    ])
    expect(rows.map(({ ingredient }) => ingredient)).toEqual(['a', 'c', 'b'])
  })
})
