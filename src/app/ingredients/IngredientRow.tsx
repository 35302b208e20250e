import { lazy, Suspense, useId, useState } from 'react'
import { Swatch } from '../axis/Patterns.tsx'
import { usePageActions, useSearch } from '../state/context.tsx'
import type { LineView } from '../state/lineViews.ts'
import { AmountCell } from './AmountCell.tsx'
import { IngredientSearch } from './IngredientSearch.tsx'

const LineDetail = lazy(() => import('./LineDetail.tsx'))

interface Props {
  readonly view: LineView
  readonly onChosen: (row: number) => void
  readonly onRemove: (row: number, key: string) => void
}

/** One line: what it is, what was ordered, and what that comes to. */
export function IngredientRow({ view, onChosen, onRemove }: Props) {
  const refusalId = useId()
  const factsId = useId()
  const { order, key, refusals } = view
  const [open, setOpen] = useState(false)
  return (
    <>
      <tr role="row" className={refusals.length > 0 ? 'line line-refused' : 'line'}>
        <td role="cell" className="ingredient-cell">
          <NameCell view={view} describedBy={`${factsId} ${refusalId}`} onChosen={onChosen} />
          {view.facts !== '' && (
            <span id={factsId} className="line-facts small soft">
              {view.facts}
              {view.fromMemory && <em> from memory</em>}
            </span>
          )}
          <MoreButton view={view} open={open} onToggle={() => setOpen(!open)} />
        </td>
        <td role="cell" className="amount-cell">
          <AmountCell view={view} describedBy={refusalId} />
        </td>
        <Figures view={view} />
        <td role="cell" className="remove-cell no-print">
          <button
            type="button"
            className="plain-button remove-button"
            tabIndex={-1}
            data-row={order}
            data-column="remove"
            aria-label={`Remove line ${order + 1}, ${view.name}`}
            title="Remove this line (Ctrl+Delete)"
            onClick={() => onRemove(order, key)}
          >
            ×
          </button>
        </td>
      </tr>
      {open && view.known && <DetailRow lineKey={key} />}
      {refusals.length > 0 && (
        <tr role="row" className="refusal-row">
          <td role="cell" colSpan={8} id={refusalId}>
            {refusals.map((refusal) => (
              <p key={refusal} className="refusal">
                {refusal}
              </p>
            ))}
          </td>
        </tr>
      )}
    </>
  )
}

function MoreButton({
  view,
  open,
  onToggle,
}: {
  readonly view: LineView
  readonly open: boolean
  readonly onToggle: () => void
}) {
  if (!view.known) return null
  return (
    <button
      type="button"
      className="plain-button small more-button no-print"
      tabIndex={-1}
      data-more={view.order}
      aria-expanded={open}
      aria-label={`More about line ${view.order + 1}, ${view.name}`}
      onClick={onToggle}
    >
      {open ? 'less' : 'form, lot, data'}
    </button>
  )
}

function DetailRow({ lineKey }: { readonly lineKey: string }) {
  return (
    <tr role="row" className="detail-row no-print">
      <td role="cell" colSpan={8}>
        <Suspense fallback={<p className="soft small">Opening…</p>}>
          <LineDetail lineKey={lineKey} />
        </Suspense>
      </td>
    </tr>
  )
}

function NameCell({
  view,
  describedBy,
  onChosen,
}: {
  readonly view: LineView
  readonly describedBy: string
  readonly onChosen: (row: number) => void
}) {
  const actions = usePageActions()
  const find = useSearch()
  return (
    <span className="name-cell">
      <Swatch order={view.order} />
      <IngredientSearch
        label={`Ingredient, line ${view.order + 1}`}
        row={view.order}
        value={view.name}
        empty="ingredient"
        describedBy={describedBy}
        invalid={!view.known}
        find={find}
        onChoose={(candidate) => {
          actions.setIngredient(view.key, candidate.record ?? candidate.id)
          onChosen(view.order)
        }}
        onLeave={(text) => actions.nameIngredient(view.key, text)}
      />
    </span>
  )
}

/** Said beside the figures where the table is too narrow for its head. */
const figureLabels = ['weigh', 'mmol', 'particles', 'of all', 'mOsm/kg']

function Figures({ view }: { readonly view: LineView }) {
  return figureLabels.map((label, index) => {
    const figure = view.figures?.[index]
    return (
      <td key={label} role="cell" className="figure" data-label={label}>
        {figure ? (
          <>
            {figure.text}
            {figure.beneath !== '' && <span className="beneath small soft">{figure.beneath}</span>}
          </>
        ) : (
          <span className="no-figure">
            —<span className="unseen"> no figure</span>
          </span>
        )}
      </td>
    )
  })
}
