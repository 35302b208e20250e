import { createStore, get, promisifyRequest, type UseStore } from 'idb-keyval'
import type { Origin } from '../shelf/origin.ts'

/** What is kept of the sheet on the desk: the document as text and whatever could not be taken from its cells. */
export interface KeptSheet {
  readonly document: string
  readonly drafts: Readonly<Record<string, string>>
  readonly paper: string
  /** Names this very state, so that another window's work is recognised. */
  readonly stamp: string
  /** Where on the shelf it comes from. */
  readonly origin?: Origin | null
}

export interface Shelf {
  read(): Promise<KeptSheet | undefined>
  write(sheet: KeptSheet): Promise<void>
  /** Puts a sheet that this version cannot read where it is not written over. */
  setAside(sheet: KeptSheet): Promise<void>
}

const key = 'sheet on the desk'
const asideKey = 'sheet set aside'

/** Keeps the sheet in this browser's own database. The database is opened at first use, so a refusal is an answer. */
export function browserShelf(): Shelf {
  let store: UseStore | undefined
  const opened = () => (store ??= createStore('evenwater', 'sheets'))
  return {
    read: async () => keptSheet(await get<unknown>(key, opened())),
    write: async (sheet) => putPromptly(opened(), key, sheet),
    setAside: async (sheet) => putPromptly(opened(), asideKey, sheet),
  }
}

/** Commits without waiting to be asked, so that the write is carried out even when the page goes in the meantime. */
const putPromptly = (store: UseStore, at: string, sheet: KeptSheet): Promise<void> =>
  store('readwrite', (objects) => {
    objects.put(sheet, at)
    objects.transaction.commit()
    return promisifyRequest(objects.transaction)
  })

function keptSheet(value: unknown): KeptSheet | undefined {
  if (typeof value !== 'object' || value === null) return undefined
  const { document, drafts, paper, stamp, origin } = value as Partial<Record<keyof KeptSheet, unknown>>
  if (typeof document !== 'string' || typeof stamp !== 'string' || typeof paper !== 'string') return undefined
  if (typeof drafts !== 'object' || drafts === null) return undefined
  const texts = Object.entries(drafts).filter(
    (entry): entry is [string, string] => typeof entry[1] === 'string',
  )
  return { document, drafts: Object.fromEntries(texts), paper, stamp, origin: keptOrigin(origin) }
}

function keptOrigin(value: unknown): Origin | null {
  if (typeof value !== 'object' || value === null) return null
  const { id, version } = value as Partial<Record<keyof Origin, unknown>>
  return typeof id === 'string' && typeof version === 'string' ? { id, version } : null
}

/** The plain sentence for a storage that refused. */
export function refusalSentence(error: unknown): string {
  const name = error instanceof Error || error instanceof DOMException ? error.name : ''
  if (name === 'QuotaExceededError') {
    return 'The storage of this browser is full: this sheet stays on the screen but is not kept when the page closes. Save it as a file.'
  }
  return 'This browser does not let the page keep anything: this sheet stays on the screen but is gone when the page closes. Save it as a file.'
}
