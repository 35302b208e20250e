import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = dirname(dirname(fileURLToPath(import.meta.url)))
const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm'
const npx = process.platform === 'win32' ? 'npx.cmd' : 'npx'

/** Runs a command in the project; answers its exit code and what it printed (captured only when asked). */
export function run(command, args, options = {}) {
  const done = spawnSync(command, args, {
    cwd: root,
    stdio: options.capture ? ['ignore', 'pipe', 'inherit'] : 'inherit',
    encoding: 'utf8',
    env: { ...process.env, ...options.env },
    maxBuffer: 1 << 28,
    shell: process.platform === 'win32',
  })
  return { code: done.status ?? 1, output: done.stdout ?? '' }
}

export const runTool = (name, args, options) => run(npx, ['--no-install', name, ...args], options)

const mark = (text) => createHash('sha256').update(text).digest('hex')

function remembered(name, wanted) {
  const file = join(root, 'node_modules', '.cache', 'evenwater', name)
  if (existsSync(file) && readFileSync(file, 'utf8') === wanted) return { fresh: true, remember() {} }
  return {
    fresh: false,
    remember() {
      mkdirSync(dirname(file), { recursive: true })
      writeFileSync(file, wanted)
    },
  }
}

/** Installs exactly what the lock file names, unless that very lock is installed already. */
export function install() {
  const lock = readFileSync(join(root, 'package-lock.json'), 'utf8')
  const state = remembered('installed', mark(lock))
  if (state.fresh && existsSync(join(root, 'node_modules', 'vite'))) return
  const { code } = run(npm, ['ci', '--no-audit', '--no-fund', '--loglevel=error'])
  if (code !== 0) throw new Error('The packages could not be installed; see above.')
  state.remember()
}

function* filesBelow(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name)
    if (entry.isDirectory()) yield* filesBelow(path)
    else yield path
  }
}

/** A mark that changes when any source, datum or setting of the build changes. */
export function sourceMark() {
  const hash = createHash('sha256')
  for (const folder of ['src', 'data', 'public', '.run/page']) {
    for (const path of [...filesBelow(join(root, folder))].sort()) {
      const { mtimeMs, size } = statSync(path)
      hash.update(`${path}\n${mtimeMs}\n${size}\n`)
    }
  }
  for (const name of ['package-lock.json', 'vite.config.ts', '.run/headless.config.mjs']) {
    hash.update(readFileSync(join(root, name)))
  }
  return hash.digest('hex')
}

/** Runs `build` unless its product is there and nothing it was made from has changed since. */
export function buildOnce(name, product, build) {
  const state = remembered(name, sourceMark())
  if (state.fresh && existsSync(join(root, product))) return
  if (build() !== 0) throw new Error(`The ${name} could not be built; see above.`)
  state.remember()
}

export const buildPage = () => buildOnce('page', 'dist/index.html', () => runTool('vite', ['build']).code)
