import { readFileSync } from 'node:fs'
import { expect, it } from 'vitest'
import { library } from './contexts.ts'

const readme = readFileSync(new URL('../../../data/cautions/README.md', import.meta.url), 'utf8')
const rows = readme.split('\n').filter((row) => row.startsWith('| ') && !/^\| (rule|-)/.test(row))

it('rules without a caution say why, and name only findings that exist', () => {
  expect(rows.length).toBeGreaterThan(20)
  expect(rows.filter((row) => (row.split('|')[2] ?? '').trim() === '')).toEqual([])
  const named = rows.flatMap((row) => [...row.matchAll(/`([a-z0-9-]+)`/g)].map(([, code]) => code ?? ''))
  expect(named.length).toBeGreaterThan(20)
  expect(named.filter((code) => !library.findings.has(code))).toEqual([])
})
