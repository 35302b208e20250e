import { useShelfActions } from '../state/context.tsx'
import type { KeptFormula } from '../storage/formulas.ts'
import { Difference } from './Difference.tsx'
import { whenWritten } from './rows.ts'

interface Props {
  readonly kept: KeptFormula
  readonly name: string
}

/** Every kept state of a formula, the newest first. */
export function Versions({ kept, name }: Props) {
  const actions = useShelfActions()
  return (
    <>
      <ol className="version-list" reversed aria-label={`Versions of ${name}`}>
        {kept.versions
          .map((version, index) => ({ ...version, number: index + 1 }))
          .toReversed()
          .map(({ stamp, at, note, number }) => (
            <li key={stamp} value={number}>
              <span>
                {whenWritten(at)}
                {note !== '' && <span className="version-note"> {note}</span>}
              </span>{' '}
              <button
                type="button"
                className="quiet-button"
                aria-label={`Put version ${number} of ${name} on the desk`}
                onClick={() => void actions.openKept(kept.id, stamp)}
              >
                Put on the desk
              </button>
            </li>
          ))}
      </ol>
      <Difference kept={kept} name={name} />
    </>
  )
}
