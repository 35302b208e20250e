import { Suspense, type ReactNode } from 'react'
import { usePage } from '../state/context.tsx'

interface Props {
  readonly className: string
  /** Stands in for the sheet on paper, too. */
  readonly isOnPaper?: boolean
  readonly children: ReactNode
}

/** A part that shows results: while the calculating part is on its way it says that, on paper too. */
export function Calculated({ className, isOnPaper = false, children }: Props) {
  const isComing = usePage((state) => state.calculation === 'coming')
  const failure = usePage((state) => state.failure)
  const coming = (
    <section className={`section ${className}`}>
      <p className={failure === null ? 'soft small no-print' : 'blocked no-print'}>
        {failure ?? 'Calculating…'}
      </p>
      {isOnPaper && (
        <p className="print-only">Not a worksheet. {failure ?? 'The figures are being worked out.'}</p>
      )}
    </section>
  )
  return isComing ? coming : <Suspense fallback={coming}>{children}</Suspense>
}
