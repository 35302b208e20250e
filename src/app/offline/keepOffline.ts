/** What is known of the copy that opens without a network. */
export interface OfflineState {
  /** `none`: this page keeps no copy (opened from disk, or in development). */
  readonly copy: 'none' | 'coming' | 'kept' | 'refused'
  readonly newVersionWaits: boolean
}

export const noCopy: OfflineState = { copy: 'none', newVersionWaits: false }

type Registration = Pick<ServiceWorkerRegistration, 'installing' | 'active'> & EventTarget
export interface Registrar {
  register(address: string): Promise<Registration>
}

/** Has a copy kept and tells how that stands; a newer build is only told of: the next load takes it. */
export async function keepOffline(
  registrar: Registrar,
  tell: (state: OfflineState) => void,
  address = './service-worker.js',
): Promise<void> {
  tell({ copy: 'coming', newVersionWaits: false })
  try {
    const registration = await registrar.register(address)
    // A build that was there before this load is the one that was loaded; only a later one is newer.
    let newVersionWaits = false
    const report = () => {
      if (registration.active) tell({ copy: 'kept', newVersionWaits })
    }
    const follow = (worker: ServiceWorker | null) => {
      const isUpdate = registration.active !== null
      worker?.addEventListener('statechange', () => {
        if (worker.state === 'installed' && isUpdate) newVersionWaits = true
        if (worker.state === 'redundant' && !registration.active) {
          tell({ copy: 'refused', newVersionWaits: false })
        }
        report()
      })
    }
    follow(registration.installing)
    registration.addEventListener('updatefound', () => follow(registration.installing))
    report()
  } catch {
    tell({ copy: 'refused', newVersionWaits: false })
  }
}
