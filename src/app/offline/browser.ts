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
