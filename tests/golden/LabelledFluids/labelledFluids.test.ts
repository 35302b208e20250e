import { describe, expect, it } from 'vitest'
import { evaluated, line, ownIngredient, type OwnRecord } from '../../evaluation/formulas.ts'
import content from './rows.json'

interface Row {
  readonly product: string
  readonly lines: readonly {
    readonly ingredient?: string
    readonly own?: OwnRecord
    readonly amount: string
  }[]
  readonly printed: number
  readonly source: string
  readonly ours?: number
  readonly cause?: string
}

const { agree, exceptions, leftOut } = content as {
  agree: readonly Row[]
  exceptions: readonly Row[]
  leftOut: readonly { readonly product: string; readonly reason: string }[]
}

/** Ideal sum of one litre, through the whole evaluation. */
function labelSum({ lines }: Row): number {
  const evaluation = evaluated(
    lines.map(({ ingredient = '', own, amount }) => line(own ? ownIngredient(own) : ingredient, amount)),
    { finalVolume: '1 L', route: 'intravenous-central' },
  )
  const sum = evaluation.solution?.labelOsmolarityMilliosmPerL
  if (sum === null || sum === undefined) {
    throw new Error(`no label sum: ${evaluation.findings.map(({ code }) => code).join(', ')}`)
  }
  return sum
}

/** Labels print to 1, 5, 10, 50 or 100: the largest that divides the value and is at most 2 % of it. */
const stepOf = (printed: number) =>
  [100, 50, 10, 5].find((step) => printed % step === 0 && step <= 0.02 * printed) ?? 1

const isWithinRounding = (sum: number, printed: number) =>
  Math.abs(sum - printed) <= stepOf(printed) / 2 + 1e-6

describe('osmolarity as labels print it', () => {
  for (const row of agree) {
    it(`${row.product}: ${row.printed} mOsm/L (${row.source})`, () => {
      const sum = labelSum(row)
      expect(isWithinRounding(sum, row.printed), `sum ${sum.toFixed(2)}`).toBe(true)
    })
  }

  for (const row of exceptions) {
    it(`${row.product}: printed ${row.printed}, sum ${row.ours}: ${row.cause}`, () => {
      const sum = labelSum(row)
      expect(sum.toFixed(1)).toBe(row.ours?.toFixed(1))
      expect(isWithinRounding(sum, row.printed)).toBe(false)
    })
  }

  it('names every exception and every row left out', () => {
    expect(exceptions.every(({ cause = '' }) => cause.length > 20)).toBe(true)
    expect(leftOut.every(({ reason }) => reason.length > 20)).toBe(true)
    expect(agree.length + exceptions.length + leftOut.length).toBe(57)
  })
})
