import type { Evaluation } from '../evaluation/types.ts'
import type { LineWeighing } from '../evaluation/weighing/plan.ts'
import type { Scale } from '../evaluation/weighing/scales.ts'
import { massText, numberText } from './say.ts'

/* How the sheet speaks of balances and of the errors that they make. */

/** The step of a display, in mg below 1 g: a balance is called by it, and nobody calls one by mcg. */
export const stepText = (grams: number): string =>
  grams < 1 ? `${numberText(grams * 1000, 3)} mg` : massText(grams, 3)

export const scaleName = ({ name, readabilityG }: Scale): string =>
  name ? `${name} (${stepText(readabilityG)})` : `balance to ${stepText(readabilityG)}`

const basisWords: Readonly<Record<Scale['basis'], string>> = {
  readability: 'by its readability',
  repeatability: 'by its repeatability',
  sensitivity: 'by sensitivity and allowed error',
}

/** Each balance in use with its limit. */
export function balancesText({ weighingPlan }: Evaluation): string {
  const scales = new Map(
    weighingPlan?.lines.flatMap(({ scale }) => (scale ? [[scaleName(scale), scale] as const] : [])),
  )
  if (scales.size === 0) return 'No balance was named: masses are not rounded.'
  const each = [...scales].map(
    ([name, scale]) =>
      `${name}: least weighable mass ${massText(scale.leastWeighableG, 4)} ${basisWords[scale.basis]}${
        scale.dilutedBelowG < scale.leastWeighableG
          ? `, weighed as such down to ${massText(scale.dilutedBelowG, 4)}`
          : ''
      }`,
  )
  return `${each.join('; ')}.`
}

const signed = (percent: number) => `${percent > 0 ? '+' : '−'}${numberText(Math.abs(percent), 2)} %`

/** What rounding does to a mass, how far the weighing may be off, and both by root sum of squares. */
export function errorText(plan: LineWeighing | undefined): string {
  if (!plan || plan.errorPercent === null || plan.combinedPercent === null) return ''
  const { roundingPercent } = plan
  const isRounded = roundingPercent !== null && Math.abs(roundingPercent) >= 0.0005
  const rounding = isRounded ? `rounding ${signed(roundingPercent)}, ` : ''
  const both = isRounded ? `, together ${numberText(plan.combinedPercent, 2)} %` : ''
  return `${rounding}error up to ${numberText(plan.errorPercent, 2)} %${both}`
}

/** In short, beside what is weighed: what rounding does, and all errors together. */
export function shortErrorText(plan: LineWeighing | undefined): string {
  if (!plan || plan.combinedPercent === null) return ''
  const { roundingPercent } = plan
  const isRounded = roundingPercent !== null && Math.abs(roundingPercent) >= 0.0005
  const rounding = isRounded ? `rounding ${signed(roundingPercent)}; ` : ''
  return `${rounding}error ${numberText(plan.combinedPercent, 2)} %`
}

/** Which balance a line goes on, where there is more than one. */
export const leastText = (plan: LineWeighing | undefined): string =>
  plan?.scale?.name ? `on ${plan.scale.name}` : ''

/** Rounding and error of one line, combined, percent: for the appendix. */
export const combinedText = (plan: LineWeighing): string =>
  plan.combinedPercent === null ? 'not weighed' : `${numberText(plan.combinedPercent, 2)} %`
