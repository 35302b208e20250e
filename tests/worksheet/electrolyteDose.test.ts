import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { emptyFormula } from '../../src/formula/document.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { electrolyteSection } from '../../src/worksheet/results.ts'

const library = loadLibrary()

const tableOf = (patient?: { readonly doseVolume: string }) => {
  const section = electrolyteSection(
    evaluate(
      {
        ...emptyFormula(),
        route: 'intravenous-central',
        finalVolume: '500 mL',
        lines: [{ key: 'k', ingredient: 'calcium-chloride-dihydrate', amount: '0.01 mmol/mL' }],
        ...(patient ? { patient } : {}),
      },
      library,
    ),
  )
  if (section?.kind !== 'table') throw new Error('no table')
  return section.rows.find(([ion]) => ion?.text === 'Ca+2')?.map(({ text }) => text)
}

describe('the electrolyte table', () => {
  it('counts each ion per mL, container and dose in mmol and mEq', () => {
    expect(tableOf({ doseVolume: '50 mL' })).toEqual(['Ca+2', '0.01', '0.02', '5', '10', '0.5', '1'])
  })
  it('has no dose columns where no dose is known', () => {
    expect(tableOf()).toHaveLength(5)
  })
})
