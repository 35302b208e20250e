import type { LineAnswer } from '../../evaluation/types.ts'

/** One ingredient's stretch of the axis, in mOsm/kg. */
export interface Segment {
  readonly key: string
  readonly order: number
  readonly name: string
  readonly isAdjuster: boolean
  readonly from: number
  readonly to: number
}

/** Shares laid end to end in the order of the lines; lines without a share take no room. */
export function layEndToEnd(
  lines: readonly LineAnswer[],
  share: (line: LineAnswer) => number | null,
): readonly Segment[] {
  const segments: Segment[] = []
  let reached = 0
  lines.forEach((line, order) => {
    const width = share(line)
    if (width === null || !(width > 0)) return
    segments.push({
      key: line.key,
      order,
      name: line.ingredient.name,
      isAdjuster: line.isAdjuster,
      from: reached,
      to: reached + width,
    })
    reached += width
  })
  return segments
}

export interface PlacedLabel {
  readonly key: string
  readonly text: string
  readonly x: number
  /** 0: inside the segment; 1, 2, …: that many rows above the bar, with a leader line. */
  readonly row: number
}

const padding = 10

/** Estimated width of a text in the page's face; generous, so that labels never touch. */
export const textWidth = (text: string, size: number) => text.length * size * 0.61

interface Wanted {
  readonly key: string
  /** Texts to try inside the segment, longest first. */
  readonly inside: readonly string[]
  readonly above: string
  readonly left: number
  readonly right: number
}

/**
 * Puts a label inside its segment when one of its texts fits there; otherwise above the bar, in the
 * lowest row where it touches no other label.
 */
export function placeLabels(wanted: readonly Wanted[], size: number, edge: number): readonly PlacedLabel[] {
  const rows: number[] = []
  return wanted.map(({ key, inside, above, left, right }) => {
    const middle = (left + right) / 2
    const fitting = inside.find((label) => textWidth(label, size) + padding <= right - left)
    if (fitting !== undefined) return { key, text: fitting, x: middle, row: 0 }
    const half = textWidth(above, size) / 2
    const x = Math.min(Math.max(middle, half), edge - half)
    let row = rows.findIndex((end) => end + padding <= x - half)
    if (row < 0) row = rows.length
    rows[row] = x + half
    return { key, text: above, x, row: row + 1 }
  })
}
