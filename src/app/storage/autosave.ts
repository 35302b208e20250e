import { writeFormula } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'
import { openText } from '../menu/files.ts'
import { lineageOf, originOf, type Origin } from '../shelf/origin.ts'
import type { PageState, PageStore, Paper } from '../state/store.ts'
import type { Desk } from './desk.ts'
import { refusalSentence, type KeptSheet, type Shelf } from './shelf.ts'
import { promptWriter } from './writer.ts'

interface Tools {
  readonly store: PageStore
  readonly shelf: Shelf
  readonly desk: Desk
  readonly newStamp: () => string
  /** Puts a whole document on the screen as one step. */
  readonly replaceDocument: (formula: Formula) => void
}

export interface Autosave {
  /** Keeps this sheet although another window has its own. */
  keepThis(): void
  /** Shows what the other window keeps; this window's sheet is one undo away. */
  takeOther(): Promise<void>
  settled(): Promise<void>
  /** Whether this window keeps the sheet, once that is known for the first time. */
  seatKnown: Promise<boolean>
}

/** What is written stands for this state; the same object of formula is written once. */
const asKept = (state: PageState, stamp: string): KeptSheet => ({
  document: writeFormula(state.formula),
  drafts: state.drafts,
  paper: state.paper,
  stamp,
  origin: originOf(state),
})

/** Keeps every change, one window at a time, and says so when it cannot. */
export function startAutosave(tools: Tools, loadedStamp: string | null): Autosave {
  const { store, shelf, desk, newStamp } = tools
  let seated = false
  let stamp = loadedStamp
  let tellSeat: (hasSeat: boolean) => void = () => undefined
  const seatKnown = new Promise<boolean>((resolve) => {
    tellSeat = resolve
  })

  const writer = promptWriter<KeptSheet>(
    (sheet) => shelf.write(sheet),
    (sheet) => {
      stamp = sheet.stamp
      if (seated) store.setState({ keeping: { kind: 'kept' } })
    },
    (error) => store.setState({ keeping: { kind: 'refused', sentence: refusalSentence(error) } }),
  )
  const keep = () => writer.put(asKept(store.getState(), newStamp()))
  const resume = () => {
    seated = true
    store.setState({ keeping: { kind: 'kept' } })
    keep()
  }
  /** Seated before the desk answers, so that the answer is not taken for a desk that fell free. */
  const takeSeat = () => {
    seated = true
    desk.take()
    resume()
  }
  store.subscribe((state, before) => {
    const changed =
      state.formula !== before.formula ||
      state.drafts !== before.drafts ||
      state.paper !== before.paper ||
      state.origins !== before.origins
    if (changed && seated) keep()
  })
  desk.sit((hasSeat) => {
    tellSeat(hasSeat)
    if (!hasSeat) {
      seated = false
      store.setState({ keeping: { kind: 'elsewhere', freed: false } })
    } else if (!seated) void comeToDesk(tools, () => stamp, resume)
  })
  return {
    keepThis: takeSeat,
    async takeOther() {
      const other = await readKept(shelf)
      if (other.kind !== 'kept') return
      stamp = other.stamp
      tools.replaceDocument(other.formula)
      store.setState((state) => ({ origins: { ...state.origins, [lineageOf(state)]: other.origin } }))
      takeSeat()
    },
    settled: () => writer.settled(),
    seatKnown,
  }
}

/** The desk is free: go on writing, unless another window has written something else in the meantime. */
async function comeToDesk(
  { store, shelf }: Tools,
  stamp: () => string | null,
  resume: () => void,
): Promise<void> {
  const wasElsewhere = store.getState().keeping.kind === 'elsewhere'
  if (!wasElsewhere) {
    resume()
    return
  }
  const other = await readKept(shelf)
  if (other.kind === 'kept' && other.stamp !== stamp())
    store.setState({ keeping: { kind: 'elsewhere', freed: true } })
  else resume()
}

export interface Kept {
  readonly formula: Formula
  readonly drafts: Readonly<Record<string, string>>
  readonly paper: Paper | null
  readonly stamp: string
  readonly origin: Origin | null
}

export type ReadKept =
  | { readonly kind: 'nothing' }
  | ({ readonly kind: 'kept' } & Kept)
  | { readonly kind: 'unreadable'; readonly sentence: string }

/** The kept sheet, climbed to today's version. One that cannot be read is set aside, never written over. */
export async function readKept(shelf: Shelf): Promise<ReadKept> {
  try {
    const sheet = await shelf.read()
    if (!sheet) return { kind: 'nothing' }
    const opened = openText('the kept sheet', sheet.document)
    if (!opened.ok) {
      await shelf.setAside(sheet)
      const sentence = 'The sheet kept from last time cannot be read by this version; it was set aside.'
      return { kind: 'unreadable', sentence }
    }
    const paper = sheet.paper === 'A4' || sheet.paper === 'Letter' ? sheet.paper : null
    const { drafts, stamp, origin = null } = sheet
    return { kind: 'kept', formula: opened.formula, drafts, paper, stamp, origin }
  } catch {
    return { kind: 'nothing' }
  }
}
