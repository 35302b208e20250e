import { usePage } from '../state/context.tsx'
import { electrolyteTable } from '../state/electrolyteTable.ts'

/** Each ion as it was put in, the way infusions are ordered and checked. */
export function Electrolytes() {
  const table = usePage(electrolyteTable)
  if (!table) return null
  return (
    <table className="ion-table" aria-label={table.heading}>
      <thead>
        <tr>
          {table.columns.map(({ label }) => (
            <th key={label} scope="col">
              {label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {table.rows.map(([ion, ...figures]) => (
          <tr key={ion?.text}>
            <th scope="row">{ion?.text}</th>
            {figures.map(({ text }, column) => (
              <td key={table.columns[column + 1]?.label}>{text}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
