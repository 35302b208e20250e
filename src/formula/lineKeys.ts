import type { Read } from '../quantity/amount.ts'
import { accept, quote, refuse } from '../quantity/refusal.ts'
import { isPlainObject, type PlainObject } from './plainObject.ts'

/** Gives the lines that have no key one by their place, and refuses a key that stands twice. */
export function withLineKeys(content: PlainObject): Read<PlainObject> {
  if (!Array.isArray(content.lines)) return accept(content)
  const lines: readonly unknown[] = content.lines
  const taken = new Set<unknown>()
  for (const line of lines) {
    if (!isPlainObject(line) || line.key === undefined) continue
    if (taken.has(line.key)) {
      return refuse(
        'line-key-repeated',
        `Two lines have the key ${quote(String(line.key))}.`,
        'Give each line its own key, or none.',
      )
    }
    taken.add(line.key)
  }
  const freeKey = (place: number): string => {
    const key = `line-${place}`
    if (taken.has(key)) return freeKey(place + 1)
    taken.add(key)
    return key
  }
  const keyed = (line: unknown, index: number): unknown =>
    isPlainObject(line) && line.key === undefined ? { ...line, key: freeKey(index + 1) } : line
  return accept({
    ...content,
    lines: lines.map(keyed),
  })
}
