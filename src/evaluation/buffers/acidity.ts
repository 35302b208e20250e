import {
  bufferedAt,
  capacityOf,
  speciesAgainstPH,
  titrationCurve,
  titreTo,
  type Buffered,
  type CurvePoint,
  type SpeciesAtPH,
} from '../../chemistry/buffering.ts'
import type { Library } from '../../library/library.ts'
import { compositionOf, type Portion, type Setting } from '../model.ts'
import { portionsInEvaluation } from '../portions.ts'
import type { Evaluation } from '../types.ts'
import { temperatureOf } from './foundation.ts'

export interface Dilution {
  /** Parts in all: 2 is one part and one of diluent. */
  readonly parts: number
  readonly inWater: number | null
  readonly inSaline: number | null
}

/** The acid and base side of an answered formula, its pH by charge balance at the formula's temperature. */
export interface Acidity {
  readonly celsius: number
  readonly pH: number
  readonly capacityMillimolesPerLitrePerPH: number
  /** By mass balance, e.g. "phosphate"; "water" is H+ and OH-. */
  readonly capacityByComponent: Readonly<Record<string, number>>
  readonly dilutions: readonly Dilution[]
  /** pH when the solution stands open to the air; null without carbonate. */
  readonly openToAir: number | null
  /** Components that can be drawn against pH. */
  readonly components: readonly string[]
}

const dilutionParts = [2, 5, 10] as const
const salineGramsPerLitre = 9
/** Carbon dioxide in air, about 420 ppm. common practice */
const airCarbonDioxideAtm = 4.2e-4

/** Portions and setting of an answered formula with its pH left to charge balance; null while it has no answer. */
export function settingOf(
  evaluation: Evaluation,
): { readonly portions: readonly Portion[]; readonly setting: Setting } | null {
  const { volumeMl, formula, status } = evaluation
  if (status !== 'ok' || volumeMl === null) return null
  const setting = { volumeMl, pH: 'solve', temperatureCelsius: temperatureOf(formula) } as const
  return { portions: portionsInEvaluation(evaluation), setting }
}

/** Capacity, dilutions and what the air does; null where the pH of the formula cannot be known. */
export function acidityOf(evaluation: Evaluation, library: Library): Acidity | null {
  const known = settingOf(evaluation)
  if (!known) return null
  const { portions, setting } = known
  const celsius = setting.temperatureCelsius
  const buffered = readyAt(portions, setting, celsius, library)
  if (!buffered) return null
  const { molPerLitrePerPH, byComponent } = capacityOf(buffered)
  return {
    celsius,
    pH: buffered.answer.pH,
    capacityMillimolesPerLitrePerPH: molPerLitrePerPH * 1000,
    capacityByComponent: Object.fromEntries(
      Object.entries(byComponent).map(([component, part]) => [component, part * 1000]),
    ),
    dilutions: dilutionParts.map((parts) => ({
      parts,
      inWater: pHDiluted(portions, setting, parts, null, library),
      inSaline: pHDiluted(portions, setting, parts, salineGramsPerLitre, library),
    })),
    openToAir: openToAir(portions, setting, buffered, library),
    components: componentsOf(buffered, library),
  }
}

function readyAt(
  portions: readonly Portion[],
  setting: Setting,
  celsius: number,
  library: Library,
  components: readonly string[] = [],
): Buffered | null {
  const result = bufferedAt(compositionOf(portions, setting), library, celsius, { components })
  return result.status === 'ready' ? result : null
}

/** pH of one part made up to `parts` with water, or with sodium chloride solution of so many g/L. */
export function pHDiluted(
  portions: readonly Portion[],
  setting: Setting,
  parts: number,
  salineGrams: number | null,
  library: Library,
): number | null {
  const diluted = portions.map((portion) => ({ ...portion, grams: portion.grams / parts }))
  const saline = library.ingredients.get('sodium-chloride')
  if (salineGrams !== null) {
    if (!saline) return null
    const grams = (salineGrams * setting.volumeMl * (1 - 1 / parts)) / 1000
    diluted.push({ key: 'diluent', ingredient: saline, grams })
  }
  return readyAt(diluted, setting, setting.temperatureCelsius, library)?.answer.pH ?? null
}

/** pH of a litre that holds the given masses and nothing else; null where it cannot be known. */
export function pHAlone(portions: readonly Portion[], celsius: number, library: Library): number | null {
  const setting = { volumeMl: 1000, pH: 'solve', temperatureCelsius: celsius } as const
  return readyAt(portions, setting, celsius, library)?.answer.pH ?? null
}

function openToAir(
  portions: readonly Portion[],
  setting: Setting,
  { totals }: Buffered,
  library: Library,
): number | null {
  if (!((totals['carbonate'] ?? 0) > 0)) return null
  const carbonDioxide = { kind: 'open', partialPressureAtm: airCarbonDioxideAtm } as const
  const composition = compositionOf(portions, setting)
  const result = bufferedAt(composition, library, setting.temperatureCelsius, { carbonDioxide })
  return result.status === 'ready' ? result.answer.pH : null
}

