import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import type { Formula } from '../../src/formula/types.ts'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { formulaOf, library, line, ownIngredient } from './formulas.ts'
import { formulaOfOrdinary, ordinary } from './cautions/ordinary.ts'

/*
 * What was evaluated before leaves no trace: the same formula gives the same answer, bit for bit, whatever stood
 * between. What the calculation keeps for speed must be what it would make again.
 */

const demos = readdirSync('data/demos').map(
  (name) => JSON.parse(readFileSync(join('data/demos', name), 'utf8')) as Formula,
)
const qs = { target: { quantity: 'osmolality', value: '290 mOsm/kg' } } as const
/** Alike but for the charge or the ionisation of an ion of the same name. */
const twins = [1, 2].map((charge) => {
  const own = ownIngredient({ name: 'House drug', molarMass: 300, equivalent: 0.2, ions: [charge, -1] })
  const [first, second] = own.releases ?? []
  const chloride = { species: 'Cl-', count: charge, charge: -1 }
  const releases = first && second ? [{ ...first, species: 'house drug ion' }, chloride] : []
  return formulaOf([line({ ...own, releases }, '1 %'), line('sodium-chloride', '0.3 %')])
})
const more: readonly Formula[] = [
  ...twins,
  formulaOf([line('pilocarpine-hydrochloride', '1 %'), line('sodium-chloride', 'q.s.')], qs),
  formulaOf([line('pilocarpine-hydrochloride', '1 %'), line('sodium-chloride', 'q.s.')], { ...qs, pH: 6 }),
  formulaOf([line('boric-acid', '0.5 %'), line('calcium-chloride-dihydrate', '0.1 %')], { pH: 7.4 }),
  formulaOf([line('mannitol', '5 %'), line('edetate-disodium-dihydrate', '0.1 %')]),
  formulaOf([line('edetate-disodium-dihydrate', '0.1 %'), line('mannitol', '5 %')]),
]
const formulas = [...ordinary.slice(0, 24).map(formulaOfOrdinary), ...demos, ...more]

/** Every number by its bits, and the lazily made parts with the rest. */
const written = (formula: Formula) =>
  JSON.stringify(evaluate(formula, library), (_, value: unknown) => (Object.is(value, -0) ? '-0' : value))

describe('an answer does not hang on what was evaluated before', () => {
  const first = formulas.map(written)

  it('repeated at once', () => {
    expect(formulas.map(written)).toEqual(first)
  })

  it('backwards', () => {
    const backwards = formulas.toReversed().map(written)
    expect(backwards.toReversed()).toEqual(first)
  })

  it('each after every other of a few', () => {
    const few = [0, 5, 9, formulas.length - 1, formulas.length - 3, formulas.length - 6, formulas.length - 7]
    for (const before of few) {
      for (const index of few) {
        const [one, other] = [formulas[before], formulas[index]]
        if (!one || !other) throw new Error('There are fewer formulas than the test takes.')
        written(one)
        expect(written(other)).toBe(first[index])
      }
    }
  })

  it('after so many others that everything kept was let go', () => {
    const ids = [...library.ingredients.keys()].slice(0, 130)
    for (const [index, id] of ids.entries()) {
      const salt = line('sodium-chloride', `${(0.1 + index / 1000).toFixed(3)} %`)
      evaluate(formulaOf([line(id, '0.4 %'), salt, line('boric-acid', '0.1 %')]), library)
    }
    expect(formulas.map(written)).toEqual(first)
  })

  it('and each from data of its own, where nothing is kept yet', () => {
    const anew = formulas.map((formula) =>
      JSON.stringify(evaluate(formula, { ...library, species: new Map(library.species) })),
    )
    expect(anew).toEqual(formulas.map((formula) => JSON.stringify(evaluate(formula, library))))
  })

  it('is the same deeply, by value', () => {
    const [formula] = demos
    if (!formula) throw new Error('There is no demo.')
    const [one, two] = [evaluate(formula, library), evaluate(formula, library)]
    expect(one).toStrictEqual(two)
    expect(structuredClone(one.state)).toStrictEqual(JSON.parse(JSON.stringify(two.state)))
  })
})
