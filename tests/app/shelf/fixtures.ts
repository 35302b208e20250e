import { shelfActions } from '../../../src/app/shelf/actions.ts'
import { createShelfStore } from '../../../src/app/shelf/shelfDesk.ts'
import type { FormulaStore, KeptFormula } from '../../../src/app/storage/formulas.ts'
import { pageWith } from '../state/fixtures.ts'

/** A storage that several windows share, without a browser. */
export function memoryFormulas(refuse: () => Error | null = () => null) {
  const records = new Map<string, KeptFormula>()
  const formulas: FormulaStore = {
    all: async () => ({ formulas: [...records.values()], unreadable: 0 }),
    exchange: async (exchanges) => {
      const error = refuse()
      if (error) throw error
      const isAsExpected = exchanges.every(({ before, after }) => {
        const id = (after ?? before)?.id ?? ''
        return (records.get(id)?.stamp ?? null) === (before?.stamp ?? null)
      })
      if (!isAsExpected) return false
      for (const { before, after } of exchanges) {
        if (after) records.set(after.id, after)
        else if (before) records.delete(before.id)
      }
      return true
    },
  }
  return { formulas, records }
}

let keys = 0

/** A window with a sheet and a shelf. */
export function windowOn(formulas: FormulaStore, lines: Parameters<typeof pageWith>[0] = []) {
  const page = pageWith(lines)
  const shelf = createShelfStore()
  const actions = shelfActions({
    page: page.store,
    shelf,
    formulas,
    newKey: () => `key ${(keys += 1)}`,
    now: () => (keys += 1),
    announce: () => undefined,
    replaceDocument: page.actions.replaceDocument,
    askToLast: async () => true,
  })
  const typeTitle = (title: string) => page.actions.typeInCell({ kind: 'field', field: 'title' }, title)
  return { page, shelf, actions, typeTitle }
}
