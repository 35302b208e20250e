import { useRef, useState, type KeyboardEvent } from 'react'
import { usePage, usePageActions } from '../state/context.tsx'

/** The other ways out of the page: a link that carries the formula, and a table of its figures. */
export function ExportFold() {
  const fold = useRef<HTMLDetailsElement>(null)
  const [link, setLink] = useState('')
  const actions = usePageActions()
  const hasPersonal = usePage(({ formula }) => formula.patient !== undefined || formula.order !== undefined)
  const close = () => {
    if (!fold.current) return
    fold.current.open = false
    fold.current.querySelector('summary')?.focus()
  }
  const keys = (event: KeyboardEvent) => {
    if (event.key === 'Escape') close()
  }
  const copy = async () => {
    const { link: made, isCopied } = await actions.copyLink()
    setLink(isCopied ? '' : made)
    if (isCopied) close()
  }
  return (
    <details ref={fold} className="demos" onKeyDown={keys}>
      <summary className="plain-button">Export</summary>
      <div className="demos-list">
        <button type="button" className="plain-button" onClick={() => void copy()}>
          Copy a link to this formula
        </button>
        <p className="small soft">
          The link itself holds the whole sheet
          {hasPersonal ? ', with what it says of the order and the patient' : ''}; nothing is sent.
        </p>
        {link !== '' && (
          <label className="link-out small">
            The browser does not let the page copy. Copy it here:
            <input
              className="boxed-input"
              readOnly
              value={link}
              ref={(input) => input?.select()}
              onFocus={(event) => event.currentTarget.select()}
            />
          </label>
        )}
        <button
          type="button"
          className="plain-button"
          onClick={() => {
            close()
            void actions.saveCsv()
          }}
        >
          Lines and results as CSV
        </button>
      </div>
    </details>
  )
}
