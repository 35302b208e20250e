import type { LineAnswer } from '../types.ts'
import { lineKeyOf } from './keys.ts'
import type { StockShare } from './stock.ts'

/** Everything that one line of the formula brings. */
export interface LineGroup {
  /** Key of the formula's line. */
  readonly key: string
  readonly stock: StockShare | null
  /** One, or one for each ingredient of a stock. */
  readonly lines: readonly LineAnswer[]
}

/** Lines of the answer by the lines of the formula, in their order. */
export function groupLines(lines: readonly LineAnswer[]): readonly LineGroup[] {
  const groups = new Map<string, LineAnswer[]>()
  for (const line of lines) {
    const key = lineKeyOf(line.key)
    groups.set(key, [...(groups.get(key) ?? []), line])
  }
  return [...groups].map(([key, of]) => ({ key, stock: of[0]?.stock ?? null, lines: of }))
}

/** The sum of a figure over the parts; null where one of them is not known. */
export const summed = ({ lines }: LineGroup, of: (line: LineAnswer) => number | null): number | null =>
  lines.reduce<number | null>((sum, line) => {
    const value = of(line)
    return sum === null || value === null ? null : sum + value
  }, 0)
