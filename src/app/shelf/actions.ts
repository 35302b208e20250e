import { readFormulaText } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'
import { openText, saveAsFile } from '../menu/files.ts'
import { newestVersion, type KeptFormula } from '../storage/formulas.ts'
import { shelfKeeper, type Keeper } from './keeper.ts'
import { keepingActions, type KeepingTools } from './keeping.ts'
import { lineageOf, originsAfter } from './origin.ts'
import { formulaById, mostColumns } from './shelfDesk.ts'
import { quotedName, textOf } from './standing.ts'

interface ActionTools extends KeepingTools {
  readonly replaceDocument: (formula: Formula) => void
}

export type ShelfActions = ReturnType<typeof shelfActions>

/** Everything a hand can do to the shelf. */
export function shelfActions(tools: ActionTools) {
  const keeper = shelfKeeper(tools)
  tools.page.subscribe((state, before) => {
    const origins = originsAfter(state, before)
    if (origins !== state.origins) tools.page.setState({ origins })
  })
  const keeping = keepingActions(tools, keeper)
  return {
    setOpen(open: boolean) {
      tools.shelf.setState({ open })
      if (open) void keeper.readOnce()
    },
    read: keeper.read,
    undoShelf: keeper.undo,
    redoShelf: keeper.redo,
    ...keeping,
    ...recordActions(tools, keeper),
    ...openingActions(tools, keeper),
    ...columnActions(tools),
    ...importActions(tools, keeping.addAll),
  }
}

function recordActions({ shelf, newKey, now }: ActionTools, keeper: Keeper) {
  const change = (
    id: string,
    how: (kept: KeptFormula) => KeptFormula | null,
    said: (name: string) => string,
  ) =>
    keeper.inTurn(async () => {
      const before = formulaById(shelf.getState(), id)
      if (!before) return
      await keeper.doStep({
        sentence: said(quotedName(before.title)),
        exchanges: [{ before, after: how(before) }],
      })
    })
  return {
    copy: (id: string) =>
      keeper.inTurn(async () => {
        const kept = formulaById(shelf.getState(), id)
        const read = kept && readFormulaText(newestVersion(kept).document)
        if (!kept || !read?.ok) return
        const title = `${read.formula.title} (copy)`.trim()
        const version = { stamp: newKey(), at: now(), note: '', document: textOf({ ...read.formula, title }) }
        const after = { id: newKey(), title, archived: false, stamp: newKey(), versions: [version] }
        const sentence = `${quotedName(kept.title)} was copied.`
        await keeper.doStep({ sentence, exchanges: [{ before: null, after }] })
      }),
    setArchived: (id: string, archived: boolean) =>
      change(
        id,
        (kept) => ({ ...kept, archived, stamp: newKey() }),
        (name) => `${name} was ${archived ? 'archived' : 'taken out of the archive'}.`,
      ),
    remove: (id: string) =>
      change(
        id,
        () => null,
        (name) => `${name} was deleted.`,
      ),
    setVersionNote: (id: string, stamp: string, note: string) =>
      change(
        id,
        (kept) => ({
          ...kept,
          stamp: newKey(),
          versions: kept.versions.map((version) =>
            version.stamp === stamp ? { ...version, note } : version,
          ),
        }),
        (name) => `A note of ${name} was changed.`,
      ),
  }
}

function openingActions({ page, shelf, replaceDocument }: ActionTools, keeper: Keeper) {
  const opened = (id: string, stamp?: string) => {
    const kept = formulaById(shelf.getState(), id)
    const version = kept?.versions.find((one) => one.stamp === stamp) ?? (kept && newestVersion(kept))
    if (!kept || !version) return null
    const read = openText(kept.title, version.document)
    if (!read.ok) shelf.setState({ said: read.sentence })
    return read.ok ? { kept, formula: read.formula } : null
  }
  return {
    /** Puts a version on the desk, the newest unless said; keeping it makes it the newest one. */
    openKept: (id: string, stamp?: string) =>
      keeper.inTurn(async () => {
        const found = opened(id, stamp)
        if (!found) return
        replaceDocument(found.formula)
        const origin = { id, version: newestVersion(found.kept).stamp }
        page.setState((state) => ({ origins: { ...state.origins, [lineageOf(state)]: origin } }))
        const which = stamp === undefined ? '' : 'An earlier state of '
        const is = `${which}${quotedName(found.kept.title)} is on the desk`
        shelf.setState({ said: `${is}; what stood there is one undo of the sheet away.`, conflict: null })
      }),
    saveKept(id: string) {
      const found = opened(id)
      if (found) saveAsFile(found.formula)
    },
  }
}

function columnActions({ shelf }: ActionTools) {
  return {
    /** Puts a formula among those side by side, or takes it out; more than four do not fit. */
    setColumn(id: string, among: boolean) {
      const { columns } = shelf.getState()
      const others = columns.filter((column) => column !== id)
      if (!among) shelf.setState({ columns: others })
      else if (others.length < mostColumns) shelf.setState({ columns: [...others, id] })
      else shelf.setState({ said: `Side by side there is room for ${mostColumns}; take one out first.` })
    },
  }
}

function importActions(
  { shelf }: ActionTools,
  keep: (formulas: readonly Formula[], sentence: string) => Promise<boolean>,
) {
  let running: AbortController | null = null
  return {
    /** Several files at once: each that is a formula becomes one on the shelf. */
    async importFiles(files: readonly File[]) {
      running?.abort()
      const own = new AbortController()
      running = own
      shelf.setState({ open: true })
      const { importFiles } = await import('../transfer/importFiles.ts')
      await importFiles(files, {
        signal: own.signal,
        report: (importing) => {
          if (running === own) shelf.setState({ importing })
        },
        keep,
        breathe: () => new Promise((resolve) => setTimeout(resolve)),
      })
    },
    cancelImport: () => running?.abort(),
    dismissImport: () => shelf.setState({ importing: null }),
  }
}
