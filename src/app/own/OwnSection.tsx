import { lazy, Suspense, useState } from 'react'
import '../common/tables.css'

const OwnPanel = lazy(() => import('./OwnPanel.tsx'))

/** Ingredients and solutions of one's own, and diluting them. */
export function OwnSection() {
  const [open, setOpen] = useState(false)
  return (
    <section className="section no-print" aria-labelledby="own">
      <details onToggle={(event) => setOpen(event.currentTarget.open)}>
        <summary>
          <h2 id="own" className="summary-heading">
            Your own ingredients, stocks and dilutions
          </h2>
        </summary>
        {open && (
          <Suspense fallback={<p className="soft small">Opening…</p>}>
            <OwnPanel />
          </Suspense>
        )}
      </details>
    </section>
  )
}
