import type { Library } from '../../library/library.ts'
import type { Formula, FormulaLine } from '../../formula/types.ts'
import { evaluate } from '../evaluate.ts'
import { findingOf } from '../finding.ts'
import type { Portion } from '../model.ts'
import type { Evaluation, Finding } from '../types.ts'
import { foundationOf, type Foundation } from './foundation.ts'
import { capacityAt, partsOf, reach, type Recipe } from './solve.ts'
import type { BufferPart, BufferRefusal, BufferResult, BufferWish } from './types.ts'

const strongAcid = 'hydrochloric-acid'
const strongBase = 'sodium-hydroxide'
/** The adjuster changes with the buffer and the pH a little with the adjuster. */
const mostRounds = 6
const settledShare = 1e-3
const mostSizings = 12
const settledCapacity = 1e-4
/** mol/L and pH for each mol/L of buffer: where the search begins. */
const guessedCapacity = 0.4
/** More than this of any buffer is no buffer any more, mol/L. */
const strongest = 3

/** The wish with its ingredients looked up; null where the way has no such forms. */
export function recipeOf(wish: BufferWish, library: Library): Recipe | null {
  const { system, way } = wish
  const of = (id: string | undefined) => (id === undefined ? undefined : library.ingredients.get(id))
  const acid = of(way === 'base-with-acid' ? strongAcid : (wish.acidForm ?? system.acidForms[0]))
  const base = of(way === 'acid-with-base' ? strongBase : (wish.baseForm ?? system.baseForms[0]))
  return acid?.molarMass && base?.molarMass ? { system, way, acid, base } : null
}

/**
 * A buffer for the formula as it stands: both forms (or one form and a strong acid or base) so that the finished
 * solution, adjuster and all, has the wanted pH. It takes the place of the buffer that is there. The keys of new
 * lines are given by the caller.
 */
export function designBuffer(
  evaluation: Evaluation,
  wish: BufferWish,
  keys: readonly [string, string],
  library: Library,
): BufferResult {
  const foundation = foundationOf(evaluation, library)
  const recipe = recipeOf(wish, library)
  const refuse = (code: string, values: Finding['values'] = {}): BufferRefusal => ({
    status: 'refused',
    system: wish.system.id,
    findings: [
      findingOf(library, code, { values: { buffer: wish.system.name, pH: round2(wish.pH), ...values } }),
    ],
  })
  if (!foundation) return refuse('buffer-formula-blocked')
  if (!recipe) return refuse('buffer-not-solved')
  let portions: readonly Portion[] = foundation.portions
  for (let round = 1; round <= mostRounds; round += 1) {
    const sized = sizeOf(recipe, wish, { ...foundation, portions }, library)
    if ('code' in sized) return refuse(sized.code, sized.values)
    const parts = partsOf(recipe, sized.molPerLitre, sized.x, foundation.setting.volumeMl, library)
    const formula = placed(foundation, parts, keys)
    const now = evaluate(formula, library)
    if (now.adjuster?.status === 'already-above') return refuse('buffer-fills-target')
    if (now.status !== 'ok') return refuse('buffer-blocks')
    const next = withAdjusterOf(now, foundation)
    if (isSettled(portions, next)) {
      return {
        status: 'designed',
        system: wish.system.id,
        way: wish.way,
        pH: wish.pH,
        millimolesPerLitre: sized.molPerLitre * 1000,
        capacityMillimolesPerLitrePerPH: sized.capacity,
        parts,
        replaces: foundation.replaces.map(({ key }) => key),
        formula,
        evaluation: now,
        findings: remarksOn(wish, sized.molPerLitre * 1000, foundation, now, library),
      }
    }
    portions = next
  }
  return refuse('buffer-not-solved')
}

/** The adjuster has stopped moving with the buffer. */
const isSettled = (before: readonly Portion[], after: readonly Portion[]): boolean =>
  after.every(({ grams }, index) => Math.abs(grams - (before[index]?.grams ?? 0)) <= settledShare * grams)

function withAdjusterOf(now: Evaluation, { portions }: Foundation): readonly Portion[] {
  const masses = new Map(
    now.lines.filter(({ isAdjuster }) => isAdjuster).map(({ key, grams }) => [key, grams]),
  )
  return portions.map((portion) => ({ ...portion, grams: masses.get(portion.key) ?? portion.grams }))
}

