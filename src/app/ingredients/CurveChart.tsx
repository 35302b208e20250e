import { useMemo } from 'react'
import { CartesianGrid, Line, LineChart, ResponsiveContainer, XAxis, YAxis } from 'recharts'
import type { Ingredient } from '../../library/types.ts'
import { usePage } from '../state/context.tsx'
import { curveView } from '../state/detailViews.ts'

const ink = { fill: 'var(--ink)', fontSize: 12.5 }

/** The osmotic curve of one ingredient alone in water, as the model has it. */
export default function CurveChart({ ingredient }: { readonly ingredient: Ingredient }) {
  const library = usePage((state) => state.library)
  const { points, text } = useMemo(() => curveView(ingredient, library), [ingredient, library])
  if (points.length < 2) return <p className="small soft">No osmotic curve can be drawn for it.</p>
  return (
    <figure className="curve-chart">
      <figcaption>Alone in water: mOsm/kg against % w/v</figcaption>
      <div aria-hidden="true">
        <ResponsiveContainer width="100%" height={220}>
          <LineChart
            data={[...points]}
            margin={{ top: 8, right: 16, bottom: 4, left: 4 }}
            accessibilityLayer={false}
          >
            <CartesianGrid stroke="var(--rule)" />
            <XAxis dataKey="percent" type="number" domain={[0, 'dataMax']} unit=" %" tick={ink} />
            <YAxis tick={ink} width={48} />
            <Line dataKey="milliosmPerKg" stroke="var(--ink)" strokeWidth={2} isAnimationActive={false} />
          </LineChart>
        </ResponsiveContainer>
      </div>
      <p className="unseen">{text}</p>
    </figure>
  )
}
