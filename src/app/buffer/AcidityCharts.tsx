import { useMemo, useState, type ReactElement } from 'react'
import {
  CartesianGrid,
  Legend,
  Line,
  LineChart,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from 'recharts'
import type { Evaluation } from '../../evaluation/types.ts'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { usePage } from '../state/context.tsx'
import { acidityCurvesView, type AcidityCurvesView } from '../state/curveViews.ts'

const ink = { fill: 'var(--ink)', fontSize: 12.5 }
const plain = { margin: { top: 10, right: 16, bottom: 22, left: 4 }, accessibilityLayer: false } as const
const line = { strokeWidth: 2, dot: false, isAnimationActive: false } as const
const dashes = ['0', '6 3', '2 3', '8 3 2 3', '1 4']

interface Props {
  readonly evaluation: Evaluation
  readonly components: readonly string[]
}

/** Titration with capacity, species against pH, pH against temperature; each with the same in words. */
export default function AcidityCharts({ evaluation, components }: Props) {
  const library = usePage((state) => state.library)
  const [component, setComponent] = useState<string | null>(null)
  const chosen = component !== null && components.includes(component) ? component : (components[0] ?? null)
  const view = useMemo(() => acidityCurvesView(evaluation, chosen, library), [evaluation, chosen, library])
  if (!view) return null
  return (
    <>
      {chosen !== null && components.length > 1 && (
        <p>
          Species of{' '}
          <InlineChoice
            label="Component whose species are drawn"
            value={chosen}
            choices={components.map((value) => ({ value, words: value }))}
            onChoose={setComponent}
          />
        </p>
      )}
      <div className="buffer-charts">
        <Titration view={view} />
        {chosen !== null && <Species view={view} component={chosen} />}
        <Temperature view={view} />
      </div>
    </>
  )
}

function Titration({ view }: { readonly view: AcidityCurvesView }) {
  const { reach, ticks } = view
  return (
    <Chart
      title="pH as acid (left) or base (right) is added"
      x="mmol/L of strong acid (−) or base (+)"
      text={view.titrationText}
    >
      <LineChart data={view.titration} {...plain}>
        <CartesianGrid stroke="var(--rule)" />
        <XAxis dataKey="added" type="number" domain={[-reach, reach]} ticks={ticks} tick={ink} />
        <YAxis yAxisId="pH" domain={['auto', 'auto']} tick={ink} width={42} />
        <YAxis yAxisId="capacity" orientation="right" domain={[0, 'auto']} tick={ink} width={42} />
        <ReferenceLine yAxisId="pH" x={0} stroke="var(--ink)" />
        <Legend verticalAlign="top" />
        <Line yAxisId="pH" dataKey="pH" name="pH" stroke="var(--ink)" {...line} />
        <Line
          yAxisId="capacity"
          dataKey="capacity"
          name="capacity, mmol/L per pH (right)"
          stroke="var(--accent)"
          strokeDasharray="6 3"
          {...line}
        />
      </LineChart>
    </Chart>
  )
}

function Species({ view, component }: { readonly view: AcidityCurvesView; readonly component: string }) {
  return (
    <Chart title={`Species of ${component}, share in %`} x="pH" text={view.speciesText}>
      <LineChart data={view.species} {...plain}>
        <CartesianGrid stroke="var(--rule)" />
        <XAxis dataKey="pH" type="number" domain={[2, 12]} ticks={[2, 4, 6, 8, 10, 12]} tick={ink} />
        <YAxis domain={[0, 100]} tick={ink} width={42} />
        <Legend verticalAlign="top" />
        {view.speciesNames.map((name, index) => (
          <Line
            key={name}
            dataKey={name}
            name={name}
            stroke={index % 2 === 0 ? 'var(--ink)' : 'var(--accent)'}
            strokeDasharray={dashes[index % dashes.length] ?? '0'}
            {...line}
          />
        ))}
      </LineChart>
    </Chart>
  )
}

function Temperature({ view }: { readonly view: AcidityCurvesView }) {
  return (
    <Chart title="pH against temperature" x="°C" text={view.temperatureText}>
      <LineChart data={view.temperature} {...plain}>
        <CartesianGrid stroke="var(--rule)" />
        <XAxis dataKey="celsius" type="number" domain={[0, 40]} tick={ink} />
        <YAxis domain={['auto', 'auto']} tick={ink} width={42} />
        <Line dataKey="pH" stroke="var(--ink)" strokeWidth={2} isAnimationActive={false} />
      </LineChart>
    </Chart>
  )
}

interface ChartProps {
  readonly title: string
  readonly x: string
  /** The same in words, for whoever does not see the drawing. */
  readonly text: string
  readonly children: ReactElement
}

function Chart({ title, x, text, children }: ChartProps) {
  return (
    <figure className="buffer-chart">
      <figcaption>{title}</figcaption>
      <div aria-hidden="true">
        <ResponsiveContainer width="100%" height={260}>
          {children}
        </ResponsiveContainer>
        <p className="chart-axis-name small soft">{x}</p>
      </div>
      <p className="unseen">{text}</p>
    </figure>
  )
}
