import { lazy, Suspense } from 'react'
import { useShelf, useShelfActions } from '../state/context.tsx'
import './shelf.css'

const ShelfPanel = lazy(async () => ({ default: (await import('./ShelfPanel.tsx')).ShelfPanel }))

/** The formulas kept in this browser, folded away until asked for. */
export function ShelfSection() {
  const open = useShelf((state) => state.open)
  const said = useShelf((state) => state.said)
  const actions = useShelfActions()
  return (
    <section className="section shelf-section no-print" aria-labelledby="shelf">
      <details
        className="shelf"
        open={open}
        onToggle={(event) => {
          if (event.currentTarget.open !== open) actions.setOpen(event.currentTarget.open)
        }}
      >
        <summary id="shelf-summary">
          <h2 id="shelf">The shelf</h2>
        </summary>
        {open && (
          <Suspense fallback={<p className="soft small">Opening the shelf…</p>}>
            <ShelfPanel />
          </Suspense>
        )}
      </details>
      <p className="unseen" role="status">
        {said}
      </p>
    </section>
  )
}
