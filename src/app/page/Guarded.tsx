import type { ReactNode } from 'react'
import { Guard } from '../common/Guard.tsx'
import { usePage } from '../state/context.tsx'

interface Props {
  readonly what: string
  readonly children: ReactNode
}

/** A part of the page that may break alone; the next change of the document gives it a new try. */
export function Guarded({ what, children }: Props) {
  const revision = usePage((state) => state.revision)
  return (
    <Guard what={what} revision={revision}>
      {children}
    </Guard>
  )
}
