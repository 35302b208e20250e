import { useState, type FormEvent } from 'react'
import { usePage, useShelf, useShelfActions } from '../state/context.tsx'
import { formulaById } from './shelfDesk.ts'
import { quotedName, type Standing } from './standing.ts'
import { useStanding } from './useStanding.ts'

/** Puts the sheet on the desk on the shelf, with a note if there is something to say. */
export function KeepRow() {
  const [note, setNote] = useState('')
  const standing = useStanding()
  const actions = useShelfActions()
  const unreadable = usePage((state) => Object.keys(state.drafts).length > 0)
  const conflict = useShelf((state) => state.conflict)
  const isThere = standing.kind === 'as-kept'
  const keep = async (how: 'as-usual' | 'newest' | 'copy') => {
    if (await actions.keepOnShelf(note, how)) setNote('')
  }
  const submit = (event: FormEvent) => {
    event.preventDefault()
    void keep('as-usual')
  }
  return (
    <>
      <form className="keep-row" onSubmit={submit}>
        <label className="keep-note">
          <span className="small">note for this version</span>
          <input
            className="boxed-input"
            value={note}
            maxLength={500}
            placeholder="what changed, and why"
            autoComplete="off"
            onChange={(event) => setNote(event.currentTarget.value)}
          />
        </label>
        <button type="submit" className="firm-button" aria-disabled={isThere}>
          {standing.kind === 'not-kept' ? 'Keep on the shelf' : 'Keep as a new version'}
        </button>
        <span className="small soft">
          {standingSentence(standing)}
          {unreadable && ' Fields that cannot be read are not kept; mend them first.'}
        </span>
      </form>
      {conflict !== null && <Conflict id={conflict} onKeep={keep} />}
    </>
  )
}

function standingSentence(standing: Standing): string {
  if (standing.kind === 'not-kept') return 'The sheet is not on the shelf.'
  const name = quotedName(standing.kept.title)
  if (standing.kind === 'as-kept') return `${name} is on the shelf as it stands on the sheet.`
  if (standing.kind === 'changed') return `The sheet has changed since ${name} was kept.`
  return `The sheet and ${name} on the shelf have both changed.`
}

interface ConflictProps {
  readonly id: string
  readonly onKeep: (how: 'newest' | 'copy') => Promise<void>
}

function Conflict({ id, onKeep }: ConflictProps) {
  const kept = useShelf((state) => formulaById(state, id))
  const actions = useShelfActions()
  if (!kept) return null
  return (
    <p className="notice notice-grave" role="alert">
      <span>
        {quotedName(kept.title)} was changed on the shelf since it came to this desk, perhaps in another
        window. Nothing was overwritten.
      </span>
      <button type="button" className="quiet-button" onClick={() => void onKeep('copy')}>
        Keep this one beside it
      </button>
      <button type="button" className="quiet-button" onClick={() => void onKeep('newest')}>
        Keep this one as its newest version
      </button>
      <button type="button" className="quiet-button" onClick={() => void actions.openKept(id)}>
        Show the one on the shelf
      </button>
    </p>
  )
}
