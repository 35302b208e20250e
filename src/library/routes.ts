import * as v from 'valibot'
import rawRoutes from '../../data/routes/routes.json'
import { checked } from './checked.ts'
import type { SourceKey } from './types.ts'

/** How a limit or a rule is known, in the words that stand beside it on the page and on paper. */
export const evidenceGrades = [
  'published',
  'published in part',
  'label',
  'computed here',
  'common practice',
  'from memory',
] as const
export type EvidenceGrade = (typeof evidenceGrades)[number]

/** Quantities in which the trade states how concentrated a route may be, each with its unit. */
export const routeQuantities = {
  osmolality: 'mOsm/kg',
  osmolarity: 'mOsm/L',
  'sodium-chloride-equivalent': '% w/v',
  pH: 'pH',
} as const
export type RouteQuantity = keyof typeof routeQuantities

/** A side that is left out is not limited. */
export interface Band {
  readonly low?: number
  readonly high?: number
}

/** Two bands: outside `tolerated` is worth a warning, outside `absolute` is not acceptable. */
export interface Guardrail {
  readonly quantity: RouteQuantity
  readonly tolerated: Band
  readonly absolute?: Band
  readonly evidence: EvidenceGrade
  readonly source: SourceKey
  readonly note?: string
}

export interface RouteLimits {
  readonly id: string
  /** "for the eye": completes "a solution …". */
  readonly spokenName: string
  readonly isSterile: boolean
  /** The tolerated span in mOsm/kg, as the osmolality axis draws it. */
  readonly span?: {
    readonly low: number
    readonly high: number
    readonly evidence: EvidenceGrade
    readonly source: SourceKey
    readonly note?: string
  }
  /** Absent where the tissue does not mind; `note` says so. */
  readonly tonicity?: Guardrail
  readonly pH: Guardrail
  readonly preservative: {
    readonly rule: 'never' | 'avoid' | 'multiple-dose only'
    readonly evidence: EvidenceGrade
    readonly source: SourceKey
    readonly note?: string
  }
  /** What is aimed at where the order does not say. */
  readonly target?: { readonly quantity: string; readonly text: string }
  readonly note?: string
}

const filled = v.pipe(v.string(), v.trim(), v.nonEmpty())
const finite = v.pipe(v.number(), v.finite())
export const evidenceSchema = v.picklist(evidenceGrades)

const band = v.strictObject({ low: v.exactOptional(finite), high: v.exactOptional(finite) })
const standing = { evidence: evidenceSchema, source: filled, note: v.exactOptional(filled) }

const guardrail = v.strictObject({
  quantity: v.picklist(['osmolality', 'osmolarity', 'sodium-chloride-equivalent', 'pH']),
  tolerated: band,
  absolute: v.exactOptional(band),
  ...standing,
})

const routesSchema = v.array(
  v.strictObject({
    id: filled,
    spokenName: filled,
    isSterile: v.boolean(),
    span: v.exactOptional(v.strictObject({ low: finite, high: finite, ...standing })),
    tonicity: v.exactOptional(guardrail),
    pH: guardrail,
    preservative: v.strictObject({
      rule: v.picklist(['never', 'avoid', 'multiple-dose only']),
      ...standing,
    }),
    target: v.exactOptional(v.strictObject({ quantity: filled, text: filled })),
    note: v.exactOptional(filled),
  }),
)

export const routeFiles: Readonly<Record<string, unknown>> = { routes: rawRoutes }

/** How a guardrail contradicts itself; empty when it does not. */
export function guardrailFaults({ tolerated, absolute = {} }: Pick<Guardrail, 'tolerated' | 'absolute'>) {
  const lowest = Number.NEGATIVE_INFINITY
  const highest = Number.POSITIVE_INFINITY
  const rising = [
    absolute.low ?? lowest,
    tolerated.low ?? lowest,
    tolerated.high ?? highest,
    absolute.high ?? highest,
  ]
  const faults: string[] = []
  if (tolerated.low === undefined && tolerated.high === undefined) faults.push('the tolerated band is open')
  if (rising.some((bound, index) => bound < (rising[index - 1] ?? lowest))) {
    faults.push('the bounds do not rise from absolute low over tolerated to absolute high')
  }
  if (tolerated.low !== undefined && tolerated.low === tolerated.high) faults.push('the band has no width')
  return faults
}

/** The limits of every route; throws where a guardrail contradicts itself. */
export function loadRoutes(): ReadonlyMap<string, RouteLimits> {
  const routes = new Map<string, RouteLimits>()
  for (const route of checked(routesSchema, rawRoutes, 'routes/routes')) {
    const faults = [
      ...(route.tonicity ? guardrailFaults(route.tonicity) : []),
      ...guardrailFaults(route.pH),
      ...(!route.span || route.span.low < route.span.high ? [] : ['the span has no width']),
      ...(routes.has(route.id) ? ['the route stands twice'] : []),
    ]
    if (faults.length > 0) throw new Error(`data/routes/routes.json, ${route.id}: ${faults.join('; ')}`)
    routes.set(route.id, route)
  }
  return routes
}
