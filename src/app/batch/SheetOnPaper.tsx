import { lazy, Suspense, useDeferredValue, useState } from 'react'
import { documentIds, type DocumentId } from '../../worksheet/types.ts'
import { documentKinds, usualDocuments } from '../../worksheet/kinds.ts'
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
  const [documents, setDocuments] = useState<readonly DocumentId[]>(usualDocuments)
  const drawn = useDeferredValue(evaluation)
  return (
    <>
      <div className="print-row no-print">
        <span>
          Paper <InlineChoice label="Paper size" value={paper} choices={papers} onChoose={actions.setPaper} />
        </span>
        <DocumentChoice chosen={documents} onChoose={setDocuments} />
        <PrintButton refusal={refusalOf(drawn === evaluation, documents, refusal)} />
      </div>
      {drawn !== null && drawn.status === 'ok' && !isEmpty ? (
        <Suspense fallback={<p className="soft small">Not a worksheet yet: it is being drawn.</p>}>
          <SheetPreview evaluation={drawn} library={library} paper={paper} documents={documents} />
        </Suspense>
      ) : (
        <p className="print-only">Not a worksheet. {refusal}</p>
      )}
    </>
  )
}

const refusalOf = (isDrawn: boolean, documents: readonly DocumentId[], refusal: string | null) => {
  if (!isDrawn) return 'The sheet is being drawn.'
  return refusal ?? (documents.length === 0 ? 'Choose what to print.' : null)
}

interface ChoiceProps {
  readonly chosen: readonly DocumentId[]
  onChoose(documents: readonly DocumentId[]): void
}

function DocumentChoice({ chosen, onChoose }: ChoiceProps) {
  return (
    <fieldset className="document-choice">
      <legend className="unseen">What to print</legend>
      {documentIds.map((id) => (
        <label key={id}>
          <input
            type="checkbox"
            checked={chosen.includes(id)}
            onChange={({ currentTarget: { checked } }) =>
              onChoose(documentIds.filter((other) => (other === id ? checked : chosen.includes(other))))
            }
          />
          {documentKinds[id].name}
        </label>
      ))}
    </fieldset>
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
