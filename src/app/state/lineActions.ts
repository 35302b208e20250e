import type { Command } from '../../formula/commands.ts'
import { longestAmount, longestText, mostLines } from '../../formula/schema.ts'
import type { FormulaLine } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { Stock } from '../../library/stocks.ts'
import { pasteNotice } from '../ingredients/pasteNotice.ts'
import type { PastedLine, PastedTable } from '../ingredients/pasteLines.ts'
import { doOnce, type Tools } from './deskChanges.ts'
import { calledExactly } from './search.ts'

type LineFields = {
  readonly [Field in 'orderedAs' | 'certificate' | 'share' | 'cap' | 'note']?: FormulaLine[Field] | undefined
}

/** Id of what is called so, else the text as it stands. */
const idIn = (library: Library, text: string) =>
  calledExactly(library, text)?.id ?? text.slice(0, longestText)

/** Everything that makes a line. */
export function addingActions({ store, newKey }: Tools) {
  /** Adds at the end, in one step, as many as a document holds; what does not fit is said. */
  const append = (added: readonly PastedLine[]) => {
    const from = store.getState().formula.lines.length
    const fitting = added.slice(0, mostLines - from)
    if (fitting.length < added.length) {
      store.setState({ notice: `A formula holds ${mostLines} lines; what came after them was not added.` })
    }
    doOnce(
      store,
      'add lines',
      fitting.map(({ name, amount }, index) => ({
        kind: 'add-line',
        line: {
          key: newKey(),
          ingredient: idIn(store.getState().library, name),
          amount: amount.slice(0, longestAmount),
        },
        index: from + index,
      })),
    )
  }
  const appendLine = (line: FormulaLine, before: readonly Command[] = []) => {
    const index = store.getState().formula.lines.length
    if (index < mostLines) doOnce(store, 'add line', [...before, { kind: 'add-line', line, index }])
  }
  return {
    /** A name as typed or chosen, or a record of one's own. */
    addLine(ingredient: FormulaLine['ingredient']) {
      if (typeof ingredient === 'string') append([{ name: ingredient, amount: '' }])
      else appendLine({ key: newKey(), ingredient, amount: '' })
    },
    /** A solution of one's own goes into the document with its record. */
    addStockLine(stock: Stock) {
      const { stocks = [] } = store.getState().formula
      const value = [...stocks.filter(({ id }) => id !== stock.id), stock]
      appendLine({ key: newKey(), ingredient: stock.id, amount: '' }, [
        { kind: 'set-field', field: 'stocks', value },
      ])
    },
    /** Rows of a spreadsheet; a name that is not known stays as it was written. */
    addPasted(table: PastedTable) {
      store.setState({ notice: pasteNotice(table, store.getState().library) })
      append(table.lines)
    },
  }
}

/** Everything that changes or removes a line. */
export function lineActions({ store }: Tools) {
  const idOf = (text: string) => idIn(store.getState().library, text)
  /** Form and certificate belong to the article that was there. */
  const withoutLot = (key: string): readonly Command[] => {
    const line = store.getState().formula.lines.find((candidate) => candidate.key === key)
    return (['orderedAs', 'certificate'] as const)
      .filter((field) => line?.[field] !== undefined)
      .map((field) => ({ kind: 'set-line-field', key, field, value: undefined }) as Command)
  }
  return {
    removeLine(key: string) {
      doOnce(store, 'remove line', [{ kind: 'remove-line', key }])
    },
    moveLine(key: string, by: 1 | -1) {
      const { lines } = store.getState().formula
      const to = lines.findIndex((line) => line.key === key) + by
      if (to < 0 || to >= lines.length) return
      doOnce(store, 'move line', [{ kind: 'move-line', key, to }])
    },
    setIngredient(key: string, ingredient: FormulaLine['ingredient']) {
      doOnce(store, 'set ingredient', [{ kind: 'set-ingredient', key, ingredient }, ...withoutLot(key)])
    },
    /** Another article of the same kind from the shelf; the amount keeps what it meant. */
    swapForm(key: string, ingredient: string) {
      const line = store.getState().formula.lines.find((candidate) => candidate.key === key)
      if (!line || typeof line.ingredient !== 'string' || line.ingredient === ingredient) return
      const meant = line.orderedAs ?? line.ingredient
      doOnce(store, 'swap form', [
        { kind: 'set-ingredient', key, ingredient },
        { kind: 'set-line-field', key, field: 'orderedAs', value: meant === ingredient ? undefined : meant },
        // A certificate belongs to the lot of the other article.
        { kind: 'set-line-field', key, field: 'certificate', value: undefined },
      ])
    },
    setLineFields(key: string, fields: LineFields) {
      doOnce(
        store,
        'set line fields',
        Object.entries(fields).map(
          ([field, value]) => ({ kind: 'set-line-field', key, field, value }) as Command,
        ),
      )
    },
    /** What was typed in an ingredient cell and left: a known name is taken, anything else stays in sight and blocks. */
    nameIngredient(key: string, text: string) {
      const line = store.getState().formula.lines.find((candidate) => candidate.key === key)
      if (!line || text === '' || line.ingredient === idOf(text)) return
      doOnce(store, 'set ingredient', [
        { kind: 'set-ingredient', key, ingredient: idOf(text) },
        ...withoutLot(key),
      ])
    },
  }
}
