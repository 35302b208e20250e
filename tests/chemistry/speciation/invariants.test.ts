import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bufferCapacity } from '../../../src/chemistry/speciation/capacity.ts'
import { molalityOf } from '../../../src/chemistry/speciation/speciation.ts'
import { amountToReach, titrate, withTitrant } from '../../../src/chemistry/speciation/titrate.ts'
import type { Speciated } from '../../../src/chemistry/speciation/types.ts'
import { sizedActivity } from './models.ts'
import { compiledOr, partsWith, solvedOr } from './parts.ts'

const parts = partsWith(sizedActivity)
const weak = [
  'acetate',
  'borate',
  'carbonate',
  'citrate',
  'edetate',
  'glycine',
  'histidine',
  'lactate',
  'phosphate',
  'sulfate',
  'tartrate',
  'tromethamine',
]
const strong = ['Na+', 'K+', 'Ca+2', 'Mg+2', 'Zn+2', 'Al+3', 'Cl-', 'NO3-']
const components = [...weak, ...strong]

/** Any amounts from absent to molar, traces included. */
const anyAmount = fc.oneof(
  fc.constant(0),
  fc.double({ min: -9, max: 0, noNaN: true }).map((exponent) => 10 ** exponent),
)
const anyTotals = fc
  .array(anyAmount, { minLength: components.length, maxLength: components.length })
  .map((amounts) =>
    Object.fromEntries(components.map((component, index) => [component, amounts[index] ?? 0])),
  )

const compiled = compiledOr({ celsius: 25, components }, parts)

/** Sum of a component over all species of an answer. */
function held(answer: Speciated, component: string): number {
  let sum = 0
  for (const [index, record] of answer.species.entries()) {
    const own = record.component === component ? record.count : 0
    const shared = record.partners?.find((partner) => partner.component === component)?.count ?? 0
    sum += (own + shared) * (answer.molalities[index] ?? 0)
  }
  return sum
}

const chargeOf = (answer: Speciated) =>
  answer.species.reduce((sum, record, index) => sum + record.charge * (answer.molalities[index] ?? 0), 0)

describe('any composition', () => {
  it('converges, keeps every component to 1e-10 and the charge to 1e-10 of the ionic strength', () => {
    fc.assert(
      fc.property(anyTotals, (totals) => {
        const answer = solvedOr(compiled, totals)
        for (const component of components) {
          const total = totals[component] ?? 0
          expect(Math.abs(held(answer, component) - total)).toBeLessThanOrEqual(1e-10 * total)
        }
        expect(Math.abs(chargeOf(answer))).toBeLessThanOrEqual(1e-10 * answer.ionicStrength)
        expect(answer.residuals.massBalance).toBeLessThanOrEqual(1e-10)
        expect(answer.molalities.every((molality) => molality >= 0)).toBe(true)
      }),
      { numRuns: 200 },
    )
  })

  it('given a pH, keeps every component and is electroneutral with the implied acid or base', () => {
    fc.assert(
      fc.property(anyTotals, fc.double({ min: 1, max: 13, noNaN: true }), (totals, pH) => {
        const answer = solvedOr(compiled, totals, { kind: 'pH', pH })
        expect(answer.pH).toBeCloseTo(pH, 9)
        const added: Record<string, number> = {
          'Cl-': answer.impliedAcidMolPerKg,
          'Na+': answer.impliedBaseMolPerKg,
        }
        for (const component of components) {
          const total = (totals[component] ?? 0) + (added[component] ?? 0)
          expect(Math.abs(held(answer, component) - total)).toBeLessThanOrEqual(1e-10 * total)
        }
        expect(Math.abs(chargeOf(answer))).toBeLessThanOrEqual(1e-10 * answer.ionicStrength)
        expect(Math.min(answer.impliedAcidMolPerKg, answer.impliedBaseMolPerKg)).toBe(0)
      }),
      { numRuns: 200 },
    )
  })

  it('gives the same numbers whatever the order of the components', () => {
    fc.assert(
      fc.property(
        anyTotals,
        fc.shuffledSubarray(components, { minLength: components.length }),
        (totals, order) => {
          const other = compiledOr({ celsius: 25, components: order }, parts)
          expect([...solvedOr(other, totals).molalities]).toEqual([...solvedOr(compiled, totals).molalities])
        },
      ),
      { numRuns: 30 },
    )
  })

  it('solved, then taken at the solved pH, needs no acid or base', () => {
    fc.assert(
      fc.property(anyTotals, (totals) => {
        const free = solvedOr(compiled, totals)
        fc.pre(free.pH > -1 && free.pH < 15)
        const held = solvedOr(compiled, totals, { kind: 'pH', pH: free.pH })
        const implied = held.impliedAcidMolPerKg + held.impliedBaseMolPerKg
        expect(implied).toBeLessThanOrEqual(1e-8 * Math.max(held.ionicStrength, 1e-6))
      }),
      { numRuns: 100 },
    )
  })
})

