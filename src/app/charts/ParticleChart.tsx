import { Bar, BarChart, LabelList, ResponsiveContainer, XAxis, YAxis } from 'recharts'
import type { ParticleView } from '../state/particleViews.ts'

const ink = { fill: 'var(--ink)', fontSize: 12.5 }
const rowHeight = 46
const axisHeight = 34

/** Two bars for each ingredient; the table beside it says the same in figures. */
export default function ParticleChart({ shares }: { readonly shares: readonly ParticleView[] }) {
  const rows = shares.map(({ order, name, ...share }) => ({ ...share, name: `${order + 1} ${name}` }))
  return (
    <ResponsiveContainer width="100%" height={shares.length * rowHeight + axisHeight}>
      <BarChart
        data={rows}
        layout="vertical"
        barGap={1}
        barCategoryGap="20%"
        margin={{ left: 0, right: 48, top: 2, bottom: 0 }}
        accessibilityLayer={false}
      >
        <XAxis type="number" domain={[0, 'auto']} unit=" %" height={26} tick={ink} />
        <YAxis type="category" dataKey="name" width={168} tickLine={false} tick={ink} />
        <Bar
          dataKey="formal"
          fill="var(--paper)"
          stroke="var(--ink)"
          strokeDasharray="4 3"
          barSize={14}
          isAnimationActive={false}
        >
          <LabelList dataKey="formalText" position="right" {...ink} />
        </Bar>
        <Bar
          dataKey="counted"
          fill="var(--accent)"
          stroke="var(--ink)"
          barSize={14}
          isAnimationActive={false}
        >
          <LabelList dataKey="countedText" position="right" {...ink} />
        </Bar>
      </BarChart>
    </ResponsiveContainer>
  )
}
