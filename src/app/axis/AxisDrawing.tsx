import type { AxisContent, AxisLayout, ReferenceMark } from './model.ts'
import { labelSize, totalLabel, wide } from './model.ts'
import { weaveFill, weaveText } from './Patterns.tsx'
import { textWidth } from './segments.ts'

export interface DrawingProps {
  readonly content: AxisContent
  readonly layout: AxisLayout
  readonly width: number
  readonly writeValue: (value: number) => string
}

export function ToleratedSpan({ content: { span }, layout, width, label }: DrawingProps & { label: string }) {
  if (!span) return null
  const left = layout.scale.place(span.low)
  const right = layout.scale.place(span.high)
  const half = textWidth(label, labelSize) / 2
  const middle = Math.min(Math.max((left + right) / 2, half), width - half)
  return (
    <g>
      <rect
        x={left}
        y={20}
        width={Math.max(0, right - left)}
        height={layout.axisTop - 20}
        className="span-wash"
      />
      <rect
        x={left}
        y={20}
        width={Math.max(0, right - left)}
        height={layout.axisTop - 20}
        fill="url(#tolerated)"
      />
      <path d={`M${left} 20V${layout.axisTop}`} className="span-edge" />
      {span.high <= layout.scale.maximum && (
        <path d={`M${right} 20V${layout.axisTop}`} className="span-edge" />
      )}
      <text x={middle} y={14} textAnchor="middle" className="span-label">
        {label}
      </text>
    </g>
  )
}

export function Shares({ content, layout }: DrawingProps) {
  const { scale, barTop, barHeight } = layout
  return (
    <g>
      {content.shares.map(({ key, order, from, to }) => (
        <rect
          key={key}
          x={scale.place(from)}
          y={barTop}
          width={Math.max(0.5, scale.place(to) - scale.place(from))}
          height={barHeight}
          fill={weaveFill(order)}
          className="share"
        />
      ))}
    </g>
  )
}

const leaderRow = 17

/** Leader lines under all texts, so that none is crossed out. */
function Leaders({ content, layout }: DrawingProps) {
  const { scale, barTop } = layout
  return layout.labels.map(({ key, row }) => {
    const segment = content.shares.find((share) => share.key === key)
    if (!segment || row === 0) return null
    const foot = (scale.place(segment.from) + scale.place(segment.to)) / 2
    return (
      <path key={key} d={`M${foot} ${barTop}V${barTop - 3 - (row - 1) * leaderRow}`} className="leader" />
    )
  })
}

export function ShareLabels(drawing: DrawingProps) {
  const { content, layout } = drawing
  const { barTop, barHeight } = layout
  return (
    <g>
      <Leaders {...drawing} />
      {layout.labels.map(({ key, text, x, row }) => {
        const order = content.shares.find((share) => share.key === key)?.order ?? 0
        const inside = row === 0
        return (
          <text
            key={key}
            x={x}
            y={inside ? barTop + barHeight / 2 + 4.5 : barTop - 6 - (row - 1) * leaderRow}
            textAnchor="middle"
            className={`share-label ${inside ? weaveText(order) : 'halo'}`}
          >
            {text}
          </text>
        )
      })}
    </g>
  )
}

export function HeldByCells({ content, layout, width, writeValue }: DrawingProps) {
  const { scale, heldTop, heldHeight } = layout
  if (!content.effective || !content.total) return null
  const reached = scale.place(content.effective.value)
  const end = scale.place(content.total.value)
  const label = `cells hold ${writeValue(content.effective.value)}`
  const fits = reached + textWidth(label, labelSize) + 10 < width
  return (
    <g>
      {end > reached + 1 && (
        <rect x={reached} y={heldTop} width={end - reached} height={heldHeight} className="passes" />
      )}
      <rect
        x={scale.place(0)}
        y={heldTop}
        width={reached - scale.place(0)}
        height={heldHeight}
        className="held"
      />
      <text
        x={fits ? Math.max(reached, end) + 8 : reached}
        y={fits ? heldTop + heldHeight - 1.5 : heldTop + heldHeight + 15}
        textAnchor={fits ? 'start' : 'end'}
        className="held-label halo"
      >
        {label}
      </text>
    </g>
  )
}

export function Total({ content: { total }, layout, width, writeValue }: DrawingProps) {
  if (!total) return null
  const { scale, barTop, barHeight } = layout
  const middle = barTop + barHeight / 2
  const low = scale.place(total.low)
  const high = scale.place(total.high)
  const whisker = `M${low} ${middle}H${high}M${low} ${middle - 8}V${middle + 8}M${high} ${middle - 8}V${middle + 8}`
  return (
    <g>
      <path d={whisker} className="whisker-halo" />
      <path d={whisker} className="whisker" />
      {width >= wide && (
        <text x={high + 10} y={middle + 5} className="total-label halo">
          {totalLabel(total, writeValue)}
        </text>
      )}
    </g>
  )
}

export function Target({ content: { target }, layout, width, writeValue }: DrawingProps) {
  if (target === null) return null
  const { scale, barTop, axisTop } = layout
  const x = scale.place(target)
  return (
    <g>
      <path d={`M${x} ${barTop - 8}V${axisTop}`} className="target-line" />
      <path d={`M${x - 5} ${barTop - 15}h10l-5 8z`} className="target-flag" />
      {width >= wide && (
        <text x={x + 6} y={axisTop - 8} className="target-label halo">
          target {writeValue(target)}
        </text>
      )}
    </g>
  )
}

export function Ticks({ content, layout, width }: DrawingProps) {
  const { scale, axisTop } = layout
  return (
    <g>
      <path d={`M${scale.place(0)} ${axisTop}H${scale.place(scale.maximum)}`} className="axis-line" />
      {scale.ticks.map((tick) => {
        const x = scale.place(tick)
        const anchor = x < 12 ? 'start' : x > width - 16 ? 'end' : 'middle'
        return (
          <g key={tick}>
            <path d={`M${x} ${axisTop - 4}v8`} className="axis-line" />
            <text x={x} y={axisTop + 18} textAnchor={anchor} className="tick-label">
              {tick}
            </text>
          </g>
        )
      })}
      {spread(content.marks, layout).map(({ label, osmolalityMilliosmPerKg }) => {
        const x = scale.place(osmolalityMilliosmPerKg)
        return (
          <g key={label}>
            <path d={`M${x} ${axisTop}v26`} className="mark-line" />
            <text x={x} y={axisTop + 38} textAnchor="middle" className="mark-label">
              {label}
            </text>
          </g>
        )
      })}
    </g>
  )
}

/** Of reference marks that would be written over each other the larger stays. */
function spread(marks: readonly ReferenceMark[], { scale }: AxisLayout): readonly ReferenceMark[] {
  return marks.filter((mark, index) => {
    const next = marks[index + 1]
    if (!next) return true
    const room = scale.place(next.osmolalityMilliosmPerKg) - scale.place(mark.osmolalityMilliosmPerKg)
    return room > textWidth(next.label, 12) + 8
  })
}
