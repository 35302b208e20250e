import { createReadStream } from 'node:fs'
import { stat } from 'node:fs/promises'
import { createServer, type Server } from 'node:http'
import { extname, join, normalize } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { AddressInfo } from 'node:net'

/** Where the built page lies. */
export const builtPage = process.env['PAGE_FOLDER'] ?? fileURLToPath(new URL('../dist', import.meta.url))

const types: Readonly<Record<string, string>> = {
  '.css': 'text/css',
  '.html': 'text/html',
  '.js': 'text/javascript',
  '.json': 'application/json',
  '.svg': 'image/svg+xml',
  '.webmanifest': 'application/manifest+json',
}

/** A plain server of one folder, to be stopped at any time. */
export interface FolderServer {
  readonly address: string
  stop(): Promise<void>
}

async function fileAt(folder: string, path: string): Promise<string | null> {
  const file = join(folder, normalize(decodeURIComponent(path === '/' ? '/index.html' : path)))
  try {
    return file.startsWith(folder) && (await stat(file)).isFile() ? file : null
  } catch {
    return null
  }
}

export async function serveFolder(folder: string): Promise<FolderServer> {
  const server: Server = createServer((request, response) => {
    void fileAt(folder, new URL(request.url ?? '/', 'http://localhost').pathname).then((file) => {
      if (file === null) return response.writeHead(404).end()
      response.writeHead(200, {
        'Content-Type': types[extname(file)] ?? 'application/octet-stream',
        'Cache-Control': 'no-store',
      })
      return createReadStream(file).pipe(response)
    })
  })
  await new Promise<void>((resolve) => void server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  return {
    address: `http://localhost:${port}/`,
    stop: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}
