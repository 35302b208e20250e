import type { KeyboardEvent } from 'react'
import { useShelf, useShelfActions, usePageActions } from '../state/context.tsx'
import { ImportReport } from '../transfer/ImportReport.tsx'
import { KeepRow } from './KeepRow.tsx'
import { ShelfList } from './ShelfList.tsx'

/** What is on the shelf, and what can be done with it. */
export function ShelfPanel() {
  const actions = useShelfActions()
  /** Within the shelf the keys of undo work on the shelf, not on the sheet. */
  const keys = (event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return
    const key = event.key.toLowerCase()
    if (key === 'z' && !event.shiftKey) void actions.undoShelf()
    else if (key === 'z' || (key === 'y' && !event.shiftKey)) void actions.redoShelf()
    else return
    event.preventDefault()
    event.stopPropagation()
  }
  return (
    <div className="shelf-panel" onKeyDown={keys}>
      <KeepRow />
      <ShelfNotices />
      <Said />
      <ImportReport />
      <ShelfList />
    </div>
  )
}

function ShelfNotices() {
  const status = useShelf((state) => state.status)
  const unreadable = useShelf((state) => state.unreadable)
  const lasting = useShelf((state) => state.lasting)
  const { saveFile } = usePageActions()
  return (
    <>
      {status.kind === 'refused' && (
        <p className="notice notice-grave" role="alert">
          <span>{status.sentence}</span>
          <button type="button" className="quiet-button" onClick={saveFile}>
            Save the sheet as a file
          </button>
        </p>
      )}
      {unreadable > 0 && (
        <p className="notice">
          {unreadable === 1 ? 'One formula' : `${unreadable} formulas`} on the shelf cannot be read by this
          version and {unreadable === 1 ? 'is' : 'are'} left as found.
        </p>
      )}
      {!lasting && (
        <p className="small soft">
          This browser does not promise to keep the shelf: a private window forgets it when it closes, and a
          full disk may clear it. Save as a file what has to last.
        </p>
      )}
    </>
  )
}

/** What was done last, and the way back. */
function Said() {
  const said = useShelf((state) => state.said)
  const canUndo = useShelf((state) => state.past.length > 0)
  const canRedo = useShelf((state) => state.future.length > 0)
  const actions = useShelfActions()
  return (
    <p className="shelf-said">
      <span>{said}</span>
      {(canUndo || canRedo) && (
        <span className="shelf-undo">
          <button
            type="button"
            className="quiet-button"
            aria-disabled={!canUndo}
            onClick={() => void actions.undoShelf()}
          >
            Undo on the shelf
          </button>
          <button
            type="button"
            className="quiet-button"
            aria-disabled={!canRedo}
            onClick={() => void actions.redoShelf()}
          >
            Redo
          </button>
        </span>
      )}
    </p>
  )
}
