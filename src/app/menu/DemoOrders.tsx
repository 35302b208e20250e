import { useRef, type KeyboardEvent } from 'react'
import { usePageActions } from '../state/context.tsx'
import { demoOrders } from './demos.ts'

/** Five invented orders, folded away until asked for. */
export function DemoOrders() {
  const fold = useRef<HTMLDetailsElement>(null)
  const actions = usePageActions()
  const close = () => {
    if (!fold.current) return
    fold.current.open = false
    fold.current.querySelector('summary')?.focus()
  }
  const keys = (event: KeyboardEvent) => {
    if (event.key === 'Escape') close()
  }
  return (
    <details ref={fold} className="demos" onKeyDown={keys}>
      <summary className="plain-button">Demo orders</summary>
      <div className="demos-list">
        <p className="small soft">Invented, for looking around. Opening one can be undone.</p>
        {demoOrders.map((demo) => (
          <button
            key={demo.id}
            type="button"
            className="plain-button"
            onClick={() => {
              close()
              void actions.openDemo(demo)
            }}
          >
            {demo.name}
          </button>
        ))}
      </div>
    </details>
  )
}
