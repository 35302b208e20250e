import 'fake-indexeddb/auto'
import { createStore, set } from 'idb-keyval'
import { beforeEach, describe, expect, it } from 'vitest'
import { browserFormulas, shelfRefusal, type KeptFormula } from '../../../src/app/storage/formulas.ts'

const record = (id: string, stamp: string): KeptFormula => ({
  id,
  title: id,
  archived: false,
  stamp,
  versions: [{ stamp: `${stamp} v`, at: 1, note: '', document: '{}' }],
})

beforeEach(async () => {
  const store = browserFormulas()
  const { formulas } = await store.all()
  await store.exchange(formulas.map((before) => ({ before, after: null })))
})

describe('the shelf in the browser’s own database', () => {
  it('keeps, changes and removes', async () => {
    const store = browserFormulas()
    const first = record('a', '1')
    expect(await store.exchange([{ before: null, after: first }])).toBe(true)
    const second = record('a', '2')
    expect(await store.exchange([{ before: first, after: second }])).toBe(true)
    expect((await browserFormulas().all()).formulas).toEqual([second])
    expect(await store.exchange([{ before: second, after: null }])).toBe(true)
    expect((await store.all()).formulas).toEqual([])
  })

  it('changes nothing when one of several is not as expected', async () => {
    const store = browserFormulas()
    const a = record('a', '1')
    await store.exchange([{ before: null, after: a }])
    const outdated = record('a', '0')
    const exchanges = [
      { before: null, after: record('b', '1') },
      { before: outdated, after: record('a', '3') },
    ]
    expect(await store.exchange(exchanges)).toBe(false)
    expect(await store.exchange([{ before: null, after: record('a', '4') }])).toBe(false)
    expect((await store.all()).formulas).toEqual([a])
  })

  it('leaves what it cannot read as it is, and counts it', async () => {
    await set('strange', { title: 7 }, createStore('evenwater shelf', 'formulas'))
    const { formulas, unreadable } = await browserFormulas().all()
    expect({ formulas, unreadable }).toEqual({ formulas: [], unreadable: 1 })
    expect(await browserFormulas().exchange([{ before: null, after: record('strange', '1') }])).toBe(false)
  })

  it('has a plain sentence for a full and for a denied storage', () => {
    expect(shelfRefusal(new DOMException('', 'QuotaExceededError'))).toContain('full')
    expect(shelfRefusal(new DOMException('', 'SecurityError'))).toContain('does not let')
  })
})