const componentsOf = ({ totals }: Buffered, library: Library): readonly string[] =>
  library.equilibria.acids
    .map(({ component }) => component)
    .filter((component) => (totals[component] ?? 0) > 0)

export type TitrantName = 'hydrochloric-acid' | 'sodium-hydroxide'
const bringsOf = { 'hydrochloric-acid': 'Cl-', 'sodium-hydroxide': 'Na+' } as const

export interface TitreStep {
  /** Share of the whole titre. */
  readonly share: number
  readonly millilitres: number
  readonly pH: number
}

/** What brings the solution to a pH. */
export type TitrePlan =
  | { readonly status: 'there-already'; readonly pH: number }
  | {
      readonly status: 'found'
      readonly titrant: TitrantName
      readonly molar: number
      readonly millimoles: number
      readonly millilitres: number
      readonly steps: readonly TitreStep[]
    }
  | { readonly status: 'not-found'; readonly reached: number | null }

const titreShares = [0.5, 0.8, 0.9, 1, 1.1] as const

/**
 * Volume of hydrochloric acid or sodium hydroxide solution, molar strength named, that brings the formula to a pH in its
 * final volume; null while the pH of the formula cannot be known. The steps are the pH on the way and beyond.
 */
export function titreOf(
  evaluation: Evaluation,
  pH: number,
  molar: number,
  library: Library,
): TitrePlan | null {
  const known = settingOf(evaluation)
  if (!known) return null
  const { portions, setting } = known
  const buffered = readyAt(portions, setting, setting.temperatureCelsius, library, ['Cl-', 'Na+'])
  if (!buffered) return null
  const from = buffered.answer.pH
  if (Math.abs(from - pH) < 0.005) return { status: 'there-already', pH: from }
  const titrant = pH < from ? 'hydrochloric-acid' : 'sodium-hydroxide'
  const brings = { [bringsOf[titrant]]: 1 }
  const titre = titreTo(buffered, brings, pH)
  if (titre.status !== 'reached')
    return { status: 'not-found', reached: titre.status === 'not-reached' ? titre.pH : null }
  const millimoles = titre.molPerKg * setting.volumeMl
  const curve = titrationCurve(
    buffered,
    brings,
    titreShares.map((share) => share * titre.molPerKg),
  )
  return {
    status: 'found',
    titrant,
    molar,
    millimoles,
    millilitres: millimoles / molar,
    steps: curve.map(({ molPerLitre, pH: reached }) => ({
      share: Math.round((molPerLitre / titre.molPerKg) * 100) / 100,
      millilitres: (molPerLitre * setting.volumeMl) / molar,
      pH: reached,
    })),
  }
}

export interface AcidityCurves {
  /** Acid counts negative, base positive, mmol/L. */
  readonly titration: readonly (Omit<CurvePoint, 'molPerLitre'> & { readonly millimolesPerLitre: number })[]
  readonly temperature: readonly { readonly celsius: number; readonly pH: number }[]
  readonly species: readonly SpeciesAtPH[]
}

const chartTemperatures = [2, 5, 10, 15, 20, 25, 30, 37, 40] as const
const pointsEachSide = 16
const charted = { lowest: 2, highest: 12, step: 0.25 }

/** Up to the next 1, 2 or 4 times a power of ten, so that the axis has plain marks. */
function rounded(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value))
  return ([1, 2, 4].find((step) => step * power >= value) ?? 10) * power
}

/** What the charts show: pH and capacity against titrant, pH against temperature, a component's species against pH. */
export function acidityCurves(
  evaluation: Evaluation,
  component: string | null,
  library: Library,
): AcidityCurves | null {
  const known = settingOf(evaluation)
  if (!known) return null
  const { portions, setting } = known
  const buffered = readyAt(portions, setting, setting.temperatureCelsius, library, ['Cl-', 'Na+'])
  if (!buffered) return null
  const reachMol = rounded(Math.max(1e-3, 2 * capacityOf(buffered).molPerLitrePerPH))
  const amounts = Array.from(
    { length: pointsEachSide },
    (_, index) => ((index + 1) / pointsEachSide) * reachMol,
  )
  const side = (brings: string, sign: number, at: readonly number[]) =>
    titrationCurve(buffered, { [brings]: 1 }, at).map(({ molPerLitre, ...rest }) => ({
      ...rest,
      millimolesPerLitre: sign * molPerLitre * 1000,
    }))
  const pHs = Array.from(
    { length: Math.round((charted.highest - charted.lowest) / charted.step) + 1 },
    (_, index) => charted.lowest + index * charted.step,
  )
  return {
    titration: [...side('Cl-', -1, amounts).toReversed(), ...side('Na+', 1, [0, ...amounts])],
    temperature: chartTemperatures.flatMap((celsius) => {
      const at = readyAt(portions, setting, celsius, library)
      return at ? [{ celsius, pH: at.answer.pH }] : []
    }),
    species: component === null ? [] : speciesAgainstPH(buffered, component, pHs),
  }
}
