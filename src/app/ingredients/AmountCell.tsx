import { usePageActions } from '../state/context.tsx'
import type { LineView } from '../state/lineViews.ts'

interface Props {
  readonly view: LineView
  readonly describedBy: string
}

/** The amount as the order has it, kept as typed. */
export function AmountCell({ view, describedBy }: Props) {
  const actions = usePageActions()
  const cell = { kind: 'amount', key: view.key } as const
  return (
    <input
      className={view.isAdjuster ? 'cell-input amount-input adjuster-input' : 'cell-input amount-input'}
      data-row={view.order}
      data-column="amount"
      aria-label={`Amount of ${view.name}, line ${view.order + 1}`}
      aria-invalid={view.amountRefused || undefined}
      aria-describedby={describedBy}
      value={view.amount}
      placeholder="amount, or q.s."
      autoComplete="off"
      autoCapitalize="off"
      spellCheck={false}
      onFocus={() => actions.beginCell(cell)}
      onChange={(event) => actions.typeInCell(cell, event.currentTarget.value)}
      onBlur={() => actions.leaveCell()}
    />
  )
}
