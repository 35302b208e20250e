import type { Formula, PatientData, RouteId } from '../../../src/formula/types.ts'

/** A formula as a person types it. */
export interface Typed {
  readonly route: RouteId
  readonly lines: Readonly<Record<string, string>>
  readonly volume?: string
  readonly pH?: number
  readonly target?: Formula['target']
  readonly patient?: PatientData
}

/** One way in which the work has gone wrong, as it would be typed, and its sound neighbour. */
export interface Failure {
  readonly failure: string
  readonly wrong: Typed
  /** Finding codes that must catch it, by severity. */
  readonly caught: Readonly<Partial<Record<'stop' | 'warn' | 'note', readonly string[]>>>
  /** What is changed so that it is sound: none of the codes above may be raised. Lines are replaced as a whole. */
  readonly sound: Partial<Typed>
}

export const formulaOf = (typed: Typed): Formula => ({
  format: 'evenwater.formula',
  version: 1,
  title: 'As typed',
  route: typed.route,
  finalVolume: typed.volume ?? '1000 mL',
  ...(typed.pH === undefined ? {} : { pH: typed.pH }),
  ...(typed.target ? { target: typed.target } : {}),
  ...(typed.patient ? { patient: typed.patient } : {}),
  lines: Object.entries(typed.lines).map(([ingredient, amount], index) => ({
    key: `line-${index + 1}`,
    ingredient,
    amount,
  })),
})
