import { printAmount } from '../quantity/writeAmount.ts'
import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { massText, numberText, volumeText } from './say.ts'
import { nameOf } from './names.ts'

const isVehicle = ({ ingredient: { roles } }: LineAnswer) => roles.length === 1 && roles[0] === 'vehicle'
const isActive = ({ ingredient: { roles } }: LineAnswer) =>
  roles.some((role) => role.startsWith('active') || role === 'diagnostic')

export const dissolved = ({ lines }: Evaluation): readonly LineAnswer[] =>
  lines.filter((line) => !isVehicle(line))

/** What carries the strength: the active lines, or all of them where none is. */
export function strengthLines(evaluation: Evaluation): readonly LineAnswer[] {
  const actives = dissolved(evaluation).filter(isActive)
  return actives.length > 0 ? actives : dissolved(evaluation)
}

/** What is in it beside the actives. */
export const inactiveLines = (evaluation: Evaluation): readonly LineAnswer[] => {
  const strong = new Set(strengthLines(evaluation))
  return dissolved(evaluation).filter((line) => !strong.has(line))
}

/** An amount as it was ordered, in safe expression. */
export function orderedText({ amount, isAdjuster }: LineAnswer): string {
  if (isAdjuster) return 'to target (q.s.)'
  return amount.kind === 'quantity-sufficient' ? 'q.s.' : printAmount(amount)
}

/**
 * Total per container first, then per mL: "Pilocarpine hydrochloride 1 g per 100 mL (10 mg per mL)". The ordered
 * strength, before any rounding.
 */
export function strengthText(line: LineAnswer, volumeMl: number): string {
  const { gramsExact, millilitres, grams, millimoles, stock } = line
  if (millilitres !== null && !stock) {
    const percent = numberText((millilitres / volumeMl) * 100, 4)
    return `${nameOf(line)} ${volumeText(millilitres, 4)} per ${volumeText(volumeMl)} (${percent} % v/v)`
  }
  const perMl = gramsExact === null ? null : gramsExact / volumeMl
  const ordered = line.ingredient.roles.includes('electrolyte') && millimoles !== null && grams && gramsExact
  const moles = ordered ? `, ${numberText((millimoles * gramsExact) / grams, 4)} mmol` : ''
  return `${nameOf(line)} ${massText(gramsExact, 4)}${moles} per ${volumeText(volumeMl)} (${massText(perMl, 4)} per mL)`
}

export function strengthsText(evaluation: Evaluation): string | null {
  const { volumeMl } = evaluation
  if (volumeMl === null) return null
  return strengthLines(evaluation)
    .map((line) => strengthText(line, volumeMl))
    .join('; ')
}
