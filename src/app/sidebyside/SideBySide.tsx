import { useDeferredValue, useMemo } from 'react'
import { SeverityMark } from '../findings/SeverityMark.tsx'
import { formulaOfText } from '../shelf/rows.ts'
import { deskColumn } from '../shelf/shelfDesk.ts'
import { nameOf } from '../shelf/standing.ts'
import { usePage, useShelf, useShelfActions } from '../state/context.tsx'
import { newestVersion } from '../storage/formulas.ts'
import { tellFinding } from '../../worksheet/tell.ts'
import { columnsOf, type Chosen, type Column } from './columns.ts'
import { printComparison } from './print.ts'
import { SharedAxis } from './SharedAxis.tsx'
import { ingredientRows, resultRows, type CellMark, type ComparedRow } from './table.ts'
import './sidebyside.css'

/** Two to four formulas in columns: what is in them and what comes of it. */
export function SideBySide() {
  const columns = useColumns()
  const library = usePage((state) => state.library)
  const results = useMemo(() => resultRows(columns), [columns])
  const ingredients = useMemo(() => ingredientRows(columns, library), [columns, library])
  if (columns.length < 2) return <p className="soft">Choose a second formula on the shelf.</p>
  return (
    <>
      <p className="compare-key small soft">
        <MarkSign mark="differs" /> not as in A. <MarkSign mark="within" /> other than in A, but the intervals
        overlap: the difference is smaller than what is known.
        <span className="print-only">For comparison; not a batch worksheet.</span>
      </p>
      <SharedAxis columns={columns} />
      <div className="compare-frame" tabIndex={0} role="region" aria-label="Formulas side by side">
        <table role="table" className="compare-table" aria-label="Formulas side by side">
          <Head columns={columns} />
          <RowGroup title="Ingredients" rows={ingredients} columns={columns} />
          <RowGroup title="Order and results" rows={results} columns={columns} />
          <Cautions columns={columns} />
        </table>
      </div>
      <p className="no-print compare-print">
        <button type="button" className="quiet-button" onClick={printComparison}>
          Print the comparison
        </button>
      </p>
    </>
  )
}

function useColumns(): readonly Column[] {
  const ids = useShelf((state) => state.columns)
  const kept = useShelf((state) => state.formulas)
  const library = usePage((state) => state.library)
  const formula = useDeferredValue(usePage((state) => state.formula))
  const unreadable = usePage((state) => Object.keys(state.drafts).length > 0)
  return useMemo(() => {
    const chosen = ids.flatMap((id): readonly Chosen[] => {
      if (id === deskColumn)
        return [{ id, name: `${nameOf(formula.title)} (on the desk)`, formula, unreadable }]
      const record = kept.find((one) => one.id === id)
      const read = record && formulaOfText(newestVersion(record).document)
      return record && read ? [{ id, name: nameOf(record.title), formula: read, unreadable: false }] : []
    })
    return columnsOf(chosen, library)
  }, [ids, kept, library, formula, unreadable])
}

function Head({ columns }: { readonly columns: readonly Column[] }) {
  const actions = useShelfActions()
  return (
    <thead role="rowgroup">
      <tr role="row">
        <td role="cell" className="compare-corner" />
        {columns.map(({ id, letter, name, blocked }) => (
          <th key={id} role="columnheader" scope="col">
            <span className="compare-letter">{letter}</span> {name}
            {blocked !== null && <span className="refusal compare-blocked">{blocked}</span>}
            <button
              type="button"
              className="plain-button no-print compare-out"
              aria-label={`Take ${name} out of the comparison`}
              onClick={() => actions.setColumn(id, false)}
            >
              ×
            </button>
          </th>
        ))}
      </tr>
    </thead>
  )
}

interface GroupProps {
  readonly title: string
  readonly rows: readonly ComparedRow[]
  readonly columns: readonly Column[]
}

function RowGroup({ title, rows, columns }: GroupProps) {
  return (
    <tbody role="rowgroup">
      <tr role="row">
        <th role="rowheader" scope="rowgroup" colSpan={columns.length + 1} className="compare-group">
          {title}
        </th>
      </tr>
      {rows.map(({ key, label, cells }) => (
        <tr key={key} role="row">
          <th role="rowheader" scope="row">
            {label}
          </th>
          {cells.map(({ text, beneath, mark }, index) => (
            <td
              key={columns[index]?.id}
              role="cell"
              data-letter={columns[index]?.letter}
              className={mark === 'same' ? undefined : 'compare-other'}
            >
              <MarkSign mark={mark} />
              {text}
              {beneath !== '' && <span className="beneath small soft">{beneath}</span>}
            </td>
          ))}
        </tr>
      ))}
    </tbody>
  )
}

const signs: Readonly<Record<Exclude<CellMark, 'same'>, readonly [sign: string, words: string]>> = {
  differs: ['≠', 'differs from A: '],
  within: ['≈', 'within the intervals of A: '],
}

function MarkSign({ mark }: { readonly mark: CellMark }) {
  if (mark === 'same') return null
  const [sign, words] = signs[mark]
  return (
    <>
      <span className="compare-sign" aria-hidden="true">
        {sign}
      </span>{' '}
      <span className="unseen">{words}</span>
    </>
  )
}

function Cautions({ columns }: { readonly columns: readonly Column[] }) {
  const library = usePage((state) => state.library)
  return (
    <tbody role="rowgroup">
      <tr role="row">
        <th role="rowheader" scope="rowgroup" colSpan={columns.length + 1} className="compare-group">
          What to watch
        </th>
      </tr>
      <tr role="row">
        <th role="rowheader" scope="row">
          stops and warnings
        </th>
        {columns.map(({ id, letter, evaluation }) => {
          const findings = evaluation?.findings ?? []
          const grave = findings.filter(({ severity }) => severity !== 'note')
          const notes = findings.length - grave.length
          return (
            <td key={id} role="cell" data-letter={letter}>
              <ul className="compare-cautions">
                {grave.map((finding, index) => (
                  <li key={`${finding.code} ${index}`}>
                    <span className={`compare-grave finding-word finding-${finding.severity}`}>
                      <SeverityMark severity={finding.severity} />{' '}
                      {finding.severity === 'stop' ? 'Stop' : 'Warn'}
                    </span>{' '}
                    {tellFinding(finding, library).message}
                  </li>
                ))}
              </ul>
              <span className="small soft">{besides(evaluation !== null, grave.length, notes)}</span>
            </td>
          )
        })}
      </tr>
    </tbody>
  )
}

function besides(isJudged: boolean, grave: number, notes: number): string {
  if (!isJudged) return 'not judged'
  const counted = notes === 1 ? '1 note' : `${notes} notes`
  if (grave > 0) return notes > 0 ? `and ${counted}` : ''
  return notes > 0 ? `none; ${counted}` : 'none'
}
