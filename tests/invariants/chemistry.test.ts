import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { movableMixture, prepare, solveSolution } from '../../src/chemistry/solution.ts'
import type { Composition, Dissolved, SolutionState } from '../../src/chemistry/types.ts'
import { library } from '../evaluation/formulas.ts'

/** ms: every drawn composition makes its own systems ready. */
const patience = 30_000

/* Everything of the library that is weighed and dissolved, with a molar mass. */
const ids = [...library.ingredients.values()]
  .filter(({ roles, molarMass }) => molarMass && !roles.includes('vehicle'))
  .map(({ id }) => id)
  .toSorted()

const millimolal = fc.oneof(
  fc.double({ min: 0.001, max: 300, noNaN: true }),
  fc.double({ min: -3, max: 2.5, noNaN: true }).map((power) => 10 ** power),
)

function dissolved(id: string, molPerKg: number, key = id): Dissolved {
  const ingredient = library.ingredients.get(id)
  if (!ingredient) throw new Error(`${id} is no ingredient`)
  return { key, ingredient, amount: { kind: 'per-water', molPerKg } }
}

const items = fc.uniqueArray(
  fc.tuple(fc.constantFrom(...ids), millimolal).map(([id, amount]) => dissolved(id, amount / 1000)),
  { minLength: 1, maxLength: 8, selector: ({ key }) => key },
)
const pH = fc.oneof(fc.constant('solve' as const), fc.double({ min: 3, max: 10, noNaN: true }))

const composition = (parts: readonly Dissolved[], at: number | 'solve' = 'solve'): Composition => ({
  volumeLitres: 1,
  pH: at,
  temperatureCelsius: 25,
  dissolved: parts,
})

function stateOf(parts: readonly Dissolved[], at: number | 'solve' = 'solve'): SolutionState | null {
  const result = solveSolution(composition(parts, at), library)
  return result.status === 'solved' ? result.state : null
}

function stateOr(parts: readonly Dissolved[], at: number | 'solve' = 'solve'): SolutionState {
  const state = stateOf(parts, at)
  if (!state) throw new Error('refused')
  return state
}

