import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { answerFrom, cacheOf, dropOld, fill, type PageCopy } from '../../../src/app/offline/copy.ts'

const scope = 'https://page.test/sheet/'
const mark = (text: string) => createHash('sha256').update(text).digest('hex')

const copyWith = (version: string, contents: Readonly<Record<string, string>>): PageCopy => ({
  version,
  files: Object.entries(contents).map(([path, text]) => ({ path, sha256: mark(text) })),
})

/** Caches in memory, in the order in which they were opened. */
function memoryCaches() {
  const all = new Map<string, Map<string, Response>>()
  const found = (contents: Map<string, Response> | undefined, address: string) =>
    contents?.get(address)?.clone()
  const caches = {
    open: async (name: string) => {
      const contents = all.get(name) ?? new Map<string, Response>()
      all.set(name, contents)
      return {
        put: async (address: string, response: Response) => void contents.set(address, response),
        match: async (address: string) => found(contents, address),
      }
    },
    keys: async () => [...all.keys()],
    delete: async (name: string) => all.delete(name),
    match: async (address: string) =>
      [...all.values()].map((contents) => found(contents, address)).find((response) => response),
  } as unknown as CacheStorage
  return { caches, names: () => [...all.keys()] }
}

const serving =
  (contents: Readonly<Record<string, string>>): typeof fetch =>
  async (request) => {
    const path = new Request(request).url.slice(scope.length)
    const text = contents[path]
    return text === undefined ? new Response('', { status: 404 }) : new Response(text)
  }

const noNetwork: typeof fetch = () => Promise.reject(new TypeError('no network'))
const textOf = async (answer: Promise<Response>) => (await answer).text()

const contents = { '': '<page>', 'assets/a.js': 'one()' }

describe('a copy of the page', () => {
  it('answers page and parts without a network, the page whatever its query, under both of its names', async () => {
    const { caches } = memoryCaches()
    const copy = copyWith('1', contents)
    await fill(caches, copy, scope, serving(contents))
    for (const path of ['', 'index.html', '?from=home']) {
      const request = new Request(scope + path)
      expect(await textOf(answerFrom(caches, request, scope, noNetwork))).toBe('<page>')
    }
    const part = new Request(`${scope}assets/a.js`)
    expect(await textOf(answerFrom(caches, part, scope, noNetwork))).toBe('one()')
  })

  it('leaves what it does not hold to the network, and its failure too', async () => {
    const { caches } = memoryCaches()
    const copy = copyWith('1', contents)
    await fill(caches, copy, scope, serving(contents))
    const other = new Request(`${scope}evenwater.html`)
    expect(await textOf(answerFrom(caches, other, scope, serving({ 'evenwater.html': 'whole' })))).toBe(
      'whole',
    )
    await expect(answerFrom(caches, other, scope, noNetwork)).rejects.toThrow('no network')
  })

  it('is not kept at all when a file is missing or belongs to another build', async () => {
    const copy = copyWith('1', contents)
    for (const [served, reason] of [
      [{ '': '<page>' }, /answers 404/],
      [{ ...contents, 'assets/a.js': 'two()' }, /belongs to another build/],
    ] as const) {
      const { caches, names } = memoryCaches()
      await expect(fill(caches, copy, scope, serving(served))).rejects.toThrow(reason)
      expect(names()).toEqual([])
    }
  })

  it('keeps the build before it for windows that are still open, and drops older ones and no stranger', async () => {
    const { caches, names } = memoryCaches()
    for (const version of ['1', '2', '3']) await caches.open(cacheOf(copyWith(version, {})))
    await caches.open('somebody else')
    await dropOld(caches, copyWith('3', {}))
    expect(names()).toEqual([cacheOf(copyWith('2', {})), cacheOf(copyWith('3', {})), 'somebody else'])
  })

  it('with its page missing is not yet a whole one, and the earlier build is loaded', async () => {
    const { caches } = memoryCaches()
    await fill(caches, copyWith('1', contents), scope, serving(contents))
    const half = await caches.open(cacheOf(copyWith('2', {})))
    await half.put(`${scope}assets/b.js`, new Response('two()'))
    expect(await textOf(answerFrom(caches, new Request(scope), scope, noNetwork))).toBe('<page>')
  })

  it('lets an older window have its own parts from the older copy', async () => {
    const { caches } = memoryCaches()
    await fill(caches, copyWith('1', contents), scope, serving(contents))
    const next = { '': '<next>', 'assets/b.js': 'two()' }
    const copy = copyWith('2', next)
    await fill(caches, copy, scope, serving(next))
    const old = new Request(`${scope}assets/a.js`)
    expect(await textOf(answerFrom(caches, old, scope, noNetwork))).toBe('one()')
    expect(await textOf(answerFrom(caches, new Request(scope), scope, noNetwork))).toBe('<next>')
  })
})
