import { useShelf, useShelfActions } from '../state/context.tsx'
import type { ImportState } from '../shelf/shelfDesk.ts'

/** What came in of several files, and what did not and why. */
export function ImportReport() {
  const importing = useShelf((state) => state.importing)
  const actions = useShelfActions()
  if (!importing) return null
  const { kind, done, total, refused } = importing
  if (kind === 'running') {
    return (
      <p className="notice">
        <label>
          Reading file {done + 1} of {total} <progress value={done} max={total} />
        </label>
        <button type="button" className="quiet-button" onClick={actions.cancelImport}>
          Cancel
        </button>
      </p>
    )
  }
  return (
    <div className={refused.length > 0 ? 'notice notice-grave' : 'notice'}>
      <span role="status">{endSentence(importing)}</span>
      <button type="button" className="quiet-button" onClick={actions.dismissImport}>
        Put away
      </button>
      {refused.length > 0 && (
        <ul className="not-imported" aria-label="Files that were not taken" tabIndex={0}>
          {refused.map(({ name, reason }, index) => (
            <li key={`${name} ${index}`}>
              <strong>{name}</strong> {reason}
            </li>
          ))}
        </ul>
      )}
    </div>
  )
}

const filesInWords = (count: number) => (count === 1 ? '1 file' : `${count} files`)

function endSentence({ kind, done, total, imported, refused }: ImportState): string {
  if (kind === 'cancelled') {
    return `Cancelled after ${done} of ${filesInWords(total)}: nothing was put on the shelf.`
  }
  const taken = `${imported} of ${filesInWords(total)} put on the shelf`
  if (imported === 0 && refused.length < total) return `${taken}: the shelf refused them.`
  if (refused.length === 0) return `${taken}.`
  return `${taken}; ${refused.length} not taken, ${refused.length === 1 ? 'it is' : 'each is'} named here.`
}
