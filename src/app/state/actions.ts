import type { Command } from '../../formula/commands.ts'
import { longestAmount, longestText, mostLines } from '../../formula/schema.ts'
import type { Formula, RouteId } from '../../formula/types.ts'
import { openFile, openText, saveAsFile, type Opened } from '../menu/files.ts'
import type { DemoOrder } from '../menu/demos.ts'
import { usualTarget, type TargetChoice } from '../words/order.ts'
import type { PastedLine } from '../ingredients/pasteLines.ts'
import { cellCommands, cellId, type Cell } from './cells.ts'
import { drop, perform, redo, undo, type Desk } from './history.ts'
import { calledExactly } from './search.ts'
import type { PageState, PageStore, Paper } from './store.ts'

interface Tools {
  readonly store: PageStore
  /** A key that no line of any document has. */
  readonly newKey: () => string
  readonly emptyFormula: () => Formula
}

export type Actions = ReturnType<typeof pageActions>

/** Everything a hand can do to the page. Nothing else changes the document. */
export function pageActions(tools: Tools) {
  return {
    ...lineActions(tools),
    ...cellActions(tools),
    ...orderActions(tools),
    ...documentActions(tools),
    ...noticeActions(tools),
  }
}

let intentions = 0
/** An intention of its own: never joined with the step before. */
const once = (what: string) => `${what} ${(intentions += 1)}`

function changeDesk(store: PageStore, change: (desk: Desk) => Desk, rest: Partial<PageState> = {}): void {
  const state = store.getState()
  const { formula, past, future } = change(state)
  const changed = formula !== state.formula || rest.drafts !== undefined
  store.setState({ formula, past, future, revision: state.revision + (changed ? 1 : 0), ...rest })
}

const doOnce = (store: PageStore, what: string, commands: readonly Command[]) => {
  if (commands.length > 0) changeDesk(store, (desk) => perform(desk, once(what), commands))
}

function lineActions({ store, newKey }: Tools) {
  const idOf = (text: string) =>
    calledExactly(store.getState().library, text)?.id ?? text.slice(0, longestText)
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
        line: { key: newKey(), ingredient: idOf(name), amount: amount.slice(0, longestAmount) },
        index: from + index,
      })),
    )
  }
  return {
    addLine: (ingredient: string) => append([{ name: ingredient, amount: '' }]),
    /** Rows of a spreadsheet; a name that is not known stays as it was written. */
    addPasted: append,
    removeLine(key: string) {
      doOnce(store, 'remove line', [{ kind: 'remove-line', key }])
    },
    moveLine(key: string, by: 1 | -1) {
      const { lines } = store.getState().formula
      const to = lines.findIndex((line) => line.key === key) + by
      if (to < 0 || to >= lines.length) return
      doOnce(store, 'move line', [{ kind: 'move-line', key, to }])
    },
    setIngredient(key: string, ingredient: string) {
      doOnce(store, 'set ingredient', [{ kind: 'set-ingredient', key, ingredient }])
    },
    /** What was typed in an ingredient cell and left: a known name is taken, anything else stays in sight and blocks. */
    nameIngredient(key: string, text: string) {
      const line = store.getState().formula.lines.find((candidate) => candidate.key === key)
      if (!line || text === '' || line.ingredient === idOf(text)) return
      doOnce(store, 'set ingredient', [{ kind: 'set-ingredient', key, ingredient: idOf(text) }])
    },
  }
}

function cellActions({ store }: Tools) {
  let session = ''
  return {
    beginCell(cell: Cell) {
      session = once(`cell ${cellId(cell)}`)
    },
    typeInCell(cell: Cell, text: string) {
      const id = cellId(cell)
      const { drafts } = store.getState()
      const outcome = cellCommands(store.getState().formula, cell, text)
      if (outcome.kind === 'unreadable') {
        changeDesk(store, (desk) => desk, { drafts: { ...drafts, [id]: text }, typing: id })
        return
      }
      const { [id]: _mended, ...others } = drafts
      const rest = id in drafts ? { drafts: others, typing: id } : { typing: id }
      changeDesk(store, (desk) => perform(desk, session, outcome.commands), rest)
    },
    leaveCell() {
      session = once('left')
      if (store.getState().typing !== null) store.setState({ typing: null })
    },
    /** As the cell was when the hand came to it. */
    restoreCell() {
      const { typing, drafts } = store.getState()
      const ended = session
      session = once('restored')
      if (typing === null) return
      const { [typing]: _dropped, ...others } = drafts
      const rest = typing in drafts ? { drafts: others, typing: null } : { typing: null }
      changeDesk(store, (desk) => drop(desk, ended), rest)
    },
  }
}

function orderActions({ store }: Tools) {
  return {
    setRoute(route: RouteId) {
      doOnce(store, 'set route', [{ kind: 'set-field', field: 'route', value: route }])
    },
    setTargetQuantity(choice: TargetChoice) {
      const value = choice === 'none' ? undefined : { quantity: choice, value: usualTarget[choice] }
      doOnce(store, 'set target', [{ kind: 'set-field', field: 'target', value }])
    },
    setPaper(paper: Paper) {
      store.setState({ paper })
    },
    /** An empty reason takes the acceptance back. */
    acknowledge(code: string, reason: string) {
      const others = (store.getState().formula.acknowledgements ?? []).filter((other) => other.code !== code)
      const value = reason === '' ? others : [...others, { code, reason }]
      doOnce(store, 'acknowledge', [
        { kind: 'set-field', field: 'acknowledgements', value: value.length > 0 ? value : undefined },
      ])
    },
  }
}

function documentActions({ store, emptyFormula }: Tools) {
  /** A whole document in one step; undo brings the old one back. */
  const replace = (formula: Formula) =>
    changeDesk(store, (desk) => perform(desk, once('replace'), [{ kind: 'replace-all', formula }]), {
      drafts: {},
      typing: null,
    })
  const take = (opened: Opened) => {
    if (!opened.ok) {
      store.setState({ notice: opened.sentence })
      return
    }
    replace(opened.formula)
    store.setState({ notice: opened.notices.length > 0 ? opened.notices.join(' ') : null })
  }
  return {
    undo: () => stepBack(store),
    redo: () => changeDesk(store, redo, { drafts: {}, typing: null }),
    startNew: () => replace(emptyFormula()),
    async openFile(file: File) {
      take(await openFile(file))
    },
    async openDemo(demo: DemoOrder) {
      take(openText(demo.name, await demo.load()))
    },
    saveFile() {
      const { formula, drafts } = store.getState()
      saveAsFile(formula)
      if (Object.keys(drafts).length > 0) {
        store.setState({
          notice: 'The file was saved without the fields that could not be read; mend them first.',
        })
      }
    },
    replaceDocument: replace,
  }
}

/** Undo takes unreadable text out of its field first; what stood there before is the step back. */
function stepBack(store: PageStore): void {
  const { drafts } = store.getState()
  if (Object.keys(drafts).length > 0) changeDesk(store, (desk) => desk, { drafts: {}, typing: null })
  else changeDesk(store, undo, { typing: null })
}

function noticeActions({ store }: Tools) {
  return {
    dismissNotice: () => store.setState({ notice: null }),
  }
}
