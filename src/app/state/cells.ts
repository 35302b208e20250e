import type { Command } from '../../formula/commands.ts'
import { longestAmount, longestText } from '../../formula/schema.ts'
import type { Formula } from '../../formula/types.ts'
import { fieldCommand, type FieldId } from './fields.ts'

/** A place on the page where text is typed. */
export type Cell =
  { readonly kind: 'amount'; readonly key: string } | { readonly kind: 'field'; readonly field: FieldId }

/** Name of the cell among drafts and as the place where a hand is at work. */
export const cellId = (cell: Cell) => (cell.kind === 'amount' ? `amount ${cell.key}` : cell.field)

export type CellOutcome =
  { readonly kind: 'taken'; readonly commands: readonly Command[] } | { readonly kind: 'unreadable' }

/**
 * What typed text does to the document. Text fields take anything that a document can hold: what it means is
 * judged by the evaluation.
 */
export function cellCommands(formula: Formula, cell: Cell, text: string): CellOutcome {
  if (text.length > (cell.kind === 'amount' ? longestAmount : longestText)) return { kind: 'unreadable' }
  if (cell.kind === 'amount') {
    return { kind: 'taken', commands: [{ kind: 'set-amount', key: cell.key, amount: text }] }
  }
  const command = fieldCommand(formula, cell.field, text)
  return command === null ? { kind: 'unreadable' } : { kind: 'taken', commands: [command] }
}