describe('acid and base', () => {
  it('acid never raises the pH, base never lowers it', () => {
    fc.assert(
      fc.property(anyTotals, fc.double({ min: -6, max: -1, noNaN: true }), (totals, exponent) => {
        const amount = 10 ** exponent
        const start = solvedOr(compiled, totals).lnHydrogenActivity
        const [acid, base] = ['Cl-', 'Na+'].map((ion) =>
          solvedOr(compiled, withTitrant(totals, { [ion]: 1 }, amount)),
        )
        expect(acid?.lnHydrogenActivity).toBeGreaterThan(start - 1e-9)
        expect(base?.lnHydrogenActivity).toBeLessThan(start + 1e-9)
      }),
      { numRuns: 100 },
    )
  })

  it('moves without a jump', () => {
    const totals = { 'Na+': 0, 'Ca+2': 0.002, 'Cl-': 0.004, citrate: 0.02, phosphate: 0.02, borate: 0.1 }
    const amounts = Array.from({ length: 400 }, (_, index) => index * 5e-4)
    const curve = titrate(compiled, totals, { 'Na+': 1 }, amounts)
    const readings = curve.map(({ result }) => (result.status === 'converged' ? result.pH : NaN))
    for (let index = 1; index < readings.length; index++) {
      const rise = (readings[index] ?? NaN) - (readings[index - 1] ?? NaN)
      expect(rise).toBeGreaterThan(0)
      expect(rise).toBeLessThan(0.5)
    }
  })
})

describe('buffer capacity', () => {
  it('is the slope of the titration', () => {
    fc.assert(
      fc.property(anyTotals, (totals) => {
        const answer = solvedOr(compiled, totals)
        const capacity = bufferCapacity(compiled, totals, answer).molPerKgPerPH
        const step = capacity * 2e-4
        const readings = [0, 1, 2].map(
          (count) => solvedOr(compiled, withTitrant(totals, { 'Na+': 1 }, count * step)).pH,
        )
        const [zero = NaN, one = NaN, two = NaN] = readings
        const slope = (4 * one - two - 3 * zero) / (2 * step)
        expect(Math.abs(capacity * slope - 1)).toBeLessThan(1e-4)
      }),
      { numRuns: 100 },
    )
  })

  it('sums over its parts', () => {
    const totals = { 'Na+': 0.03, citrate: 0.02, phosphate: 0.02, borate: 0.1, 'Ca+2': 0.001, 'Cl-': 0.002 }
    const capacity = bufferCapacity(compiled, totals, solvedOr(compiled, totals))
    const sum = Object.values(capacity.byComponent).reduce((total, part) => total + part, 0)
    expect(sum).toBeCloseTo(capacity.atHeldActivity, 12)
    expect(Object.values(capacity.byComponent).every((part) => part > -1e-12)).toBe(true)
  })
})

describe('titre', () => {
  it('the amount found brings the pH asked for', () => {
    const totals = { phosphate: 0.05, 'K+': 0.05 }
    const titre = amountToReach(compiled, totals, { 'Na+': 1 }, 7.4)
    if (titre.status !== 'reached') throw new Error(JSON.stringify(titre))
    expect(solvedOr(compiled, withTitrant(totals, { 'Na+': 1 }, titre.molPerKg)).pH).toBeCloseTo(7.4, 8)
    const direct = solvedOr(compiled, totals, { kind: 'pH', pH: 7.4 })
    expect(titre.molPerKg).toBeCloseTo(direct.impliedBaseMolPerKg, 9)
  })

  it('says when the pH lies on the other side, or beyond the titrant', () => {
    const totals = { phosphate: 0.05, 'K+': 0.05 }
    expect(amountToReach(compiled, totals, { 'Na+': 1 }, 3)).toMatchObject({ status: 'already-past' })
    expect(amountToReach(compiled, totals, { tromethamine: 1 }, 12)).toMatchObject({ status: 'not-reached' })
  })
})

describe('open to carbon dioxide', () => {
  it('pure water in air reads near 5.6', () => {
    const open = { kind: 'open', partialPressureAtm: 4.2e-4 } as const
    const air = compiledOr({ celsius: 25, components: ['carbonate'], carbonDioxide: open }, parts)
    const answer = solvedOr(air, {})
    expect(answer.pH).toBeCloseTo(5.6, 2)
    expect(molalityOf(answer, 'CO2')).toBeCloseTo(0.03404 * 4.2e-4, 7)
  })

  it('bicarbonate left open to air turns alkaline', () => {
    const totals = { 'Na+': 0.15, carbonate: 0.15 }
    const open = { kind: 'open', partialPressureAtm: 4.2e-4 } as const
    const air = compiledOr({ celsius: 25, components: ['Na+', 'carbonate'], carbonDioxide: open }, parts)
    expect(solvedOr(air, { 'Na+': 0.15 }).pH).toBeGreaterThan(solvedOr(compiled, totals).pH + 1)
  })
})
