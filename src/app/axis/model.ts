import type { Interval } from '../../quantity/interval.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import { layEndToEnd, placeLabels, textWidth, type PlacedLabel, type Segment } from './segments.ts'
import { zeroScale, type Scale } from './scale.ts'

export interface ReferenceMark {
  readonly label: string
  readonly osmolalityMilliosmPerKg: number
}

/** What the axis shows, in mOsm/kg; nothing in it is calculated here. */
export interface AxisContent {
  readonly total: Interval | null
  readonly effective: Interval | null
  readonly target: number | null
  readonly span: Evaluation['routeSpan']
  readonly shares: readonly Segment[]
  readonly held: readonly Segment[]
  readonly marks: readonly ReferenceMark[]
}

export function axisContent(
  evaluation: Evaluation | null,
  target: number | null,
  marks: readonly ReferenceMark[],
): AxisContent {
  const lines = evaluation?.lines ?? []
  return {
    total: evaluation?.solution?.osmolality ?? null,
    effective: evaluation?.solution?.effectiveOsmolality ?? null,
    target,
    span: evaluation?.routeSpan ?? null,
    shares: layEndToEnd(lines, (line) => line.osmolalityShareMilliosmPerKg),
    held: layEndToEnd(lines, (line) => line.effectiveOsmolalityShareMilliosmPerKg),
    marks,
  }
}

const leastReach = 330

/** The axis reaches past everything that is drawn; a very wide tolerated span runs off its end. */
export function axisReach({ total, target, span, shares, marks }: AxisContent): number {
  const drawn = Math.max(
    leastReach,
    total?.high ?? 0,
    target ?? 0,
    shares.at(-1)?.to ?? 0,
    ...marks.map((mark) => mark.osmolalityMilliosmPerKg),
  )
  return span && Number.isFinite(span.high) ? Math.max(drawn, Math.min(span.high, drawn * 1.5)) : drawn
}

export const totalLabel = ({ value, low, high }: Interval, writeValue: (value: number) => string) =>
  `${writeValue(value)} (${writeValue(low)} to ${writeValue(high)})`

/** From this width on the total is written beside its interval; below it the sentences carry it. */
export const wide = 640

/** Lengthens the axis until the total's label finds room beyond the interval. */
function withRoomForTotal(
  content: AxisContent,
  width: number,
  writeValue: (value: number) => string,
): number {
  const reach = axisReach(content)
  if (!content.total || width < wide) return reach
  const label = textWidth(totalLabel(content.total, writeValue), totalSize) + 24
  return Math.max(reach, (content.total.high * width) / (width - label))
}

export interface AxisLayout {
  readonly scale: Scale
  readonly labels: readonly PlacedLabel[]
  readonly barTop: number
  readonly barHeight: number
  readonly heldTop: number
  readonly heldHeight: number
  readonly axisTop: number
  readonly height: number
}

export const labelSize = 12.5
export const totalSize = 14
const labelRow = 17
const edge = 1

export function axisLayout(
  content: AxisContent,
  width: number,
  writeValue: (value: number) => string,
): AxisLayout {
  const scale = zeroScale(withRoomForTotal(content, width, writeValue), edge, width - edge)
  const labels = placeLabels(
    content.shares.map(({ key, order, name, from, to }) => {
      const value = writeValue(to - from)
      return {
        key,
        inside: [`${name} ${value}`, `${order + 1} · ${value}`, `${order + 1}`],
        above: width < 560 ? `${order + 1} · ${value}` : `${order + 1} ${name} ${value}`,
        left: scale.place(from),
        right: scale.place(to),
      }
    }),
    labelSize,
    width,
  )
  const rows = Math.max(0, ...labels.map((label) => label.row))
  const barTop = 30 + rows * labelRow
  const barHeight = 34
  const heldTop = barTop + barHeight + 12
  const heldHeight = 12
  const axisTop = heldTop + heldHeight + 28
  return { scale, labels, barTop, barHeight, heldTop, heldHeight, axisTop, height: axisTop + 44 }
}
