import { cautionLine, ionTotalsOf } from '../../../src/evaluation/cautions/contextOf.ts'
import type {
  CautionContext,
  CautionLine,
  CautionPatient,
  CautionSolution,
} from '../../../src/evaluation/cautions/context.ts'
import { factsOf } from '../../../src/evaluation/order/facts.ts'
import type { RouteId } from '../../../src/formula/types.ts'
import { loadLibrary } from '../../../src/library/library.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { loadUsualStrengths } from '../../../src/library/usual-strengths.ts'
import { intervalAround } from '../../../src/quantity/interval.ts'
import { readAmount } from '../../../src/quantity/readAmount.ts'
import { resolveAmount } from '../../../src/quantity/resolveAmount.ts'

export const library = loadLibrary()

/** What a case says; everything else is an unremarkable isotonic, neutral solution of 1000 mL. */
export interface Situation {
  readonly route?: RouteId
  /** Ingredient id, or the name of a record of the line's own, to the amount as typed. */
  readonly lines?: Readonly<Record<string, string>>
  readonly pH?: number | null
  readonly osmolality?: number
  readonly effective?: number
  readonly osmolarity?: number
  readonly equivalent?: number
  readonly capacity?: number
  readonly volumeMl?: number
  readonly patient?: CautionPatient
}

export const ownRecord = (name: string): Ingredient => ({
  id: name.toLowerCase().replaceAll(' ', '-'),
  name,
  synonyms: [],
  crystalWaters: 0,
  state: 'solid',
  percentBasis: 'w/v',
  roles: ['active'],
  tags: [],
  sodiumChlorideEquivalents: [],
})

function lineOf(key: string, id: string, text: string, volumeMl: number): CautionLine {
  const ingredient = library.ingredients.get(id) ?? ownRecord(id)
  const amount = readAmount(text)
  if (!amount.ok) throw new Error(`${text}: ${amount.refusal.message}`)
  const isAdjuster = amount.value.kind === 'quantity-sufficient'
  const resolved = isAdjuster ? null : resolveAmount(amount.value, factsOf(ingredient), volumeMl)
  if (resolved && !resolved.ok) throw new Error(`${id} ${text}: ${resolved.refusal.message}`)
  const grams = resolved?.ok ? (resolved.value.grams ?? null) : null
  const molarMass = ingredient.molarMass?.value
  const millimoles = grams === null || molarMass === undefined ? null : (grams / molarMass) * 1000
  return cautionLine({ key, ingredient, grams, millimoles, isAdjuster }, volumeMl)
}

const solutionOf = (situation: Situation): CautionSolution => {
  const osmolality = situation.osmolality ?? 290
  const effectiveOsmolality = situation.effective ?? osmolality
  return {
    osmolality,
    effectiveOsmolality,
    intervals: {
      osmolality: intervalAround(osmolality, 3),
      effectiveOsmolality: intervalAround(effectiveOsmolality, 3),
    },
    freezingPointDepressionK: 0.00186 * osmolality,
    osmolarity: situation.osmolarity ?? osmolality,
    labelOsmolarity: null,
    sodiumChlorideEquivalentPercent: situation.equivalent ?? 0.9,
    pH: situation.pH === undefined ? 7.2 : situation.pH,
    bufferCapacity: () => situation.capacity ?? null,
  }
}

export function contextOf(situation: Situation): CautionContext {
  const routeId = situation.route ?? 'ophthalmic'
  const limits = library.routes.get(routeId)
  if (!limits) throw new Error(`no limits for ${routeId}`)
  const volumeMl = situation.volumeMl ?? 1000
  const written = Object.entries(situation.lines ?? {})
  const lines = written.map(([id, text], index) => lineOf(`line-${index + 1}`, id, text, volumeMl))
  return {
    formula: {
      format: 'evenwater.formula',
      version: 1,
      title: 'Test',
      route: routeId,
      finalVolume: `${volumeMl} mL`,
      lines: written.map(([ingredient, amount], index) => ({ key: `line-${index + 1}`, ingredient, amount })),
    },
    routeId,
    limits,
    patient: situation.patient ?? {},
    lines,
    solution: solutionOf(situation),
    ionTotals: ionTotalsOf(lines, library),
    volumeMl,
    usualStrengths: loadUsualStrengths(),
  }
}

/** A rule's id; where it speaks; and what is changed so that it is silent. Lines are replaced as a whole. */
export type Case = readonly [id: string, fires: Situation, silent: Situation]

export const silenced = ([, fires, silent]: Case): Situation => ({ ...fires, ...silent })
