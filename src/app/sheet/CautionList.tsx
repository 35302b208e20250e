import type { SheetCaution } from '../../worksheet/types.ts'

const words = { stop: 'STOP', warn: 'WARN', note: 'NOTE' } as const

/** What to watch, on paper: the word and the frame tell the severity, never a colour. */
export function CautionList({ cautions }: { readonly cautions: readonly SheetCaution[] }) {
  if (cautions.length === 0) return <p>No finding. That is not a verdict that the preparation is safe.</p>
  return (
    <ul className="paper-cautions">
      {cautions.map((caution, index) => (
        <Caution key={`${caution.code} ${index}`} caution={caution} />
      ))}
    </ul>
  )
}

const Caution = ({ caution }: { readonly caution: SheetCaution }) => (
  <li data-severity={caution.severity}>
    <strong>{words[caution.severity]}</strong>
    <span>
      {caution.text} {caution.wayOut}
      {caution.source && <small> {caution.source}</small>}
      {caution.acceptedBecause !== null && (
        <span className="paper-accepted">Accepted in writing: {caution.acceptedBecause}</span>
      )}
    </span>
    <span className="paper-initials">read by</span>
  </li>
)
