import { describe, expect, it } from 'vitest'
import { shelfRows } from '../../../src/app/shelf/rows.ts'
import { versionDifference } from '../../../src/app/shelf/versionDifference.ts'
import { emptyFormula, writeFormula } from '../../../src/formula/document.ts'
import type { KeptFormula } from '../../../src/app/storage/formulas.ts'
import { formulaOf, library, line } from '../../evaluation/formulas.ts'

const kept = (id: string, at: number, document: string, note = '', archived = false): KeptFormula => ({
  id,
  title: id,
  archived,
  stamp: id,
  versions: [{ stamp: `${id} 1`, at, note, document }],
})

const withMannitol = writeFormula(formulaOf([line('mannitol', '5 %')]))

describe('the list of the shelf', () => {
  const formulas = [
    kept('old', 1, withMannitol),
    kept('new', 2, writeFormula(emptyFormula()), 'for the night'),
    kept('away', 3, withMannitol, '', true),
    kept('later', 4, '{"format":"evenwater.formula","version":99}'),
  ]
  const found = (text: string, archived = false) =>
    shelfRows(formulas, text, archived, library).map(({ kept: { id } }) => id)

  it('has the one changed last first and leaves out what is archived', () => {
    expect(found('')).toEqual(['later', 'new', 'old'])
    expect(found('', true)).toEqual(['later', 'away', 'new', 'old'])
  })

  it('is searched by title, ingredient and note, all words of them', () => {
    expect(found('MANNI')).toEqual(['old'])
    expect(found('night')).toEqual(['new'])
    expect(found('old mannitol')).toEqual(['old'])
    expect(found('nothing such')).toEqual([])
  })

  it('shows what this version cannot open and does not offer to open it', () => {
    const [later] = shelfRows(formulas, 'later', false, library)
    expect(later?.readable).toBe(false)
  })
})

describe('the difference of two versions in words', () => {
  it('tells lines, fields, results and findings', () => {
    const before = formulaOf([line('sodium-chloride', '0.9 %'), line('mannitol', '1 %')])
    const after = formulaOf([line('sodium-chloride', '0.45 %')], { title: 'Half' })
    const { lines, fields, results, findings } = versionDifference(before, after, library)
    expect(lines.map(({ what, before: was, after: is, how }) => [what, was, is, how])).toEqual([
      ['Sodium chloride', '0.9 %', '0.45 %', 'amount'],
      ['Mannitol', '1 %', '—', 'removed, was line 2'],
    ])
    expect(fields.map(({ what }) => what)).toContain('The title')
    expect(results.map(({ what }) => what)).toEqual(
      expect.arrayContaining(['osmolality, mOsm/kg', 'freezing point, °C']),
    )
    expect(findings.every(({ how }) => how === 'new' || how === 'no longer')).toBe(true)
  })

  it('says why one of them has no figures', () => {
    const before = formulaOf([line('sodium-chloride', '0.9 %')])
    const after = formulaOf([line('sodium-chloride', '0,9 %')])
    const { results, findings } = versionDifference(before, after, library)
    expect(results.find(({ what }) => what.startsWith('osmolality'))?.after).toBe('—')
    expect(findings.some(({ what, how }) => how === 'new' && what.startsWith('No numbers'))).toBe(true)
  })

  it('is empty between a version and itself', () => {
    const formula = formulaOf([line('sodium-chloride', '0.9 %')])
    expect(versionDifference(formula, formula, library)).toEqual({
      lines: [],
      fields: [],
      results: [],
      findings: [],
    })
  })
})
