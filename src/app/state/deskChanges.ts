import type { Command } from '../../formula/commands.ts'
import type { Formula } from '../../formula/types.ts'
import { perform, type Desk } from './history.ts'
import type { PageState, PageStore } from './store.ts'

export interface Tools {
  readonly store: PageStore
  /** A key that no line of any document has. */
  readonly newKey: () => string
  readonly emptyFormula: () => Formula
}

let intentions = 0
/** An intention of its own: never joined with the step before. */
export const once = (what: string) => `${what} ${(intentions += 1)}`

export function changeDesk(
  store: PageStore,
  change: (desk: Desk) => Desk,
  rest: Partial<PageState> = {},
): void {
  const state = store.getState()
  const { formula, past, future } = change(state)
  const changed = formula !== state.formula || rest.drafts !== undefined
  store.setState({ formula, past, future, revision: state.revision + (changed ? 1 : 0), ...rest })
}

export const doOnce = (store: PageStore, what: string, commands: readonly Command[]) => {
  if (commands.length > 0) changeDesk(store, (desk) => perform(desk, once(what), commands))
}
