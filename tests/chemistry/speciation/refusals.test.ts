import { describe, expect, it } from 'vitest'
import texts from '../../../data/findings/speciation.json'
import {
  compileSpeciation,
  molalityOf,
  solveSpeciation,
} from '../../../src/chemistry/speciation/speciation.ts'
import { gatherTotals, refuseCharged } from '../../../src/chemistry/speciation/totals.ts'
import type { BackgroundIon, SpeciationSystem } from '../../../src/chemistry/speciation/types.ts'
import { sizedActivity } from './models.ts'
import { compiledOr, electroneutral, partsWith, solvedOr, solveWith, species } from './parts.ts'

const parts = partsWith(sizedActivity)
const records = new Map(species.map((record) => [record.id, record]))
const codes = new Set(texts.map((text) => text.code))
const base: SpeciationSystem = { celsius: 25, components: ['Na+', 'Cl-', 'phosphate'] }

/** A refusal's code, known to data/findings. */
function codeOf(result: { readonly status: string }): string {
  const code = 'code' in result ? String(result.code) : `not refused: ${result.status}`
  expect(codes).toContain(code)
  return code
}

describe('refusals', () => {
  it('names what it cannot take', () => {
    expect(codeOf(compileSpeciation({ ...base, celsius: 90 }, parts))).toBe('temperature-outside-constants')
    expect(codeOf(compileSpeciation({ ...base, components: ['unobtainium'] }, parts))).toBe('species-unknown')
    const compiled = compiledOr(base, parts)
    expect(codeOf(compiled.solve({ citrate: 1 }, electroneutral))).toBe('species-unknown')
    expect(codeOf(compiled.solve({ 'Na+': -0.1 }, electroneutral))).toBe('total-not-possible')
    expect(codeOf(compiled.solve({ 'Na+': NaN }, electroneutral))).toBe('total-not-possible')
    expect(codeOf(compiled.solve({ 'Na+': 0.1 }, { kind: 'pH', pH: 17 }))).toBe('ph-outside-range')
    expect(codeOf(compiled.solve({ 'Na+': 0.1 }, { kind: 'pH', pH: NaN }))).toBe('ph-outside-range')
  })

  it('names ionisation steps that do not fit together', () => {
    const ion = (charge: number, ...acidCharges: number[]): BackgroundIon => ({
      id: 'drug',
      charge,
      steps: acidCharges.map((acidCharge) => ({ pKa: 7, acidCharge })),
    })
    for (const broken of [ion(1, 1, 1), ion(2, 1), ion(-2, 0)]) {
      expect(codeOf(compileSpeciation({ ...base, background: [broken] }, parts))).toBe(
        'ionisation-steps-broken',
      )
    }
    expect(compileSpeciation({ ...base, background: [ion(1, 1, 0)] }, parts).status).toBe('compiled')
  })

  it('names a model that gives no number', () => {
    const broken = partsWith((list) => ({ species: list, lnGamma: (_m, out) => out.fill(NaN) }))
    expect(codeOf(compiledOr(base, broken).solve({ 'Na+': 0.1, 'Cl-': 0.1 }, electroneutral))).toBe(
      'activity-not-finite',
    )
  })

  it('names activity coefficients that never agree', () => {
    let turn = 0
    const restless = partsWith((list) => ({
      species: list,
      lnGamma: (_m, out) => out.fill((turn = 1 - turn)),
    }))
    const totals = { 'Na+': 0.1, 'Cl-': 0.05, phosphate: 0.05 }
    expect(codeOf(compiledOr(base, restless).solve(totals, electroneutral))).toBe('speciation-not-converged')
  })

  it('solves again after a refusal as if nothing had been', () => {
    const compiled = compiledOr(base, parts)
    const totals = { 'Na+': 0.1, phosphate: 0.06 }
    const first = solvedOr(compiled, totals)
    compiled.solve({ 'Na+': -1 }, electroneutral)
    expect([...solvedOr(compiled, totals).molalities]).toEqual([...first.molalities])
  })
})

