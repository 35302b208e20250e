import { readTemperature } from '../../quantity/readMeasure.ts'
import type { Library } from '../../library/library.ts'
import { pHIsKnown } from '../../chemistry/mixture/acidity.ts'
import type { Formula } from '../../formula/types.ts'
import { portionsInEvaluation } from '../portions.ts'
import type { Portion, Setting } from '../model.ts'
import type { Evaluation, LineAnswer } from '../types.ts'

/** What stands in a formula apart from its buffer. */
export interface Foundation {
  readonly formula: Formula
  readonly setting: Setting
  readonly portions: readonly Portion[]
  /** Lines that the new buffer takes the place of. */
  readonly replaces: readonly LineAnswer[]
  /** Lines whose acid or base strength nobody knows. */
  readonly unknown: readonly LineAnswer[]
}

const titrants = new Set(['hydrochloric-acid', 'sodium-hydroxide'])

/** Buffers of the formula and the acid and base beside them; never the line that is sized to the target. */
export function bufferLines(evaluation: Evaluation, library: Library): readonly LineAnswer[] {
  const forms = new Set([
    ...library.bufferSystems.flatMap(({ acidForms, baseForms }) => [...acidForms, ...baseForms]),
    ...titrants,
  ])
  return evaluation.lines.filter(
    ({ ingredient, isAdjuster }) =>
      !isAdjuster &&
      forms.has(ingredient.id) &&
      ['buffer', 'pH adjust'].some((role) => ingredient.roles.includes(role)),
  )
}

const roomTemperature = 25

/** Temperature of the pH, °C; an answered formula has one that can be read. */
export function temperatureOf({ temperature }: Formula): number {
  const read = temperature === undefined ? null : readTemperature(temperature)
  return read?.ok ? read.value : roomTemperature
}

/** The formula of an evaluation without its buffer; null while it has no answer. */
export function foundationOf(evaluation: Evaluation, library: Library): Foundation | null {
  const { formula, volumeMl, status } = evaluation
  if (status !== 'ok' || volumeMl === null) return null
  const replaces = bufferLines(evaluation, library)
  const gone = new Set(replaces.map(({ key }) => key))
  const kept = portionsInEvaluation(evaluation).filter(({ key }) => !gone.has(key))
  const isKnown = ({ ingredient }: Portion) => pHIsKnown([{ ingredient }])
  const unknownKeys = new Set(kept.filter((portion) => !isKnown(portion)).map(({ key }) => key))
  return {
    formula,
    setting: { volumeMl, pH: 'solve', temperatureCelsius: temperatureOf(formula) },
    portions: kept.filter(({ key }) => !unknownKeys.has(key)),
    replaces,
    unknown: evaluation.lines.filter(({ key }) => unknownKeys.has(key)),
  }
}
