/** One build of the page, as it is kept for use without a network. */
export interface PageCopy {
  /** Mark of the content of all files. */
  readonly version: string
  readonly files: readonly {
    /** Below the address of the page; '' is the page itself. */
    readonly path: string
    /** SHA-256 of the content, hexadecimal. */
    readonly sha256: string
  }[]
}

const ours = 'evenwater page '

export const cacheOf = ({ version }: PageCopy): string => ours + version

/** Fetches every file of a build anew and keeps it; all or none, and only what this build really consists of. */
export async function fill(
  caches: CacheStorage,
  copy: PageCopy,
  scope: string,
  load: typeof fetch,
): Promise<void> {
  const fetched = await Promise.all(
    copy.files.map(async ({ path, sha256 }) => {
      const address = new URL(path, scope).href
      const response = await load(new Request(address, { cache: 'reload' }))
      if (!response.ok) throw new Error(`${address} answers ${response.status}`)
      const content = await response.clone().arrayBuffer()
      if ((await markOf(content)) !== sha256) throw new Error(`${address} belongs to another build`)
      return { address, response }
    }),
  )
  const cache = await caches.open(cacheOf(copy))
  await Promise.all(fetched.map(({ address, response }) => cache.put(address, response)))
}

async function markOf(content: ArrayBuffer): Promise<string> {
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', content))
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, '0')).join('')
}

/** Drops all copies but this one and the one before it, from which an open window may still load a part. */
export async function dropOld(caches: CacheStorage, copy: PageCopy): Promise<void> {
  const others = (await caches.keys()).filter((name) => name.startsWith(ours) && name !== cacheOf(copy))
  await Promise.all(others.slice(0, -1).map((name) => caches.delete(name)))
}

/** A newer build may start when the window that is loading is the only one. */
export const mayStart = (openWindows: number): boolean => openWindows < 2

/** From this build's copy, then from an earlier one, then from the network; the page itself whatever its fragment. */
export async function answerFrom(
  caches: CacheStorage,
  copy: PageCopy,
  request: Request,
  scope: string,
  load: typeof fetch,
): Promise<Response> {
  const address = new URL(request.url)
  const wanted =
    address.pathname === new URL('index.html', scope).pathname ? scope : address.origin + address.pathname
  const options = { ignoreVary: true }
  const cache = await caches.open(cacheOf(copy))
  return (
    (await cache.match(wanted, options)) ?? (await caches.match(wanted, options)) ?? (await load(request))
  )
}
