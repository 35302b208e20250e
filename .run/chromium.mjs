import { spawnSync } from 'node:child_process'
import { accessSync, constants, existsSync } from 'node:fs'
import { run, runTool } from './steps.mjs'

const names = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable']

function onPath(name) {
  for (const folder of (process.env.PATH ?? '').split(':')) {
    const path = `${folder}/${name}`
    try {
      accessSync(path, constants.X_OK)
      return path
    } catch {
      // not in this folder
    }
  }
  return undefined
}

const onSystem = () => names.map(onPath).find(Boolean)

function installDebianPackage() {
  if (process.getuid?.() !== 0 || !onPath('apt-get')) return
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  run('apt-get', ['update', '-qq'], { env, capture: true })
  run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium', 'fonts-dejavu-core'], {
    env,
    capture: true,
  })
}

/** Path of a Chromium: CHROMIUM_PATH, the system's, a Debian package, or the test runner's own download. */
export function findChromium() {
  const named = process.env.CHROMIUM_PATH
  if (named) {
    if (existsSync(named)) return named
    throw new Error(`CHROMIUM_PATH names ${named}, which is not there.`)
  }
  const found = onSystem()
  if (found) return found
  installDebianPackage()
  const installed = onSystem()
  if (installed) return installed
  if (runTool('playwright', ['install', 'chromium']).code !== 0) {
    throw new Error('No Chromium was found and none could be installed; name one in CHROMIUM_PATH.')
  }
  const asked = spawnSync(
    process.execPath,
    ['-e', "import('@playwright/test').then((m) => console.log(m.chromium.executablePath()))"],
    { encoding: 'utf8' },
  )
  return asked.stdout.trim()
}
