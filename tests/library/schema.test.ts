import * as v from 'valibot'
import { describe, expect, it } from 'vitest'
import { checked } from '../../src/library/checked.ts'
import { contentMark } from '../../src/library/content-mark.ts'
import { loadIngredients } from '../../src/library/ingredients.ts'
import { ingredientSchema, sourceSchema } from '../../src/library/schema.ts'

const [sample] = loadIngredients()

describe('the shape of an ingredient', () => {
  it('takes every record of the library', () => {
    expect(loadIngredients().every((ingredient) => v.is(ingredientSchema, ingredient))).toBe(true)
  })

  it('refuses an unknown key, a missing unit, a wrong kind, NaN, an empty source, a share above one', () => {
    const mass = sample?.molarMass
    const wrong = [
      { ...sample, colour: 'white' },
      { ...sample, molarMass: { ...mass, unit: undefined } },
      { ...sample, molarMass: { ...mass, kind: 'guessed' } },
      { ...sample, molarMass: { ...mass, value: Number.NaN } },
      { ...sample, molarMass: { ...mass, value: -1 } },
      { ...sample, molarMass: { ...mass, source: ' ' } },
      { ...sample, molarMass: { ...mass, remark: 'x' } },
      { ...sample, molarMass: { ...mass, alternatives: [{ value: 1 }] } },
      { ...sample, reflection: { ...mass, value: 1.2 } },
      { ...sample, id: 'Sodium chloride' },
      { ...sample, percentBasis: 'w/w' },
      { ...sample, releases: [{ species: 'Na+', count: 0.5, charge: 1 }] },
      { ...sample, tags: 'sodium' },
    ]
    for (const record of wrong) expect(v.is(ingredientSchema, record), JSON.stringify(record)).toBe(false)
  })

  it('names file, place and reason when it refuses', () => {
    const record = { ...sample, state: 'gas' }
    expect(() => checked(v.array(ingredientSchema), [record], 'ingredients/x')).toThrow(
      /data\/ingredients\/x\.json, 0\.state: .*"gas"/,
    )
  })
})

describe('the shape of a source', () => {
  it('refuses a key with spaces and an unknown kind', () => {
    expect(v.is(sourceSchema, { key: 'A1', title: 'T', kind: 'publication' })).toBe(true)
    expect(v.is(sourceSchema, { key: 'A 1', title: 'T', kind: 'publication' })).toBe(false)
    expect(v.is(sourceSchema, { key: 'A1', title: 'T', kind: 'rumour' })).toBe(false)
  })
})

describe('the mark of content', () => {
  it('is FNV-1a, the same for the same text and another for another', () => {
    expect(contentMark('')).toBe('811c9dc5')
    expect(contentMark('a')).toBe('e40c292c')
    expect(contentMark('foobar')).toBe('bf9cf968')
    expect(contentMark('0.50')).not.toBe(contentMark('0.51'))
  })
})
