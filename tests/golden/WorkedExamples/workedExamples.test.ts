import { describe, expect, it } from 'vitest'
import type { Formula } from '../../../src/formula/types.ts'
import { loadConventions } from '../../../src/library/conventions.ts'
import type { Evaluation, MethodAnswer } from '../../../src/evaluation/types.ts'
import {
  evaluated,
  library,
  line,
  ownIngredient,
  solved,
  type OwnRecord,
  type WrittenLine,
} from '../../evaluation/formulas.ts'
import content from './rows.json'

interface Reading {
  readonly read: string
  readonly expect: string
  readonly method?: MethodAnswer['method']
  readonly line?: number
  readonly ion?: string
}

interface Case {
  readonly id: string
  readonly given: string
  readonly question: string
  readonly published: string
  readonly source: string
  readonly recall: string
  readonly volume: string
  readonly target?: Formula['target']
  readonly lines: readonly {
    readonly ingredient?: string
    readonly own?: OwnRecord
    readonly amount: string
  }[]
  readonly reads: readonly Reading[]
  readonly remark?: string
}

interface LeftOut {
  readonly id: string
  readonly reason: string
}

const { cases, leftOut } = content as { cases: readonly Case[]; leftOut: readonly LeftOut[] }
const { cryoscopicConstant } = loadConventions()

function written({ ingredient, own, amount }: Case['lines'][number]): WrittenLine {
  if (own) return line(ownIngredient(own), amount)
  if (ingredient === undefined) throw new Error('a line needs an ingredient')
  return line(ingredient, amount)
}

const evaluationOf = ({ lines, volume, target }: Case): Evaluation =>
  evaluated(lines.map(written), { finalVolume: volume, ...(target ? { target } : {}) })

function present<T>(value: T | null | undefined, name: string): T {
  if (value === null || value === undefined) throw new Error(`${name} is missing`)
  return value
}

const methodOf = (evaluation: Evaluation, reading: Reading): MethodAnswer =>
  present(
    evaluation.methods.find(({ method }) => method === reading.method),
    `method ${reading.method}`,
  )

const traced = (evaluation: Evaluation, method: MethodAnswer['method'], key: string): number =>
  present(
    methodOf(evaluation, { read: '', expect: '', method }).trace.find((step) => step.key === key)?.result
      .value,
    `${key} in the trace`,
  )

/** The ion of the first line's salt, or the one that is named, in mEq. */
function milliequivalents(evaluation: Evaluation, ion: string | undefined): number {
  const found =
    ion === 'first' ? evaluation.electrolytes[0] : evaluation.electrolytes.find((entry) => entry.ion === ion)
  return present(found?.mEqPerMl, 'mEq') * present(evaluation.volumeMl, 'volume')
}

/** E of the example: its measured-i sum against that of sodium chloride with i 1.8 and 58.5 g/mol. */
function equivalentFromFactor(evaluation: Evaluation): number {
  const salt = ownIngredient({
    name: 'Sodium chloride',
    molarMass: 58.5,
    measuredI: 1.8,
    ions: [1, -1],
    electrolyteClass: 'uni-univalent',
  })
  const reference = evaluated([line(salt, '1 %')])
  return traced(evaluation, 'vant-hoff', 'measured-sum') / traced(reference, 'vant-hoff', 'measured-sum')
}

const readers: Readonly<Record<string, (evaluation: Evaluation, reading: Reading) => number>> = {
  'method-adjuster': (evaluation, reading) =>
    present(methodOf(evaluation, reading).adjusterGrams, 'adjuster'),
  'method-adjuster-milligrams': (evaluation, reading) =>
    present(methodOf(evaluation, reading).adjusterGrams, 'adjuster') * 1000,
  'method-volume': (evaluation, reading) => present(methodOf(evaluation, reading).isotonicVolumeMl, 'volume'),
  'line-grams': (evaluation, reading) => present(evaluation.lines[reading.line ?? 0]?.grams, 'grams'),
  'line-milligrams': (evaluation, reading) =>
    present(evaluation.lines[reading.line ?? 0]?.grams, 'grams') * 1000,
  'volume-percent': (evaluation, reading) =>
    (present(evaluation.lines[reading.line ?? 0]?.millilitres, 'mL') /
      present(evaluation.volumeMl, 'volume')) *
    100,
  'label-osmolarity': (evaluation) =>
    present(solved(evaluation).labelOsmolarityMilliosmPerL, 'label osmolarity'),
  'measured-i-sum': (evaluation) => traced(evaluation, 'vant-hoff', 'measured-sum'),
  'freezing-point-of-measured-sum': (evaluation) =>
    (-traced(evaluation, 'vant-hoff', 'measured-sum') / 1000) * cryoscopicConstant.value,
  'freezing-point-of-ideal-sum': (evaluation) =>
    (-traced(evaluation, 'vant-hoff', 'sum') / 1000) * cryoscopicConstant.value,
  milliequivalents: (evaluation, { ion }) => milliequivalents(evaluation, ion),
  'milliequivalents-per-litre': (evaluation, { ion }) =>
    (milliequivalents(evaluation, ion) / present(evaluation.volumeMl, 'volume')) * 1000,
  'equivalent-from-i': equivalentFromFactor,
  'class-equivalent': (evaluation) => {
    const step = methodOf(evaluation, { read: '', expect: '', method: 'l-iso' }).trace.find(({ key }) =>
      key.startsWith('volume-'),
    )
    return present(step?.inputs.find(({ name }) => name === 'E')?.value, 'E')
  },
  trace: (evaluation, { method }) => traced(evaluation, present(method, 'method'), 'line-1'),
}

const decimalsOf = (printed: string) => printed.split('.')[1]?.length ?? 0

describe('published worked examples, to the printed digits', () => {
  for (const example of cases) {
    it(`${example.id}: ${example.given} → ${example.published} (${example.source})`, () => {
      const evaluation = evaluationOf(example)
      for (const reading of example.reads) {
        const value = present(readers[reading.read], reading.read)(evaluation, reading)
        expect(value.toFixed(decimalsOf(reading.expect)), reading.read).toBe(reading.expect)
      }
    })
  }

  it('reads every example and leaves none out without a reason', () => {
    expect(cases.every(({ reads, source }) => reads.length > 0 && source !== '')).toBe(true)
    expect(leftOut.every(({ reason }) => reason.length > 20)).toBe(true)
    const covered = new Set([...cases, ...leftOut].map(({ id }) => id))
    expect(covered.size).toBe(58)
    expect(leftOut.some(({ id }) => cases.some((example) => example.id === id))).toBe(false)
  })

  it('takes the library’s own figures where the example’s are the same', () => {
    expect(library.ingredients.get('pilocarpine-nitrate')?.sodiumChlorideEquivalents[0]?.e.value).toBe(0.23)
  })
})
