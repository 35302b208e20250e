import { roundToReadability } from '../../quantity/readability.ts'
import type { Measure } from './measures.ts'

export { leastWeighable } from './scales.ts'

/** One dilution: bring to `flask`, draw with `pipette`. */
export interface AliquotStep {
  readonly flaskName: string
  readonly flaskMl: number
  readonly pipetteName: string
  readonly drawMl: number
}

/** How a mass below the least weighable one is measured by dilution. */
export interface AliquotPlan {
  /** Rounded to the balance. */
  readonly weighGrams: number
  /** What the aliquot of the rounded mass holds. */
  readonly doseGrams: number
  /** Weighed mass over needed mass, before rounding. */
  readonly multiple: number
  readonly steps: readonly AliquotStep[]
  /** Volume of diluent that enters the preparation with the dose, mL. */
  readonly carriedMl: number
  readonly wastedGrams: number
  readonly budget: ErrorBudget
  /** Root sum of squares of weighing, flasks and pipettes, percent of the dose. */
  readonly errorPercent: number
}

/** Largest errors, percent of the dose. */
export interface ErrorBudget {
  readonly weighingPercent: number
  readonly flasksPercent: number
  readonly drawsPercent: number
}

export interface AliquotNeed {
  readonly neededGrams: number
  readonly leastWeighableGrams: number
  /** Largest error of one weighing, g. */
  readonly weighingErrorGrams: number
  /** The diluent carried in must leave room for the rest, mL. */
  readonly roomMl: number
  /** Step of the balance, g; absent: the weighed mass is not rounded. */
  readonly readabilityGrams?: number
}

interface Dilution {
  readonly flask: Measure
  readonly pipette: Measure
  readonly drawMl: number
  readonly factor: number
}

/**
 * The sensible dilution: fewest steps first (one, at most two), a multiple within twice the smallest that can be
 * weighed, then the smallest vessels. Null when no pair of vessels reaches the dose: a third step is never planned.
 * Mass balance: weighGrams = neededGrams × Π(flask / draw).
 * @example designAliquot({ neededGrams: 0.004, leastWeighableGrams: 0.12, weighingErrorGrams: 0.006, roomMl: 50 }, devices) → weighGrams 0.2, multiple 50, 1 mL drawn from 50 mL
 */
export function designAliquot(need: AliquotNeed, measures: readonly Measure[]): AliquotPlan | null {
  const single = dilutions(measures)
  const least = (need.leastWeighableGrams / need.neededGrams) * (1 - 1e-12)
  const one = single.filter(({ factor }) => factor >= least).map((dilution) => [dilution])
  const best = preferred(one, need)
  if (best) return planOf(best, need)
  const two = single.flatMap((first) => single.map((second) => [first, second]))
  const pair = preferred(
    two.filter((chain) => factorOf(chain) >= least),
    need,
  )
  return pair ? planOf(pair, need) : null
}

/** Parts of its capacity that are drawn with a measure that has marks. */
const easyParts = [1, 0.5, 0.2]

function drawsOf(measure: Measure): readonly number[] {
  const { capacityMl, smallestMl, graduationMl } = measure
  if (graduationMl === null) return [capacityMl]
  const onAMark = (volume: number) => Math.abs(roundToReadability(volume, graduationMl) - volume) < 1e-9
  return easyParts
    .map((part) => part * capacityMl)
    .filter((volume) => volume >= smallestMl * (1 - 1e-9) && onAMark(volume))
}

function dilutions(measures: readonly Measure[]): readonly Dilution[] {
  const flasks = measures.filter(({ kind }) => kind === 'flask' || kind === 'graduate')
  const pipettes = measures.filter(({ kind }) => kind === 'pipette' || kind === 'syringe')
  return flasks.flatMap((flask) =>
    pipettes.flatMap((pipette) =>
      drawsOf(pipette)
        .filter((drawMl) => drawMl < flask.capacityMl)
        .map((drawMl) => ({ flask, pipette, drawMl, factor: flask.capacityMl / drawMl })),
    ),
  )
}

/** Up to this many times the smallest possible multiple, a smaller vessel is worth the waste. */
const sensibleMultiple = 2

const factorOf = (chain: readonly Dilution[]) => chain.reduce((product, { factor }) => product * factor, 1)
const volumeOf = (chain: readonly Dilution[]) => chain.reduce((sum, { flask }) => sum + flask.capacityMl, 0)
const carriedBy = (chain: readonly Dilution[]) => chain.at(-1)?.drawMl ?? 0

function preferred(
  chains: readonly (readonly Dilution[])[],
  need: AliquotNeed,
): readonly Dilution[] | undefined {
  const fitting = chains.filter((chain) => carriedBy(chain) <= need.roomMl)
  const smallest = Math.min(...fitting.map(factorOf))
  return fitting
    .filter((chain) => factorOf(chain) <= smallest * sensibleMultiple)
    .toSorted((a, b) => volumeOf(a) - volumeOf(b) || factorOf(a) - factorOf(b))[0]
}

const percentOf = (parts: readonly number[]) => Math.hypot(...parts) * 100

function planOf(chain: readonly Dilution[], need: AliquotNeed): AliquotPlan {
  const multiple = factorOf(chain)
  const exact = need.neededGrams * multiple
  const { readabilityGrams } = need
  const weighGrams = readabilityGrams === undefined ? exact : roundToReadability(exact, readabilityGrams)
  const weighingPercent = percentOf([need.weighingErrorGrams / weighGrams])
  const flasksPercent = percentOf(chain.map(({ flask }) => flask.toleranceMl / flask.capacityMl))
  const drawsPercent = percentOf(chain.map(({ pipette, drawMl }) => pipette.toleranceMl / drawMl))
  return {
    weighGrams,
    doseGrams: weighGrams / multiple,
    multiple,
    steps: chain.map(({ flask, pipette, drawMl }) => ({
      flaskName: flask.name,
      flaskMl: flask.capacityMl,
      pipetteName: pipette.name,
      drawMl,
    })),
    carriedMl: carriedBy(chain),
    wastedGrams: weighGrams - weighGrams / multiple,
    budget: { weighingPercent, flasksPercent, drawsPercent },
    errorPercent: Math.hypot(weighingPercent, flasksPercent, drawsPercent),
  }
}
