import { readdirSync, readFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'

const dataFolder = join(dirname(dirname(dirname(fileURLToPath(import.meta.url)))), 'data')

export interface DataFile {
  /** Below data/, without the ending. */
  readonly name: string
  readonly content: unknown
}

/** Every JSON file under data/, read from disk: what no loader imports is seen too. */
export function dataFiles(folder = dataFolder): DataFile[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name)
    if (entry.isDirectory()) return dataFiles(path)
    if (!entry.name.endsWith('.json')) return []
    const name = relative(dataFolder, path)
      .replaceAll('\\', '/')
      .replace(/\.json$/, '')
    return [{ name, content: JSON.parse(readFileSync(path, 'utf8')) as unknown }]
  })
}

/** Every object in a file, with the path that leads to it. */
export function* objectsIn(
  value: unknown,
  path = '',
): Generator<{ path: string; object: Record<string, unknown> }> {
  if (Array.isArray(value)) {
    for (const [index, item] of value.entries()) yield* objectsIn(item, `${path}[${index}]`)
  } else if (typeof value === 'object' && value !== null) {
    const object = value as Record<string, unknown>
    yield { path, object }
    for (const [key, item] of Object.entries(object)) yield* objectsIn(item, `${path}.${key}`)
  }
}
