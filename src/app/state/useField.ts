import { useMemo } from 'react'
import type { TextEditing } from '../common/InlineText.tsx'
import { usePage, usePageActions } from './context.tsx'
import { fieldRefusal, fieldText, type FieldId } from './fields.ts'

/** One field of the order or the batch, as something that can be typed in. */
export function useField(field: FieldId): TextEditing {
  const actions = usePageActions()
  const text = usePage((state) => state.drafts[field] ?? fieldText(state.formula, field))
  const refusal = usePage((state) =>
    state.typing === field ? null : fieldRefusal(state.formula, field, state.drafts[field]),
  )
  return useMemo(() => {
    const cell = { kind: 'field', field } as const
    return {
      text,
      refusal,
      begin: () => actions.beginCell(cell),
      change: (typed) => actions.typeInCell(cell, typed),
      finish: () => actions.leaveCell(),
      restore: () => actions.restoreCell(),
    }
  }, [actions, field, text, refusal])
}
