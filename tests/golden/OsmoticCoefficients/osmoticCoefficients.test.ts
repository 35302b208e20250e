import { describe } from 'vitest'
import { expectNamed, expectStatistics } from '../support/named.ts'
import { rowsOf } from '../support/rows.ts'
import { particles, solutionOf } from '../support/salts.ts'

const rows = rowsOf(new URL('rows.csv', import.meta.url))
/* The curve of sucrose at 25 °C is fitted to isopiestic molalities, of which these rows are no part. */
const deviations = rows.map(({ solute = '', molality = '', phi = '' }) => {
  const osmolality = solutionOf(solute, Number(molality)).states['25'].osmolalityOsmPerKg
  const ours = osmolality / (particles(solute) * Number(molality))
  return { label: `${solute} ${molality}`, percent: (ours / Number(phi) - 1) * 100 }
})

describe('tabulated osmotic coefficients at 25 °C, through the whole chemistry', () => {
  expectStatistics(deviations, 0.5, 1.5)
  expectNamed(
    deviations.filter(({ percent }) => Math.abs(percent) > 1.5),
    [],
  )
})
