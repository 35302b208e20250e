import { answerFrom, dropOld, fill, type PageCopy } from './copy.ts'

/*
 * Keeps a copy of one build of the page, so that it opens without a network. A newer build is fetched beside it: open
 * windows keep what they run on, and whatever is loaded from then on is the newest build that is there as a whole.
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

self.addEventListener('fetch', (event) => {
  const { request } = event
  if (request.method !== 'GET' || !request.url.startsWith(scope)) return
  event.respondWith(answerFrom(self.caches, request, scope, fetch))
})
