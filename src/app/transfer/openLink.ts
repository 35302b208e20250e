import type { Formula } from '../../formula/types.ts'
import type { PageStore } from '../state/store.ts'
import { isBlank, quotedName } from '../shelf/standing.ts'
import type { ShelfActions } from '../shelf/actions.ts'
import { readLink } from './formulaLink.ts'

export interface LinkTools {
  readonly store: PageStore
  readonly shelf: Pick<ShelfActions, 'keepBeforeOther'>
  readonly replaceDocument: (formula: Formula) => void
  /** Whether this window keeps the sheet on the desk. */
  readonly seatKnown: Promise<boolean>
}

/**
 * Puts the formula of a link on the desk as one step. What stood there goes to the shelf first, since a step
 * back is forgotten with the page. True when the link was taken.
 */
export async function openLink(fragment: string, tools: LinkTools): Promise<boolean> {
  const { store, shelf, replaceDocument, seatKnown } = tools
  const read = await readLink(fragment)
  if (!read.ok) {
    store.setState({
      notice: `The link was not opened. ${read.reason} The sheet on the screen is unchanged.`,
    })
    return false
  }
  const { formula: before } = store.getState()
  const kept = (await seatKnown) ? await shelf.keepBeforeOther() : 'nothing'
  replaceDocument(read.formula)
  store.setState({
    notice: [
      `${quotedName(read.formula.title)} was opened from a link.`,
      isBlank(before) ? '' : whereBefore(kept),
      ...read.notices,
    ]
      .filter(Boolean)
      .join(' '),
  })
  return true
}

function whereBefore(kept: 'nothing' | 'kept' | 'refused'): string {
  if (kept === 'kept') return 'What stood here is on the shelf, and one undo away.'
  if (kept === 'refused')
    return 'What stood here is one undo away; the shelf refused it, so undo before you close the page.'
  return 'What stood here is one undo away.'
}
