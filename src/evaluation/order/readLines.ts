import { readAmount } from '../../quantity/readAmount.ts'
import { resolveAmount } from '../../quantity/resolveAmount.ts'
import { findIngredients } from '../../library/find.ts'
import type { Library } from '../../library/library.ts'
import type { Ingredient } from '../../library/types.ts'
import type { Formula, FormulaLine } from '../../formula/types.ts'
import { findingOf } from '../finding.ts'
import { factsOf } from './facts.ts'
import type { Finding } from '../types.ts'
import type { ReadLine } from '../lowering.ts'

/** The lines whose words were understood; what was not is a blocking finding of its line. */
export function readLines(
  formula: Formula,
  library: Library,
  volumeMl: number | null,
): { lines: ReadLine[]; findings: Finding[] } {
  const lines: ReadLine[] = []
  const findings: Finding[] = []
  for (const line of formula.lines) {
    const ingredient = ingredientOf(line, library)
    if (!ingredient) findings.push(unknownIngredient(line, library))
    else readLine(line, ingredient, library, volumeMl, lines, findings)
  }
  findings.push(...repeated(lines, library))
  return { lines, findings }
}

const ingredientOf = ({ ingredient }: FormulaLine, library: Library): Ingredient | undefined =>
  typeof ingredient === 'string' ? library.ingredients.get(ingredient) : ingredient

function unknownIngredient(line: FormulaLine, library: Library): Finding {
  const id = String(line.ingredient)
  const near = findIngredients(library, id, 3).map(({ ingredient }) => ingredient.id)
  return findingOf(library, near.length > 0 ? 'ingredient-unknown' : 'ingredient-unknown-nothing-near', {
    values: { id, near: near.join(', ') },
    ingredients: [id],
    lineKeys: [line.key],
    blocks: true,
  })
}

function readLine(
  line: FormulaLine,
  ingredient: Ingredient,
  library: Library,
  volumeMl: number | null,
  lines: ReadLine[],
  findings: Finding[],
): void {
  const about = { ingredients: [ingredient.id], lineKeys: [line.key], blocks: true }
  const refused = (code: string, text: string, reason: string, instead: string) =>
    findings.push(
      findingOf(library, code, { ...about, values: { ingredient: ingredient.name, text, reason, instead } }),
    )
  const amount = readAmount(line.amount)
  if (!amount.ok) {
    refused('amount-unreadable', line.amount, amount.refusal.message, amount.refusal.wayOut)
    return
  }
  const isVehicle = isWater(ingredient)
  const isAdjuster = amount.value.kind === 'quantity-sufficient' && !isVehicle
  const share = line.share ?? 1
  if (!(Number.isFinite(share) && share > 0)) refused('share-unusable', String(line.share), '', '')
  let capGrams: number | null = null
  if (isAdjuster && line.cap !== undefined) {
    capGrams = readCap(line.cap, ingredient, volumeMl, (reason, instead) =>
      refused('cap-unreadable', line.cap ?? '', reason, instead),
    )
  }
  const part = isVehicle ? 'vehicle' : isAdjuster ? 'adjuster' : 'solute'
  lines.push({ key: line.key, ingredient, amount: amount.value, part, share, capGrams })
}

/** The water around everything: it takes no share in the osmolality and "q.s." means up to volume. */
export const isWater = ({ roles }: Ingredient) => roles.length === 1 && roles[0] === 'vehicle'

function readCap(
  text: string,
  ingredient: Ingredient,
  volumeMl: number | null,
  refused: (reason: string, instead: string) => void,
): number | null {
  const cap = readAmount(text)
  if (!cap.ok) {
    refused(cap.refusal.message, cap.refusal.wayOut)
    return null
  }
  if (volumeMl === null) return null
  const resolved = resolveAmount(cap.value, factsOf(ingredient), volumeMl)
  if (!resolved.ok) {
    refused(resolved.refusal.message, resolved.refusal.wayOut)
    return null
  }
  if (resolved.value.grams === undefined) {
    refused(
      'A largest strength per kilogram of water cannot be kept while sizing.',
      'Write it as % w/v or as a mass.',
    )
    return null
  }
  return resolved.value.grams
}

/** The same ingredient on several lines is allowed and worth a remark. */
function repeated(lines: readonly ReadLine[], library: Library): Finding[] {
  const keys = new Map<string, string[]>()
  for (const { ingredient, key } of lines) keys.set(ingredient.id, [...(keys.get(ingredient.id) ?? []), key])
  return [...keys].flatMap(([id, lineKeys]) =>
    lineKeys.length < 2
      ? []
      : [
          findingOf(library, 'ingredient-repeated', {
            values: { ingredient: library.ingredients.get(id)?.name ?? id, count: lineKeys.length },
            ingredients: [id],
            lineKeys,
          }),
        ],
  )
}
