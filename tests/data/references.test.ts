import { describe, expect, it } from 'vitest'
import { loadLibrary } from '../../src/library/library.ts'
import { dataFiles, objectsIn } from './files.ts'

const { ingredients } = loadLibrary()

describe('what data files say about each other', () => {
  it('names only ingredients that are in the library', () => {
    const strangers = dataFiles().flatMap(({ name, content }) =>
      [...objectsIn(content)]
        .map(({ path, object }) => ({ path, id: object['ingredient'] }))
        .filter(({ id }) => typeof id === 'string' && !ingredients.has(id))
        .map(({ path, id }) => `${name}${path}: ${id}`),
    )
    expect(strangers).toEqual([])
  })

  it('has every ingredient that the demo orders and vehicles use', () => {
    const used = dataFiles().flatMap(({ content }) =>
      [...objectsIn(content)].filter(({ object }) => typeof object['ingredient'] === 'string'),
    )
    expect(used.length).toBeGreaterThan(20)
  })
})
