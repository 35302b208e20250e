import type { Amount } from '../../quantity/amount.ts'
import { resolveAmount } from '../../quantity/resolveAmount.ts'
import type { FormulaLine } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { Stock } from '../../library/stocks.ts'
import { findingOf } from '../finding.ts'
import type { ReadLine, Surroundings } from '../lowering.ts'
import { factsOf } from '../order/facts.ts'
import type { Finding } from '../types.ts'
import { partKey } from './keys.ts'
import { bulkOf, contentsOf } from './stock.ts'

export interface StockRead {
  readonly lines: readonly ReadLine[]
  readonly findings: readonly Finding[]
}

/** A line that measures a stock, as the lines of what the stock holds. */
export function readStock(line: FormulaLine, amount: Amount, stock: Stock, library: Library): StockRead {
  const refuse = (code: string, values: Finding['values'] = {}): StockRead => ({
    lines: [],
    findings: [
      findingOf(library, code, {
        values: { stock: stock.name, text: line.amount, ...values },
        ingredients: [stock.id],
        lineKeys: [line.key],
        blocks: true,
      }),
    ],
  })
  const { parts, unknown } = contentsOf(stock, library)
  if (unknown.length > 0) return refuse('stock-ingredient-unknown', { ids: unknown.join(', ') })
  if (!bulkOf(stock, library)) return refuse('stock-impossible')
  const isOpen = amount.kind === 'quantity-sufficient'
  if (isOpen && stock.use !== 'vehicle') return refuse('stock-not-for-filling')
  if (amount.kind === 'percent' || amount.kind === 'ratio') return refuse('stock-percent-ambiguous')
  const bySubstance =
    !isOpen && amount.kind !== 'volume' && amount.kind !== 'volume-per-volume' && amount.kind !== 'mass'
  if (bySubstance && parts.length !== 1) return refuse('stock-amount-of-several')
  return {
    findings: [],
    lines: parts.map(({ ingredient, gramsPerLitre }) => ({
      key: partKey(line.key, ingredient.id),
      ingredient,
      amount,
      part: isOpen ? 'fill' : 'solute',
      share: 1,
      capGrams: null,
      stock: { lineKey: line.key, stock, gramsPerMl: gramsPerLitre / 1000, fills: isOpen },
    })),
  }
}

/** Volume of a stock in the evaluated volume, mL, or the reason why there is none. */
export function stockVolume(
  { ingredient, amount, stock }: ReadLine,
  around: Surroundings,
  library: Library,
):
  | { readonly ok: true; readonly millilitres: number }
  | { readonly ok: false; readonly reason: string; readonly instead: string } {
  const share = stock!
  const bulk = bulkOf(share.stock, library)
  const byStock = amount.kind === 'volume' || amount.kind === 'volume-per-volume' || amount.kind === 'mass'
  const facts = byStock
    ? ({
        percentBasis: 'v/v',
        isLiquid: true,
        densityGPerMl: bulk?.densityGPerMl,
        equivalentsPerMole: null,
      } as const)
    : factsOf(ingredient, around.densityGPerMl)
  const resolved = resolveAmount(amount, facts, around.volumeMl)
  if (!resolved.ok) return { ok: false, reason: resolved.refusal.message, instead: resolved.refusal.wayOut }
  const { millilitres, grams, molPerKg = 0 } = resolved.value
  if (byStock && millilitres !== undefined) return { ok: true, millilitres }
  const mass = grams ?? molPerKg * (ingredient.molarMass?.value ?? Number.NaN) * around.waterKg
  return { ok: true, millilitres: mass / share.gramsPerMl }
}
