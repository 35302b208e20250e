import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import { emptyFormula } from '../../../src/formula/document.ts'
import { loadLibrary } from '../../../src/library/library.ts'
import table from './isotonic-vehicles.json'

/* Sodium chloride of published isotonic vehicles, to 0.02 % w/v; rows whose printed figure is doubtful are named. */

const library = loadLibrary()
const tolerance = 0.02

function sodiumChloridePercent(
  gramsPerLitre: Readonly<Record<string, number | undefined>>,
  method: string,
): number {
  const lines = Object.entries(gramsPerLitre).map(([ingredient, grams]) => ({
    key: ingredient,
    ingredient,
    amount: `${grams} g`,
  }))
  const evaluation = evaluate(
    {
      ...emptyFormula(),
      route: 'ophthalmic',
      finalVolume: '1000 mL',
      target: { quantity: 'sodium-chloride-equivalent', value: '0.9 %' },
      lines: [...lines, { key: 'adjuster', ingredient: 'sodium-chloride', amount: 'q.s.' }],
    },
    library,
  )
  const grams = evaluation.methods.find((answer) => answer.method === method)?.adjusterGrams
  return (grams ?? Number.NaN) / 10
}

describe(`isotonic vehicles: ${table.source}`, () => {
  const named = new Map(table.named.map((entry) => [entry.id, entry]))
  for (const { id, method, gramsPerLitre, sodiumChloridePercent: printed } of table.rows) {
    const exception = named.get(id)
    const ours = () => sodiumChloridePercent(gramsPerLitre, method)
    if (exception) {
      it(`${id}: printed ${printed} %, ours ${exception.ours} % (${exception.reason})`, () => {
        expect(ours()).toBeCloseTo(exception.ours, 2)
        expect(Math.abs(ours() - printed)).toBeGreaterThan(tolerance)
      })
    } else {
      it(`${id}: ${printed} %`, () => {
        expect(Math.abs(ours() - printed)).toBeLessThanOrEqual(tolerance)
      })
    }
  }
})
