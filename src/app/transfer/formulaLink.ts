import { longestDocument, readFormulaText, writeFormula } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'
import { checksumOf } from './checksum.ts'
import { bytesOf, textOfBytes } from './base64url.ts'
import { linkStart } from './linkStart.ts'

/* The fragment: #formula=<version of this notation>.<checksum of the document>.<document, compressed>. A browser
   sends no fragment to any server. */

const thisNotation = 1
const longestLink = 200_000

export type LinkRead =
  | { readonly ok: true; readonly formula: Formula; readonly notices: readonly string[] }
  | { readonly ok: false; readonly reason: string }

/** The whole formula as the fragment of an address. */
export async function writeLink(formula: Formula): Promise<string> {
  const document = new TextEncoder().encode(JSON.stringify(JSON.parse(writeFormula(formula))))
  const packed = await collected(through(document, new CompressionStream('deflate-raw')), Infinity)
  return `${linkStart}${thisNotation}.${checksumOf(document)}.${textOfBytes(packed)}`
}

const refused = (reason: string): LinkRead => ({ ok: false, reason })

const damaged = refused('The link is damaged or cut short. Ask for it again, or for the formula as a file.')

/** Reads such a fragment. One letter changed on the way and it is refused: its checksum is not the document's. */
export async function readLink(fragment: string): Promise<LinkRead> {
  const [notation, checksum, packed, ...more] = fragment.slice(linkStart.length).split('.')
  if (/^[1-9]\d{0,5}$/.test(notation ?? '') && Number(notation) > thisNotation) {
    return refused('The link was made by a newer version of Evenwater. Open it with that version.')
  }
  if (notation !== String(thisNotation) || !checksum || !packed || more.length > 0) return damaged
  if (fragment.length > longestLink) return refused('The link is far too long to be a formula.')
  const text = await unpacked(packed, checksum)
  if (text === null) return damaged
  const read = readFormulaText(text)
  return read.ok ? read : refused(`${read.refusal.message} ${read.refusal.wayOut}`)
}

async function unpacked(packed: string, checksum: string): Promise<string | null> {
  const bytes = bytesOf(packed)
  if (!bytes) return null
  try {
    const document = await collected(
      through(bytes, new DecompressionStream('deflate-raw')),
      longestDocument * 3,
    )
    if (checksumOf(document) !== checksum) return null
    return new TextDecoder('utf-8', { fatal: true }).decode(document)
  } catch {
    return null
  }
}

const through = (
  bytes: Uint8Array<ArrayBuffer>,
  stream: CompressionStream | DecompressionStream,
): ReadableStream<Uint8Array> => new Blob([bytes]).stream().pipeThrough(stream)

/** What comes out of the stream, up to `most` bytes: a small link that unfolds without end is broken off. */
async function collected(stream: ReadableStream<Uint8Array>, most: number): Promise<Uint8Array<ArrayBuffer>> {
  const reader = stream.getReader()
  const parts: Uint8Array<ArrayBuffer>[] = []
  let length = 0
  for (;;) {
    const { done, value } = await reader.read()
    if (done) break
    length += value.length
    if (length > most) {
      await reader.cancel()
      throw new Error('The link unfolds to more than a formula.')
    }
    parts.push(new Uint8Array(value))
  }
  return new Uint8Array(await new Blob(parts).arrayBuffer())
}
