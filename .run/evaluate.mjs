import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { buildOnce, root, runTool } from './steps.mjs'

const product = 'node_modules/.cache/evenwater/headless/evaluate.mjs'

try {
  buildOnce(
    'headless-mark',
    product,
    () => runTool('vite', ['build', '--config', '.run/headless.config.mjs'], { capture: true }).code,
  )
} catch (problem) {
  process.stderr.write(`${problem.message}\n`)
  process.exit(2)
}
if (!process.argv.includes('--build-only')) await import(pathToFileURL(join(root, product)).href)
