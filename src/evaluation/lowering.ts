import type { Amount } from '../quantity/amount.ts'
import { resolveAmount } from '../quantity/resolveAmount.ts'
import { roundToReadability } from '../quantity/readability.ts'
import { loadDeviceData } from '../library/devices.ts'
import type { Library } from '../library/library.ts'
import type { FormFactor } from '../library/forms.ts'
import type { Ingredient } from '../library/types.ts'
import { findingOf } from './finding.ts'
import type { Certified } from './forms/certificate.ts'
import { factsOf } from './order/facts.ts'
import type { StockShare } from './stocks/stock.ts'
import { stockVolume } from './stocks/readStock.ts'
import type { Finding } from './types.ts'
import { designAliquot, type AliquotPlan } from './weighing/aliquot.ts'
import { measureFor, measureOf, type Measure, type Measured } from './weighing/measures.ts'
import { chooseScale, isBelowLeast, isDiluted, type Scale } from './weighing/scales.ts'

/** A line whose words were understood. */
export interface ReadLine {
  readonly key: string
  readonly ingredient: Ingredient
  readonly amount: Amount
  /** What the line is in the work: put into the solution, sized to the target, or the water around it. */
  readonly part: 'solute' | 'adjuster' | 'vehicle' | 'fill'
  readonly share: number
  /** Largest mass of an adjuster in the evaluated volume, g. */
  readonly capGrams: number | null
  /** What the amount means, where it is not the article. */
  readonly ordered?: FormFactor
  readonly certified?: Certified
  /** Measured as a solution from the shelf. */
  readonly stock?: StockShare
}

/** Masses of the pure substance in the evaluated volume. */
export interface Lowered {
  readonly key: string
  readonly gramsExact: number
  /** After rounding to the balance; everything downstream belongs to it. */
  readonly grams: number
  readonly articleGrams: number | null
  readonly millilitres: number | null
  readonly belowLeastWeighable: boolean
  readonly belowReadability: boolean
  /** The balance that was chosen; absent: nothing is rounded, or measured by volume. */
  readonly scale?: Scale
  /** Too small to be weighed as such: to be diluted or triturated. */
  readonly isDiluted?: boolean
  /** The dilution by which a mass below the least weighable one is measured. */
  readonly aliquot?: AliquotPlan
  /** The measure that was chosen; null where the bench has none for this volume. */
  readonly measured?: Measured | null
}

/** What the solution is like, for amounts that are written against it. */
export interface Surroundings {
  readonly volumeMl: number
  readonly waterKg: number
  readonly densityGPerMl: number
}

/** What there is to weigh and to measure with. */
export interface Balance {
  /** Empty: nothing is rounded. */
  readonly scales: readonly Scale[]
  /** Measures of one's own; empty: volumes are not rounded and aliquots are designed for class A glassware. */
  readonly measures: readonly Measure[]
  readonly batchFactor: number
  readonly batchVolumeMl: number
}

/** Its mass follows from the finished solution, which must be known first. */
export const needsSurroundings = ({ amount }: ReadLine) =>
  amount.kind === 'moles-per-water-mass' || amount.kind === 'mass-per-mass'

/** Mass of a solute line in the evaluated volume, or the finding that says why there is none. */
export function lower(
  line: ReadLine,
  around: Surroundings,
  balance: Balance,
  library: Library,
): Lowered | Finding {
  const { ingredient, amount } = line
  if (line.stock) return measuredStock(line, around, balance, library)
  const resolved = resolveAmount(amount, factsOf(ingredient, around.densityGPerMl, line), around.volumeMl)
  if (!resolved.ok) return unusable(line, resolved.refusal.message, resolved.refusal.wayOut, library)
  const { grams, molPerKg = 0, millilitres } = resolved.value
  const ordered = grams ?? molPerKg * orderedMolarMass(line) * around.waterKg
  const exact = ordered * (line.ordered?.factor ?? 1)
  return isByVolume(line) ? poured(line, exact, millilitres ?? null, balance) : weighed(line, exact, balance)
}

const orderedMolarMass = ({ ordered, ingredient }: ReadLine): number =>
  ordered?.orderedMolarMass ?? ingredient.molarMass?.value ?? Number.NaN

const unusable = (line: ReadLine, reason: string, instead: string, library: Library): Finding =>
  findingOf(library, 'amount-unusable', {
    values: { ingredient: line.ingredient.name, text: line.amount.text, reason, instead },
    ingredients: [line.ingredient.id],
    lineKeys: [line.key],
    blocks: true,
  })

