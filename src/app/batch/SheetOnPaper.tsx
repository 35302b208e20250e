import { lazy, Suspense, useDeferredValue } from 'react'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { usePage, usePageActions } from '../state/context.tsx'
import { printRefusal } from '../state/printing.ts'
import { currentEvaluation } from '../state/store.ts'

const SheetPreview = lazy(async () => ({ default: (await import('../sheet/SheetPreview.tsx')).SheetPreview }))

const papers = [
  { value: 'A4', words: 'A4' },
  { value: 'Letter', words: 'Letter' },
] as const

/** The way to paper, and the paper itself; shut while what is shown is blocked or not yet drawn again. */
export function SheetOnPaper() {
  const actions = usePageActions()
  const paper = usePage((state) => state.paper)
  const library = usePage((state) => state.library)
  const evaluation = usePage(currentEvaluation)
  const refusal = usePage(printRefusal)
  const isEmpty = usePage((state) => state.formula.lines.length === 0)
  const drawn = useDeferredValue(evaluation)
  return (
    <>
      <div className="print-row no-print">
        <span>
          Paper <InlineChoice label="Paper size" value={paper} choices={papers} onChoose={actions.setPaper} />
        </span>
        <PrintButton refusal={drawn === evaluation ? refusal : 'The sheet is being drawn.'} />
      </div>
      {drawn !== null && drawn.status === 'ok' && !isEmpty ? (
        <Suspense fallback={<p className="soft small">Not a worksheet yet: it is being drawn.</p>}>
          <SheetPreview evaluation={drawn} library={library} paper={paper} />
        </Suspense>
      ) : (
        <p className="print-only">Not a worksheet. {refusal}</p>
      )}
    </>
  )
}

function PrintButton({ refusal }: { readonly refusal: string | null }) {
  return (
    <span className="print-button">
      <button
        type="button"
        className="firm-button"
        aria-disabled={refusal !== null}
        aria-describedby={refusal === null ? undefined : 'print-refusal'}
        onClick={() => {
          if (refusal === null) window.print()
        }}
      >
        Print the sheet
      </button>
      {refusal !== null && (
        <span id="print-refusal" className="refusal">
          {refusal}
        </span>
      )}
    </span>
  )
}