describe('remarks', () => {
  const codesOf = (remarks: readonly { readonly code: string }[]) => {
    for (const { code } of remarks) expect(codes).toContain(code)
    return remarks.map(({ code }) => code)
  }

  it('names the acid or base that a given pH implies, with its ion', () => {
    const answer = solveWith(parts, { 'K+': 0.05, phosphate: 0.05 }, { kind: 'pH', pH: 7 })
    expect(codesOf(answer.remarks)).toEqual(['implied-ph-adjuster'])
    expect(answer.remarks[0]?.values).toMatchObject({ kind: 'base', counterIon: 'Na+' })
    expect(molalityOf(answer, 'Na+')).toBeCloseTo(answer.impliedBaseMolPerKg, 15)
    const other = solveWith(
      parts,
      { 'K+': 0.05, phosphate: 0.05 },
      { kind: 'pH', pH: 3 },
      {
        adjuster: { acidAnion: 'NO3-', baseCation: 'K+' },
      },
    )
    expect(other.remarks[0]?.values).toMatchObject({ kind: 'acid', counterIon: 'NO3-' })
  })

  it('names a metal and a ligand whose bond is not known, once both are there', () => {
    const totals = { 'Cu+2': 0.001, 'Cl-': 0.002, citrate: 0.01, 'Na+': 0.03 }
    expect(codesOf(solveWith(parts, totals).remarks)).toEqual(['complex-unknown'])
    expect(solveWith(parts, { ...totals, citrate: 0, 'Na+': 0 }).remarks).toEqual([])
    expect(solveWith(parts, { 'Zn+2': 0.01, 'Cl-': 0.02 }).remarks).toEqual([])
    const sweet = solveWith(parts, { borate: 0.1, 'D-mannitol': 0.2 })
    expect(sweet.remarks[0]?.values).toEqual({ metal: 'D-mannitol', ligand: 'borate' })
  })

  it('says when an enthalpy had to be assumed, and only away from 25 °C', () => {
    const drug: BackgroundIon = { id: 'drugH+', charge: 1, steps: [{ pKa: 7, acidCharge: 1 }] }
    const totals = { drugH: 0, 'drugH+': 0.05, 'Cl-': 0.05 }
    const solve = (celsius: number) => {
      const compiled = compiledOr({ celsius, components: ['Cl-'], background: [drug] }, parts)
      return solvedOr(compiled, { 'drugH+': totals['drugH+'], 'Cl-': totals['Cl-'] })
    }
    expect(codesOf(solve(25).remarks)).toEqual([])
    expect(codesOf(solve(37).remarks)).toEqual(['ionisation-enthalpy-assumed'])
  })
})

describe('totals', () => {
  it('count a complex in each of its components', () => {
    const gathered = gatherTotals(
      [
        { species: 'CaEDTA-2', molPerKg: 0.01 },
        { species: 'Na+', molPerKg: 0.02 },
      ],
      records,
    )
    expect(gathered).toEqual({ totals: { edetate: 0.01, 'Ca+2': 0.01, 'Na+': 0.02 }, charge: 0 })
  })

  it('count four boron in tetraborate, and acid by its charge alone', () => {
    const gathered = gatherTotals(
      [
        { species: 'B4O5(OH)4-2', molPerKg: 0.01 },
        { species: 'H+', molPerKg: 0.02 },
      ],
      records,
    )
    expect(gathered).toEqual({ totals: { borate: 0.04 }, charge: 0 })
  })

  it('refuse a stranger, and to solve a pH for ions that do not sum to zero', () => {
    expect(codeOf(gatherTotals([{ species: 'Xx+', molPerKg: 1 }], records) as { status: string })).toBe(
      'species-unknown',
    )
    const lone = gatherTotals([{ species: 'Na+', molPerKg: 0.1 }], records)
    if ('status' in lone) throw new Error(lone.code)
    expect(codeOf(refuseCharged(lone) ?? { status: 'none' })).toBe('released-ions-unbalanced')
    expect(refuseCharged({ totals: {}, charge: 0 })).toBeNull()
  })
})

describe('complexes and drugs', () => {
  it('edetate takes up calcium to the last', () => {
    const answer = solveWith(parts, { 'Na+': 0.02, 'Ca+2': 0.01, edetate: 0.012 }, { kind: 'pH', pH: 7 })
    expect(molalityOf(answer, 'CaEDTA-2')).toBeCloseTo(0.01, 6)
    expect(molalityOf(answer, 'Ca+2')).toBeLessThan(1e-6)
  })

  it('a drug half neutralised reads its pKa in dilute solution', () => {
    const drug: BackgroundIon = { id: 'drugH+', charge: 1, steps: [{ pKa: 8.5, acidCharge: 1 }] }
    const compiled = compiledOr({ celsius: 25, components: ['Cl-'], background: [drug] }, parts)
    const answer = solvedOr(compiled, { 'drugH+': 1e-3, 'Cl-': 5e-4 })
    expect(answer.pH).toBeCloseTo(8.5, 1)
    expect(molalityOf(answer, 'drugH+')).toBeCloseTo(molalityOf(answer, 'drugH+ (charge 0)'), 4)
  })

  it('solves once what it compiles for many', () => {
    const totals = { 'Na+': 0.08, phosphate: 0.05 }
    const once = solveSpeciation({ celsius: 25, totals, condition: electroneutral }, parts)
    const compiled = compiledOr({ celsius: 25, components: ['phosphate', 'Na+'] }, parts)
    expect(once).toEqual(solvedOr(compiled, totals))
  })
})
