import type { Formula } from '../../formula/types.ts'
import { openFile } from '../menu/files.ts'
import type { ImportState, NotImported } from '../shelf/shelfDesk.ts'

interface Tools {
  readonly signal: AbortSignal
  readonly report: (state: ImportState) => void
  /** Puts all of them where they are kept, in one step; false when that was refused. */
  readonly keep: (formulas: readonly Formula[], sentence: string) => Promise<boolean>
  /** Lets the page paint and hear a hand that cancels. */
  readonly breathe: () => Promise<void>
}

const reportEvery = 10

/**
 * Reads several files, names each that is no formula with the reason, and puts the others on the shelf in one
 * step. When it is cancelled nothing is put there.
 */
export async function importFiles(files: readonly File[], tools: Tools): Promise<ImportState> {
  const { signal, report, keep, breathe } = tools
  const formulas: Formula[] = []
  const refused: NotImported[] = []
  const state = (kind: ImportState['kind'], done: number, imported: number): ImportState => ({
    kind,
    done,
    total: files.length,
    imported,
    refused: [...refused],
  })
  for (const [index, file] of files.entries()) {
    if (index % reportEvery === 0) {
      report(state('running', index, 0))
      await breathe()
    }
    if (signal.aborted) return ended(state('cancelled', index, 0))
    const opened = await openFile(file)
    if (opened.ok) formulas.push(opened.formula)
    else refused.push({ name: file.name, reason: opened.reason })
  }
  if (formulas.length === 0) return ended(state('done', files.length, 0))
  const count = formulas.length === 1 ? 'One formula' : `${formulas.length} formulas`
  const isKept = await keep(
    formulas,
    `${count} from files ${formulas.length === 1 ? 'is' : 'are'} on the shelf.`,
  )
  return ended(state('done', files.length, isKept ? formulas.length : 0))

  function ended(last: ImportState): ImportState {
    report(last)
    return last
  }
}
