import { useWidth } from '../common/useWidth.ts'
import { spanScale, type Scale } from '../axis/scale.ts'
import { textWidth } from '../axis/segments.ts'
import { wholeNumber } from '../words/figures.ts'
import type { Column } from './columns.ts'

const rowHeight = 58
const head = 6
const edge = 14
const leastSpan = 60

/** Every formula's osmolality with its interval on one axis, over the span that its route tolerates. */
export function SharedAxis({ columns }: { readonly columns: readonly Column[] }) {
  const [frame, width] = useWidth<HTMLDivElement>(960)
  const scale = scaleFor(columns, width)
  const axisTop = head + columns.length * rowHeight + 4
  return (
    <figure className="shared-axis">
      <div ref={frame} className="axis-frame">
        <svg
          className="axis"
          width={width}
          height={axisTop + 26}
          role="img"
          aria-labelledby="shared-axis-said"
        >
          {columns.map((column, index) => (
            <AxisRow
              key={column.id}
              column={column}
              scale={scale}
              width={width}
              top={head + index * rowHeight}
            />
          ))}
          <path d={`M${edge} ${axisTop}H${width - edge}`} className="axis-line" />
          {scale.ticks.map((tick) => (
            <g key={tick}>
              <path d={`M${scale.place(tick)} ${axisTop - 4}v8`} className="axis-line" />
              <text x={scale.place(tick)} y={axisTop + 20} textAnchor="middle" className="tick-label">
                {wholeNumber(tick)}
              </text>
            </g>
          ))}
        </svg>
      </div>
      <figcaption id="shared-axis-said" className="axis-caption">
        Osmolality in mOsm/kg; the axis does not begin at zero. The bar is the interval that 95 of 100
        readings lie in, hatched what the route tolerates.
        <span className="unseen"> {columns.map(spoken).join(' ')}</span>
      </figcaption>
    </figure>
  )
}

const spoken = ({ letter, name, evaluation }: Column) => {
  const osmolality = evaluation?.solution?.osmolality
  if (!osmolality) return `${letter}, ${name}: no figure.`
  return `${letter}, ${name}: ${wholeNumber(osmolality.value)}, ${wholeNumber(osmolality.low)} to ${wholeNumber(osmolality.high)}.`
}

/** From a little below the lowest to a little above the highest, and never so close that nothing looks like much. */
function scaleFor(columns: readonly Column[], width: number): Scale {
  const intervals = columns.flatMap(({ evaluation }) => evaluation?.solution?.osmolality ?? [])
  const low = Math.min(...intervals.map((interval) => interval.low))
  const high = Math.max(...intervals.map((interval) => interval.high))
  if (intervals.length === 0) return spanScale(0, 330, edge, width - edge)
  const margin = Math.max((high - low) * 0.25, (leastSpan - (high - low)) / 2)
  return spanScale(Math.max(0, low - margin), high + margin, edge, width - edge)
}

interface RowProps {
  readonly column: Column
  readonly scale: Scale
  readonly width: number
  readonly top: number
}

function AxisRow({ column: { letter, name, evaluation }, scale, width, top }: RowProps) {
  const osmolality = evaluation?.solution?.osmolality
  const span = evaluation?.routeSpan
  const middle = top + 38
  const value = osmolality ? wholeNumber(osmolality.value) : 'no figure'
  const label = shortened(`${letter}  ${name}`, width - edge * 2 - textWidth(value, 14) - 20)
  const left = span ? scale.place(span.low) : 0
  const right = span ? scale.place(span.high) : 0
  return (
    <g>
      {right > left && (
        <>
          <rect x={left} y={middle - 14} width={right - left} height={28} className="span-wash" />
          <rect x={left} y={middle - 14} width={right - left} height={28} fill="url(#tolerated)" />
        </>
      )}
      <text x={edge} y={top + 14} className="shared-name halo">
        {label} <tspan className="total-label">{value}</tspan>
      </text>
      {osmolality && (
        <Whisker low={scale.place(osmolality.low)} high={scale.place(osmolality.high)} middle={middle} />
      )}
      {osmolality && <circle cx={scale.place(osmolality.value)} cy={middle} r={5} className="target-flag" />}
    </g>
  )
}

function Whisker({
  low,
  high,
  middle,
}: {
  readonly low: number
  readonly high: number
  readonly middle: number
}) {
  const path = `M${low} ${middle}H${high}M${low} ${middle - 8}V${middle + 8}M${high} ${middle - 8}V${middle + 8}`
  return (
    <>
      <path d={path} className="whisker-halo" />
      <path d={path} className="whisker" />
    </>
  )
}

function shortened(text: string, room: number): string {
  if (textWidth(text, 12.5) <= room) return text
  const fitting = Math.max(4, Math.floor((room / textWidth(text, 12.5)) * text.length) - 1)
  return `${text.slice(0, fitting)}…`
}
