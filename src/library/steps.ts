import * as v from 'valibot'
import raw from '../../data/steps/steps.json'

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
