import { describe, expect, it } from 'vitest'
import { expectNamed, expectStatistics } from '../support/named.ts'
import { rowsOf } from '../support/rows.ts'
import { solutionOf } from '../support/salts.ts'
import content from './fitted.json'
import named from './named.json'

const rows = rowsOf(new URL('rows.csv', import.meta.url))

/* Curves of these molecules at 25 °C and the tetraborate's constant are fitted to these rows: they check nothing here. */
const fitted = new Set(content.solutes)
const fittedRows = new Set(content.rows)

const deviations = rows
  .filter(({ solute = '', molality = '' }) => !fitted.has(solute) && !fittedRows.has(`${solute} ${molality}`))
  .map(({ solute = '', molality = '', reference = '', referenceMolality = '' }) => {
    const at = (name: string, value: string) =>
      solutionOf(name, Number(value)).states['25'].osmolalityOsmPerKg
    return {
      label: `${solute} ${molality} ${reference} ${referenceMolality}`,
      percent: (at(solute, molality) / at(reference, referenceMolality) - 1) * 100,
    }
  })

describe('solutions measured to have the same water activity, at 25 °C', () => {
  it('are all at 25 °C', () => expect(rows.every(({ kelvin }) => kelvin === '298.15')).toBe(true))
  expectStatistics(deviations, 0.5, 1.5)
  expectNamed(
    deviations.filter(({ percent }) => Math.abs(percent) > 1.5),
    named,
  )
})
