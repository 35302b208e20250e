import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compileSpeciation } from '../../../src/chemistry/speciation/speciation.ts'
import { gatherTotals } from '../../../src/chemistry/speciation/totals.ts'
import type { BackgroundIon } from '../../../src/chemistry/speciation/types.ts'
import { loadIngredients } from '../../../src/library/ingredients.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { electroneutral, species } from './parts.ts'
import { realParts } from './real.ts'

const records = new Map(species.map((record) => [record.id, record]))
const ingredients = loadIngredients().filter((ingredient) => ingredient.releases?.length)

interface Mixture {
  readonly background: readonly BackgroundIon[]
  readonly totals: Readonly<Record<string, number>>
}

/** What a set of ingredients brings at given molalities. */
function mixtureOf(parts: readonly (readonly [Ingredient, number])[]): Mixture {
  const background = new Map<string, BackgroundIon>()
  const own: Record<string, number> = {}
  const released: { species: string; molPerKg: number }[] = []
  for (const [ingredient, molPerKg] of parts) {
    for (const { species: id, count, charge } of ingredient.releases ?? []) {
      if (records.has(id)) {
        released.push({ species: id, molPerKg: count * molPerKg })
        continue
      }
      const isIonising = (ingredient.ionisingSpecies ?? id) === id
      const steps = isIonising ? (ingredient.ownIonisation ?? []) : []
      background.set(id, {
        id,
        charge,
        steps: steps.map((step) => ({ pKa: step.pKa.value, acidCharge: step.acidCharge })),
      })
      own[id] = (own[id] ?? 0) + count * molPerKg
    }
  }
  const gathered = gatherTotals(released, records)
  if ('status' in gathered) throw new Error(gathered.code)
  return { background: [...background.values()], totals: { ...gathered.totals, ...own } }
}

const anyMixture = fc
  .array(
    fc.tuple(
      fc.constantFrom(...ingredients),
      fc.double({ min: -5, max: -0.3, noNaN: true }).map((exponent) => 10 ** exponent),
    ),
    { minLength: 1, maxLength: 10 },
  )
  .map(mixtureOf)

describe('the ingredients of the library', () => {
  it('solve in any mixture, at any of the temperatures, with and without a given pH', () => {
    fc.assert(
      fc.property(
        anyMixture,
        fc.constantFrom(-0.5, 5, 25, 37),
        fc.option(fc.double({ min: 2, max: 12, noNaN: true })),
        ({ background, totals }, celsius, pH) => {
          const own = new Set(background.map((ion) => ion.id))
          const components = Object.keys(totals).filter((component) => !own.has(component))
          const compiled = compileSpeciation({ celsius, components, background }, realParts)
          if (compiled.status !== 'compiled') throw new Error(JSON.stringify(compiled))
          const answer = compiled.solve(totals, pH === null ? electroneutral : { kind: 'pH', pH })
          if (answer.status !== 'converged') throw new Error(JSON.stringify(answer))
          expect(answer.residuals.massBalance).toBeLessThanOrEqual(1e-10)
          expect(answer.residuals.charge).toBeLessThanOrEqual(1e-10 * answer.ionicStrength)
          expect(Number.isFinite(answer.pH)).toBe(true)
        },
      ),
      { numRuns: 200 },
    )
  })

  it('each solve alone', () => {
    for (const ingredient of ingredients) {
      const { background, totals } = mixtureOf([[ingredient, 0.01]])
      const own = new Set(background.map((ion) => ion.id))
      const components = Object.keys(totals).filter((component) => !own.has(component))
      const compiled = compileSpeciation({ celsius: 25, components, background }, realParts)
      expect(compiled.status, ingredient.id).toBe('compiled')
      if (compiled.status !== 'compiled') continue
      expect(compiled.solve(totals, electroneutral).status, ingredient.id).toBe('converged')
    }
  })
})
