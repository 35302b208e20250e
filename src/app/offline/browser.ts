import type { PageStore } from '../state/store.ts'
import { keepOffline } from './keepOffline.ts'

/** Only a page that was served with its manifest has a service worker beside it; one file opened from disk has not. */
const isServed = () => import.meta.env.PROD && document.querySelector('link[rel="manifest"]') !== null

/** Keeps a copy of the page in this browser, and looks for a newer build whenever the window is come back to. */
export async function keepCopyInBrowser(store: PageStore): Promise<void> {
  if (!isServed()) return
  if (!('serviceWorker' in navigator)) {
    store.setState({ offline: { copy: 'refused', newVersionWaits: false } })
    return
  }
  const { serviceWorker } = navigator
  await keepOffline(serviceWorker, (offline) => store.setState({ offline }))
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') void lookForNewer(serviceWorker)
  })
}

/** Without a network there is nothing newer to be had, and nothing to say. */
async function lookForNewer(serviceWorker: ServiceWorkerContainer): Promise<void> {
  try {
    const registration = await serviceWorker.getRegistration()
    await registration?.update()
  } catch {
    // offline
  }
}

const longestHandoverMs = 10_000

/**
 * Before anything can be typed: lets a newer build that waits start, and loads it. True while that load is under way.
 * If another window is open, or it does not start in time, the page goes on as it is.
 */
export async function startsNewerBuild(): Promise<boolean> {
  if (!isServed() || !('serviceWorker' in navigator) || !navigator.serviceWorker.controller) return false
  const { serviceWorker } = navigator
  const waiting = (await serviceWorker.getRegistration())?.waiting
  if (!waiting) return false
  const hasStarted = await new Promise<boolean>((resolve) => {
    serviceWorker.addEventListener('controllerchange', () => resolve(true), { once: true })
    serviceWorker.addEventListener('message', ({ data }) => {
      if (data === 'stays') resolve(false)
    })
    serviceWorker.startMessages()
    setTimeout(() => resolve(false), longestHandoverMs)
    // oxlint-disable-next-line unicorn/require-post-message-target-origin -- a worker has no other origin
    waiting.postMessage('start')
  })
  if (hasStarted) window.location.reload()
  return hasStarted
}
