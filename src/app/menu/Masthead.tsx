import { InlineText } from '../common/InlineText.tsx'
import { useSettled } from '../common/useSettled.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { runningAnswer } from '../state/runningAnswer.ts'
import { useField } from '../state/useField.ts'
import { DemoOrders } from './DemoOrders.tsx'
import { ExportFold } from './ExportFold.tsx'
import { KeepButton, ShelfButton } from './ShelfButtons.tsx'
import { OpenFile } from './OpenFile.tsx'
import './masthead.css'

/** Name, title and what the sheet says now, always in sight; and the few things that are done to a whole sheet. */
export function Masthead() {
  const title = useField('title')
  return (
    <header className="masthead no-print">
      <div className="masthead-title">
        <h1 className="masthead-name">Evenwater</h1>
        <InlineText label="Title" editing={title} empty="untitled formula" className="title-input" />
      </div>
      <RunningAnswer />
      <Menu />
    </header>
  )
}

function Menu() {
  const actions = usePageActions()
  const canUndo = usePage((state) => state.past.length > 0)
  const canRedo = usePage((state) => state.future.length > 0)
  return (
    <nav className="menu" aria-label="Sheet">
      <button type="button" className="plain-button" aria-disabled={!canUndo} onClick={actions.undo}>
        Undo
      </button>
      <button type="button" className="plain-button" aria-disabled={!canRedo} onClick={actions.redo}>
        Redo
      </button>
      <button type="button" className="plain-button" onClick={actions.startNew}>
        New
      </button>
      <OpenFile />
      <KeepButton />
      <ShelfButton />
      <button type="button" className="plain-button" onClick={actions.saveFile}>
        Save as file
      </button>
      <ExportFold />
      <DemoOrders />
      <a className="plain-button menu-print" href="#sheet">
        To the sheet
      </a>
    </nav>
  )
}

function RunningAnswer() {
  const { number, words, watch } = usePage(runningAnswer)
  const spoken = useSettled(`${number} ${words}. ${watch}`, 900)
  return (
    <>
      <p className="running">
        <span className="running-number">{number}</span> <span>{words}</span>
        {watch !== '' && <span className="running-watch">{watch}</span>}
      </p>
      <p className="unseen" aria-live="polite" aria-atomic="true">
        {spoken}
      </p>
    </>
  )
}
