import * as v from 'valibot'
import raw from '../../data/cautions/usual-strengths.json'
import { checked } from './checked.ts'
import { type EvidenceGrade, evidenceSchema } from './routes.ts'
import type { SourceKey } from './types.ts'

export const strengthUnits = ['% w/v', 'mg/mL', 'mcg/mL', 'mmol/L', 'mmol/mL'] as const

/** The range in which an ingredient is ordinarily used: what a slip of the decimal point is measured against. */
export interface UsualStrength {
  readonly ingredient: string
  readonly from: number
  readonly to: number
  readonly unit: (typeof strengthUnits)[number]
  /** Absent: wherever it is used. */
  readonly routes?: readonly string[]
  readonly evidence: EvidenceGrade
  readonly source: SourceKey
}

const filled = v.pipe(v.string(), v.trim(), v.nonEmpty())
const positive = v.pipe(v.number(), v.finite(), v.gtValue(0))

const usualStrengthsSchema = v.array(
  v.strictObject({
    ingredient: filled,
    from: positive,
    to: positive,
    unit: v.picklist(strengthUnits),
    routes: v.exactOptional(v.pipe(v.array(filled), v.minLength(1))),
    evidence: evidenceSchema,
    source: filled,
  }),
)

export const usualStrengthFiles: Readonly<Record<string, unknown>> = { 'usual-strengths': raw }

let loaded: readonly UsualStrength[] | undefined

/** Every usual range; throws where one is upside down. */
export function loadUsualStrengths(): readonly UsualStrength[] {
  loaded ??= checkedRanges()
  return loaded
}

function checkedRanges(): readonly UsualStrength[] {
  const ranges = checked(usualStrengthsSchema, raw, 'cautions/usual-strengths')
  const upsideDown = ranges.find(({ from, to }) => from > to)
  if (upsideDown)
    throw new Error(`data/cautions/usual-strengths.json: ${upsideDown.ingredient} is upside down`)
  return ranges
}
