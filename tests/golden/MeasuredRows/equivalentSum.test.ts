import { describe, expect, it } from 'vitest'
import { statistics } from '../support/salts.ts'
import { byEquivalents } from './equivalents.ts'
import { measuredRows } from './measured.ts'

/* Not sodium chloride, by which the equivalents are made; not the rows to which a parameter was fitted. */
const compared = measuredRows.flatMap((row) => {
  const sum = row.isFitted || row.solute === 'NaCl' ? null : byEquivalents(row)
  if (sum === null) return []
  const inOsmol = row.table === 'freezing points' ? row.measured / 1.86 : row.measured
  return [
    {
      label: row.label,
      inOsmol,
      sum: (sum / row.measured - 1) * 100,
      model: (row.ours / row.measured - 1) * 100,
    },
  ]
})

const errors = (of: 'sum' | 'model', upTo: number) =>
  statistics(
    compared.filter(({ inOsmol }) => inOsmol <= upTo).map((row) => ({ label: row.label, percent: row[of] })),
  )

describe('the textbook sum of equivalents and the model, on the same measured rows', () => {
  it('compares every solute with a tabulated equivalent', () => expect(compared.length).toBeGreaterThan(340))

  /* The equivalents are tabulated at 1 % and near the isotonic strength. */
  it.each([0.6, 100])(
    'the model errs less at the median and at the 95th of 100, up to %d osmol/kg',
    (upTo) => {
      const [sum, model] = [errors('sum', upTo), errors('model', upTo)]
      expect(model.median).toBeLessThan(sum.median / 5)
      expect(model.p95).toBeLessThan(sum.p95 / 2)
    },
  )

  it('errs as the table of the documentation says', () => {
    const figures = [0.6, 100].flatMap((upTo) =>
      (['sum', 'model'] as const).flatMap((of) => {
        const { median, p95 } = errors(of, upTo)
        return [median.toFixed(1), p95.toFixed(1)]
      }),
    )
    expect(figures).toEqual(['4.1', '13.6', '0.4', '5.2', '9.6', '46.9', '0.2', '1.6'])
  })
})
