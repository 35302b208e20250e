import * as v from 'valibot'
import beyondUse from '../../data/steps/beyond-use.json'
import raw from '../../data/steps/steps.json'
import { checked } from './checked.ts'

export const stepFiles: Readonly<Record<string, unknown>> = { steps: raw, 'beyond-use': beyondUse }

const stepRule = v.strictObject({
  id: v.string(),
  rank: v.number(),
  /** Which ingredients it takes: by role or tag; 'rest' what no other rule takes; 'none' a step of its own; 'sterile' a step for sterile routes. */
  takes: v.union([
    v.picklist(['none', 'rest', 'sterile']),
    v.strictObject({ roles: v.array(v.string()), tags: v.array(v.string()) }),
  ]),
  text: v.string(),
  reason: v.string(),
  source: v.string(),
})

/** One rule of the order of mixing; the lower the rank the earlier. */
export type StepRule = v.InferOutput<typeof stepRule>

/** The rules of mixing, in order of rank. Throws when data/steps is malformed. */
export function loadSteps(): readonly StepRule[] {
  return v.parse(v.array(stepRule), raw).toSorted((first, second) => first.rank - second.rank)
}

const policyText = v.strictObject({ text: v.string(), source: v.string(), evidence: v.string() })
const beyondUseTexts = v.strictObject({ sterile: policyText, eye: policyText, nonsterile: policyText })

/** What policies of the trade say about beyond-use dates: orientation, never the date. */
export type BeyondUseTexts = v.InferOutput<typeof beyondUseTexts>

export const loadBeyondUse = (): BeyondUseTexts => checked(beyondUseTexts, beyondUse, 'steps/beyond-use')
