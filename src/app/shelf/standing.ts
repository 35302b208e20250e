import { writeFormula } from '../../formula/document.ts'
import type { Formula } from '../../formula/types.ts'
import { newestVersion, type KeptFormula } from '../storage/formulas.ts'
import type { PageState } from '../state/store.ts'
import { originOf } from './origin.ts'

const texts = new WeakMap<Formula, string>()

/** The document as text, written once for each state of the formula. */
export function textOf(formula: Formula): string {
  const known = texts.get(formula)
  if (known !== undefined) return known
  const text = writeFormula(formula)
  texts.set(formula, text)
  return text
}

/** How the sheet on the desk stands to the shelf. */
export type Standing =
  | { readonly kind: 'not-kept' }
  | { readonly kind: 'as-kept' | 'changed' | 'changed-elsewhere'; readonly kept: KeptFormula }

export function standingOf(page: PageState, formulas: readonly KeptFormula[]): Standing {
  const origin = originOf(page)
  const kept = origin && formulas.find(({ id }) => id === origin.id)
  if (!origin || !kept) return { kind: 'not-kept' }
  const newest = newestVersion(kept)
  if (newest.document === textOf(page.formula)) return { kind: 'as-kept', kept }
  return { kind: newest.stamp === origin.version ? 'changed' : 'changed-elsewhere', kept }
}

export const isBlank = ({ lines, title }: Formula) => lines.length === 0 && title.trim() === ''

export const nameOf = (title: string) => (title.trim() === '' ? 'untitled formula' : title.trim())

export const quotedName = (title: string) => `“${nameOf(title)}”`
