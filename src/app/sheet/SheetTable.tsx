import type { SheetCell, SheetTable as Table } from '../../worksheet/types.ts'

/** A ruled table; its head is repeated on each page. */
export function SheetTable({ table }: { readonly table: Table }) {
  return (
    <>
      <table className="paper-table">
        <caption className="unseen">{table.heading}</caption>
        <thead>
          <tr>
            {table.columns.map(({ label, align, blank, room }) => (
              <th key={label} scope="col" data-align={align} data-blank={blank || undefined} data-room={room}>
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
                  strong={table.columns[column]?.strong ?? false}
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
  readonly strong: boolean
  readonly align: string
}

function Entry({ entry, first, strong, align }: EntryProps) {
  const content = (
    <>
      {entry.text}
      {entry.small && <small>{entry.small}</small>}
    </>
  )
  return first ? (
    <th scope="row" data-align={align} data-strong={strong || undefined}>
      {content}
    </th>
  ) : (
    <td data-align={align}>{content}</td>
  )
}
