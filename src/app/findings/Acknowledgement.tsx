import { useId, useState, type FormEvent } from 'react'
import { usePageActions } from '../state/context.tsx'
import type { FindingView } from '../state/findingViews.ts'

/** A stop may be gone past by a person who writes why; the reason is printed on the sheet. */
export function Acknowledgement({ view }: { readonly view: FindingView }) {
  const actions = usePageActions()
  const [reason, setReason] = useState('')
  const field = useId()
  if (view.accepted !== null) {
    return (
      <p className="accepted">
        Accepted in writing: “{view.accepted}”{' '}
        <button
          type="button"
          className="quiet-button no-print"
          aria-label={`Take back the acceptance of: ${view.message}`}
          onClick={() => actions.acknowledge(view.code, '')}
        >
          Take back
        </button>
      </p>
    )
  }
  const accept = (event: FormEvent) => {
    event.preventDefault()
    if (reason.trim() === '') return
    actions.acknowledge(view.code, reason.trim())
    setReason('')
  }
  return (
    <form className="acknowledge no-print" onSubmit={accept}>
      <label htmlFor={field} className="small">
        To go past this stop, write the reason; it is printed on the sheet.
      </label>
      <span className="acknowledge-row">
        <input
          id={field}
          className="boxed-input"
          value={reason}
          maxLength={500}
          autoComplete="off"
          onChange={(event) => setReason(event.currentTarget.value)}
        />
        <button type="submit" className="quiet-button" aria-disabled={reason.trim() === ''}>
          Accept in writing
        </button>
      </span>
    </form>
  )
}
