import { readFileSync, readdirSync } from 'node:fs'
import { dirname, join, relative, sep } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { breaches, rooms, type SourceFile } from './architecture.ts'

const root = dirname(dirname(fileURLToPath(import.meta.url)))

function sourceFiles(folder: string): SourceFile[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name)
    if (entry.isDirectory()) return sourceFiles(path)
    if (!/\.tsx?$/.test(entry.name)) return []
    return [{ path: relative(root, path).split(sep).join('/'), text: readFileSync(path, 'utf8') }]
  })
}

const written = (path: string, text: string): SourceFile => ({ path, text })

describe('the ladder of rooms', () => {
  it('is kept by every file in src', () => {
    const files = sourceFiles(join(root, 'src'))
    expect(files.length).toBeGreaterThan(40)
    expect(files.flatMap(breaches)).toEqual([])
  })

  it('fails on an upward import, on a type import too, and on a re-export or a dynamic import', () => {
    for (const text of [
      `import { evaluate } from '../evaluation/evaluate.ts'`,
      `import type { Evaluation } from '../evaluation/types.ts'`,
      `import { type Evaluation } from '../evaluation/types.ts'`,
      `export type { Evaluation } from '../evaluation/types.ts'`,
      `type E = import('../evaluation/types.ts').Evaluation`,
      `const later = import('../evaluation/evaluate.ts')`,
    ]) {
      expect(breaches(written('src/chemistry/sample.ts', text)), text).toHaveLength(1)
    }
  })

  it('lets a room import from those above it', () => {
    expect(
      breaches(written('src/chemistry/sample.ts', `import { findRoot } from '../numeric/roots.ts'`)),
    ).toEqual([])
  })

  it('lets only the library read data', () => {
    const text = `import raw from '../../data/routes/routes.json'`
    expect(breaches(written('src/chemistry/sample.ts', text))).toHaveLength(1)
    expect(breaches(written('src/library/sample.ts', text))).toEqual([])
  })
})

describe('purity', () => {
  it('keeps clock, randomness, console, DOM and React out of the pure rooms', () => {
    for (const text of [
      `export const now = () => Date.now()`,
      `export const dice = () => Math.random()`,
      `console.log('x')`,
      `export const width = () => window.innerWidth`,
      `export const where = () => document.title`,
      `import { useState } from 'react'`,
      `import { readFileSync } from 'node:fs'`,
    ]) {
      expect(breaches(written('src/evaluation/sample.ts', text)), text).toHaveLength(1)
    }
  })

  it('casts to a brand in one file only', () => {
    const text = `import type { Grams } from './brand.ts'\nexport const g = (n: number) => n as Grams`
    expect(breaches(written('src/quantity/other.ts', text))).toHaveLength(1)
    expect(breaches(written('src/quantity/mint.ts', text))).toEqual([])
  })
})

describe('size caps', () => {
  const lines = (count: number) => Array.from({ length: count }, (_, index) => `const a${index} = ${index}`)

  it('allows 400 lines in a file and not one more', () => {
    expect(breaches(written('src/numeric/sample.ts', lines(400).join('\n')))).toEqual([])
    expect(breaches(written('src/numeric/sample.ts', lines(401).join('\n')))).toHaveLength(1)
  })

  it('allows 60 lines in a function and not one more', () => {
    const body = (count: number) => `function long() {\n${lines(count - 2).join('\n')}\n}`
    expect(breaches(written('src/numeric/sample.ts', body(60)))).toEqual([])
    expect(breaches(written('src/numeric/sample.ts', body(61)))).toHaveLength(1)
  })
})

describe('the house', () => {
  it('has its eight rooms and nothing else in src but the page and its types', () => {
    const entries = readdirSync(join(root, 'src'), { withFileTypes: true })
    expect(
      entries
        .filter((entry) => entry.isDirectory())
        .map((entry) => entry.name)
        .sort(),
    ).toEqual([...rooms].sort())
  })
})
