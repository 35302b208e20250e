import { gzipSync } from 'node:zlib'
import type { Plugin } from 'vite'
import { pageFile } from './files.ts'

/** The one place of the budget: what is loaded before the first keystroke can be taken, gzipped, in kB of 1000 bytes. */
export const firstLoadBudgetKb = 220

export interface BuiltFile {
  readonly fileName: string
  readonly content: string | Uint8Array
  /** Files without which it does not start. */
  readonly needs: readonly string[]
}

export interface Weighed {
  readonly fileName: string
  readonly kb: number
}

/** The page, and what it needs before it starts, gzipped, heaviest first. Throws when a needed file is missing. */
export function firstLoad(files: readonly BuiltFile[], start: string): readonly Weighed[] {
  const byName = new Map(files.map((file) => [file.fileName, file]))
  const needed = new Map<string, Weighed>()
  const walk = (fileName: string) => {
    if (needed.has(fileName)) return
    const file = byName.get(fileName)
    if (!file) throw new Error(`${fileName} is needed by the page and was not built.`)
    needed.set(fileName, { fileName, kb: gzipSync(file.content, { level: 9 }).length / 1000 })
    file.needs.forEach(walk)
  }
  walk(start)
  return [...needed.values()].toSorted((one, other) => other.kb - one.kb)
}

export const totalKb = (files: readonly Weighed[]): number => files.reduce((sum, { kb }) => sum + kb, 0)

/** Files that a page names in its head and that hold up its start. */
export const namedIn = (page: string): readonly string[] =>
  [
    ...page.matchAll(
      /<(?:script|link rel="stylesheet"|link rel="modulepreload")[^>]*?(?:src|href)="\.\/([^"]+)"/g,
    ),
  ].flatMap(([, path]) => path ?? [])

/** Fails the build when the page needs more than its budget before it can be typed into. */
export function firstLoadBudget(budgetKb = firstLoadBudgetKb): Plugin {
  return {
    name: 'first-load-budget',
    apply: 'build',
    generateBundle: {
      order: 'post',
      handler(_options, bundle) {
        const files = Object.values(bundle).map((file): BuiltFile => {
          if (file.type === 'chunk') {
            return { fileName: file.fileName, content: file.code, needs: file.imports }
          }
          const isPage = file.fileName === pageFile
          return {
            fileName: file.fileName,
            content: file.source,
            needs: isPage ? namedIn(String(file.source)) : [],
          }
        })
        const needed = firstLoad(files, pageFile)
        const total = totalKb(needed)
        const said = `First load ${total.toFixed(1)} of ${budgetKb} kB gzipped, ${needed.length} files`
        if (total <= budgetKb) return this.info(said)
        const heaviest = needed.slice(0, 8).map(({ fileName, kb }) => `  ${kb.toFixed(1)} kB  ${fileName}`)
        return this.error(`${said}: over the budget.\n${heaviest.join('\n')}`)
      },
    },
  }
}
