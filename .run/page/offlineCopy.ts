import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Plugin } from 'vite'
import type { PageCopy } from '../../src/app/offline/copy.ts'
import { filesBelow, pageFile, read, serviceWorkerFile, sha256, singleFile } from './files.ts'

/** Not part of the page: the worker that keeps the copy, and the file that stands for itself. */
const left: ReadonlySet<string> = new Set([serviceWorkerFile, singleFile])

/** What the copy of a built page consists of, each file with the hash of its content. */
export function copyOf(folder: string): PageCopy {
  const files = filesBelow(folder)
    .filter((path) => !left.has(path))
    .map((path) => ({
      path: path === pageFile ? '' : path,
      sha256: sha256(readFileSync(join(folder, path))),
    }))
  return { version: sha256(JSON.stringify(files)).slice(0, 16), files }
}

/** Builds the service worker and tells it which files it keeps, once all of them are written. */
export function offlineCopy(source: string): Plugin {
  return {
    name: 'offline-copy',
    apply: 'build',
    buildStart() {
      this.emitFile({ type: 'chunk', id: source, fileName: serviceWorkerFile })
    },
    writeBundle: {
      order: 'post',
      sequential: true,
      handler({ dir }, bundle) {
        const built = bundle[serviceWorkerFile]
        if (!dir || built?.type !== 'chunk') return this.error('The service worker was not built.')
        if (built.imports.length > 0) return this.error('The service worker has to be one file.')
        const list = `const pageCopy=${JSON.stringify(copyOf(dir))};`
        writeFileSync(join(dir, serviceWorkerFile), list + read(dir, serviceWorkerFile))
      },
    },
  }
}
