import { describe, expect, it } from 'vitest'
import type { ElectrolyteParameters } from '../../../src/library/electrolytes.ts'
import { source, speciatedEngineParameters } from '../GeochemicalEngine/parameters.ts'
import { rowsOf } from '../support/rows.ts'
import { library, statistics } from '../support/salts.ts'
import { engineEquilibria } from './constants.ts'
import named from './named.json'
import { solvedAs, type Engine } from './solutions.ts'

const rows: readonly Engine[] = rowsOf(new URL('rows.csv', import.meta.url)).map(
  ({ label = '', celsius, totals = '', phi, waterActivity, pH }) => ({
    label: `${label} at ${celsius} °C`,
    celsius: Number(celsius),
    totals,
    phi: Number(phi),
    waterActivity: Number(waterActivity),
    pH: Number(pH),
  }),
)

/* The other engine was given this program's pairs where it has none; acetate mixes with chloride in both. */
const theirs = withAcetate(speciatedEngineParameters(library.electrolytes.binary))

function withAcetate(parameters: ElectrolyteParameters): ElectrolyteParameters {
  const key = 'Acetate-|Cl-'
  const value = library.electrolytes.theta.get(key)
  if (!value) throw new Error(`${key} has no coefficient`)
  return { ...parameters, theta: new Map([...parameters.theta, [key, value]]) }
}

interface Exception {
  readonly row: string
  readonly engine: number
  readonly ours: number
  readonly cause: string
}

const lines = (list: readonly Omit<Exception, 'cause'>[]) =>
  list.map(({ row, engine, ours }) => `${row}: engine ${engine.toFixed(4)}, ours ${ours.toFixed(4)}`)

const phis = (parameters: ElectrolyteParameters) =>
  rows.map((row) => ({ row: row.label, engine: row.phi, ours: solvedAs(row, parameters).phi }))

/*
 * Right arithmetic, not right parameters: every row as a composition through the whole chemistry, speciated with the
 * charge balanced. The strong salts alone, past the activity model only, stand in GeochemicalEngine.
 */
describe(`an independent engine, every solution through the whole chemistry (${source})`, () => {
  const equilibria = engineEquilibria(library.equilibria)

  it('holds all 118 solutions', () => expect(rows).toHaveLength(118))

  it.each(rows.map((row) => [row.label, row] as const))(
    '%s: φ and the activity of water within 1e-4, parameters and constants the same',
    (_, row) => {
      const { phi, waterActivity } = solvedAs(row, theirs, equilibria)
      expect(Math.abs(phi - row.phi)).toBeLessThan(1e-4)
      expect(Math.abs(waterActivity - row.waterActivity)).toBeLessThan(1e-5)
    },
  )

  it('names every solution that this program’s own constants and pairs take further than 1e-4', () => {
    const beyond = phis(theirs).filter(({ engine, ours }) => Math.abs(ours - engine) >= 1e-4)
    expect(lines(beyond)).toEqual(lines(named.constants))
  })
})

describe('the same solutions with this program’s own parameters', () => {
  const all = phis(library.electrolytes)

  it('half within 0.15 % of φ', () => {
    const found = statistics(
      all.map(({ row, engine, ours }) => ({ label: row, percent: (ours / engine - 1) * 100 })),
    )
    expect(found.median).toBeLessThan(0.15)
  })

  it('names every solution that the choice of parameters moves by more than 0.5 %', () => {
    const beyond = all.filter(({ engine, ours }) => Math.abs(ours / engine - 1) > 0.005)
    expect(lines(beyond)).toEqual(lines(named.parameters))
  })

  it('says why for each', () => {
    for (const { cause } of [...named.constants, ...named.parameters] as readonly Exception[])
      expect(cause.length).toBeGreaterThan(30)
  })
})