describe('any composition of the library', () => {
  it(
    'is electroneutral, and keeps every component to 1e-10',
    () => {
      let solved = 0
      fc.assert(
        fc.property(items, pH, (parts, at) => {
          const ready = prepare(composition(parts, at), library)
          const cold = movableMixture(composition(parts, at), library)
          if ('problems' in ready || !cold) return
          solved += 1
          const { species, molalities, ionicStrength } = cold.mixture.speciated
          let charge = 0
          const held = new Map<string, number>()
          const add = (component: string, amount: number) =>
            held.set(component, (held.get(component) ?? 0) + amount)
          for (const [index, record] of species.entries()) {
            const amount = molalities[index] ?? NaN
            charge += record.charge * amount
            add(record.component, record.count * amount)
            for (const partner of record.partners ?? []) add(partner.component, partner.count * amount)
          }
          expect(Math.abs(charge)).toBeLessThanOrEqual(1e-10 * ionicStrength)
          for (const [component, total] of Object.entries(ready.condition.totals))
            expect(Math.abs((held.get(component) ?? 0) - total)).toBeLessThanOrEqual(1e-10 * total)
        }),
        { numRuns: 150 },
      )
      expect(solved).toBeGreaterThan(100)
    },
    patience,
  )

  it(
    'does not mind the order of its solutes',
    () => {
      fc.assert(
        fc.property(items, pH, (parts, at) => {
          const [one, other] = [stateOf(parts, at), stateOf(parts.toReversed(), at)]
          expect(other === null).toBe(one === null)
          if (!one || !other) return
          for (const temperature of ['freezing', '25', '37'] as const) {
            const [first, second] = [one.states[temperature], other.states[temperature]]
            expect(second.osmolalityOsmPerKg / first.osmolalityOsmPerKg).toBeCloseTo(1, 9)
            expect(second.pH ?? 0).toBeCloseTo(first.pH ?? 0, 7)
          }
          for (const { key, osmolalityOsmPerKg } of one.shares)
            expect(other.shares.find((share) => share.key === key)?.osmolalityOsmPerKg).toBeCloseTo(
              osmolalityOsmPerKg,
              9,
            )
        }),
        { numRuns: 60 },
      )
    },
    patience,
  )

  it(
    'does not mind one solute written in two lines',
    () => {
      fc.assert(
        fc.property(items, (parts) => {
          const [first, ...rest] = parts
          if (first?.amount.kind !== 'per-water') return
          const half = first.amount.molPerKg / 2
          const halves = [
            dissolved(first.ingredient.id, half, 'one'),
            dissolved(first.ingredient.id, half, 'two'),
          ]
          const [whole, apart] = [stateOf(parts), stateOf([...halves, ...rest])]
          if (!whole || !apart) return
          expect(
            apart.states.freezing.osmolalityOsmPerKg / whole.states.freezing.osmolalityOsmPerKg,
          ).toBeCloseTo(1, 8)
        }),
        { numRuns: 60 },
      )
    },
    patience,
  )

  /*
   * A solute known by a table goes to the count that its table means, which need not be its whole number. The ions of
   * water, and the protons that a weak acid lets go, belong to no line.
   */
  it(
    'is ideal when diluted: the osmolality is the sum of the particles',
    () => {
      fc.assert(
        fc.property(items, (parts) => {
          const state = stateOf(parts.map(({ key, ingredient }) => dissolved(ingredient.id, 1e-5, key)))
          if (!state) return
          const { species } = state.states.freezing
          const ofWater = (species['H+'] ?? 0) + (species['OH-'] ?? 0)
          const counted = state.shares.reduce(
            (sum, share) => sum + share.particlesCounted * share.molality,
            0,
          )
          const { osmolalityOsmPerKg } = state.states.freezing
          expect(Math.abs(osmolalityOsmPerKg - counted)).toBeLessThan(0.02 * osmolalityOsmPerKg + ofWater)
          if (state.shares.every(({ basis }) => basis === 'ion-interaction'))
            expect(state.states['25'].osmoticCoefficient).toBeCloseTo(1, 1)
        }),
        { numRuns: 60 },
      )
    },
    patience,
  )

  it('of ions alone is ideal when diluted further and further', () => {
    const salts = ['sodium-chloride', 'calcium-chloride-dihydrate', 'sodium-citrate-dihydrate', 'boric-acid']
    let before = 0
    for (const molality of [1e-2, 1e-3, 1e-4, 1e-5, 1e-6]) {
      const phi = stateOr(salts.map((id) => dissolved(id, molality))).states['25'].osmoticCoefficient
      expect(phi).toBeGreaterThan(before)
      before = phi
    }
    expect(before).toBeCloseTo(1, 2)
  })
})

describe('Gibbs and Duhem through the whole chemistry', () => {
  /* Along a dilution, species changing as they will: O = ∫ Σ m d ln(mγ), which for nothing is Σ m. */
  const recipes: Readonly<Record<string, readonly (readonly [string, number])[]>> = {
    'sodium chloride': [['sodium-chloride', 0.154]],
    'phosphate buffered': [
      ['sodium-chloride', 0.12],
      ['sodium-phosphate-monobasic-anhydrous', 0.01],
      ['sodium-phosphate-dibasic-anhydrous', 0.02],
    ],
    'balanced salts': [
      ['sodium-chloride', 0.1],
      ['potassium-chloride', 0.01],
      ['calcium-chloride-dihydrate', 0.003],
      ['magnesium-chloride-hexahydrate', 0.002],
      ['sodium-acetate-trihydrate', 0.03],
      ['sodium-citrate-dihydrate', 0.006],
    ],
    'boric acid and borax': [
      ['boric-acid', 0.2],
      ['sodium-borate-decahydrate', 0.01],
      ['sodium-chloride', 0.05],
    ],
    'magnesium sulfate': [['magnesium-sulfate-heptahydrate', 0.2]],
  }

  function excess(parts: readonly (readonly [string, number])[], scale: number) {
    const state = stateOr(parts.map(([id, molality]) => dissolved(id, molality * scale))).states['25']
    const species = Object.entries(state.species).map(
      ([id, m]) => [id, m, m > 0 ? Math.log(m * (state.activityCoefficients[id] ?? NaN)) : NaN] as const,
    )
    return { osmolality: state.osmolalityOsmPerKg, species }
  }

  it.each(Object.entries(recipes))(
    '%s',
    (_, parts) => {
      const steps = 160
      const [low, high] = [Math.log(1e-3), 0]
      let before = excess(parts, Math.exp(low))
      const start = before.osmolality
      let risen = 0
      for (let index = 1; index <= steps; index += 1) {
        const after = excess(parts, Math.exp(low + ((high - low) * index) / steps))
        for (const [place, [id, m, ln]] of after.species.entries()) {
          const [sameId, earlier, earlierLn] = before.species[place] ?? ['', NaN, NaN]
          expect(sameId).toBe(id)
          /* The mean of m over a step in which it grows as a power of the scale. */
          const mean = Math.abs(m / earlier - 1) < 1e-9 ? m : (m - earlier) / Math.log(m / earlier)
          if (m > 0 && earlier > 0) risen += mean * (ln - earlierLn)
        }
        before = after
      }
      expect((start + risen) / before.osmolality).toBeCloseTo(1, 4)
    },
    patience,
  )
})

