import { describe, expect, it } from 'vitest'
import { loadLibrary } from '../../src/library/library.ts'
import { readIngredient } from '../../src/library/own-ingredient.ts'

const { ingredients } = loadLibrary()
const calcium = ingredients.get('calcium-chloride-dihydrate')
const codeOf = (record: unknown) => {
  const read = readIngredient(record)
  return read.ok ? null : read.refusal.code
}

describe('an ingredient that somebody brings along', () => {
  it('is held to the rules that every ingredient of the library keeps', () => {
    for (const ingredient of ingredients.values()) expect(codeOf(ingredient), ingredient.id).toBeNull()
  })

  it('is refused by name of the mistake', () => {
    expect(codeOf(null)).toBe('ingredient-record-unreadable')
    expect(codeOf('sodium chloride')).toBe('ingredient-record-unreadable')
    expect(codeOf({ ...calcium, remark: '' })).toBe('ingredient-record-unreadable')
    expect(codeOf({ ...calcium, name: 'Calcium chloride' })).toBe('ingredient-id-differs')
    expect(codeOf({ ...calcium, releases: calcium?.releases?.slice(1) })).toBe('ingredient-not-neutral')
    expect(codeOf({ ...calcium, formula: 'CaCl2' })).toBe('ingredient-mass-differs')
    expect(codeOf({ ...calcium, formula: 'calcium' })).toBe('molecular-formula-unreadable')
  })

  it('says where the record is wrong', () => {
    const read = readIngredient({ ...calcium, molarMass: { ...calcium?.molarMass, value: 'heavy' } })
    expect(read.ok ? '' : read.refusal.message).toContain('molarMass.value')
  })
})
