import { usePage, usePageActions } from '../state/context.tsx'
import { currentEvaluation } from '../state/store.ts'

/** The interval by chance instead of by propagation, on request. */
export function Sampling() {
  const { startSampling, cancelSampling } = usePageActions()
  const sampling = usePage((state) => state.sampling)
  const hasHeadline = usePage(
    (state) =>
      currentEvaluation(state)?.headline === 'electrolyte' && currentEvaluation(state)?.status === 'ok',
  )
  if (!hasHeadline) return null
  if (sampling.kind === 'running') {
    return (
      <p className="sampling small">
        <progress max={sampling.total} value={sampling.done} aria-label="Draws made" />
        <button type="button" className="plain-button" onClick={cancelSampling}>
          Stop drawing
        </button>
      </p>
    )
  }
  return (
    <p className="sampling small" role="status">
      {sampling.sentence}{' '}
      <button type="button" className="plain-button" onClick={startSampling}>
        {sampling.kind === 'idle' ? 'Check the interval with 10,000 draws' : 'Draw again'}
      </button>
    </p>
  )
}
