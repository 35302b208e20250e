import { lazy, Suspense, useState } from 'react'
import '../common/tables.css'
import './buffer.css'
import './printed.css'

const BufferPanel = lazy(() => import('./BufferPanel.tsx'))

/** Acid, base and buffer: closed until it is wanted, since it asks the model many times. */
export function BufferSection() {
  const [open, setOpen] = useState(false)
  return (
    <section className="section buffer-section" aria-labelledby="buffer">
      <details onToggle={(event) => setOpen(event.currentTarget.open)}>
        <summary>
          <h2 id="buffer" className="summary-heading">
            pH and buffer
          </h2>
        </summary>
        {open && (
          <Suspense fallback={<p className="soft small">Opening…</p>}>
            <BufferPanel />
          </Suspense>
        )}
      </details>
    </section>
  )
}
