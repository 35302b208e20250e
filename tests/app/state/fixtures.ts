import { apply, type Command } from '../../../src/formula/commands.ts'
import { emptyFormula } from '../../../src/formula/document.ts'
import type { Formula } from '../../../src/formula/types.ts'
import { loadLibrary } from '../../../src/library/library.ts'
import { pageActions } from '../../../src/app/state/actions.ts'
import { createPageStore } from '../../../src/app/state/store.ts'

/** A page without a browser: state and actions over a formula of the given lines. */
export function pageWith(lines: readonly (readonly [ingredient: string, amount: string])[] = []) {
  const commands = lines.map(([ingredient, amount], index): Command => ({
    kind: 'add-line',
    line: { key: `k${index}`, ingredient, amount },
    index,
  }))
  const formula = commands.reduce<Formula>(
    (reached, command) => apply(reached, command).formula,
    emptyFormula(),
  )
  const store = createPageStore({ library: loadLibrary(), formula, drafts: {}, paper: 'A4' })
  let keys = 0
  const actions = pageActions({ store, newKey: () => `new${(keys += 1)}`, emptyFormula })
  return { store, actions, amount: (index: number) => store.getState().formula.lines[index]?.amount }
}
