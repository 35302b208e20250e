import { usePage } from '../state/context.tsx'

/** Told in passing; nothing waits for an answer, and nothing changes under the hand. */
export function NewVersion() {
  const waits = usePage((state) => state.offline.newVersionWaits)
  return (
    <p className="small soft no-print" role="status">
      {waits && 'A new version is ready; it starts when you reload.'}
    </p>
  )
}
