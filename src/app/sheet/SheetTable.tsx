import type { SheetCell, SheetSection } from '../../worksheet/types.ts'

type Table = Extract<SheetSection, { kind: 'table' }>

/** A ruled table; its head is repeated on each page. */
export function SheetTable({ table }: { readonly table: Table }) {
  return (
    <>
      <table className="paper-table">
        <caption className="unseen">{table.heading}</caption>
        <thead>
          <tr>
            {table.columns.map(({ label, align, blank }) => (
              <th key={label} scope="col" data-align={align} data-blank={blank || undefined}>
                {label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((row, index) => (
            <tr key={`${index} ${row[0]?.text ?? ''}`}>
              {row.map((entry, column) => (
                <Entry
                  key={table.columns[column]?.label ?? column}
                  entry={entry}
                  first={column === 0}
                  align={table.columns[column]?.align ?? 'start'}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {table.note && <p className="paper-note">{table.note}</p>}
    </>
  )
}

interface EntryProps {
  readonly entry: SheetCell
  readonly first: boolean
  readonly align: string
}

function Entry({ entry, first, align }: EntryProps) {
  const content = (
    <>
      {entry.text}
      {entry.small && <small>{entry.small}</small>}
    </>
  )
  return first ? (
    <th scope="row" data-align={align}>
      {content}
    </th>
  ) : (
    <td data-align={align}>{content}</td>
  )
}
