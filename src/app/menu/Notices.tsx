import { usePage, usePageActions } from '../state/context.tsx'
import './notices.css'

/** Plain sentences about files and keeping, under the masthead; nothing waits for an answer. */
export function Notices() {
  const notice = usePage((state) => state.notice)
  const actions = usePageActions()
  return (
    <div className="notices no-print" role="status">
      <KeepingNotice />
      {notice !== null && (
        <p className="notice">
          <span>{notice}</span>
          <button type="button" className="quiet-button" onClick={actions.dismissNotice}>
            Put away
          </button>
        </p>
      )}
    </div>
  )
}

function KeepingNotice() {
  const keeping = usePage((state) => state.keeping)
  const actions = usePageActions()
  if (keeping.kind === 'refused') {
    return (
      <p className="notice notice-grave">
        <span>{keeping.sentence}</span>
        <button type="button" className="quiet-button" onClick={actions.saveFile}>
          Save as file
        </button>
      </p>
    )
  }
  if (keeping.kind !== 'elsewhere') return null
  return (
    <p className="notice notice-grave">
      <span>
        {keeping.freed
          ? 'Another window kept a different sheet in the meantime. What stands here is not being kept.'
          : 'This sheet is open in another window, which keeps it. What is changed here is not being kept.'}
      </span>
      <button type="button" className="quiet-button" onClick={actions.keepThis}>
        Keep this one
      </button>
      <button type="button" className="quiet-button" onClick={actions.takeOther}>
        Show the other one
      </button>
    </p>
  )
}
