import { shelfRefusal, type FormulaStore } from '../storage/formulas.ts'
import type { PageStore } from '../state/store.ts'
import { exchanged, reversed, type ShelfStep } from './steps.ts'
import type { ShelfStore } from './shelfDesk.ts'

export interface Tools {
  readonly page: PageStore
  readonly shelf: ShelfStore
  readonly formulas: FormulaStore
  readonly newKey: () => string
  readonly now: () => number
  /** Tells the other windows that the shelf is not as it was. */
  readonly announce: () => void
}

const changedElsewhere = 'Another window changed the shelf in the meantime; nothing was done. Look again.'

export type Keeper = ReturnType<typeof shelfKeeper>

/** Reads the shelf, and does and undoes one step at a time; what the storage refuses is said. */
export function shelfKeeper(tools: Tools) {
  let queue: Promise<unknown> = Promise.resolve()
  /** One after another, so that a step is made from what the one before left. */
  const inTurn = <T>(run: () => Promise<T>): Promise<T> => {
    const next = queue.then(run)
    queue = next.catch(() => undefined)
    return next
  }
  const read = () => readShelf(tools)
  const { doStep, undo, redo } = stepping(tools)
  return {
    inTurn,
    read,
    async readOnce() {
      if (tools.shelf.getState().status.kind !== 'ready') await read()
    },
    doStep,
    undo: () => inTurn(undo),
    redo: () => inTurn(redo),
  }
}

async function readShelf({ shelf, formulas }: Tools): Promise<void> {
  try {
    const content = await formulas.all()
    shelf.setState({ ...content, status: { kind: 'ready' } })
  } catch (error) {
    shelf.setState({ status: { kind: 'refused', sentence: shelfRefusal(error) } })
  }
}

/** True when it was done; when it was not, the reason is said. */
async function exchange(tools: Tools, step: ShelfStep, forward: boolean): Promise<boolean> {
  const { page, shelf, formulas, announce } = tools
  const exchanges = forward ? step.exchanges : reversed(step.exchanges)
  try {
    if (!(await formulas.exchange(exchanges))) {
      await readShelf(tools)
      shelf.setState({ said: changedElsewhere })
      return false
    }
  } catch (error) {
    shelf.setState({ status: { kind: 'refused', sentence: shelfRefusal(error) } })
    return false
  }
  shelf.setState((state) => ({ formulas: exchanged(state.formulas, exchanges), status: { kind: 'ready' } }))
  if (step.origin) {
    const { lineage, before, after } = step.origin
    page.setState(({ origins }) => ({ origins: { ...origins, [lineage]: forward ? after : before } }))
  }
  announce()
  return true
}

function stepping(tools: Tools) {
  const { shelf } = tools
  return {
    async doStep(step: ShelfStep): Promise<boolean> {
      const done = await exchange(tools, step, true)
      if (done) {
        const { sentence: said } = step
        shelf.setState(({ past }) => ({ past: [...past, step], future: [], said, conflict: null }))
      }
      return done
    },
    async undo(): Promise<void> {
      const step = shelf.getState().past.at(-1)
      if (!step || !(await exchange(tools, step, false))) return
      shelf.setState(({ past, future }) => ({
        past: past.slice(0, -1),
        future: [step, ...future],
        said: `Taken back: ${step.sentence}`,
      }))
    },
    async redo(): Promise<void> {
      const [step] = shelf.getState().future
      if (!step || !(await exchange(tools, step, true))) return
      shelf.setState(({ past, future }) => ({
        past: [...past, step],
        future: future.slice(1),
        said: step.sentence,
      }))
    },
  }
}
