import type { Severity } from '../../evaluation/types.ts'

const shapes: Record<Severity, string> = {
  stop: 'M6 1h8l5 5v8l-5 5H6l-5-5V6z',
  warn: 'M10 1.5 19 18H1z',
  note: 'M10 1a9 9 0 1 1 0 18 9 9 0 0 1 0-18z',
}

const strokes: Record<Severity, string> = {
  stop: 'M6.5 6.5l7 7M13.5 6.5l-7 7',
  warn: 'M10 7.5v5M10 15v.6',
  note: 'M10 9v5M10 5.6v.6',
}

/** A grave finding is known by its outline before its colour. */
export function SeverityMark({ severity }: { readonly severity: Severity }) {
  return (
    <svg className="severity-mark" viewBox="0 0 20 20" width="18" height="18" aria-hidden="true">
      <path d={shapes[severity]} className={severity === 'stop' ? 'mark-full' : 'mark-open'} />
      <path d={strokes[severity]} className={severity === 'stop' ? 'mark-cut' : 'mark-sign'} />
    </svg>
  )
}
