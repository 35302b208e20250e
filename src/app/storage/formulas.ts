import { createStore, promisifyRequest, values, type UseStore } from 'idb-keyval'

/** One state of a formula that a person chose to keep. */
export interface KeptVersion {
  readonly stamp: string
  /** Milliseconds of the clock of this machine. */
  readonly at: number
  readonly note: string
  /** The document as a file holds it. */
  readonly document: string
}

/** A formula on the shelf with all its versions, the oldest first. */
export interface KeptFormula {
  readonly id: string
  readonly title: string
  readonly archived: boolean
  /** Names this very state of the record, so that another window's work is recognised. */
  readonly stamp: string
  readonly versions: readonly KeptVersion[]
}

/** From one state of the shelf to the next; null where there is no record. */
export interface Exchange {
  readonly before: KeptFormula | null
  readonly after: KeptFormula | null
}

export interface ShelfContent {
  readonly formulas: readonly KeptFormula[]
  /** Records that this version cannot read; they are left as they are. */
  readonly unreadable: number
}

export interface FormulaStore {
  all(): Promise<ShelfContent>
  /** All or none, and only while every record is as `before` says; false when another window was first. */
  exchange(exchanges: readonly Exchange[]): Promise<boolean>
}

export const newestVersion = ({ versions }: KeptFormula): KeptVersion => {
  const newest = versions.at(-1)
  if (!newest) throw new Error('A formula on the shelf has no version.')
  return newest
}

/** Keeps formulas in this browser's own database, opened at first use, so that a refusal is an answer. */
export function browserFormulas(): FormulaStore {
  let store: UseStore | undefined
  const opened = () => (store ??= createStore('evenwater shelf', 'formulas'))
  return {
    all: async () => contentOf(await values<unknown>(opened())),
    exchange: async (exchanges) => opened()('readwrite', (objects) => exchangeIn(objects, exchanges)),
  }
}

async function exchangeIn(objects: IDBObjectStore, exchanges: readonly Exchange[]): Promise<boolean> {
  const found = await Promise.all(
    exchanges.map(({ before, after }) =>
      promisifyRequest(objects.get(idOf(before, after)) as IDBRequest<unknown>),
    ),
  )
  const isAsExpected = exchanges.every(
    ({ before }, index) => stampOf(found[index]) === (before?.stamp ?? null),
  )
  if (!isAsExpected) return false
  for (const { before, after } of exchanges) {
    if (after) objects.put(after, after.id)
    else objects.delete(idOf(before, after))
  }
  objects.transaction.commit()
  await promisifyRequest(objects.transaction)
  return true
}

function idOf(before: KeptFormula | null, after: KeptFormula | null): string {
  const record = after ?? before
  if (!record) throw new Error('An exchange from nothing to nothing.')
  return record.id
}

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null

/** Null for no record; undefined for one without a stamp, which matches no expectation. */
const stampOf = (value: unknown) => {
  if (value === undefined) return null
  return isObject(value) && typeof value.stamp === 'string' ? value.stamp : undefined
}

function contentOf(records: readonly unknown[]): ShelfContent {
  const formulas = records.filter(isKeptFormula)
  return { formulas, unreadable: records.length - formulas.length }
}

function isKeptFormula(value: unknown): value is KeptFormula {
  if (!isObject(value)) return false
  const { id, title, archived, stamp, versions } = value
  return (
    typeof id === 'string' &&
    typeof title === 'string' &&
    typeof archived === 'boolean' &&
    typeof stamp === 'string' &&
    Array.isArray(versions) &&
    versions.length > 0 &&
    versions.every(isVersion)
  )
}

function isVersion(value: unknown): value is KeptVersion {
  if (!isObject(value)) return false
  const { stamp, at, note, document } = value
  return (
    typeof stamp === 'string' &&
    typeof at === 'number' &&
    typeof note === 'string' &&
    typeof document === 'string'
  )
}

/** The plain sentence for a storage that refused the shelf. */
export function shelfRefusal(error: unknown): string {
  const name = error instanceof Error || error instanceof DOMException ? error.name : ''
  return name === 'QuotaExceededError'
    ? 'The storage of this browser is full: nothing was put on the shelf, and what is there is unharmed. Save the sheet as a file.'
    : 'This browser does not let the page keep a shelf. Save the sheet as a file.'
}
