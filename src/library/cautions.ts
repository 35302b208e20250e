import * as v from 'valibot'
import electrolytes from '../../data/cautions/electrolytes.json'
import handling from '../../data/cautions/handling.json'
import incompatibilityIons from '../../data/cautions/incompatibility-ions.json'
import incompatibilityDrugs from '../../data/cautions/incompatibility-drugs.json'
import incompatibilityPreservatives from '../../data/cautions/incompatibility-preservatives.json'
import names from '../../data/cautions/names.json'
import osmolality from '../../data/cautions/osmolality.json'
import pH from '../../data/cautions/ph.json'
import populations from '../../data/cautions/populations.json'
import routes from '../../data/cautions/routes.json'
import { checked } from './checked.ts'
import { type Condition, conditionSchema } from './conditions.ts'
import type { FindingText } from './findings.ts'
import { type EvidenceGrade, evidenceSchema } from './routes.ts'
import type { SourceKey } from './types.ts'

export const cautionGroups = [
  'incompatibility',
  'osmolality',
  'electrolyte',
  'pH',
  'population',
  'route',
  'handling',
  'name',
] as const

/** A rule of the trade: when it speaks, how loudly, in which words, and how it is known. */
export interface Caution {
  readonly id: string
  readonly severity: 'stop' | 'warn' | 'note'
  readonly group: (typeof cautionGroups)[number]
  readonly when: Condition
  /** `{name}` is filled with what the condition found. */
  readonly message: string
  readonly wayOut: string
  readonly source: SourceKey
  /** Where the figure of the limit is from, when not from `source`. */
  readonly limitSource?: SourceKey
  readonly evidence: EvidenceGrade
  /** Louder cautions that already say this one. */
  readonly yieldsTo?: readonly string[]
}

const filled = v.pipe(v.string(), v.trim(), v.nonEmpty())
const slug = v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/))

const cautionsSchema = v.array(
  v.strictObject({
    id: slug,
    severity: v.picklist(['stop', 'warn', 'note']),
    group: v.picklist(cautionGroups),
    when: conditionSchema,
    message: filled,
    wayOut: filled,
    source: filled,
    limitSource: v.exactOptional(filled),
    evidence: evidenceSchema,
    yieldsTo: v.exactOptional(v.pipe(v.array(slug), v.minLength(1))),
  }),
)

export const cautionFiles: Readonly<Record<string, unknown>> = {
  electrolytes,
  handling,
  'incompatibility-drugs': incompatibilityDrugs,
  'incompatibility-ions': incompatibilityIons,
  'incompatibility-preservatives': incompatibilityPreservatives,
  names,
  osmolality,
  ph: pH,
  populations,
  routes,
}

let loaded: readonly Caution[] | undefined

/** Every caution, validated once; an id stands once, and what a caution yields to exists. */
export function loadCautions(): readonly Caution[] {
  loaded ??= gathered()
  return loaded
}

function gathered(): readonly Caution[] {
  const cautions = Object.entries(cautionFiles).flatMap(([file, content]): readonly Caution[] =>
    checked(cautionsSchema, content, `cautions/${file}`),
  )
  const ids = new Set<string>()
  for (const { id } of cautions) {
    if (ids.has(id)) throw new Error(`data/cautions: ${id} stands twice`)
    ids.add(id)
  }
  for (const { id, yieldsTo = [] } of cautions) {
    const stranger = yieldsTo.find((other) => !ids.has(other))
    if (stranger) throw new Error(`data/cautions: ${id} yields to ${stranger}, which does not exist`)
  }
  return cautions
}

/** The cautions' words, as findings are told. */
export const cautionWords = (): readonly FindingText[] =>
  loadCautions().map(({ id, severity, message, wayOut, source }) => ({
    code: id,
    severity,
    message,
    wayOut,
    source,
  }))
