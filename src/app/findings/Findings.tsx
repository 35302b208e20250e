import type { Severity } from '../../evaluation/types.ts'
import { usePage } from '../state/context.tsx'
import { findingViews, type FindingView } from '../state/findingViews.ts'
import { Acknowledgement } from './Acknowledgement.tsx'
import { SeverityMark } from './SeverityMark.tsx'
import './findings.css'

const severities: readonly Severity[] = ['stop', 'warn', 'note']

/** What to watch: everything that was found, the gravest first. */
export function Findings() {
  const views = usePage(findingViews)
  if (views.length === 0)
    return <p className="soft">Nothing was found in this formula that a rule here knows of.</p>
  return (
    <ul className="findings">
      {severities.flatMap((severity) =>
        views
          .filter((view) => view.severity === severity)
          .map((view) => <FindingItem key={view.key} view={view} />),
      )}
    </ul>
  )
}

function FindingItem({ view }: { readonly view: FindingView }) {
  return (
    <li className={`finding finding-${view.severity}`}>
      <span className="finding-word">
        <SeverityMark severity={view.severity} /> {view.word}
      </span>
      <div className="finding-body">
        <p>{view.message}</p>
        {view.wayOut !== '' && <p className="way-out">{view.wayOut}</p>}
        <p className="small soft">
          {view.source}
          {view.evidence !== '' && `; ${view.evidence}`}
          {view.fromMemory && <em>, from memory</em>}
        </p>
        {view.severity === 'stop' && !view.blocks && <Acknowledgement view={view} />}
      </div>
    </li>
  )
}
