import { useRef } from 'react'
import { usePage, usePageActions } from '../state/context.tsx'
import { download } from '../menu/files.ts'
import { DilutionForm } from './DilutionForm.tsx'
import { IngredientForm } from './IngredientForm.tsx'
import { StockForm } from './StockForm.tsx'
import './own.css'

export default function OwnPanel() {
  return (
    <div className="own-panel">
      <OwnList />
      <IngredientForm />
      <StockForm />
      <DilutionForm />
    </div>
  )
}

/** What lies on the shelf of one's own. */
function OwnList() {
  const { ingredients, stocks } = usePage((state) => state.own)
  const { dropOwn, addLine, addStockLine } = usePageActions()
  const items = [
    ...ingredients.map((ingredient) => ({
      id: ingredient.id,
      name: ingredient.name,
      kind: 'ingredient',
      add: () => addLine(ingredient),
    })),
    ...stocks.map((stock) => ({
      id: stock.id,
      name: stock.name,
      kind: 'solution',
      add: () => addStockLine(stock),
    })),
  ]
  return (
    <section aria-labelledby="own-list">
      <h3 id="own-list">On your own shelf</h3>
      {items.length === 0 && (
        <p className="soft">Nothing yet. What you enter below is kept in this browser alone.</p>
      )}
      <ul className="plain-list">
        {items.map(({ id, name, kind, add }) => (
          <li key={id}>
            {name} <span className="soft small">{kind}, not from the library</span>{' '}
            <button type="button" className="plain-button small" onClick={add}>
              Add to the formula<span className="unseen"> {name}</span>
            </button>{' '}
            <button type="button" className="plain-button small" onClick={() => dropOwn(id)}>
              Take off the shelf<span className="unseen"> {name}</span>
            </button>
          </li>
        ))}
      </ul>
      <InAndOut isEmpty={items.length === 0} />
    </section>
  )
}

function InAndOut({ isEmpty }: { readonly isEmpty: boolean }) {
  const { exportOwn, importOwn } = usePageActions()
  const picker = useRef<HTMLInputElement>(null)
  return (
    <p>
      <button
        type="button"
        className="plain-button"
        disabled={isEmpty}
        onClick={() => download('own-shelf.json', 'application/json', exportOwn())}
      >
        Export your own shelf
      </button>{' '}
      <button type="button" className="plain-button" onClick={() => picker.current?.click()}>
        Import a shelf
      </button>
      <input
        ref={picker}
        type="file"
        accept="application/json,.json"
        className="own-picker"
        aria-label="File of a shelf"
        tabIndex={-1}
        hidden
        onChange={async (event) => {
          const input = event.currentTarget
          const file = input.files?.[0]
          if (file) importOwn(await file.text())
          input.value = ''
        }}
      />
    </p>
  )
}
