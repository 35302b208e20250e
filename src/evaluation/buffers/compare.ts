import type { BufferConflict, BufferSystem, BufferWay, RouteUse } from '../../library/buffers.ts'
import type { Library } from '../../library/library.ts'
import { findingOf } from '../finding.ts'
import type { Evaluation, Finding, LineAnswer } from '../types.ts'
import { pHDiluted, settingOf } from './acidity.ts'
import { designBuffer } from './design.ts'
import type { BufferDesign, BufferRefusal, BufferSize } from './types.ts'

export interface ComparisonWish {
  readonly pH: number
  readonly size: BufferSize
  /** Ids of forms that lie on the shelf; a system without any of them takes its usual one. */
  readonly shelf: readonly string[]
}

/** What one buffer means for the formula. Figures are those of the evaluated formula with the buffer in it. */
export interface BufferFigures {
  readonly osmolality: number
  /** mOsm/kg that the buffer itself brings, and its share of the target (of the whole where there is no target). */
  readonly buffersOsmolality: number
  readonly shareOfTarget: number
  /** mOsm/kg left for drug and adjuster; null without a target. */
  readonly roomLeft: number | null
  readonly adjusterGrams: number | null
  /** mmol/L brought along by the buffer. */
  readonly sodium: number
  readonly potassium: number
  readonly phosphate: number
  readonly pH5: number | null
  readonly pH25: number | null
  readonly pH37: number | null
  readonly pHDilutedInWater: number | null
  readonly pHDilutedInSaline: number | null
  readonly belowLeastWeighable: number
}

export interface BufferOption {
  readonly system: BufferSystem
  readonly way: BufferWay
  readonly use: RouteUse
  readonly design: BufferDesign | null
  readonly figures: BufferFigures | null
  /** Why it is left out; empty when it is not. */
  readonly rejections: readonly Finding[]
  readonly remarks: readonly Finding[]
  /** Badness by ranking rule, from 0 (good) up to 1. */
  readonly badness: Readonly<Record<string, number>>
}

const comparedDilution = 10
const salineGramsPerLitre = 9
/** Capacity at best, for each unit of strength: ln(10) / 4. */
const bestCapacity = Math.LN10 / 4

/** Compares all buffer systems of the library one after the other, so that the caller can show how far it is. */
export function* comparingBuffers(
  evaluation: Evaluation,
  wish: ComparisonWish,
  library: Library,
): Generator<BufferOption> {
  for (const system of library.bufferSystems) yield optionOf(system, evaluation, wish, library)
}

function optionOf(
  system: BufferSystem,
  evaluation: Evaluation,
  wish: ComparisonWish,
  library: Library,
): BufferOption {
  const { formula } = evaluation
  const use = system.routes[formula.route] ?? 'not-used'
  const conflicts = conflictsOf(system, evaluation, wish.pH, library)
  const about = { values: { buffer: system.name } }
  const early = [
    ...(use === 'not-used' ? [findingOf(library, 'buffer-route-not-used', about)] : []),
    ...(wish.pH < system.pHLow || wish.pH > system.pHHigh
      ? [
          findingOf(library, 'buffer-outside-usual-ph', {
            values: { buffer: system.name, pH: wish.pH, low: system.pHLow, high: system.pHHigh },
          }),
        ]
      : []),
    ...conflicts.filter(({ code }) => code === 'buffer-conflict-rejects'),
  ]
  const remarks = [
    ...(use === 'limited' ? [findingOf(library, 'buffer-route-limited', about)] : []),
    ...conflicts.filter(({ code }) => code === 'buffer-conflict'),
  ]
  const way = system.ways[0] ?? 'two-forms'
  const base = { system, use, design: null, figures: null, badness: {} }
  if (early.length > 0) return { ...base, way, rejections: early, remarks }
  const design = designByAnyWay(system, evaluation, wish, library)
  if (design.status === 'refused') return { ...base, way, rejections: design.findings, remarks }
  const figures = figuresOf(design, library)
  return {
    system,
    way: design.way,
    use,
    design,
    figures,
    rejections: newStops(design, evaluation, library),
    remarks: [...remarks, ...design.findings],
    badness: badnessOf(
      { design, figures, use, conflicts: remarks.length - (use === 'limited' ? 1 : 0) },
      library,
    ),
  }
}

/** Both forms where they reach the pH; otherwise one of them with a strong acid or base. */
function designByAnyWay(
  system: BufferSystem,
  evaluation: Evaluation,
  wish: ComparisonWish,
  library: Library,
): BufferDesign | BufferRefusal {
  const onShelf = (forms: readonly string[]) => forms.find((id) => wish.shelf.includes(id)) ?? forms[0]
  const [acidForm, baseForm] = [onShelf(system.acidForms), onShelf(system.baseForms)]
  let first: BufferRefusal | null = null
  for (const way of system.ways) {
    const result = designBuffer(
      evaluation,
      {
        system,
        way,
        pH: wish.pH,
        size: wish.size,
        ...(acidForm === undefined ? {} : { acidForm }),
        ...(baseForm === undefined ? {} : { baseForm }),
      },
      [`${system.id} acid`, `${system.id} base`],
      library,
    )
    if (result.status === 'designed') return result
    first ??= result
  }
  return first ?? { status: 'refused', system: system.id, findings: [] }
}