interface Sized {
  readonly molPerLitre: number
  readonly x: number
  readonly capacity: number
}

type Failed = { readonly code: string; readonly values: Finding['values'] }

/** Strength and share of both parts; for a wanted capacity the strength is found by secant steps. */
function sizeOf(recipe: Recipe, wish: BufferWish, around: Foundation, library: Library): Sized | Failed {
  const at = (molPerLitre: number): Sized | Failed => {
    const reached = reach(recipe, molPerLitre, wish.pH, around, library)
    if (reached.status === 'out-of-reach')
      return {
        code: 'buffer-ph-out-of-reach',
        values: { low: round2(reached.low), high: round2(reached.high) },
      }
    if (reached.status !== 'reached') return { code: 'buffer-not-solved', values: {} }
    return { molPerLitre, x: reached.x, capacity: capacityAt(reached.buffered) }
  }
  const { size } = wish
  if (size.kind === 'strength') return at(size.millimolesPerLitre / 1000)
  const wanted = size.millimolesPerLitrePerPH
  let previous: Sized | null = null
  let molPerLitre = wanted / 1000 / guessedCapacity
  for (let step = 1; step <= mostSizings; step += 1) {
    const sized = at(molPerLitre)
    if ('code' in sized) return sized
    if (Math.abs(sized.capacity / wanted - 1) <= settledCapacity) return sized
    const slope: number = previous
      ? (sized.capacity - previous.capacity) / (sized.molPerLitre - previous.molPerLitre)
      : sized.capacity / sized.molPerLitre
    previous = sized
    molPerLitre += (wanted - sized.capacity) / slope
    // What is there without the buffer is more than what was asked for.
    if (molPerLitre <= 0) return { code: 'buffer-capacity-there-already', values: {} }
    if (!(molPerLitre < strongest)) break
  }
  return { code: 'buffer-not-sized', values: {} }
}

const round2 = (value: number) => Math.round(value * 100) / 100

/** A pH moved by this much by the rounding to the balance is told. */
const movedPH = 0.02
const significant = 5

/** The formula with the buffer where the old one stood, else before the line that is sized. Its pH is solved again. */
function placed(
  { formula, replaces }: Foundation,
  parts: readonly BufferPart[],
  keys: readonly [string, string],
): Formula {
  const gone = new Set(replaces.map(({ key }) => key))
  const first = formula.lines.findIndex(({ key }) => gone.has(key))
  const sized = formula.lines.findIndex(({ amount }) => /^\s*(q\.?\s*s|quantity)/i.test(amount))
  const at = first >= 0 ? first : sized >= 0 ? sized : formula.lines.length
  const lines: FormulaLine[] = parts.map(({ ingredient, grams }, index) => ({
    key: keys[index] ?? ingredient,
    ingredient,
    amount: `${Number(grams.toPrecision(significant))} g`,
  }))
  const before = formula.lines.slice(0, at).filter(({ key }) => !gone.has(key))
  const after = formula.lines.slice(at).filter(({ key }) => !gone.has(key))
  const { pH: _stated, ...rest } = formula
  return { ...rest, lines: [...before, ...lines, ...after] }
}

function remarksOn(
  { system, pH }: BufferWish,
  millimolesPerLitre: number,
  { unknown }: Foundation,
  now: Evaluation,
  library: Library,
): readonly Finding[] {
  const { low, high } = system.usualMillimolesPerLitre
  const say = (code: string, values: Finding['values'], keys: readonly string[] = []) =>
    findingOf(library, code, { values: { buffer: system.name, pH, ...values }, lineKeys: keys })
  return [
    ...unknown.map(({ ingredient, key }) =>
      say('buffer-without-ingredient', { ingredient: ingredient.name }, [key]),
    ),
    ...(pH < system.pHLow || pH > system.pHHigh
      ? [say('buffer-outside-usual-ph', { low: system.pHLow, high: system.pHHigh })]
      : []),
    ...(millimolesPerLitre > high
      ? [say('buffer-above-usual-strength', { millimolesPerLitre, low, high })]
      : []),
    ...(unknown.length === 0 && Math.abs((now.solution?.pH ?? pH) - pH) > movedPH
      ? [say('buffer-ph-after-rounding', { reads: round2(now.solution?.pH ?? pH) })]
      : []),
  ]
}
