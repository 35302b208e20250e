import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { emptyFormula } from '../../src/formula/document.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { stepSection } from '../../src/worksheet/steps.ts'

const library = loadLibrary()

describe('steps with solutions from the shelf', () => {
  const evaluation = evaluate(
    {
      ...emptyFormula(),
      route: 'irrigation',
      lines: [
        { key: 'a', ingredient: 'mannitol', amount: '1 %' },
        { key: 'b', ingredient: 'lactated-ringer-solution', amount: '10 mL' },
        { key: 'c', ingredient: 'sodium-chloride-0-9-percent-solution', amount: 'q.s.' },
      ],
    },
    library,
  )
  const section = stepSection(evaluation, library, true)
  const texts = section.kind === 'steps' ? section.steps.map(({ text }) => text) : []

  it('names a measured solution once, and not what it holds', () => {
    expect(texts.filter((text) => text.includes('Lactated Ringer solution'))).toHaveLength(1)
    expect(texts.some((text) => text.includes('Calcium chloride'))).toBe(false)
  })
  it('begins and fills up with the vehicle that fills', () => {
    expect(
      texts.filter((text) => text.includes('Sodium chloride 0.9 % solution')).length,
    ).toBeGreaterThanOrEqual(2)
    expect(texts.some((text) => text.includes('water for injection'))).toBe(false)
  })
})
