import { describe, expect, it } from 'vitest'
import {
  emptyFormula,
  longestDocument,
  readFormula,
  readFormulaText,
  writeFormula,
} from '../../src/formula/document.ts'
import { placeInWords } from '../../src/formula/places.ts'
import { longestAmount, mostLines } from '../../src/formula/schema.ts'
import type { Formula } from '../../src/formula/types.ts'
import { broken, brokenBeyondSchema, changed, full, least } from './samples.ts'

function taken(document: unknown): { formula: Formula; notices: readonly string[] } {
  const read = readFormula(document)
  if (!read.ok) throw new Error(read.refusal.message)
  return read
}

describe('reading a formula', () => {
  it('takes the least a file may hold', () => {
    expect(taken(least)).toMatchObject({ formula: { ...least, title: '' }, notices: [] })
  })

  it('takes a document with every field and changes nothing in it', () => {
    expect(taken(full)).toMatchObject({ formula: full, notices: [] })
  })

  it('answers the examples', () => {
    const wayOut = 'Choose a file that was saved as a formula.'
    expect(readFormula([])).toEqual({
      ok: false,
      refusal: { code: 'not-a-formula', message: 'This is not a formula.', wayOut },
    })
    expect(readFormulaText('{')).toEqual({
      ok: false,
      refusal: { code: 'not-json', message: 'The text is not JSON.', wayOut },
    })
    expect(placeInWords(['lines', 2, 'amount'])).toBe('The amount of line 3')
  })

  it.each([...broken, ...brokenBeyondSchema])('refuses %s in a plain sentence', (_what, document, named) => {
    const read = readFormula(document)
    if (read.ok) throw new Error('It was read.')
    expect(read.refusal.message).toContain(named)
    expect(read.refusal.message).toMatch(/^[A-Z].*\.$/s)
    expect(read.refusal.message).not.toMatch(/Invalid|undefined|\[object|Expected/)
    expect(read.refusal.wayOut).toMatch(/\.$/)
  })

  it('gives lines without a key one by their place, past those that are taken', () => {
    const line = { ingredient: 'sodium-chloride', amount: '1 %' }
    const { formula } = taken({ ...least, lines: [line, { ...line, key: 'line-3' }, line, line] })
    expect(formula.lines.map(({ key }) => key)).toEqual(['line-1', 'line-3', 'line-4', 'line-5'])
  })

  it('keeps an amount of the greatest length and 500 lines', () => {
    const line = { ingredient: 'sodium-chloride', amount: '1'.repeat(longestAmount) }
    const lines = Array.from({ length: mostLines }, () => line)
    expect(taken({ ...least, lines }).formula.lines).toHaveLength(500)
  })

  it('leaves out what it does not know and says so', () => {
    const { formula, notices } = taken({
      ...least,
      colour: 'red',
      target: { quantity: 'osmolality', value: '290 mOsm/kg', by: 'me' },
      lines: [{ ingredient: 'x', amount: '1 %', size: 3 }],
    })
    expect(Object.keys(formula)).not.toContain('colour')
    expect(notices).toEqual([
      'Left out, because this version does not know it: “lines.0.size”, “colour”, “target.by”.',
    ])
  })

  it('names only the first of very many', () => {
    const many = Object.fromEntries(Array.from({ length: 1000 }, (_, index) => [`k${index}`, 1]))
    const { notices } = taken({ ...many, ...least })
    expect(notices).toHaveLength(1)
    expect(notices[0]?.length).toBeLessThan(200)
    expect(notices[0]).toContain('and 995 more')
  })
})

describe('hostile text', () => {
  it('cannot reach the prototype of objects', () => {
    const text = JSON.stringify(full).replace(
      '"title"',
      '"__proto__":{"polluted":true},"constructor":{"prototype":{"polluted":true}},"toString":1,"title"',
    )
    const read = readFormulaText(text)
    if (!read.ok) throw new Error(read.refusal.message)
    expect(Object.getPrototypeOf(read.formula)).toBe(Object.prototype)
    expect('polluted' in read.formula).toBe(false)
    expect('polluted' in {}).toBe(false)
    expect(writeFormula(read.formula)).not.toContain('polluted')
    expect(read.notices[0]).toContain('__proto__')
  })

  it('is refused when too large, when nested deeply, when not JSON', () => {
    const code = (text: string) => {
      const read = readFormulaText(text)
      return read.ok ? 'read' : read.refusal.code
    }
    expect(code(' '.repeat(longestDocument + 1))).toBe('too-large')
    expect(code('['.repeat(1_000_000))).toBe('not-json')
    expect(code('['.repeat(500_000) + ']'.repeat(500_000))).toMatch(/^not-/)
    expect(code('NaN')).toBe('not-json')
    expect(code('')).toBe('not-json')
    const nested = `${'{"a":'.repeat(100_000)}1${'}'.repeat(100_000)}`
    const document = JSON.stringify(least).replace('"lines":[]', `"lines":[],"notes":${nested}`)
    expect(code(document)).toMatch(/^(not-json|formula-unreadable)$/)
  })

  it('with a number beyond all numbers is refused', () => {
    const text = JSON.stringify({ ...least, pH: 0 }).replace('"pH":0', '"pH":1e999')
    expect(readFormulaText(text)).toMatchObject({ ok: false, refusal: { code: 'formula-unreadable' } })
  })
})

describe('writing a formula', () => {
  it('gives back what was read', () => {
    const read = readFormulaText(writeFormula(full))
    expect(read).toEqual({ ok: true, formula: full, notices: [] })
  })

  it('does not depend on the order of the keys', () => {
    const turned = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(turned)
      if (typeof value !== 'object' || value === null) return value
      return Object.fromEntries(
        Object.entries(value)
          .reverse()
          .map(([key, part]) => [key, turned(part)]),
      )
    }
    expect(writeFormula(turned(full) as Formula)).toBe(writeFormula(full))
  })

  it('writes nothing for what is undefined', () => {
    expect(writeFormula(changed(full, { pH: undefined }) as Formula)).not.toContain('"pH"')
  })

  it('starts from an empty sheet that can be read', () => {
    expect(taken(emptyFormula()).formula).toEqual(emptyFormula())
    expect(emptyFormula().lines).toEqual([])
  })
})
