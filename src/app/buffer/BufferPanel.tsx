import { useDeferredValue } from 'react'
import { usePage } from '../state/context.tsx'
import { currentEvaluation } from '../state/store.ts'
import { AcidityPart } from './AcidityPart.tsx'
import { ComparePart } from './ComparePart.tsx'
import { DesignPart } from './DesignPart.tsx'
import { printBuffers } from './print.ts'
import { VehiclePart } from './VehiclePart.tsx'

/** What the solution does with acid and base, and how to give it a buffer. */
export default function BufferPanel() {
  const evaluation = useDeferredValue(usePage(currentEvaluation))
  const title = usePage((state) => state.formula.title)
  const answered = evaluation?.status === 'ok' ? evaluation : null
  return (
    <div className="buffer-panel">
      <p className="print-only">
        {title === '' ? 'Untitled formula' : title}. For comparison; not a batch worksheet. Every figure needs
        independent verification.
      </p>
      {answered ? (
        <>
          <AcidityPart evaluation={answered} />
          <DesignPart evaluation={answered} />
          <ComparePart evaluation={answered} />
        </>
      ) : (
        <p className="soft">
          A formula that has an answer can be given a buffer; clear what blocks it first.
        </p>
      )}
      <VehiclePart />
      <p className="no-print">
        <button type="button" className="quiet-button" onClick={printBuffers}>
          Print this account
        </button>
      </p>
    </div>
  )
}
