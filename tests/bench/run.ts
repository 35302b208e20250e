import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { build } from 'vite'

/*
 * Times the calculation as it is shipped, bundled and without the names that a loader of sources adds to every
 * function. Prints JSON.
 */

const root = join(import.meta.dirname, '../..')
const outDir = join(root, 'node_modules/.cache/evenwater/bench')

await build({
  root,
  configFile: false,
  logLevel: 'error',
  publicDir: false,
  ssr: { noExternal: true },
  build: {
    ssr: 'tests/bench/measure.ts',
    outDir,
    emptyOutDir: true,
    target: 'node20',
    minify: false,
    rolldownOptions: { output: { entryFileNames: 'measure.mjs', codeSplitting: false } },
  },
})
const { measured } = (await import(pathToFileURL(join(outDir, 'measure.mjs')).href)) as {
  readonly measured: () => unknown
}
console.log(JSON.stringify(measured(), null, 2))
