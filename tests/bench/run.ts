import { evaluate } from '../../src/evaluation/evaluate.ts'
import { compositionOf, quick } from '../../src/evaluation/model.ts'
import { headlineSampler } from '../../src/evaluation/sampling.ts'
import { solveSolution } from '../../src/chemistry/solution.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { seededUniform } from '../../src/numeric/random.ts'
import { startSampling } from '../../src/numeric/sample.ts'
import type { Formula } from '../../src/formula/types.ts'
import { tenIons } from './phi.ts'

/* Side by side in one run, after warm-up, as multiples of the bare osmolality of ten ions. Prints JSON. */

const library = loadLibrary()

const common = [
  ['sodium-chloride', '0.2 %'],
  ['potassium-chloride', '0.03 %'],
  ['calcium-chloride-dihydrate', '0.02 %'],
  ['magnesium-chloride-hexahydrate', '0.02 %'],
  ['sodium-acetate-trihydrate', '0.2 %'],
  ['dextrose-monohydrate', '0.5 %'],
  ['glycerin', '0.1 %'],
  ['mannitol', '0.2 %'],
  ['pilocarpine-hydrochloride', '0.3 %'],
  ['edetate-disodium-dihydrate', '0.01 %'],
] as const
const others = [...library.ingredients.values()]
  .filter(
    ({ id, sodiumChlorideEquivalents: e, molarMass }) =>
      e.length > 0 && molarMass && !common.some(([own]) => own === id),
  )
  .filter(({ roles }) => roles[0] === 'active')
  .map(({ id }) => [id, '0.02 %'] as const)

function formulaOf(count: number, adjusted = false): Formula {
  const lines = [...common, ...others].slice(0, count)
  const shown = adjusted ? [...lines.slice(0, -1), ['sodium-chloride', 'q.s.'] as const] : lines
  return {
    format: 'evenwater.formula',
    version: 1,
    title: 'bench',
    route: 'irrigation',
    finalVolume: '100 mL',
    ...(adjusted ? { target: { quantity: 'osmolality' as const, value: '320 mOsm/kg' } } : {}),
    lines: shown.map(([ingredient, amount], index) => ({ key: `l${index}`, ingredient, amount })),
  }
}

/** Median microseconds of a call over rounds of at least 20 ms, after warm-up. */
function microseconds(call: () => unknown): number {
  const warmUntil = performance.now() + 400
  while (performance.now() < warmUntil) call()
  const rounds: number[] = []
  for (let round = 0; round < 15; round += 1) {
    const start = performance.now()
    let calls = 0
    while (performance.now() - start < 20) {
      call()
      calls += 1
    }
    rounds.push(((performance.now() - start) * 1000) / calls)
  }
  return rounds.toSorted((a, b) => a - b)[7] ?? Number.NaN
}

/** The bare model costs less than reading the clock, so it is called a thousand times between two readings. */
function bare(): number {
  const { osmolality } = tenIons()
  return (
    microseconds(() => {
      for (let call = 0; call < 1000; call += 1) osmolality()
    }) / 1000
  )
}

function solving(): number {
  const { lines } = evaluate(formulaOf(10), library)
  const portions = lines.flatMap(({ key, ingredient, grams }) =>
    grams === null ? [] : [{ key, ingredient, grams }],
  )
  const composition = compositionOf(portions, { volumeMl: 100, pH: 'solve', temperatureCelsius: 25 })
  return microseconds(() => solveSolution(composition, library, quick))
}

function drawing(): number {
  const sampler = headlineSampler(evaluate(formulaOf(10), library), library)
  if (!sampler) throw new Error('no sampler')
  const start = performance.now()
  startSampling(sampler.inputs.length, sampler.evaluate, seededUniform(1)).step(10_000)
  return (performance.now() - start) * 1000
}

const base = bare()
const results = {
  'osmolality of ten ions, bare': base,
  'composition to osmolality, 10 lines': solving(),
  'evaluate, 5 lines': microseconds(() => evaluate(formulaOf(5), library)),
  'evaluate, 10 lines': microseconds(() => evaluate(formulaOf(10), library)),
  'evaluate, 20 lines': microseconds(() => evaluate(formulaOf(20), library)),
  'evaluate, 40 lines': microseconds(() => evaluate(formulaOf(40), library)),
  'evaluate with adjuster, 10 lines': microseconds(() => evaluate(formulaOf(10, true), library)),
  '10,000 draws, 10 lines': drawing(),
}
const rounded = (value: number) => Number(value.toPrecision(3))
console.log(
  JSON.stringify(
    Object.fromEntries(
      Object.entries(results).map(([name, value]) => [
        name,
        { microseconds: rounded(value), ratio: rounded(value / base) },
      ]),
    ),
    null,
    2,
  ),
)
