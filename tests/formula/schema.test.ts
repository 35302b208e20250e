import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { readFormula } from '../../src/formula/document.ts'
import { formulaSchema } from '../../src/formula/schema.ts'
import { holds, isObject, type JsonSchema } from './jsonSchema.ts'
import { broken, changed, full, least } from './samples.ts'
import { programShape, publishedShape } from './schemaShape.ts'

const published = JSON.parse(
  readFileSync(new URL('../../public/formula.schema.json', import.meta.url), 'utf8'),
) as JsonSchema

/** What the program fills in before it checks, so that a file need not have it. */
function withDefaultsAsOptional(shape: unknown): unknown {
  const whole = structuredClone(shape) as {
    required: string[]
    properties: { lines: { items: { required: string[] } } }
  }
  whole.required = whole.required.filter((key) => key !== 'title')
  const { items } = whole.properties.lines
  items.required = items.required.filter((key) => key !== 'key')
  return whole
}

describe('the published JSON Schema', () => {
  it('says the same as the program, property by property, both ways', () => {
    expect(publishedShape(published, published)).toEqual(withDefaultsAsOptional(programShape(formulaSchema)))
  })

  it('names its draft', () => {
    expect(published.$schema).toBe('https://json-schema.org/draft/2020-12/schema')
  })

  it.each([
    ['the least', least],
    ['one with every field', full],
    ['one with an unknown field', changed(least, { colour: 'red' })],
    ['lines without keys', changed(least, { lines: [{ ingredient: 'x', amount: 'q.s.' }] })],
  ])('takes %s, as the program does', (_what, document) => {
    expect(holds(published, published, document)).toBe(true)
    expect(readFormula(document).ok).toBe(true)
  })

  it.each(broken)('refuses %s, as the program does', (_what, document) => {
    expect(holds(published, published, document)).toBe(false)
    expect(readFormula(document).ok).toBe(false)
  })

  it('refuses a full document with any one required part taken out', () => {
    const required = published.required as string[]
    for (const key of required) {
      expect(holds(published, published, changed(full, { [key]: undefined })), key).toBe(false)
    }
    expect(required.length).toBe(5)
  })

  it('is one that the check of this test understands wholly', () => {
    expect(isObject(published)).toBe(true)
    expect(() => holds(published, { ...published, oneOf: [] }, full)).toThrow('oneOf')
  })
})
