import type { Formula } from '../../formula/types.ts'
import { newestVersion, type KeptFormula, type KeptVersion } from '../storage/formulas.ts'
import type { Keeper, Tools } from './keeper.ts'
import { lineageOf, originOf } from './origin.ts'
import { isBlank, quotedName, standingOf, textOf } from './standing.ts'

export interface KeepingTools extends Tools {
  /** Asks the browser not to clear what is kept; false when it does not promise. */
  readonly askToLast: () => Promise<boolean>
}

/** Where a sheet goes that is kept: beside what another window made of its formula, or on top of it. */
export type KeepAs = 'as-usual' | 'newest' | 'copy'

/** The records that a sheet makes on the shelf. */
function recordsFrom({ page, newKey, now }: Tools, keeper: Keeper) {
  const versionOf = (formula: Formula, note: string): KeptVersion => ({
    stamp: newKey(),
    at: now(),
    note: note.trim(),
    document: textOf(formula),
  })
  const recordOf = (formula: Formula, note: string): KeptFormula => ({
    id: newKey(),
    title: formula.title,
    archived: false,
    stamp: newKey(),
    versions: [versionOf(formula, note)],
  })
  const put = (before: KeptFormula | null, after: KeptFormula, sentence: string) => {
    const state = page.getState()
    const origin = {
      lineage: lineageOf(state),
      before: originOf(state),
      after: { id: after.id, version: newestVersion(after).stamp },
    }
    return keeper.doStep({ sentence, exchanges: [{ before, after }], origin })
  }
  return {
    recordOf,
    addNew(note: string) {
      const { formula } = page.getState()
      return put(null, recordOf(formula, note), `${quotedName(formula.title)} is on the shelf.`)
    },
    addVersion(kept: KeptFormula, note: string) {
      const { formula } = page.getState()
      const versions = [...kept.versions, versionOf(formula, note)]
      const after = { ...kept, title: formula.title, archived: false, stamp: newKey(), versions }
      return put(kept, after, `Version ${versions.length} of ${quotedName(formula.title)} is on the shelf.`)
    },
  }
}

export function keepingActions(tools: KeepingTools, keeper: Keeper) {
  const { page, shelf, askToLast } = tools
  const { recordOf, addNew, addVersion } = recordsFrom(tools, keeper)
  const keep = async (note: string, how: KeepAs) => {
    await keeper.read()
    const standing = standingOf(page.getState(), shelf.getState().formulas)
    if (how === 'copy' || standing.kind === 'not-kept') return addNew(note)
    if (standing.kind === 'as-kept') {
      shelf.setState({ said: `${quotedName(standing.kept.title)} is on the shelf as it stands here.` })
      return true
    }
    if (standing.kind === 'changed-elsewhere' && how !== 'newest') {
      shelf.setState({ conflict: standing.kept.id, open: true })
      return false
    }
    return addVersion(standing.kept, note)
  }
  return {
    /** Puts the sheet on the desk on the shelf: a new formula there, or a new version of the one it comes from. */
    keepOnShelf: (note = '', how: KeepAs = 'as-usual') =>
      keeper.inTurn(async () => {
        const isKept = await keep(note, how)
        // Not waited for: some browsers ask a person first.
        if (isKept) void askToLast().then((lasting) => shelf.setState({ lasting }))
        return isKept
      }),
    /** The same without being asked, before another document comes to the desk; nothing when it is there already. */
    keepBeforeOther: () =>
      keeper.inTurn(async () => {
        await keeper.readOnce()
        const { formula } = page.getState()
        const document = textOf(formula)
        const isThere = shelf
          .getState()
          .formulas.some(({ versions }) => versions.some((version) => version.document === document))
        return isBlank(formula) || isThere ? 'nothing' : (await keep('', 'newest')) ? 'kept' : 'refused'
      }),
    /** Whole documents from files, in one step. */
    addAll: (formulas: readonly Formula[], sentence: string) =>
      keeper.inTurn(async () => {
        await keeper.readOnce()
        const exchanges = formulas.map((formula) => ({ before: null, after: recordOf(formula, '') }))
        return keeper.doStep({ sentence, exchanges })
      }),
  }
}
