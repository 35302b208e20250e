import { InlineChoice } from '../common/InlineChoice.tsx'
import { InlineText } from '../common/InlineText.tsx'
import { routeIds } from '../../formula/types.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import type { FieldId } from '../state/fields.ts'
import { useField } from '../state/useField.ts'
import { routeNames } from '../../worksheet/routes.ts'
import { quantityWords, targetChoices } from '../words/order.ts'
import './order.css'

const routes = routeIds.map((value) => ({ value, words: routeNames[value] }))
const quantities = targetChoices.map((value) => ({ value, words: quantityWords[value] }))

/** The order as one sentence; what is underlined can be written over. */
export function Order() {
  const actions = usePageActions()
  const route = usePage((state) => state.formula.route)
  const quantity = usePage((state) => state.formula.target?.quantity ?? 'none')
  return (
    <p className="order-sentence">
      Make <Field id="finalVolume" label="Final volume" empty="how much?" />,{' '}
      <InlineChoice label="Route" value={route} choices={routes} onChoose={actions.setRoute} />, in{' '}
      <Field id="vehicle" label="Vehicle" empty="water for injection" />, at pH{' '}
      <Field id="pH" label="pH" empty="not set" inputMode="decimal" /> and{' '}
      <Field id="temperature" label="Temperature of the pH" empty="25 °C" />, weighed on a balance that reads
      to <Field id="balance" label="Readability of the balance" empty="not set" />, and bring{' '}
      <InlineChoice
        label="Quantity to bring to a target"
        value={quantity}
        choices={quantities}
        onChoose={actions.setTargetQuantity}
      />
      {quantity !== 'none' && (
        <>
          {' '}
          to <Field id="target" label="Target" empty="what?" />
        </>
      )}
      .
    </p>
  )
}

interface FieldProps {
  readonly id: FieldId
  readonly label: string
  readonly empty: string
  readonly inputMode?: 'text' | 'decimal'
}

function Field({ id, ...rest }: FieldProps) {
  return <InlineText {...rest} editing={useField(id)} />
}
