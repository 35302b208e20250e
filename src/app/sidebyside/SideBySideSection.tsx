import { lazy, Suspense } from 'react'
import { useShelf } from '../state/context.tsx'
import './printed.css'

const SideBySide = lazy(async () => ({ default: (await import('./SideBySide.tsx')).SideBySide }))

/** Formulas in columns, as soon as a second one is chosen from the shelf. */
export function SideBySideSection() {
  const isWanted = useShelf((state) => state.columns.length > 1)
  if (!isWanted) return null
  return (
    <section className="section side-by-side" aria-labelledby="side-by-side">
      <h2 id="side-by-side">Side by side</h2>
      <Suspense fallback={<p className="soft small">Being worked out…</p>}>
        <SideBySide />
      </Suspense>
    </section>
  )
}
