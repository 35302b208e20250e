import { describe, expect, it } from 'vitest'
import type { ElectrolyteParameters } from '../../../src/library/electrolytes.ts'
import { library, modelOf } from '../../chemistry/activity/support.ts'
import { rowsOf } from '../support/rows.ts'
import { engineParameters, source } from './parameters.ts'

type Row = Readonly<Record<string, string>>

function check(row: Row, parameters: ElectrolyteParameters): void {
  const ions = (row['ions'] ?? '').split(' ').map((ion) => ion.split('='))
  const ids = ions.map(([id = '']) => id)
  const model = modelOf(ids, Number(row['celsius']), parameters)
  const m = Float64Array.from(ions, ([, molality]) => Number(molality))
  const { osmoticCoefficient, waterActivity } = model.osmotic(m)
  expect(Math.abs(osmoticCoefficient - Number(row['phi']))).toBeLessThan(1e-4)
  expect(Math.abs(waterActivity - Number(row['waterActivity']))).toBeLessThan(1e-5)
}

/*
 * Right arithmetic, not right parameters. Left out, because the other engine speciates them: sodium bicarbonate (four
 * strengths and one with sodium chloride), sodium carbonate (two), the bicarbonate dialysate (25 and 0 °C), boric acid
 * (alone and with sodium chloride), the borate buffer, the sea water, sodium bisulfate; of the second table the
 * phosphate (two), acetate and tromethamine buffers and the plasma-like electrolyte.
 */
describe(`an independent engine with the same parameters (${source})`, () => {
  const rows = rowsOf(new URL('rows.csv', import.meta.url))
  const parameters = engineParameters()

  it.each(rows.map((row) => [`${row['label']} at ${row['celsius']} °C`, row] as const))('%s', (_, row) => {
    check(row, parameters)
  })

  it('holds 89 solutions', () => expect(rows).toHaveLength(89))
})

/* Its acetate mixes with chloride by the published coefficient that this program has too. */
const withAcetate = (parameters: ElectrolyteParameters): ElectrolyteParameters => {
  const key = 'Acetate-|Cl-'
  const value = library.electrolytes.theta.get(key)
  if (!value) throw new Error(`${key} has no coefficient`)
  return { ...parameters, theta: new Map([...parameters.theta, [key, value]]) }
}

describe('the same engine with this program’s pairs beside its own', () => {
  const rows = rowsOf(new URL('extended.csv', import.meta.url))
  const parameters = withAcetate(engineParameters(library.electrolytes.binary))

  it.each(rows.map((row) => [row['label'] ?? '', row] as const))('%s', (_, row) => check(row, parameters))
})
