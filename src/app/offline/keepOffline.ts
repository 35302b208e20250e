/** What is known of the copy that opens without a network. */
export interface OfflineState {
  /** `none`: this page keeps no copy (opened from disk, or in development). */
  readonly copy: 'none' | 'coming' | 'kept' | 'refused'
  readonly newVersionWaits: boolean
}

export const noCopy: OfflineState = { copy: 'none', newVersionWaits: false }

type Registration = Pick<ServiceWorkerRegistration, 'installing' | 'waiting' | 'active'> & EventTarget
export interface Registrar {
  register(address: string): Promise<Registration>
}

/** Has a copy kept and tells how that stands; a newer build is only told of, never started from here. */
export async function keepOffline(
  registrar: Registrar,
  tell: (state: OfflineState) => void,
  address = './service-worker.js',
): Promise<void> {
  tell({ copy: 'coming', newVersionWaits: false })
  try {
    const registration = await registrar.register(address)
    const report = () => {
      const isUpdate = registration.waiting !== null && registration.active !== null
      if (registration.active) tell({ copy: 'kept', newVersionWaits: isUpdate })
    }
    const follow = (worker: ServiceWorker | null) =>
      worker?.addEventListener('statechange', () => {
        if (worker.state === 'redundant' && !registration.active)
          tell({ copy: 'refused', newVersionWaits: false })
        report()
      })
    follow(registration.installing)
    registration.addEventListener('updatefound', () => follow(registration.installing))
    report()
  } catch {
    tell({ copy: 'refused', newVersionWaits: false })
  }
}
