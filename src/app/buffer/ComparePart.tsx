import { lazy, Suspense, useMemo, useState } from 'react'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Formula } from '../../formula/types.ts'
import {
  comparisonColumns,
  comparisonRows,
  comparisonText,
  type ComparisonRow,
} from '../state/bufferViews.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { typedNumber } from '../words/typed.ts'
import { NumberField } from './NumberField.tsx'
import { SizeFields, sizeOf, usualSize } from './SizeFields.tsx'

const ComparisonChart = lazy(() => import('./ComparisonChart.tsx'))

/** All buffer systems side by side, put in order by rules that can be weighed anew. */
export function ComparePart({ evaluation }: { readonly evaluation: Evaluation }) {
  const library = usePage((state) => state.library)
  const comparison = usePage((state) => state.comparison)
  const revision = usePage((state) => state.revision)
  const { startComparison, putLines } = usePageActions()
  const [pHText, setPHText] = useState(String(evaluation.formula.pH ?? 7))
  const [sizes, setSizes] = useState(usualSize)
  const [weights, setWeights] = useState<Readonly<Record<string, number>>>(() =>
    Object.fromEntries(library.rankingRules.map(({ id, weight }) => [id, weight])),
  )
  const pH = typedNumber(pHText, 0, 14)
  const size = sizeOf(sizes)
  const rows = useMemo(
    () => comparisonRows(comparison.options, weights, library),
    [comparison.options, weights, library],
  )
  const shelf = evaluation.lines.map(({ ingredient }) => ingredient.id)
  return (
    <section aria-labelledby="compare">
      <h3 id="compare">Compare all buffers</h3>
      <p className="buffer-wish">
        <NumberField
          label="at pH"
          text={pHText}
          valid={pH !== null}
          help="Write a pH from 0 to 14."
          onChange={setPHText}
        />{' '}
        <SizeFields sizes={sizes} onChange={setSizes} />{' '}
        <button
          type="button"
          className="plain-button"
          disabled={pH === null || size === null}
          onClick={() => pH !== null && size !== null && startComparison({ pH, size, shelf })}
        >
          Compare
        </button>
      </p>
      <Progress />
      {rows.length > 0 && (
        <>
          {comparison.revision !== revision && (
            <p role="status" className="blocked">
              The formula has changed since; compare again.
            </p>
          )}
          <Weights weights={weights} onChange={setWeights} />
          <Table rows={rows} onPut={putLines} mayPut={comparison.revision === revision} />
          <CopyButton rows={rows} />
          <Suspense fallback={<p className="soft small">Drawing…</p>}>
            <ComparisonChart rows={rows} />
          </Suspense>
        </>
      )}
    </section>
  )
}

function Progress() {
  const { kind, total, options } = usePage((state) => state.comparison)
  const { cancelComparison } = usePageActions()
  if (kind === 'failed') return <p role="status">The comparison has no answer for this formula.</p>
  if (kind !== 'running') return null
  return (
    <p>
      <progress max={total} value={options.length} aria-label="Buffers compared" />{' '}
      <button type="button" className="plain-button" onClick={cancelComparison}>
        Stop comparing
      </button>
    </p>
  )
}

interface TableProps {
  readonly rows: readonly ComparisonRow[]
  readonly mayPut: boolean
  onPut(formula: Formula): void
}

function Table({ rows, mayPut, onPut }: TableProps) {
  return (
    // The table is wider than a phone and scrolls by itself.
    <div className="wide-table" tabIndex={0} role="region" aria-label="Buffers compared, scrolls sideways">
      <table className="plain-table compare-table" aria-label="Buffers compared">
        <thead>
          <tr>
            <th scope="col">buffer</th>
            <th scope="col">score</th>
            {comparisonColumns.map((column) => (
              <th key={column} scope="col">
                {column}
              </th>
            ))}
            <th scope="col">why</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id} className={row.formula ? undefined : 'left-out'}>
              <th scope="row">
                {row.name} <span className="small soft">{row.way}</span>
                {row.formula && mayPut && (
                  <button
                    type="button"
                    className="plain-button small"
                    onClick={() => row.formula && onPut(row.formula)}
                  >
                    Put in<span className="unseen"> {row.name}</span>
                  </button>
                )}
              </th>
              <td>{row.score}</td>
              {row.score === 'left out' && !row.formula ? (
                <td colSpan={comparisonColumns.length + 1}>{row.reasons.join(' ')}</td>
              ) : (
                <>
                  {row.cells.map((text, index) => (
                    <td key={comparisonColumns[index] ?? index}>{text}</td>
                  ))}
                  <td className="compare-why">{row.reasons.join(' ')}</td>
                </>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

interface WeightsProps {
  readonly weights: Readonly<Record<string, number>>
  onChange(weights: Readonly<Record<string, number>>): void
}

/** The rules of the order and how much each counts; lower scores are better. */
function Weights({ weights, onChange }: WeightsProps) {
  const rules = usePage((state) => state.library.rankingRules)
  return (
    <details>
      <summary className="small">How they are put in order: rules and weights</summary>
      <p className="small soft">
        A judgement, not a law: each rule counts from 0 (good) to 1, times its weight; the smallest sum stands
        first.
      </p>
      <table className="plain-table" aria-label="Ranking rules">
        <thead>
          <tr>
            <th scope="col">rule</th>
            <th scope="col">counts fully at</th>
            <th scope="col">weight</th>
          </tr>
        </thead>
        <tbody>
          {rules.map(({ id, name, worstAt, unit, note }) => (
            <tr key={id}>
              <th scope="row">
                {name} {note !== undefined && <span className="small soft">{note}</span>}
              </th>
              <td>{`${worstAt} ${unit}`}</td>
              <td>
                <input
                  type="number"
                  min={0}
                  max={5}
                  step={1}
                  aria-label={`Weight of ${name}`}
                  value={weights[id] ?? 0}
                  onChange={(event) => {
                    const value = event.currentTarget.valueAsNumber
                    if (value >= 0 && value <= 5) onChange({ ...weights, [id]: value })
                  }}
                />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  )
}

function CopyButton({ rows }: { readonly rows: readonly ComparisonRow[] }) {
  const [said, setSaid] = useState('')
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(comparisonText(rows))
      setSaid('Copied: paste it into a spreadsheet or a report.')
    } catch {
      setSaid('The browser did not allow copying; select the table and copy it by hand.')
    }
  }
  return (
    <p>
      <button type="button" className="plain-button" onClick={() => void copy()}>
        Copy the table
      </button>{' '}
      <span role="status" className="small">
        {said}
      </span>
    </p>
  )
}
