import { useId, useRef, type ClipboardEvent } from 'react'
import { usePage, usePageActions } from '../state/context.tsx'
import { lineViews } from '../state/lineViews.ts'
import { AddRow } from './AddRow.tsx'
import { IngredientRow } from './IngredientRow.tsx'
import { isTable, readPastedTable } from './pasteLines.ts'
import { useGrid } from './useGrid.ts'
import './ingredients.css'

/** The lines of the formula as a sheet that is filled in with the keyboard. */
export function IngredientTable() {
  const table = useRef<HTMLTableElement>(null)
  const hint = useId()
  const actions = usePageActions()
  const views = usePage(lineViews)
  const volume = usePage((state) => state.formula.finalVolume)
  const grid = useGrid(table, views.length)
  const paste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain')
    if (!isTable(text)) return
    event.preventDefault()
    actions.addPasted(readPastedTable(text))
  }
  return (
    <>
      <table
        ref={table}
        className="sheet-table"
        role="table"
        aria-describedby={hint}
        aria-labelledby="ingredients"
        onKeyDown={grid.onKeyDown}
        onFocus={grid.onFocus}
        onInput={grid.onInput}
        onDoubleClick={grid.onDoubleClick}
        onPaste={paste}
      >
        <colgroup>
          {columns.map((column) => (
            <col key={column} className={`column-${column}`} />
          ))}
        </colgroup>
        <Head volume={volume} />
        <tbody role="rowgroup">
          {views.map((view) => (
            <IngredientRow key={view.key} view={view} onChosen={grid.goToAmount} onRemove={grid.removeLine} />
          ))}
          <AddRow row={views.length} onAdded={grid.goToAmount} />
        </tbody>
      </table>
      <p id={hint} className="small soft grid-hint no-print">
        <kbd>Enter</kbd> next line · arrows between cells · <kbd>F2</kbd> inside a cell · <kbd>Esc</kbd> as it
        was · <kbd>Alt</kbd>+<kbd>Enter</kbd> form, lot and data · <kbd>Alt</kbd>+<kbd>↑</kbd>/<kbd>↓</kbd>{' '}
        move the line · <kbd>Ctrl</kbd>+<kbd>Delete</kbd> remove it · rows copied from a spreadsheet can be
        pasted
      </p>
    </>
  )
}

const columns = ['name', 'amount', 'weigh', 'mmol', 'particles', 'share', 'osmolality', 'remove']

function Head({ volume }: { readonly volume: string }) {
  const titles = [
    'ingredient',
    'as ordered',
    `weigh for ${volume.replace(' ', '\u00A0')}`,
    'mmol',
    'particles each: formal\u00A0·\u00A0counted',
    'of all particles',
    'mOsm/kg',
  ]
  return (
    <thead role="rowgroup">
      <tr role="row">
        {titles.map((title, index) => (
          <th key={title} role="columnheader" scope="col" className={index > 1 ? 'figure-head' : undefined}>
            {title}
          </th>
        ))}
        <th role="columnheader" scope="col">
          <span className="unseen">remove</span>
        </th>
      </tr>
    </thead>
  )
}
