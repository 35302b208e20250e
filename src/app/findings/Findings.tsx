import { usePage } from '../state/context.tsx'
import { findingGroups, type FindingGroup, type FindingView } from '../state/findingViews.ts'
import { Acknowledgement } from './Acknowledgement.tsx'
import { SeverityMark } from './SeverityMark.tsx'
import './findings.css'

/** What to watch: everything that was found, the gravest first, one kind together; notes in small print. */
export function Findings() {
  const groups = usePage(findingGroups)
  const grave = groups.filter(({ first }) => first.severity !== 'note')
  const notes = groups.filter(({ first }) => first.severity === 'note')
  if (groups.length === 0) return <p className="soft">No rule kept here speaks to this formula.</p>
  return (
    <>
      <FindingList groups={grave} className="findings" />
      <FindingList groups={notes} className="findings findings-notes" />
    </>
  )
}

function FindingList({
  groups,
  className,
}: {
  readonly groups: readonly FindingGroup[]
  readonly className: string
}) {
  if (groups.length === 0) return null
  return (
    <ul className={className}>
      {groups.map((group) => (
        <FindingItem key={`${group.first.severity} ${group.first.code}`} group={group} />
      ))}
    </ul>
  )
}

function FindingItem({ group: { first, told } }: { readonly group: FindingGroup }) {
  return (
    <li className={`finding finding-${first.severity}`}>
      <span className="finding-word">
        <SeverityMark severity={first.severity} /> {first.word}
      </span>
      <div className="finding-body">
        {told.map(({ key, message, wayOut }, index) => (
          <p key={key}>
            {message} {wayOut !== '' && <span className="way-out">{wayOut}</span>}{' '}
            {index === told.length - 1 && <Standing of={first} />}
          </p>
        ))}
        {first.severity === 'stop' && !first.blocks && <Acknowledgement view={first} />}
      </div>
    </li>
  )
}

/** By whose word, and how well founded. */
function Standing({ of: { standing, fromMemory } }: { readonly of: FindingView }) {
  return <span className="small soft">{fromMemory ? <em>{standing}</em> : standing}</span>
}
