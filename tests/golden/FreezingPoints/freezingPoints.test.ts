import { describe, expect, it } from 'vitest'
import { freezingDepression } from '../../../src/chemistry/activity/freezing.ts'
import { rowsOf } from '../support/rows.ts'
import { solutionOf } from '../support/salts.ts'
import content from './named.json'

interface Exception {
  readonly row: string
  readonly table: number
  readonly ours: number
  readonly fault: 'table' | 'model'
  readonly cause: string
}

const formulas: Readonly<Record<string, string>> = content.formulas
/* What was fitted, or chosen, by which rows: those check nothing here. */
const fitted = new Set(
  Object.entries(content.fitted).flatMap(([solute, rows]) => rows.map((row) => `${solute} ${row}`)),
)
const exceptions = content.exceptions as readonly Exception[]

const checks = rowsOf(new URL('rows.csv', import.meta.url))
  .map(({ solute = '', massPercent = '', molality = '', depression = '' }) => ({
    row: `${solute} ${massPercent}`,
    table: Number(depression),
    formula: formulas[solute] ?? '',
    molality: Number(molality),
  }))
  .filter(({ row }) => !fitted.has(row))
  .map(({ row, table, formula, molality }) => {
    const { osmolalityOsmPerKg } = solutionOf(formula, molality).states.freezing
    const ours = freezingDepression(osmolalityOsmPerKg)
    return { row, table, ours, within: Math.abs(ours - table) <= 0.006 + 0.01 * table }
  })

describe('tabulated freezing-point depressions, through the whole chemistry', () => {
  it('within 0.006 K and 1 %, or named with both numbers and the cause', () => {
    const beyond = checks.filter(({ within }) => !within)
    const lines = (rows: readonly { row: string; table: number; ours: number }[]) =>
      rows.map(({ row, table, ours }) => `${row}: table ${table}, ours ${ours.toFixed(3)}`)
    expect(lines(beyond)).toEqual(lines(exceptions))
    expect(exceptions.every(({ cause }) => cause.length > 30)).toBe(true)
  })

  it('95 of 100 of the rows that the table itself does not contradict', () => {
    const faulty = new Set(exceptions.filter(({ fault }) => fault === 'table').map(({ row }) => row))
    const sound = checks.filter(({ row }) => !faulty.has(row))
    expect(sound.filter(({ within }) => within).length / sound.length).toBeGreaterThanOrEqual(0.95)
  })

  it('leaves out only rows that are there, and half at least check', () => {
    const all = new Set(
      rowsOf(new URL('rows.csv', import.meta.url)).map(
        ({ solute, massPercent }) => `${solute} ${massPercent}`,
      ),
    )
    expect([...fitted].filter((row) => !all.has(row))).toEqual([])
    expect(checks.length).toBeGreaterThan(all.size / 2)
  })
})
