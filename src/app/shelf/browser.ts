import type { Formula } from '../../formula/types.ts'
import { browserFormulas } from '../storage/formulas.ts'
import type { PageStore } from '../state/store.ts'
import { shelfActions } from './actions.ts'
import { originOf } from './origin.ts'
import { createShelfStore, type ShelfDesk } from './shelfDesk.ts'

interface Needs {
  readonly page: PageStore
  readonly newKey: () => string
  readonly replaceDocument: (formula: Formula) => void
}

const channelName = 'evenwater shelf'

/** The shelf of this browser; the other windows are told of every change. */
export function browserShelfDesk(needs: Needs): ShelfDesk {
  const store = createShelfStore()
  const channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(channelName)
  const actions = shelfActions({
    ...needs,
    shelf: store,
    formulas: browserFormulas(),
    now: () => Date.now(),
    // oxlint-disable-next-line unicorn/require-post-message-target-origin -- a channel has no other origin
    announce: () => channel?.postMessage('changed'),
    askToLast,
  })
  channel?.addEventListener('message', () => {
    if (store.getState().status.kind !== 'unread') void actions.read()
  })
  if (originOf(needs.page.getState())) void actions.read()
  return { store, actions }
}

async function askToLast(): Promise<boolean> {
  try {
    return (await navigator.storage.persisted()) || (await navigator.storage.persist())
  } catch {
    return false
  }
}
