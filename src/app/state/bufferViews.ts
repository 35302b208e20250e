import { acidityOf, titreOf, type Acidity } from '../../evaluation/buffers/acidity.ts'
import { scoreOf, ranked, type BufferOption } from '../../evaluation/buffers/compare.ts'
import { designBuffer } from '../../evaluation/buffers/design.ts'
import type { BufferPart, BufferWish } from '../../evaluation/buffers/types.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Formula } from '../../formula/types.ts'
import type { BufferSystem, BufferWay } from '../../library/buffers.ts'
import type { Library } from '../../library/library.ts'
import { tellFinding } from '../../worksheet/tell.ts'
import { decimals, exactMass, significant, volumeToMeasure, wholeNumber } from '../words/figures.ts'
import { joined } from '../words/join.ts'

/* What the page says about acid, base and buffers: strings made once from what the evaluation room answers. */

export const pHText = (value: number | null) => (value === null ? 'unknown' : decimals(value, 2))

export interface AcidityView {
  readonly sentence: string
  readonly capacity: string
  readonly shares: string
  readonly dilutions: readonly { readonly name: string; readonly water: string; readonly saline: string }[]
  readonly air: string
  readonly components: readonly string[]
}

export function acidityView(evaluation: Evaluation, library: Library): AcidityView | null {
  const acidity = acidityOf(evaluation, library)
  if (!acidity) return null
  return {
    sentence: `By the balance of charges the formula reads pH ${pHText(acidity.pH)} at ${wholeNumber(acidity.celsius)} °C.`,
    capacity: `${significant(acidity.capacityMillimolesPerLitrePerPH, 3)} mmol/L for one unit of pH`,
    shares: sharesOf(acidity),
    dilutions: acidity.dilutions.map(({ parts, inWater, inSaline }) => ({
      name: `1 part in ${parts}`,
      water: pHText(inWater),
      saline: pHText(inSaline),
    })),
    air:
      acidity.openToAir === null
        ? ''
        : `Left open until it is in balance with the carbon dioxide of the air, it reads pH ${pHText(acidity.openToAir)}.`,
    components: acidity.components,
  }
}

const noticeablePart = 0.01

/** Which part of the capacity each component carries. */
function sharesOf({ capacityByComponent }: Acidity): string {
  const sum = Object.values(capacityByComponent).reduce((total, part) => total + part, 0)
  if (sum <= 0) return ''
  const parts = Object.entries(capacityByComponent)
    .filter(([, part]) => part / sum >= noticeablePart)
    .toSorted(([, a], [, b]) => b - a)
    .map(([component, part]) => `${component} ${wholeNumber((part / sum) * 100)} %`)
  return parts.length === 0 ? '' : `carried by ${joined(parts)}`
}

export interface TitreView {
  readonly sentence: string
  readonly steps: readonly { readonly share: string; readonly volume: string; readonly pH: string }[]
}

const titrantNames = { 'hydrochloric-acid': 'hydrochloric acid', 'sodium-hydroxide': 'sodium hydroxide' }

export function titreView(
  evaluation: Evaluation,
  pH: number,
  molar: number,
  library: Library,
): TitreView | null {
  const plan = titreOf(evaluation, pH, molar, library)
  if (!plan) return null
  if (plan.status === 'there-already')
    return { sentence: `It reads pH ${pHText(plan.pH)} already.`, steps: [] }
  if (plan.status === 'not-found') {
    const reached = plan.reached === null ? '' : ` The most that was tried gives pH ${pHText(plan.reached)}.`
    return { sentence: `No volume was found that brings it to pH ${pHText(pH)}.${reached}`, steps: [] }
  }
  const { titrant, millimoles, millilitres } = plan
  return {
    sentence:
      `To pH ${pHText(pH)}: ${volumeToMeasure(millilitres)} of ${significant(molar, 3)} mol/L ${titrantNames[titrant]} ` +
      `(${significant(millimoles, 4)} mmol), counted in the final volume. Add the greater part, read, then go on in small steps.`,
    steps: plan.steps.map((step) => ({
      share: `${wholeNumber(step.share * 100)} %`,
      volume: volumeToMeasure(step.millilitres),
      pH: pHText(step.pH),
    })),
  }
}

export const wayWords: Readonly<Record<BufferWay, string>> = {
  'two-forms': 'both forms',
  'acid-with-base': 'acid form and sodium hydroxide',
  'base-with-acid': 'base form and hydrochloric acid',
}

export interface PartView {
  readonly name: string
  readonly mass: string
  readonly strength: string
  readonly volume: string
}

const titrantMolar = 1

const partView = (
  { ingredient, grams, millimolesPerLitre, part }: BufferPart,
  volumeMl: number,
  library: Library,
): PartView => {
  const strong = part === 'strong-acid' || part === 'strong-base'
  const millilitres = (millimolesPerLitre * volumeMl) / 1000 / titrantMolar
  return {
    name: library.ingredients.get(ingredient)?.name ?? ingredient,
    mass: exactMass(grams),
    strength: `${significant(millimolesPerLitre, 4)} mmol/L`,
    volume: strong ? `or ${volumeToMeasure(millilitres)} of ${titrantMolar} mol/L` : '',
  }
}

