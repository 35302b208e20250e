import { answerFrom, dropOld, fill, mayStart, type PageCopy } from './copy.ts'

/*
 * Keeps a copy of one build of the page, so that it opens without a network. A newer build waits beside it and starts
 * when the page is loaded again with no other window of it open; it never takes over a window in use.
 */

declare const self: ServiceWorkerGlobalScope
/** The files of this build, put in when the build has written them. */
declare const pageCopy: PageCopy

const { scope } = self.registration

self.addEventListener('install', (event) => event.waitUntil(fill(self.caches, pageCopy, scope, fetch)))

self.addEventListener('activate', (event) => {
  // The first window of all comes under its care at once; later builds find none of their own to claim.
  event.waitUntil(dropOld(self.caches, pageCopy).then(() => self.clients.claim()))
})

const looks = 10
const betweenLooksMs = 100

/** The window that was just left may still be counted for a moment, so it is looked again before giving up. */
async function isAlone(): Promise<boolean> {
  for (let look = 0; look < looks; look += 1) {
    const windows = await self.clients.matchAll({ type: 'window', includeUncontrolled: true })
    if (mayStart(windows.length)) return true
    await new Promise((resolve) => setTimeout(resolve, betweenLooksMs))
  }
  return false
}

/** Asked by a page that is just loading and has nothing typed yet; other open windows keep what they run on. */
async function startAlone(asker: ExtendableMessageEvent['source']): Promise<void> {
  if (await isAlone()) await self.skipWaiting()
  // oxlint-disable-next-line unicorn/require-post-message-target-origin -- a client of a worker has no other origin
  else asker?.postMessage('stays')
}

self.addEventListener('message', (event) => {
  if (event.data === 'start') event.waitUntil(startAlone(event.source))
})

self.addEventListener('fetch', (event) => {
  const { request } = event
  if (request.method !== 'GET' || !request.url.startsWith(scope)) return
  event.respondWith(answerFrom(self.caches, pageCopy, request, scope, fetch))
})
