import * as v from 'valibot'
import rankingFile from '../../data/buffers/ranking.json'
import systemsFile from '../../data/buffers/systems.json'
import { checked } from './checked.ts'
import { evidenceGrades, type EvidenceGrade } from './routes.ts'
import type { SourceKey } from './types.ts'

/** How a buffer is put together: from both its forms, or from one of them and a strong acid or base. */
export type BufferWay = 'two-forms' | 'acid-with-base' | 'base-with-acid'
export type RouteUse = 'usual' | 'limited' | 'not-used'

/** What stands against a buffer beside ingredients with a tag. */
export interface BufferConflict {
  readonly tag: string
  readonly level: 'rejects' | 'counts-against'
  readonly reason: string
  /** The conflict holds above this pH alone. */
  readonly abovePH?: number
}

export interface BufferSystem {
  readonly id: string
  readonly name: string
  /** Mass balance that buffers, e.g. "phosphate". */
  readonly component: string
  /** Where the trade uses it. */
  readonly pHLow: number
  readonly pHHigh: number
  /** Ingredient ids of the forms on a shelf, the usual one first. */
  readonly acidForms: readonly string[]
  readonly baseForms: readonly string[]
  readonly ways: readonly BufferWay[]
  readonly usualMillimolesPerLitre: { readonly low: number; readonly high: number }
  readonly source: SourceKey
  readonly evidence: EvidenceGrade
  readonly routes: Readonly<Record<string, RouteUse>>
  readonly conflicts: readonly BufferConflict[]
  readonly note: string
}

/** One rule by which buffers are put in order; a judgement, shown and open to another weight. */
export interface RankingRule {
  readonly id: string
  readonly name: string
  readonly weight: number
  /** Amount that counts as fully bad, in `unit`. */
  readonly worstAt: number
  readonly unit: string
  readonly source: SourceKey
  readonly note?: string
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())
const id = v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/))
const finite = v.pipe(v.number(), v.finite())
const positive = v.pipe(finite, v.gtValue(0))

const systemsSchema = v.array(
  v.strictObject({
    id,
    name: text,
    component: text,
    pHLow: finite,
    pHHigh: finite,
    acidForms: v.array(id),
    baseForms: v.array(id),
    ways: v.pipe(v.array(v.picklist(['two-forms', 'acid-with-base', 'base-with-acid'])), v.minLength(1)),
    usualMillimolesPerLitre: v.strictObject({ low: positive, high: positive }),
    source: text,
    evidence: v.picklist(evidenceGrades),
    routes: v.record(id, v.picklist(['usual', 'limited', 'not-used'])),
    conflicts: v.array(
      v.strictObject({
        tag: id,
        level: v.picklist(['rejects', 'counts-against']),
        reason: text,
        abovePH: v.exactOptional(finite),
      }),
    ),
    note: text,
  }),
)

const rankingSchema = v.array(
  v.strictObject({
    id,
    name: text,
    weight: v.pipe(finite, v.minValue(0), v.maxValue(5)),
    worstAt: positive,
    unit: text,
    source: text,
    note: v.exactOptional(text),
  }),
)

export const bufferFiles: Readonly<Record<string, unknown>> = { systems: systemsFile, ranking: rankingFile }

/** Buffer systems in the order of the file. */
export const loadBufferSystems = (): readonly BufferSystem[] =>
  checked(systemsSchema, systemsFile, 'buffers/systems')

export const loadRankingRules = (): readonly RankingRule[] =>
  checked(rankingSchema, rankingFile, 'buffers/ranking')
