import { describe, expect, it } from 'vitest'
import { placeLabels, textWidth } from '../../../src/app/axis/segments.ts'

const wanted = (key: string, left: number, right: number) => ({
  key,
  inside: ['sodium chloride 128', '5: 128', '5'],
  above: 'sodium chloride 128',
  left,
  right,
})

describe('labels on the axis', () => {
  it('stand inside their share, shortened as it gets narrow', () => {
    const texts = [300, 60, 20].map((width) => placeLabels([wanted('a', 0, width)], 12, 800)[0])
    expect(texts.map((label) => label?.text)).toEqual(['sodium chloride 128', '5: 128', '5'])
    expect(texts.every((label) => label?.row === 0)).toBe(true)
  })

  it('stand above a share that is too narrow for any text, inside the drawing', () => {
    const [label] = placeLabels([wanted('a', 0, 4)], 12, 800)
    expect(label?.row).toBe(1)
    expect(label?.x).toBeCloseTo(textWidth('sodium chloride 128', 12) / 2, 9)
  })

  it('never touch each other in one row', () => {
    const narrow = Array.from({ length: 12 }, (_, index) =>
      wanted(`${index}`, 300 + index * 9, 304 + index * 9),
    )
    const placed = placeLabels(narrow, 12, 800)
    const half = textWidth('sodium chloride 128', 12) / 2
    for (const one of placed) {
      for (const other of placed) {
        if (one.key === other.key || one.row !== other.row) continue
        expect(Math.abs(one.x - other.x)).toBeGreaterThanOrEqual(2 * half)
      }
    }
  })
})
