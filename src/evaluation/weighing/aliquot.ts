import type { VolumetricDevice } from '../../library/devices.ts'

/** One dilution: bring to `flask`, draw with `pipette`. */
export interface AliquotStep {
  readonly flaskName: string
  readonly flaskMl: number
  readonly pipetteName: string
  readonly drawMl: number
}

/** How a mass below the least weighable one is measured by dilution. */
export interface AliquotPlan {
  readonly weighGrams: number
  /** Weighed mass over needed mass. */
  readonly multiple: number
  readonly steps: readonly AliquotStep[]
  /** Volume of diluent that enters the preparation with the dose, mL. */
  readonly carriedMl: number
  readonly wastedGrams: number
  /** Root sum of squares of weighing, flasks and pipettes, percent of the dose. */
  readonly errorPercent: number
}

export interface AliquotNeed {
  readonly neededGrams: number
  readonly leastWeighableGrams: number
  /** Largest error of one weighing, g. */
  readonly weighingErrorGrams: number
  /** The diluent carried in must leave room for the rest, mL. */
  readonly roomMl: number
}

interface Dilution {
  readonly flask: VolumetricDevice
  readonly pipette: VolumetricDevice
  readonly factor: number
}

/**
 * The sensible dilution: fewest steps first (one, at most two), a multiple within twice the smallest that can be
 * weighed, then the smallest vessels. Null when no pair of vessels reaches the dose: a third step is never planned.
 * Mass balance: weighGrams = neededGrams × Π(flask / draw).
 * @example designAliquot({ neededGrams: 0.004, leastWeighableGrams: 0.12, weighingErrorGrams: 0.006, roomMl: 50 }, devices) → weighGrams 0.2, multiple 50, 1 mL drawn from 50 mL
 */
export function designAliquot(need: AliquotNeed, devices: readonly VolumetricDevice[]): AliquotPlan | null {
  const single = dilutions(devices)
  const least = need.leastWeighableGrams / need.neededGrams
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

function dilutions(devices: readonly VolumetricDevice[]): readonly Dilution[] {
  const flasks = devices.filter(({ kind }) => kind === 'flask')
  const pipettes = devices.filter(({ kind }) => kind === 'pipette')
  return flasks.flatMap((flask) =>
    pipettes
      .filter((pipette) => pipette.capacityMl < flask.capacityMl)
      .map((pipette) => ({ flask, pipette, factor: flask.capacityMl / pipette.capacityMl })),
  )
}

/** Up to this many times the smallest possible multiple, a smaller vessel is worth the waste. */
const sensibleMultiple = 2

const factorOf = (chain: readonly Dilution[]) => chain.reduce((product, { factor }) => product * factor, 1)
const volumeOf = (chain: readonly Dilution[]) => chain.reduce((sum, { flask }) => sum + flask.capacityMl, 0)
const carriedBy = (chain: readonly Dilution[]) => chain.at(-1)?.pipette.capacityMl ?? 0

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

function planOf(chain: readonly Dilution[], need: AliquotNeed): AliquotPlan {
  const multiple = factorOf(chain)
  const weighGrams = need.neededGrams * multiple
  const parts = chain.flatMap(({ flask, pipette }) => [
    flask.tolerance.value / flask.capacityMl,
    pipette.tolerance.value / pipette.capacityMl,
  ])
  const relative = Math.hypot(need.weighingErrorGrams / weighGrams, ...parts)
  return {
    weighGrams,
    multiple,
    steps: chain.map(({ flask, pipette }) => ({
      flaskName: flask.name,
      flaskMl: flask.capacityMl,
      pipetteName: pipette.name,
      drawMl: pipette.capacityMl,
    })),
    carriedMl: carriedBy(chain),
    wastedGrams: weighGrams - need.neededGrams,
    errorPercent: relative * 100,
  }
}

/**
 * Least mass that a balance of the given sensitivity weighs within the allowed error, g.
 * LWQ = sensitivity / allowed relative error.
 * @example leastWeighable(0.006, 5) → 0.12
 */
export const leastWeighable = (sensitivityGrams: number, allowedErrorPercent: number): number =>
  (sensitivityGrams * 100) / allowedErrorPercent
