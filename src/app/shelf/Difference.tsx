import { useDeferredValue, useMemo, useState } from 'react'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { usePage } from '../state/context.tsx'
import type { KeptFormula } from '../storage/formulas.ts'
import { formulaOfText } from './rows.ts'
import { originOf } from './origin.ts'
import { versionDifference, type DifferenceRow } from './versionDifference.ts'

interface Props {
  readonly kept: KeptFormula
  readonly name: string
}

const desk = 'desk'

/** What has changed between any two versions, or between one and the sheet on the desk. */
export function Difference({ kept, name }: Props) {
  const { versions } = kept
  const isOnDesk = usePage((state) => originOf(state)?.id === kept.id)
  const [from, setFrom] = useState<string | null>(null)
  const [to, setTo] = useState<string | null>(null)
  const library = usePage((state) => state.library)
  const sheet = useDeferredValue(usePage((state) => state.formula))
  const unreadable = usePage((state) => Object.keys(state.drafts).length > 0)
  const choices = [
    ...versions.map(({ stamp }, index) => ({ value: stamp, words: `version ${index + 1}` })),
    { value: desk, words: 'the sheet on the desk' },
  ]
  const newest = versions.at(-1)?.stamp ?? desk
  const before = known(from, choices) ?? (isOnDesk ? newest : (versions.at(-2)?.stamp ?? newest))
  const after = known(to, choices) ?? (isOnDesk ? desk : newest)
  const formulaOf = (stamp: string) => {
    const version = versions.find((one) => one.stamp === stamp)
    return version ? formulaOfText(version.document) : sheet
  }
  const one = formulaOf(before)
  const other = formulaOf(after)
  const difference = useMemo(
    () => one && other && versionDifference(one, other, library),
    [one, other, library],
  )
  return (
    <div className="difference">
      <p>
        From{' '}
        <InlineChoice
          label={`Difference of ${name}: from`}
          value={before}
          choices={choices}
          onChoose={setFrom}
        />{' '}
        to{' '}
        <InlineChoice label={`Difference of ${name}: to`} value={after} choices={choices} onChoose={setTo} />
        {unreadable && (before === desk || after === desk) && ', without its fields that cannot be read'}
        {difference === null && ': one of them cannot be opened by this version.'}
        {difference &&
          Object.values(difference).every((rows) => rows.length === 0) &&
          ': nothing is different.'}
      </p>
      {difference && (
        <>
          <Rows title="Lines" rows={difference.lines} />
          <Rows title="Order" rows={difference.fields} />
          <Rows title="Results" rows={difference.results} />
          <Rows title="What to watch" rows={difference.findings} />
        </>
      )}
    </div>
  )
}

const known = (stamp: string | null, choices: readonly { readonly value: string }[]) =>
  choices.some(({ value }) => value === stamp) ? stamp : null

function Rows({ title, rows }: { readonly title: string; readonly rows: readonly DifferenceRow[] }) {
  if (rows.length === 0) return null
  return (
    <table className="difference-table">
      <thead>
        <tr>
          <th scope="col">{title}</th>
          <th scope="col">before</th>
          <th scope="col">after</th>
          <th scope="col">what changed</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, what, before, after, how }) => (
          <tr key={key}>
            <th scope="row">{what}</th>
            <td>{before}</td>
            <td>{after}</td>
            <td>{how}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
