import { createHash } from 'node:crypto'
import { readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'

/** The page and the one file that holds all of it. */
export const pageFile = 'index.html'
export const singleFile = 'evenwater.html'
export const serviceWorkerFile = 'service-worker.js'

/** Every file below a folder, as paths with slashes, in order. */
export function filesBelow(folder: string, below = ''): readonly string[] {
  return readdirSync(join(folder, below), { withFileTypes: true })
    .flatMap((entry) => {
      const path = below === '' ? entry.name : `${below}/${entry.name}`
      return entry.isDirectory() ? filesBelow(folder, path) : [path]
    })
    .toSorted()
}

export const sha256 = (content: string | Uint8Array): string =>
  createHash('sha256').update(content).digest('hex')

export const read = (folder: string, path: string): string => readFileSync(join(folder, path), 'utf8')
