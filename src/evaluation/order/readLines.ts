import { readAmount } from '../../quantity/readAmount.ts'
import { resolveAmount } from '../../quantity/resolveAmount.ts'
import { findIngredients } from '../../library/find.ts'
import { formFactor, type FormFactor } from '../../library/forms.ts'
import type { Library } from '../../library/library.ts'
import type { Stock } from '../../library/stocks.ts'
import type { Ingredient } from '../../library/types.ts'
import type { Formula, FormulaLine } from '../../formula/types.ts'
import { findingOf } from '../finding.ts'
import { certify } from '../forms/certificate.ts'
import { readStock } from '../stocks/readStock.ts'
import { stockOf } from '../stocks/stock.ts'
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
    const stock = typeof line.ingredient === 'string' ? stockOf(line.ingredient, formula, library) : undefined
    if (!ingredient && stock) readStockLine(line, stock, library, lines, findings)
    else if (!ingredient) findings.push(unknownIngredient(line, library))
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

function readStockLine(
  line: FormulaLine,
  stock: Stock,
  library: Library,
  lines: ReadLine[],
  findings: Finding[],
): void {
  const amount = readAmount(line.amount)
  if (!amount.ok) {
    const { message, wayOut } = amount.refusal
    findings.push(
      findingOf(library, 'amount-unreadable', {
        values: { ingredient: stock.name, text: line.amount, reason: message, instead: wayOut },
        ingredients: [stock.id],
        lineKeys: [line.key],
        blocks: true,
      }),
    )
    return
  }
  const read = readStock(line, amount.value, stock, library)
  lines.push(...read.lines)
  findings.push(...read.findings)
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
  const form = orderedForm(line, ingredient, library)
  if (form.finding) findings.push(form.finding)
  const certificate = line.certificate ? certify(line.key, ingredient, line.certificate, library) : null
  findings.push(...(certificate?.findings ?? []))
  lines.push({
    key: line.key,
    ingredient,
    amount: amount.value,
    part,
    share,
    capGrams,
    ...(form.ordered ? { ordered: form.ordered } : {}),
    ...(certificate?.certified ? { certified: certificate.certified } : {}),
  })
}

/** What the amount means where it is not the article; a meaning that does not fit the article blocks. */
function orderedForm(
  { key, orderedAs, amount }: FormulaLine,
  ingredient: Ingredient,
  library: Library,
): { readonly ordered: FormFactor | null; readonly finding: Finding | null } {
  if (orderedAs === undefined || orderedAs === ingredient.id) return { ordered: null, finding: null }
  const ordered = formFactor(ingredient, orderedAs, library.ingredients, library.moieties)
  if (ordered) return { ordered, finding: null }
  return {
    ordered: null,
    finding: findingOf(library, 'ordered-form-unknown', {
      values: { ingredient: ingredient.name, form: orderedAs, text: amount },
      ingredients: [ingredient.id],
      lineKeys: [key],
      blocks: true,
    }),
  }
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
  for (const { ingredient, key, stock } of lines) {
    if (stock) continue
    keys.set(ingredient.id, [...(keys.get(ingredient.id) ?? []), key])
  }
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
