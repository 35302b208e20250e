import { Bar, BarChart, ResponsiveContainer, XAxis, YAxis } from 'recharts'
import type { ComparisonRow } from '../state/bufferViews.ts'

const ink = { fill: 'var(--ink)', fontSize: 12.5 }
const rowHeight = 34
const around = 40

/** What each buffer takes of the target and what it leaves; the table says the same in figures. */
export default function ComparisonChart({ rows }: { readonly rows: readonly ComparisonRow[] }) {
  const drawn = rows.flatMap(({ name, osmotic }) =>
    osmotic
      ? [{ name, taken: Math.round(osmotic.taken), left: Math.max(0, Math.round(osmotic.left ?? 0)) }]
      : [],
  )
  if (drawn.length === 0) return null
  return (
    <figure className="buffer-chart" aria-hidden="true">
      <figcaption>
        Osmolality in mOsm/kg: taken by each buffer (filled), left below the target (dashed)
      </figcaption>
      <ResponsiveContainer width="100%" height={drawn.length * rowHeight + around}>
        <BarChart data={drawn} layout="vertical" margin={{ left: 0, right: 20 }} accessibilityLayer={false}>
          <XAxis type="number" tick={ink} />
          <YAxis type="category" dataKey="name" width={150} tickLine={false} tick={ink} />
          <Bar
            dataKey="taken"
            name="taken"
            stackId="o"
            fill="var(--accent)"
            stroke="var(--ink)"
            barSize={16}
            isAnimationActive={false}
          />
          <Bar
            dataKey="left"
            name="left"
            stackId="o"
            fill="var(--paper)"
            stroke="var(--ink)"
            strokeDasharray="4 3"
            barSize={16}
            isAnimationActive={false}
          />
        </BarChart>
      </ResponsiveContainer>
    </figure>
  )
}
