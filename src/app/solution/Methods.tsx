import { usePage } from '../state/context.tsx'
import { methodViews, type MethodView } from '../state/methodViews.ts'
import { useWidth } from '../common/useWidth.ts'
import { spanScale, type Scale } from '../axis/scale.ts'
import { textWidth } from '../axis/segments.ts'
import { Trace } from './Trace.tsx'
import './methods.css'

const inset = 10

/** Every method's answer on one axis; each opens into its arithmetic. */
export function Methods() {
  const { title, unit, low, high, methods } = usePage(methodViews)
  const [frame, width] = useWidth<HTMLDivElement>(420)
  const scale = spanScale(low, high, inset, width - inset, 84)
  return (
    <section aria-labelledby="methods">
      <h2 id="methods">{title}</h2>
      <div className="methods">
        {methods.map((method) => (
          <Method key={method.id} method={method} scale={scale} width={width} />
        ))}
        <div className="method-axis-row">
          <div ref={frame} className="method-plot">
            {high > low && <MethodAxis scale={scale} width={width} unit={unit} />}
          </div>
        </div>
      </div>
    </section>
  )
}

interface MethodProps {
  readonly method: MethodView
  readonly scale: Scale
  readonly width: number
}

function Method({ method, scale, width }: MethodProps) {
  return (
    <details className="method">
      <summary className="method-summary">
        <span className={method.isHeadline ? 'method-name method-headline' : 'method-name'}>
          {method.name}
        </span>
        <span className="method-plot">
          {method.value === null ? (
            <span className="small soft">{method.text}</span>
          ) : (
            <Dot
              value={method.value}
              text={method.text}
              scale={scale}
              width={width}
              headline={method.isHeadline}
            />
          )}
        </span>
      </summary>
      <div className="method-opened">
        {method.why !== '' && <p>{method.why}</p>}
        {method.missing.map((sentence) => (
          <p key={sentence} className="small">
            {sentence}
          </p>
        ))}
        <Trace steps={method.steps} />
      </div>
    </details>
  )
}

interface DotProps {
  readonly value: number
  readonly text: string
  readonly scale: Scale
  readonly width: number
  readonly headline: boolean
}

function Dot({ value, text, scale, width, headline }: DotProps) {
  const x = scale.place(value)
  const fits = x + textWidth(text, 13) + 16 < width
  return (
    <>
      <svg className="method-dot-row" width={width} height="24" aria-hidden="true">
        <path d={`M${inset} 12H${width - inset}`} className="method-guide" />
        {headline ? (
          <path d={`M${x} 4l8 8-8 8-8-8z`} className="method-diamond" />
        ) : (
          <circle cx={x} cy="12" r="5.5" className="method-dot" />
        )}
        <text
          x={fits ? x + 12 : x - 12}
          y="16.5"
          textAnchor={fits ? 'start' : 'end'}
          className="method-value halo"
        >
          {text}
        </text>
      </svg>
      <span className="unseen">{text}</span>
    </>
  )
}

function MethodAxis({
  scale,
  width,
  unit,
}: {
  readonly scale: Scale
  readonly width: number
  readonly unit: string
}) {
  return (
    <svg width={width} height="34" aria-hidden="true" className="method-axis">
      <path d={`M${inset} 6H${width - inset}`} className="axis-line" />
      {scale.ticks.map((tick, index) => {
        const x = scale.place(tick)
        const anchor = x < 24 ? 'start' : x > width - 30 ? 'end' : 'middle'
        return (
          <g key={tick}>
            <path d={`M${x} 2v8`} className="axis-line" />
            <text x={x} y="25" textAnchor={anchor} className="tick-label">
              {index === 0 ? `${tick} ${unit}` : tick}
            </text>
          </g>
        )
      })}
    </svg>
  )
}
