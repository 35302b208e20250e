import { readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { findingFiles } from '../../src/library/findings.ts'
import { library } from './formulas.ts'

const room = fileURLToPath(new URL('../../src/evaluation', import.meta.url))

function filesBelow(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) =>
    entry.isDirectory() ? filesBelow(join(folder, entry.name)) : [join(folder, entry.name)],
  )
}

const text = filesBelow(room)
  .filter((path) => !path.includes('cautions'))
  .map((path) => readFileSync(path, 'utf8'))
  .join('\n')

const own = findingFiles['evaluation'] as readonly { readonly code: string }[]

describe('words of the evaluation room', () => {
  it('exist for every code that it raises', () => {
    const raised = [
      ...text.matchAll(/findingOf\(\s*[\w.]+,\s*'([a-z-]+)'/g),
      ...text.matchAll(/(?:code|reason): '([a-z-]+)'/g),
      ...text.matchAll(/about\('([a-z-]+)'/g),
      ...text.matchAll(/failed\('[a-z-]+', '([a-z-]+)'/g),
    ].map(([, code = '']) => code)
    expect(raised.length).toBeGreaterThan(35)
    const internal = new Set(['missing-for-adjuster'])
    expect([...new Set(raised)].filter((code) => !internal.has(code) && !library.findings.has(code))).toEqual(
      [],
    )
  })

  it('are all raised somewhere', () => {
    expect(own.map(({ code }) => code).filter((code) => !text.includes(`'${code}'`))).toEqual([])
  })
})
