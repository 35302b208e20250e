import { spawn } from 'node:child_process'
import { createServer } from 'node:net'
import { buildPage, install, root } from './steps.mjs'

const firstPort = 4180

const isFree = (port) =>
  new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(false))
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)))
  })

async function freePort() {
  for (let port = firstPort; port < firstPort + 50; port += 1) if (await isFree(port)) return port
  throw new Error(`No free port between ${firstPort} and ${firstPort + 49}.`)
}

/** Opens the page where a browser can be opened; elsewhere the printed address is enough. */
function open(address) {
  const [command, ...args] =
    process.platform === 'darwin'
      ? ['open', address]
      : process.platform === 'win32'
        ? ['cmd', '/c', 'start', '', address]
        : ['xdg-open', address]
  const opened = spawn(command, args, { stdio: 'ignore', detached: true })
  opened.on('error', () => {})
  opened.unref()
}

try {
  install()
  buildPage()
  const port = await freePort()
  const { preview } = await import('vite')
  await preview({
    root: `${root}/src`,
    configFile: `${root}/vite.config.ts`,
    preview: { host: '127.0.0.1', port, strictPort: true },
  })
  const address = `http://127.0.0.1:${port}/`
  console.log(`Evenwater is at ${address}  (stop with Ctrl+C)`)
  if (!process.env.CI) open(address)
} catch (problem) {
  console.error(problem.message)
  process.exitCode = 1
}
