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
  const isPage = ({ address }: { readonly address: string }) => address === scope
  const put = ({ address, response }: (typeof fetched)[number]) => cache.put(address, response)
  await Promise.all(fetched.filter((file) => !isPage(file)).map(put))
  // The page last: a build whose page is there is there as a whole.
  await Promise.all(fetched.filter(isPage).map(put))
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

/** From the newest build that holds it, then from an earlier one, then from the network; the page whatever its query. */
export async function answerFrom(
  caches: CacheStorage,
  request: Request,
  scope: string,
  load: typeof fetch,
): Promise<Response> {
  const { origin, pathname } = new URL(request.url)
  const wanted = pathname === new URL('index.html', scope).pathname ? scope : origin + pathname
  // In the order in which they were made.
  const names = (await caches.keys()).filter((name) => name.startsWith(ours))
  for (const name of names.toReversed()) {
    const cache = await caches.open(name)
    const found = await cache.match(wanted, { ignoreVary: true })
    if (found) return found
  }
  return load(request)
}
