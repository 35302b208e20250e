import { array, asyncProperty, assert, constantFrom, integer, nat, record, string } from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checksumOf } from '../../../src/app/transfer/checksum.ts'
import { readLink, writeLink } from '../../../src/app/transfer/formulaLink.ts'
import { textOfBytes } from '../../../src/app/transfer/base64url.ts'
import { emptyFormula, writeFormula } from '../../../src/formula/document.ts'
import { routeIds } from '../../../src/formula/types.ts'
import { full } from '../../formula/samples.ts'

const bytes = (text: string) => new TextEncoder().encode(text)

async function linkOf(text: string, checksum = checksumOf(bytes(text)), notation = '1') {
  const stream = new Blob([text]).stream().pipeThrough(new CompressionStream('deflate-raw'))
  const packed = new Uint8Array(await new Response(stream).arrayBuffer())
  return `#formula=${notation}.${checksum}.${textOfBytes(packed)}`
}

describe('a link that carries a formula', () => {
  it('gives back every field there is', async () => {
    const read = await readLink(await writeLink(full))
    expect(read.ok && writeFormula(read.formula)).toBe(writeFormula(full))
  })

  it('gives back any formula, whatever is written in it', async () => {
    const text = string({ unit: 'grapheme', maxLength: 80 })
    const anyFormula = record({
      title: text,
      route: constantFrom(...routeIds),
      notes: text,
      pH: integer({ min: 0, max: 14 }),
      amounts: array(text, { maxLength: 30 }),
    })
    await assert(
      asyncProperty(anyFormula, async ({ amounts, ...fields }) => {
        const lines = amounts.map((amount, index) => ({ key: `k${index}`, ingredient: 'mannitol', amount }))
        const formula = { ...emptyFormula(), ...fields, lines }
        const link = await writeLink(formula)
        expect(link).toMatch(/^#formula=1\.[0-9a-f]{8}\.[\w-]+$/)
        const read = await readLink(link)
        expect(read.ok && writeFormula(read.formula)).toBe(writeFormula(formula))
      }),
      { numRuns: 100 },
    )
  })

  it('is refused with any one letter changed, and cut anywhere', async () => {
    const link = await writeLink(full)
    const letters = [...'ABCXYZabcxyz0189-_.'].join('')
    await assert(
      asyncProperty(nat(link.length - 10), nat(letters.length - 1), async (place, letter) => {
        const at = 9 + place
        const changed = `${link.slice(0, at)}${letters[letter]}${link.slice(at + 1)}`
        const read = await readLink(changed)
        // The last letter carries unused bits: another letter there may be the same document.
        if (read.ok) expect(writeFormula(read.formula)).toBe(writeFormula(full))
        else expect(read.reason).toMatch(/damaged|newer/)
        const cut = await readLink(link.slice(0, at))
        expect(cut.ok).toBe(false)
      }),
      { numRuns: 300 },
    )
  })

  it('is refused politely when it is newer, in its notation or in its document', async () => {
    const newerNotation = await linkOf(writeFormula(full), undefined, '2')
    expect(await readLink(newerNotation)).toMatchObject({
      ok: false,
      reason: expect.stringContaining('newer version'),
    })
    const newerDocument = await linkOf('{"format":"evenwater.formula","version":99}')
    expect(await readLink(newerDocument)).toMatchObject({
      ok: false,
      reason: expect.stringContaining('version 99'),
    })
  })

  it('is refused when it is something else', async () => {
    for (const fragment of [
      '#formula=',
      '#formula=1',
      '#formula=1.00000000.',
      '#formula=1.x.%%%',
      '#formula=0.a.b',
    ]) {
      expect((await readLink(fragment)).ok, fragment).toBe(false)
    }
    expect(await readLink(await linkOf('{"hello":1}'))).toMatchObject({ ok: false })
    expect((await readLink(await linkOf(writeFormula(full), '00000000'))).ok).toBe(false)
  })

  it('that unfolds without end is broken off', async () => {
    const bomb = await linkOf(' '.repeat(40_000_000))
    expect(bomb.length).toBeLessThan(60_000)
    const before = performance.now()
    expect((await readLink(bomb)).ok).toBe(false)
    expect(performance.now() - before).toBeLessThan(2000)
  })
})

describe('the checksum', () => {
  it('is the one of the worked value', () => {
    expect(checksumOf(bytes('123456789'))).toBe('cbf43926')
    expect(checksumOf(bytes(''))).toBe('00000000')
  })
})
