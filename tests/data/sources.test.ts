import { readdirSync, readFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { libraryContent } from '../../src/library/content.ts'
import { loadSources, sourceFiles } from '../../src/library/sources.ts'
import { dataFiles, objectsIn } from './files.ts'

const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))))
const sources = loadSources()
/* Saved orders hold typed text under the key "value"; they are formulas, not data. */
const files = dataFiles().filter(({ name }) => !name.startsWith('demos/'))
const data = files.filter(({ name }) => !name.startsWith('sources/'))

const codeText = (folder: string): string =>
  readdirSync(folder, { withFileTypes: true })
    .map((entry) => {
      const path = join(folder, entry.name)
      if (entry.isDirectory()) return codeText(path)
      return /\.tsx?$/.test(entry.name) ? readFileSync(path, 'utf8') : ''
    })
    .join('\n')

describe('sources', () => {
  it('are all loaded', () => {
    const onDisk = files.filter(({ name }) => name.startsWith('sources/')).map(({ name }) => name.slice(8))
    expect(Object.keys(sourceFiles).sort()).toEqual(onDisk.sort())
  })

  it('exist for every use', () => {
    const missing = data.flatMap(({ name, content }) =>
      [...objectsIn(content)]
        .filter(({ object }) => 'source' in object)
        .filter(({ object }) => typeof object['source'] !== 'string' || !sources.has(object['source']))
        .map(({ path, object }) => `${name}${path}: ${JSON.stringify(object['source'])}`),
    )
    expect(missing).toEqual([])
  })

  it('are all used', () => {
    const used = new Set<unknown>()
    for (const { content } of data) {
      for (const { object } of objectsIn(content)) {
        for (const [key, value] of Object.entries(object)) if (/source/i.test(key)) used.add(value)
      }
    }
    /* A docstring that names the key of its source is a use. */
    const code = codeText(join(root, 'src'))
    expect(
      [...sources.keys()].filter((key) => !used.has(key) && !new RegExp(`\\b${key}\\b`).test(code)),
    ).toEqual([])
  })

  it('say nothing twice', () => {
    const titles = [...sources.values()].map(({ title }) => title)
    expect(titles.filter((title, index) => titles.indexOf(title) !== index)).toEqual([])
  })
})

describe('every value', () => {
  it('has unit, kind, source, confidence and says whether it is recalled', () => {
    const bare = data.flatMap(({ name, content }) =>
      [...objectsIn(content)]
        .filter(({ object }) => ['number', 'string'].includes(typeof object['value']))
        .filter(
          ({ object }) =>
            !object['unit'] ||
            !object['kind'] ||
            !object['source'] ||
            !object['confidence'] ||
            !('fromMemory' in object),
        )
        .map(({ path }) => `${name}${path}`),
    )
    expect(bare.slice(0, 20)).toEqual([])
  })

  it('that stands as from memory alone says so', () => {
    const wrong = data.flatMap(({ name, content }) =>
      [...objectsIn(content)]
        .filter(({ object }) => 'value' in object && 'fromMemory' in object)
        .filter(({ object }) => object['source'] === 'from-memory' && object['fromMemory'] !== true)
        .map(({ path }) => `${name}${path}`),
    )
    expect(wrong).toEqual([])
  })
})

describe('the mark of the library', () => {
  it('covers every data file', () => {
    expect(Object.keys(libraryContent()).sort()).toEqual(files.map(({ name }) => name).sort())
  })
})

describe('the check itself', () => {
  it('sees a value without a unit, at any depth', () => {
    const found = [...objectsIn({ a: [{ value: 1, kind: 'measured', source: 'x' }] })]
    expect(found.filter(({ object }) => 'value' in object && !object['unit'])).toHaveLength(1)
  })
})
