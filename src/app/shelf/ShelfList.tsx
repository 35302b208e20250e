import { useDeferredValue, useId, useMemo, useRef, useState } from 'react'
import { usePage, useShelf, useShelfActions } from '../state/context.tsx'
import { newestVersion, type KeptFormula } from '../storage/formulas.ts'
import { deskColumn } from './shelfDesk.ts'
import { shelfRows, type ShelfRow } from './rows.ts'
import { Versions } from './Versions.tsx'

/** The formulas on the shelf, the one changed last first. */
export function ShelfList() {
  const [text, setText] = useState('')
  const [archived, setArchived] = useState(false)
  const formulas = useShelf((state) => state.formulas)
  const library = usePage((state) => state.library)
  const wanted = useDeferredValue(text)
  const rows = useMemo(
    () => shelfRows(formulas, wanted, archived, library),
    [formulas, wanted, archived, library],
  )
  const hasArchived = formulas.some((formula) => formula.archived)
  const list = useRef<HTMLUListElement>(null)
  const isRead = useShelf((state) => state.status.kind === 'ready')
  if (formulas.length === 0) return isRead ? <p className="soft">Nothing on the shelf yet.</p> : null
  /** Focus goes to the row that takes the place of the one that went, never to nowhere. */
  const focusRow = (index: number) =>
    requestAnimationFrame(() => {
      const open = list.current?.querySelectorAll<HTMLElement>('.shelf-open')
      const next = open?.[Math.min(index, open.length - 1)]
      ;(next ?? document.getElementById('shelf-summary'))?.focus()
    })
  return (
    <>
      <div className="shelf-search">
        <label>
          <span className="small">search the shelf</span>{' '}
          <input
            type="search"
            className="boxed-input"
            value={text}
            placeholder="title, ingredient or note"
            onChange={(event) => setText(event.currentTarget.value)}
          />
        </label>
        {hasArchived && (
          <label className="shelf-check">
            <input
              type="checkbox"
              checked={archived}
              onChange={(event) => setArchived(event.currentTarget.checked)}
            />{' '}
            with archived
          </label>
        )}
        <DeskCheck />
        <span className="small soft">
          {rows.length} of {formulas.length}
        </span>
      </div>
      <ul ref={list} className="shelf-list" aria-label="Formulas on the shelf">
        {rows.map((row, index) => (
          <Row key={row.kept.id} row={row} onGone={() => focusRow(index)} />
        ))}
      </ul>
      {rows.length === 0 && <p className="soft">Nothing on the shelf answers to that.</p>}
    </>
  )
}

function DeskCheck() {
  const among = useShelf((state) => state.columns.includes(deskColumn))
  const actions = useShelfActions()
  return (
    <label className="shelf-check">
      <input
        type="checkbox"
        checked={among}
        onChange={(event) => actions.setColumn(deskColumn, event.currentTarget.checked)}
      />{' '}
      the sheet itself side by side
    </label>
  )
}

interface RowProps {
  readonly row: ShelfRow
  readonly onGone: () => void
}

function Row({ row, onGone }: RowProps) {
  const { kept, name, facts } = row
  return (
    <li className="shelf-row" aria-label={name}>
      <div className="shelf-head">
        <span className="shelf-name">
          {name}
          {kept.archived && <span className="shelf-tag small"> archived</span>}
        </span>
        <span className="small soft">{facts}</span>
      </div>
      <RowButtons row={row} onGone={onGone} />
      <VersionFold kept={kept} name={name} />
    </li>
  )
}

function RowButtons({ row: { kept, name, readable }, onGone }: RowProps) {
  const actions = useShelfActions()
  const { id, archived } = kept
  const leave = async (done: Promise<void>) => {
    await done
    onGone()
  }
  return (
    <div className="shelf-buttons">
      {readable && <OpeningButtons id={id} name={name} />}
      <button
        type="button"
        className="plain-button"
        aria-label={`${archived ? 'Take out of the archive:' : 'Archive'} ${name}`}
        onClick={() => void leave(actions.setArchived(id, !archived))}
      >
        {archived ? 'Out of the archive' : 'Archive'}
      </button>
      <button
        type="button"
        className="plain-button"
        aria-label={`Delete ${name}`}
        onClick={() => void leave(actions.remove(id))}
      >
        Delete
      </button>
      {readable && <ColumnCheck id={id} name={name} />}
    </div>
  )
}

interface NamedProps {
  readonly id: string
  readonly name: string
}

/** For a formula that this version can open. */
function OpeningButtons({ id, name }: NamedProps) {
  const actions = useShelfActions()
  return (
    <>
      <button
        type="button"
        className="quiet-button shelf-open"
        aria-label={`Open ${name}`}
        onClick={() => void actions.openKept(id)}
      >
        Open
      </button>
      <button
        type="button"
        className="plain-button"
        aria-label={`Copy ${name}`}
        onClick={() => void actions.copy(id)}
      >
        Copy
      </button>
      <button
        type="button"
        className="plain-button"
        aria-label={`Save ${name} as a file`}
        onClick={() => actions.saveKept(id)}
      >
        Save as a file
      </button>
    </>
  )
}

function ColumnCheck({ id, name }: NamedProps) {
  const among = useShelf((state) => state.columns.includes(id))
  const actions = useShelfActions()
  return (
    <label className="shelf-check">
      <input
        type="checkbox"
        checked={among}
        aria-label={`${name} side by side`}
        onChange={(event) => actions.setColumn(id, event.currentTarget.checked)}
      />{' '}
      side by side
    </label>
  )
}

function VersionFold({ kept, name }: { readonly kept: KeptFormula; readonly name: string }) {
  const [open, setOpen] = useState(false)
  const labelId = useId()
  const count = kept.versions.length
  const { note } = newestVersion(kept)
  return (
    <details className="shelf-versions" open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="small" id={labelId}>
        {count === 1 ? '1 version' : `${count} versions`}
        <span className="unseen"> of {name}</span>
        {note !== '' && <span className="soft">: {note}</span>}
      </summary>
      {open && <Versions kept={kept} name={name} />}
    </details>
  )
}
