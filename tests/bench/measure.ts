import { evaluate } from '../../src/evaluation/evaluate.ts'
import { compositionOf, quick } from '../../src/evaluation/model.ts'
import { headlineSampler } from '../../src/evaluation/sampling.ts'
import { solveSolution } from '../../src/chemistry/solution.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { seededUniform } from '../../src/numeric/random.ts'
import { startSampling } from '../../src/numeric/sample.ts'
import type { Formula } from '../../src/formula/types.ts'
import { tenIons } from './phi.ts'

/* Side by side in one run, after warm-up, as multiples of the bare osmolality of ten ions. */

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

/** So many amounts of the second line go round that no answer can be one that was kept. */
const turns = 997
const turned = (turn: number) => `${(0.03 + (turn % turns) * 1e-5).toFixed(5)} %`

function formulaOf(count: number, turn: number, adjusted = false): Formula {
  const lines = [...common, ...others].slice(0, count)
  const shown = adjusted ? [...lines.slice(0, -1), ['sodium-chloride', 'q.s.'] as const] : lines
  return {
    format: 'evenwater.formula',
    version: 1,
    title: 'bench',
    route: 'irrigation',
    finalVolume: '100 mL',
    ...(adjusted ? { target: { quantity: 'osmolality' as const, value: '320 mOsm/kg' } } : {}),
    lines: shown.map(([ingredient, amount], index) => ({
      key: `l${index}`,
      ingredient,
      amount: index === 1 ? turned(turn) : amount,
    })),
  }
}

const rounds = 800

interface Time {
  readonly least: number
  readonly median: number
}

/**
 * Microseconds of a call over rounds of at least 0.5 ms, after warm-up: the median, and the least, which other work on the
 * machine disturbs least.
 */
function microseconds(call: (turn: number) => unknown): Time {
  let turn = 0
  const warmUntil = performance.now() + 600
  while (performance.now() < warmUntil) call((turn += 1))
  const times: number[] = []
  for (let round = 0; round < rounds; round += 1) {
    const start = performance.now()
    let calls = 0
    do {
      call((turn += 1))
      calls += 1
    } while (performance.now() - start < 0.5)
    times.push(((performance.now() - start) * 1000) / calls)
  }
  const sorted = times.toSorted((a, b) => a - b)
  return { least: sorted[0] ?? Number.NaN, median: sorted[rounds / 2] ?? Number.NaN }
}

/** The bare model costs less than reading the clock, so it is called a thousand times between two readings. */
function bare(): Time {
  const { osmolality } = tenIons()
  let sum = 0
  const { least, median } = microseconds((turn) => {
    for (let call = 0; call < 1000; call += 1) sum += osmolality(1 + (turn % turns) * 1e-4 + call * 1e-7)
  })
  if (!(sum > 0)) throw new Error('The bare model gave no osmolality.')
  return { least: least / 1000, median: median / 1000 }
}

function solving(): Time {
  const { lines } = evaluate(formulaOf(10, 0), library)
  const portions = lines.flatMap(({ key, ingredient, grams }) =>
    grams === null ? [] : [{ key, ingredient, grams }],
  )
  const compositions = Array.from({ length: turns }, (_, turn) =>
    compositionOf(
      portions.map((portion, index) =>
        index === 1 ? { ...portion, grams: portion.grams * (1 + turn * 1e-4) } : portion,
      ),
      { volumeMl: 100, pH: 'solve', temperatureCelsius: 25 },
    ),
  )
  return microseconds((turn) => {
    const composition = compositions[turn % turns]
    if (composition && solveSolution(composition, library, quick).status === 'refused')
      throw new Error('refused')
  })
}

function drawing(): Time {
  const sampler = headlineSampler(evaluate(formulaOf(10, 0), library), library)
  if (!sampler) throw new Error('no sampler')
  const times = [1, 2, 3].map((seed) => {
    const start = performance.now()
    startSampling(sampler.inputs.length, sampler.evaluate, seededUniform(seed)).step(10_000)
    return (performance.now() - start) * 1000
  })
  const [least = Number.NaN, median = Number.NaN] = times.toSorted((a, b) => a - b)
  return { least, median }
}

const evaluating = (count: number, adjusted = false) =>
  microseconds((turn) => evaluate(formulaOf(count, turn, adjusted), library))

/** Everything measured, in microseconds, and as multiples of the bare osmolality of ten ions. */
export function measured() {
  const base = bare()
  const results = {
    'osmolality of ten ions, bare': base,
    'composition to osmolality, 10 lines': solving(),
    'evaluate, 5 lines': evaluating(5),
    'evaluate, 10 lines': evaluating(10),
    'evaluate, 20 lines': evaluating(20),
    'evaluate, 40 lines': evaluating(40),
    'evaluate with adjuster, 10 lines': evaluating(10, true),
    '10,000 draws, 10 lines': drawing(),
  }
  const rounded = (value: number) => Number(value.toPrecision(3))
  const rows = Object.entries(results).map(([name, { least, median }]) => {
    const ratio = rounded(least / base.least)
    return [name, { microseconds: rounded(least), median: rounded(median), ratio }] as const
  })
  return Object.fromEntries(rows)
}
