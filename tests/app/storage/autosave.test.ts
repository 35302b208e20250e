import 'fake-indexeddb/auto'
import { describe, expect, it } from 'vitest'
import { readKept, startAutosave } from '../../../src/app/storage/autosave.ts'
import { browserDesk, type Desk } from '../../../src/app/storage/desk.ts'
import { browserShelf, refusalSentence, type KeptSheet, type Shelf } from '../../../src/app/storage/shelf.ts'
import { pageWith } from '../state/fixtures.ts'

const ownDesk: Desk = { sit: (onSeat) => onSeat(true), take: () => undefined }

function memoryShelf(refuse: () => Error | null = () => null) {
  const kept: { sheet?: KeptSheet; aside?: KeptSheet } = {}
  const shelf: Shelf = {
    read: async () => kept.sheet,
    write: async (sheet) => {
      const error = refuse()
      if (error) throw error
      kept.sheet = sheet
    },
    setAside: async (sheet) => {
      kept.aside = sheet
    },
  }
  return { shelf, kept }
}

function keeping(shelf: Shelf, desk: Desk = ownDesk, loadedStamp: string | null = null) {
  const page = pageWith([['sodium-chloride', '1 %']])
  let stamps = 0
  const autosave = startAutosave(
    {
      store: page.store,
      shelf,
      desk,
      newStamp: () => `stamp ${Math.random()} ${(stamps += 1)}`,
      replaceDocument: page.actions.replaceDocument,
    },
    loadedStamp,
  )
  return { ...page, autosave }
}

describe('keeping the sheet', () => {
  it('writes every change and reads it back with its unreadable fields and its paper', async () => {
    const shelf = browserShelf()
    const { actions, autosave } = keeping(shelf)
    actions.typeInCell({ kind: 'field', field: 'title' }, 'Kept')
    actions.typeInCell({ kind: 'field', field: 'pH' }, 'six')
    actions.setPaper('Letter')
    await autosave.settled()
    const kept = await readKept(shelf)
    expect(kept).toMatchObject({ kind: 'kept', drafts: { pH: 'six' }, paper: 'Letter' })
    expect(kept.kind === 'kept' && kept.formula.title).toBe('Kept')
    expect(kept.kind === 'kept' && kept.formula.lines).toHaveLength(1)
  })

  it('says that the storage is full, loses nothing, and is quiet again when there is room', async () => {
    let full = true
    const { shelf, kept } = memoryShelf(() => (full ? new DOMException('full', 'QuotaExceededError') : null))
    const { store, actions, autosave } = keeping(shelf)
    await autosave.settled()
    expect(store.getState().keeping).toMatchObject({ kind: 'refused' })
    actions.typeInCell({ kind: 'field', field: 'title' }, 'Still here')
    await autosave.settled()
    expect(store.getState().formula.title).toBe('Still here')
    full = false
    actions.setPaper('Letter')
    await autosave.settled()
    expect(store.getState().keeping).toEqual({ kind: 'kept' })
    expect(kept.sheet?.document).toContain('Still here')
  })

  it('sets aside what it cannot read and never writes over it', async () => {
    const { shelf, kept } = memoryShelf()
    const newer = {
      document: '{"format":"evenwater.formula","version":99}',
      drafts: {},
      paper: 'A4',
      stamp: 's',
    }
    kept.sheet = newer
    expect(await readKept(shelf)).toMatchObject({ kind: 'unreadable' })
    expect(kept.aside).toEqual(newer)
  })

  it('has a plain sentence for a full and for a denied storage', () => {
    expect(refusalSentence(new DOMException('', 'QuotaExceededError'))).toContain('full')
    expect(refusalSentence(new DOMException('', 'SecurityError'))).toContain('does not let')
  })
})

/** A lock manager for one name, as browsers have it: one holder, a queue, stealing. */
function fakeLocks(): LockManager {
  let free: (() => void) | null = null
  const queue: (() => void)[] = []
  const request = (_name: string, ...rest: unknown[]) => {
    const callback = rest.at(-1) as (lock: object | null) => unknown
    const options = (rest.length > 1 ? rest[0] : {}) as LockOptions
    return new Promise((resolve, reject) => {
      const grant = () => {
        free = () => reject(new DOMException('taken', 'AbortError'))
        void callback({ name: 'lock' })
      }
      if (options.steal) {
        free?.()
        grant()
      } else if (free === null) grant()
      else if (options.ifAvailable) resolve(callback(null))
      else queue.push(grant)
    })
  }
  return { request, query: async () => ({}) } as unknown as LockManager
}

const settle = () => new Promise((resolve) => setTimeout(resolve, 5))

describe('two windows', () => {
  it('write one at a time; the second takes over only when a person says so', async () => {
    const { shelf, kept } = memoryShelf()
    const locks = fakeLocks()
    const first = keeping(shelf, browserDesk(locks))
    await settle()
    const second = keeping(shelf, browserDesk(locks), kept.sheet?.stamp ?? null)
    await settle()
    expect(second.store.getState().keeping).toEqual({ kind: 'elsewhere', freed: false })

    second.actions.typeInCell({ kind: 'field', field: 'title' }, 'second')
    await settle()
    expect(kept.sheet?.document).not.toContain('second')

    second.autosave.keepThis()
    await settle()
    expect(kept.sheet?.document).toContain('second')
    expect(second.store.getState().keeping).toEqual({ kind: 'kept' })
    expect(first.store.getState().keeping).toEqual({ kind: 'elsewhere', freed: false })

    await first.autosave.takeOther()
    await settle()
    expect(first.store.getState().formula.title).toBe('second')
    first.actions.undo()
    expect(first.store.getState().formula.title).toBe('')
  })
})
