import type { Evaluation, MethodAnswer, MethodId } from '../../evaluation/types.ts'
import { methodIds } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { tellCode } from '../../worksheet/tell.ts'
import { comparedMass, significant, wholeNumber } from '../words/figures.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'
import { traceViews, type TraceView } from './traceViews.ts'

export interface MethodView {
  readonly id: MethodId
  readonly name: string
  readonly isHeadline: boolean
  /** Place on the axis, in its unit; null where the method has no answer. */
  readonly value: number | null
  readonly text: string
  readonly why: string
  readonly missing: readonly string[]
  readonly steps: readonly TraceView[]
}

export interface MethodsView {
  readonly title: string
  readonly unit: string
  readonly low: number
  readonly high: number
  readonly methods: readonly MethodView[]
}

const names: Readonly<Record<MethodId, string>> = {
  electrolyte: 'electrolyte model',
  'sodium-chloride-equivalent': 'NaCl equivalents',
  'freezing-point': 'freezing points',
  'l-iso': 'ionic class (L_iso)',
  'vant-hoff': 'van ’t Hoff',
}

/** The headline method first, then in the order of the library of methods. */
const order: readonly MethodId[] = ['electrolyte', ...methodIds.filter((id) => id !== 'electrolyte')]

export const methodViews = viewOf(
  (state) => [currentEvaluation(state), state.library] as const,
  (evaluation, library): MethodsView => {
    const adjusters = (evaluation?.lines ?? []).filter((line) => line.isAdjuster)
    const sizing = adjusters.length > 0
    const methods = order.map((id) => methodView(id, evaluation, sizing, library))
    const values = methods.flatMap(({ value }) => (value === null ? [] : [value]))
    const [low, high] = padded(values)
    const what = adjusters.map((line) => line.ingredient.name.toLowerCase()).join(' and ')
    return {
      title: sizing ? `Five ways to size the ${what}` : 'Five ways to reckon the osmolality',
      unit: sizing ? 'g' : 'mOsm/kg',
      low,
      high,
      methods,
    }
  },
)

/** A span around the values in which no two of them fall on the edge. */
function padded(values: readonly number[]): readonly [number, number] {
  if (values.length === 0) return [0, 0]
  const low = Math.min(...values)
  const high = Math.max(...values)
  const room = high > low ? (high - low) * 0.2 : Math.max(Math.abs(high) * 0.2, 0.01)
  return [Math.max(0, low - room), high + room]
}

function methodView(
  id: MethodId,
  evaluation: Evaluation | null,
  sizing: boolean,
  library: Library,
): MethodView {
  const answer = evaluation?.methods.find((method) => method.method === id)
  const value = (sizing ? answer?.adjusterGrams : answer?.osmolalityMilliosmPerKg) ?? null
  const write = sizing ? comparedMass : (milliosm: number) => `${wholeNumber(milliosm)} mOsm/kg`
  return {
    id,
    name: names[id],
    isHeadline: evaluation?.headline === id,
    value,
    text: value === null ? 'no answer' : write(value),
    why: answer ? whySentence(answer, evaluation, library) : '',
    missing: (answer?.missing ?? []).map(({ code, key }) =>
      tellCode(code, library, { ingredient: nameOf(key, evaluation) }),
    ),
    steps: traceViews(answer?.trace ?? []),
  }
}

const nameOf = (key: string, evaluation: Evaluation | null): string =>
  evaluation?.lines.find((line) => line.key === key)?.ingredient.name ?? 'the adjuster'

function whySentence({ differsBy }: MethodAnswer, evaluation: Evaluation | null, library: Library): string {
  if (!differsBy) return ''
  const more = differsBy.milliosmPerKg > 0 ? 'more' : 'less'
  const size = significant(Math.abs(differsBy.milliosmPerKg), 2)
  const name = nameOf(differsBy.key, evaluation)
  return `Differs from the headline most in ${name}, by ${size} mOsm/kg ${more}. ${tellCode(differsBy.reason, library)}`
}