export interface DesignView {
  readonly parts: readonly PartView[]
  readonly sentences: readonly string[]
  /** The formula with the buffer in it; null where there is none. */
  readonly formula: Formula | null
}

export function designView(evaluation: Evaluation, wish: BufferWish, library: Library): DesignView {
  const result = designBuffer(evaluation, wish, ['designed acid', 'designed base'], library)
  const told = result.findings.map((finding) => {
    const { message, wayOut } = tellFinding(finding, library)
    return `${message} ${wayOut}`
  })
  if (result.status === 'refused') return { parts: [], sentences: told, formula: null }
  const { parts, replaces, millimolesPerLitre, capacityMillimolesPerLitrePerPH: capacity } = result
  const gone = evaluation.lines
    .filter(({ key }) => replaces.includes(key))
    .map(({ ingredient }) => ingredient.name)
  const { solution, volumeMl } = result.evaluation
  return {
    parts: parts.map((part) => partView(part, volumeMl ?? 0, library)),
    sentences: [
      `${significant(millimolesPerLitre, 3)} mmol/L of buffer; capacity ${significant(capacity, 3)} mmol/L for one unit of pH; ` +
        `the whole reads pH ${pHText(solution?.pH ?? null)} and ${wholeNumber(solution?.osmolality.value ?? Number.NaN)} mOsm/kg.`,
      ...(gone.length > 0 ? [`It takes the place of ${joined(gone)}.`] : []),
      ...(evaluation.formula.pH === undefined ? [] : ['The stated pH is taken out: the buffer sets it now.']),
      ...told,
    ],
    formula: result.formula,
  }
}

export interface ComparisonRow {
  readonly id: string
  readonly name: string
  readonly way: string
  readonly score: string
  readonly cells: readonly string[]
  readonly reasons: readonly string[]
  readonly formula: Formula | null
  /** For the chart, mOsm/kg: what the buffer takes and what is left; null for one that is left out. */
  readonly osmotic: { readonly taken: number; readonly left: number | null } | null
}

export const comparisonColumns = [
  'masses',
  'mmol/L',
  'capacity (mmol/L per pH)',
  'takes (mOsm/kg)',
  'leaves (mOsm/kg)',
  'adjuster',
  'Na, K, P (mmol/L)',
  'pH at 5, 25, 37 °C',
  'pH of 1 in 10, water and saline',
  'use by this route',
] as const

const useWords = { usual: 'usual', limited: 'limited', 'not-used': 'not used' }

export function comparisonRows(
  options: readonly BufferOption[],
  weights: Readonly<Record<string, number>>,
  library: Library,
): readonly ComparisonRow[] {
  return ranked(options, weights).map((option) => {
    const { system, way, design, figures, rejections, remarks } = option
    const score = scoreOf(option, weights)
    return {
      id: system.id,
      name: system.name,
      way: wayWords[way],
      score: score === null ? 'left out' : decimals(score, 2),
      cells: cellsOf(option, library),
      reasons: [...rejections, ...remarks].map((finding) => tellFinding(finding, library).message),
      formula: design?.formula ?? null,
      osmotic:
        figures && score !== null ? { taken: figures.buffersOsmolality, left: figures.roomLeft } : null,
    }
  })
}

function cellsOf({ design, figures, system, use }: BufferOption, library: Library): readonly string[] {
  const evidence = `${useWords[use]} (${system.evidence})`
  if (!design || !figures) return [...comparisonColumns.slice(1).map(() => '—'), evidence]
  const masses = design.parts
    .map(
      ({ ingredient, grams }) =>
        `${exactMass(grams)} ${library.ingredients.get(ingredient)?.name ?? ingredient}`,
    )
    .join('; ')
  const below = figures.belowLeastWeighable > 0 ? ' (below the least weighable)' : ''
  return [
    masses + below,
    significant(design.millimolesPerLitre, 3),
    significant(design.capacityMillimolesPerLitrePerPH, 3),
    wholeNumber(figures.buffersOsmolality),
    figures.roomLeft === null ? 'no target' : wholeNumber(figures.roomLeft),
    figures.adjusterGrams === null ? 'none' : exactMass(figures.adjusterGrams),
    [figures.sodium, figures.potassium, figures.phosphate].map((value) => significant(value, 3)).join(', '),
    [figures.pH5, figures.pH25, figures.pH37].map(pHText).join(', '),
    [figures.pHDilutedInWater, figures.pHDilutedInSaline].map(pHText).join(', '),
    evidence,
  ]
}

/** The comparison as tab-separated text for a report. */
export function comparisonText(rows: readonly ComparisonRow[]): string {
  const head = ['buffer', 'made from', 'score', ...comparisonColumns, 'remarks']
  const lines = rows.map(({ name, way, score, cells, reasons }) =>
    [name, way, score, ...cells, reasons.join(' ')].join('\t'),
  )
  return [head.join('\t'), ...lines].join('\n')
}

export const systemChoices = (library: Library): readonly BufferSystem[] => library.bufferSystems