/** What stands against a buffer beside the ingredients of the formula that it does not replace. */
function conflictsOf(
  system: BufferSystem,
  { lines }: Evaluation,
  pH: number,
  library: Library,
): readonly Finding[] {
  const own = new Set([...system.acidForms, ...system.baseForms])
  const others = lines.filter(({ ingredient }) => !own.has(ingredient.id))
  const against = (conflict: BufferConflict, { ingredient, key }: LineAnswer) =>
    findingOf(library, conflict.level === 'rejects' ? 'buffer-conflict-rejects' : 'buffer-conflict', {
      values: { buffer: system.name, ingredient: ingredient.name, reason: conflict.reason },
      ingredients: [ingredient.id],
      lineKeys: [key],
    })
  return system.conflicts
    .filter(({ abovePH }) => abovePH === undefined || pH > abovePH)
    .flatMap((conflict) =>
      others
        .filter(({ ingredient }) => ingredient.tags.includes(conflict.tag))
        .map((line) => against(conflict, line)),
    )
}

/** Stops that the formula gets through the buffer alone. */
function newStops(design: BufferDesign, before: Evaluation, library: Library): readonly Finding[] {
  const known = new Set(before.findings.filter(({ severity }) => severity === 'stop').map(({ code }) => code))
  const stops = design.evaluation.findings.filter(
    ({ severity, code }) => severity === 'stop' && !known.has(code),
  )
  const buffer = library.bufferSystems.find(({ id }) => id === design.system)?.name ?? design.system
  return stops.length === 0
    ? []
    : [findingOf(library, 'buffer-raises-stop', { values: { buffer } }), ...stops]
}

function figuresOf(design: BufferDesign, library: Library): BufferFigures {
  const { evaluation, parts } = design
  const { solution, adjuster, lines } = evaluation
  const ids = new Set(parts.map(({ ingredient }) => ingredient))
  const own = lines.filter(({ ingredient, isAdjuster }) => ids.has(ingredient.id) && !isAdjuster)
  const buffersOsmolality = own.reduce((sum, line) => sum + (line.osmolalityShareMilliosmPerKg ?? 0), 0)
  const osmolality = solution?.osmolality.value ?? Number.NaN
  const isOsmolal = adjuster?.target.unit === 'mOsm/kg'
  const goal = isOsmolal ? adjuster.target.value : osmolality
  const known = settingOf(evaluation)
  const diluted = (saline: number | null) =>
    known ? pHDiluted(known.portions, known.setting, comparedDilution, saline, library) : null
  return {
    osmolality,
    buffersOsmolality,
    shareOfTarget: buffersOsmolality / goal,
    roomLeft: isOsmolal ? goal - buffersOsmolality : null,
    adjusterGrams: adjuster
      ? Object.values(adjuster.gramsByKey).reduce((sum, grams) => sum + grams, 0)
      : null,
    sodium: broughtBy(design, 'Na+', library),
    potassium: broughtBy(design, 'K+', library),
    phosphate: broughtBy(design, 'phosphate', library),
    pH5: solution?.pH5 ?? null,
    pH25: solution?.pH25 ?? null,
    pH37: solution?.pH37 ?? null,
    pHDilutedInWater: diluted(null),
    pHDilutedInSaline: diluted(salineGramsPerLitre),
    belowLeastWeighable: own.filter(({ belowLeastWeighable }) => belowLeastWeighable).length,
  }
}

/** mmol/L of a component that the parts of a design release. */
function broughtBy({ parts }: BufferDesign, component: string, library: Library): number {
  return parts.reduce((sum, { ingredient, millimolesPerLitre }) => {
    const released = library.ingredients.get(ingredient)?.releases ?? []
    const count = released.reduce((total, { species, count: each }) => {
      const record = library.species.get(species)
      return record?.component === component ? total + each * record.count : total
    }, 0)
    return sum + count * millimolesPerLitre
  }, 0)
}

interface Judged {
  readonly design: BufferDesign
  readonly figures: BufferFigures
  readonly use: RouteUse
  readonly conflicts: number
}

/** Each rule's amount over what counts as fully bad; what is worse still counts as fully bad. */
function badnessOf({ design, figures, use, conflicts }: Judged, library: Library): Record<string, number> {
  const moved = (one: number | null, other: number | null) =>
    one === null || other === null ? 0 : Math.abs(one - other)
  const best = bestCapacity * design.millimolesPerLitre
  const amounts: Readonly<Record<string, number>> = {
    route: use === 'limited' ? 1 : 0,
    conflict: conflicts,
    capacity: 1 - Math.min(1, design.capacityMillimolesPerLitrePerPH / best),
    'osmotic-share': figures.shareOfTarget,
    temperature: moved(figures.pH5, figures.pH37),
    dilution: moved(figures.pHDilutedInWater, design.pH),
    load: figures.sodium + figures.potassium + figures.phosphate,
    weighing: figures.belowLeastWeighable,
  }
  return Object.fromEntries(
    library.rankingRules.map(({ id, worstAt }) => [id, Math.min(1, (amounts[id] ?? 0) / worstAt)]),
  )
}

/** Weighted badness, lower is better; null for an option that is left out. */
export function scoreOf(option: BufferOption, weights: Readonly<Record<string, number>>): number | null {
  if (option.rejections.length > 0 || !option.design) return null
  return Object.entries(option.badness).reduce((sum, [rule, bad]) => sum + (weights[rule] ?? 0) * bad, 0)
}

/** Best first, those left out at the end in the order of the library. */
export function ranked(
  options: readonly BufferOption[],
  weights: Readonly<Record<string, number>>,
): readonly BufferOption[] {
  const scored = options.map((option) => ({ option, score: scoreOf(option, weights) }))
  return scored
    .toSorted((a, b) => (a.score ?? Number.POSITIVE_INFINITY) - (b.score ?? Number.POSITIVE_INFINITY) || 0)
    .map(({ option }) => option)
}
