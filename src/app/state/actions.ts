import type { Bench, Formula, RouteId } from '../../formula/types.ts'
import { openFile, openText, saveAsFile, type Opened } from '../menu/files.ts'
import type { DemoOrder } from '../menu/demos.ts'
import { usualTarget, type TargetChoice } from '../words/order.ts'
import { cellCommands, cellId, type Cell } from './cells.ts'
import { changeDesk, doOnce, once, type Tools } from './deskChanges.ts'
import { batchCommand } from './fields.ts'
import { drop, perform, redo, undo } from './history.ts'
import { addingActions, lineActions } from './lineActions.ts'
import type { PageStore, Paper } from './store.ts'

export type Actions = ReturnType<typeof pageActions>

/** Everything a hand can do to the page. Nothing else changes the document. */
export function pageActions(tools: Tools) {
  return {
    ...addingActions(tools),
    ...lineActions(tools),
    ...cellActions(tools),
    ...orderActions(tools),
    ...documentActions(tools),
    ...noticeActions(tools),
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
    setOverfill(overfill: 'none' | 'mobile' | 'viscous') {
      const change = { overfill: overfill === 'none' ? ('' as const) : overfill }
      doOnce(store, 'set overfill', [batchCommand(store.getState().formula, change)])
    },
    /** Balances and measures; an empty bench is none. */
    setBench(bench: Bench) {
      const isEmpty = (bench.balances ?? []).length === 0 && (bench.measures ?? []).length === 0
      doOnce(store, 'set bench', [{ kind: 'set-field', field: 'bench', value: isEmpty ? undefined : bench }])
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

function documentActions({ store, emptyFormula, newKey }: Tools) {
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
    /** The bench stays: it belongs to the place, not to the formula. */
    startNew() {
      const { bench } = store.getState().formula
      replace({ ...emptyFormula(), ...(bench ? { bench } : {}) })
    },
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
    /** The text of a formula file, pasted. */
    openPastedText: (text: string) => take(openText('the pasted text', text)),
    replaceDocument: replace,
    /** A formula that differs in some lines, in one step; lines that were made elsewhere get keys of their own. */
    putLines(next: Formula) {
      const known = new Set(store.getState().formula.lines.map(({ key }) => key))
      const lines = next.lines.map((line) => (known.has(line.key) ? line : { ...line, key: newKey() }))
      replace({ ...next, lines })
    },
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
