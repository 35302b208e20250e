import * as v from 'valibot'
import activity from '../../data/findings/activity.json'
import buffers from '../../data/findings/buffers.json'
import cautions from '../../data/findings/cautions.json'
import chemistry from '../../data/findings/chemistry.json'
import evaluation from '../../data/findings/evaluation.json'
import shelf from '../../data/findings/shelf.json'
import speciation from '../../data/findings/speciation.json'
import weighing from '../../data/findings/weighing.json'
import { checked } from './checked.ts'
import type { SourceKey } from './types.ts'

/** Words of one finding; `{name}` in them is filled with the finding's values. */
export interface FindingText {
  readonly code: string
  readonly severity: 'stop' | 'warn' | 'note'
  readonly message: string
  readonly wayOut: string
  readonly source: SourceKey
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())

const findingTextsSchema = v.array(
  v.strictObject({
    code: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
    severity: v.picklist(['stop', 'warn', 'note']),
    message: text,
    wayOut: text,
    source: text,
  }),
)

/** Each room brings its own words. */
export const findingFiles: Readonly<Record<string, unknown>> = {
  activity,
  buffers,
  cautions,
  chemistry,
  evaluation,
  shelf,
  speciation,
  weighing,
}

/** The words of every finding; a code stands once. */
export function loadFindings(): readonly FindingText[] {
  const seen = new Set<string>()
  return Object.entries(findingFiles).flatMap(([name, content]) => {
    const texts = checked(findingTextsSchema, content, `findings/${name}`)
    for (const { code } of texts) {
      if (seen.has(code)) throw new Error(`data/findings/${name}.json: ${code} has words already`)
      seen.add(code)
    }
    return texts
  })
}
