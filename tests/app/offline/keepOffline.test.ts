import { describe, expect, it } from 'vitest'
import { keepOffline, type OfflineState } from '../../../src/app/offline/keepOffline.ts'

class FakeWorker extends EventTarget {
  state = 'installing'
  become(state: string): void {
    this.state = state
    this.dispatchEvent(new Event('statechange'))
  }
}

class FakeRegistration extends EventTarget {
  installing: FakeWorker | null = null
  active: FakeWorker | null = null
}

async function kept(registration: FakeRegistration) {
  const told: OfflineState[] = []
  const registrar = { register: async () => registration as never }
  await keepOffline(registrar, (state) => told.push(state))
  return { last: () => told.at(-1) }
}

describe('keeping a copy', () => {
  it('is said to be there only once it is', async () => {
    const registration = new FakeRegistration()
    const worker = (registration.installing = new FakeWorker())
    const { last } = await kept(registration)
    expect(last()).toEqual({ copy: 'coming', newVersionWaits: false })
    registration.installing = null
    registration.active = worker
    worker.become('activated')
    expect(last()).toEqual({ copy: 'kept', newVersionWaits: false })
  })

  it('that is refused or breaks off is said', async () => {
    const told: OfflineState[] = []
    const refusing = { register: () => Promise.reject(new Error('denied')) }
    await keepOffline(refusing, (state) => told.push(state))
    expect(told.at(-1)).toEqual({ copy: 'refused', newVersionWaits: false })

    const registration = new FakeRegistration()
    const worker = (registration.installing = new FakeWorker())
    const { last } = await kept(registration)
    registration.installing = null
    worker.become('redundant')
    expect(last()).toEqual({ copy: 'refused', newVersionWaits: false })
  })

  it('tells of a newer build found after the load; one that fails changes nothing', async () => {
    const registration = new FakeRegistration()
    registration.active = new FakeWorker()
    const { last } = await kept(registration)
    expect(last()).toEqual({ copy: 'kept', newVersionWaits: false })

    const failing = (registration.installing = new FakeWorker())
    registration.dispatchEvent(new Event('updatefound'))
    registration.installing = null
    failing.become('redundant')
    expect(last()).toEqual({ copy: 'kept', newVersionWaits: false })

    const next = (registration.installing = new FakeWorker())
    registration.dispatchEvent(new Event('updatefound'))
    registration.installing = null
    next.become('installed')
    expect(last()).toEqual({ copy: 'kept', newVersionWaits: true })
    // Loaded again, the page is that newer build.
    expect((await kept(registration)).last()).toEqual({ copy: 'kept', newVersionWaits: false })
  })
})