/** One ingredient of a stock: the volume of the stock decides its mass. */
function measuredStock(
  line: ReadLine,
  around: Surroundings,
  balance: Balance,
  library: Library,
): Lowered | Finding {
  const volume = stockVolume(line, around, library)
  if (!volume.ok) return unusable(line, volume.reason, volume.instead, library)
  const grams = volume.millilitres * (line.stock?.gramsPerMl ?? 0)
  return { ...poured(line, grams, volume.millilitres, balance), articleGrams: null }
}

export const isFinding = (result: Lowered | Finding): result is Finding => 'code' in result

/** A liquid that was ordered by volume is measured, not weighed. */
function isByVolume({ amount, ingredient }: ReadLine): boolean {
  if (amount.kind === 'volume' || amount.kind === 'volume-per-volume') return true
  return ingredient.percentBasis === 'v/v' && (amount.kind === 'percent' || amount.kind === 'ratio')
}

function poured(
  line: ReadLine,
  exact: number,
  exactMl: number | null,
  { measures, batchFactor }: Balance,
): Lowered {
  const measured =
    exactMl === null || measures.length === 0 ? undefined : measureFor(exactMl * batchFactor, measures)
  const millilitres = measured ? measured.millilitres / batchFactor : exactMl
  const grams = measured && exactMl ? exact * (measured.millilitres / (exactMl * batchFactor)) : exact
  return {
    key: line.key,
    gramsExact: exact,
    grams,
    articleGrams: articleMass(line, grams),
    millilitres,
    belowLeastWeighable: false,
    belowReadability: false,
    ...(measured === undefined ? {} : { measured }),
  }
}

/** Share of the named substance in what lies on the shelf; null where that is the pure substance. */
function contentOfArticle({
  ingredient,
  certified,
}: Pick<ReadLine, 'ingredient' | 'certified'>): number | null {
  if (!ingredient.article && !certified) return null
  return (ingredient.article?.massFraction.value ?? 1) * (certified?.content ?? 1)
}

function articleMass(line: Pick<ReadLine, 'ingredient' | 'certified'>, grams: number): number | null {
  const content = contentOfArticle(line)
  return content === null ? null : grams / content
}

/* A mass that differs from a limit by the noise of its last binary digit is at the limit. */
const belowAtAll = 1 - 1e-12

/**
 * Rounds what is put on the balance: the batch, and the article where it is not the pure substance. Below the least
 * weighable mass it is the mass for the dilution that is rounded, and the aliquot of it that is evaluated. What the
 * balance cannot show and no dilution reaches stays exact, since it will not be weighed as such.
 */
export function weighed(
  line: Pick<ReadLine, 'key' | 'ingredient' | 'certified'>,
  gramsExact: number,
  balance: Balance,
): Lowered {
  const { batchFactor } = balance
  const exactArticle = articleMass(line, gramsExact)
  const onBalance = (exactArticle ?? gramsExact) * batchFactor
  const isMass = Number.isFinite(onBalance) && onBalance > 0
  const scale = isMass ? chooseScale(onBalance, balance.scales, loadDeviceData().rules) : null
  const isBelow = scale !== null && isBelowLeast(onBalance, scale)
  const diluted = scale !== null && isDiluted(onBalance, scale)
  const aliquot = scale && diluted ? aliquotFor(onBalance, scale, balance) : null
  const taken = takenMass(onBalance, scale, aliquot)
  const rounded = (taken ?? onBalance) / batchFactor
  return {
    key: line.key,
    gramsExact,
    grams: taken === null ? gramsExact : rounded * (contentOfArticle(line) ?? 1),
    articleGrams: exactArticle === null ? null : rounded,
    millilitres: null,
    belowLeastWeighable: isBelow,
    belowReadability: scale !== null && onBalance < scale.readabilityG * belowAtAll,
    ...(scale ? { scale } : {}),
    ...(diluted ? { isDiluted: true } : {}),
    ...(aliquot ? { aliquot } : {}),
  }
}

/** What enters the batch; null where nothing rounds it. */
function takenMass(onBalance: number, scale: Scale | null, aliquot: AliquotPlan | null): number | null {
  if (aliquot) return aliquot.doseGrams
  if (!scale || onBalance < scale.readabilityG * belowAtAll) return null
  return roundToReadability(onBalance, scale.readabilityG)
}

function aliquotFor(neededGrams: number, scale: Scale, balance: Balance): AliquotPlan | null {
  const { volumetric, rules } = loadDeviceData()
  const measures = balance.measures.length > 0 ? balance.measures : volumetric.map(measureOf)
  return designAliquot(
    {
      neededGrams,
      leastWeighableGrams: scale.dilutedBelowG,
      weighingErrorGrams: scale.errorG,
      roomMl: balance.batchVolumeMl * rules.aliquotRoomFraction.value,
      readabilityGrams: scale.readabilityG,
    },
    measures,
  )
}
