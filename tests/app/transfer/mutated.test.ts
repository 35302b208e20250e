import { describe, expect, it } from 'vitest'
import { openText } from '../../../src/app/menu/files.ts'
import { writeFormula } from '../../../src/formula/document.ts'
import { seededUniform } from '../../../src/numeric/random.ts'
import { full } from '../../formula/samples.ts'

const foreign = [
  '{',
  '}',
  '"',
  ',',
  '0',
  '-',
  'null',
  '[]',
  '{}',
  '1e999',
  '\\u0000',
  '__proto__',
  'é',
  '\u0000',
]

describe('ten thousand files that were damaged', () => {
  it('are each a whole formula or refused with a reason', () => {
    const text = writeFormula(full)
    const random = seededUniform(20_261_201)
    const below = (most: number) => Math.floor(random() * most)
    let refused = 0
    for (let count = 0; count < 10_000; count += 1) {
      let damaged = text
      for (let times = 0; times <= below(3); times += 1) {
        const at = below(damaged.length)
        const end = at + below(below(2) === 0 ? 3 : damaged.length - at)
        damaged = damaged.slice(0, at) + (foreign[below(foreign.length)] ?? '') + damaged.slice(end)
      }
      const opened = openText('damaged', damaged)
      if (!opened.ok) {
        refused += 1
        expect(opened.reason.length).toBeGreaterThan(20)
        continue
      }
      const again = openText('again', writeFormula(opened.formula))
      expect(again.ok && writeFormula(again.formula)).toBe(writeFormula(opened.formula))
    }
    expect(refused).toBeGreaterThan(8000)
  })
})