/** Largest move between neighbours of a scan, and of one with ten times as many points. */
function moves(from: number, to: number, count: number, of: (x: number) => number): readonly number[] {
  return [count, 10 * count].map((points) => {
    let largest = 0
    let before = of(from)
    for (let index = 1; index <= points; index += 1) {
      const after = of(from + ((to - from) * index) / points)
      largest = Math.max(largest, Math.abs(after - before))
      before = after
    }
    return largest
  })
}

/** A curve without a jump moves a tenth as far in a tenth of the step. */
function expectContinuous([coarse = NaN, fine = NaN]: readonly number[]): void {
  expect(coarse).toBeGreaterThan(0)
  expect(fine).toBeLessThan(0.2 * coarse)
}

describe('no jump', () => {
  const buffered = [
    dissolved('citric-acid-anhydrous', 0.02),
    dissolved('boric-acid', 0.1),
    dissolved('calcium-chloride-dihydrate', 0.002),
    dissolved('pilocarpine-hydrochloride', 0.03),
  ]

  it(
    'of osmolality across pH',
    () => {
      const reading = (at: number) => stateOr(buffered, at).states.freezing.osmolalityOsmPerKg
      expectContinuous(moves(3, 10, 60, reading))
    },
    patience,
  )

  const growing: Readonly<Record<string, (molality: number) => readonly Dissolved[]>> = {
    'a salt, through the onset of its own freezing point at 0.5 and its end at 0.8 osmol/kg': (molality) => [
      dissolved('sodium-chloride', molality),
    ],
    'a hydrolysing salt': (molality) => [dissolved('sodium-carbonate-anhydrous', molality)],
    'a sugar beside a salt': (molality) => [
      dissolved('dextrose-anhydrous', 1.2 * molality),
      dissolved('sodium-chloride', 0.1),
    ],
    'a drug, through the strengths of its table': (molality) => [
      dissolved('pilocarpine-hydrochloride', molality),
      dissolved('sodium-chloride', 0.05),
    ],
    'a sulfate that pairs': (molality) => [dissolved('magnesium-sulfate-heptahydrate', molality)],
  }

  it.each(Object.entries(growing))(
    'of the reading as it grows: %s',
    (_, made) => {
      const reading = (molality: number) => stateOr(made(molality)).states.freezing.osmolalityOsmPerKg
      expectContinuous(moves(0.01, 0.6, 60, reading))
    },
    patience,
  )

  it.each(Object.entries(growing))(
    'of the first trace: %s',
    (_, made) => {
      const reading = (micromolal: number) =>
        1e6 * stateOr(made(micromolal * 1e-6)).states.freezing.osmolalityOsmPerKg
      expectContinuous(moves(0.01, 3, 60, reading))
    },
    patience,
  )
})
