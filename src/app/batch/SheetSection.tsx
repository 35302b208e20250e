import type { ReactNode } from 'react'
import type { FieldId } from '../state/fields.ts'
import { useField } from '../state/useField.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { BenchEditor } from './BenchEditor.tsx'
import { SheetOnPaper } from './SheetOnPaper.tsx'
import './batch.css'

/** The sheet: what else stands on it, and the way to paper. */
export function SheetSection() {
  return (
    <section className="section" aria-labelledby="sheet">
      <h2 id="sheet" className="no-print">
        The sheet
      </h2>
      <div className="sheet-fields no-print">
        <FieldGroup name="Batch">
          <BoxedField id="batchUnits" label="containers" empty="1" />
          <Overfill />
          <BoxedField id="batchHoldUp" label="hold-up of filter, tubing" empty="none, or 5 mL" />
          <BoxedField id="batchSamples" label="samples for tests" empty="none, or 2 * 5 mL" />
          <BoxedField id="batchExcess" label="extra for losses" empty="none, or 10 mL" />
        </FieldGroup>
        <FieldGroup name="Order">
          <BoxedField id="orderNumber" label="order number" empty="blank on the sheet" />
          <BoxedField id="lot" label="lot" empty="blank on the sheet" />
          <BoxedField id="masterRecord" label="master record" empty="blank on the sheet" />
          <BoxedField id="container" label="container" empty="blank on the sheet" />
          <BoxedField id="preparedFor" label="prepared for" empty="blank on the sheet" />
        </FieldGroup>
        <FieldGroup name="Patient, for the limits that depend on it">
          <BoxedField id="ageYears" label="age in years" empty="not given" />
          <BoxedField id="weightKg" label="weight in kg" empty="not given" />
          <BoxedField id="doseVolume" label="one dose" empty="not given, or 0.05 mL" />
          <BoxedField id="infusionRate" label="infusion rate" empty="not given, or 100 mL/h" />
        </FieldGroup>
      </div>
      <BenchEditor />
      <SheetOnPaper />
    </section>
  )
}

function FieldGroup({ name, children }: { readonly name: string; readonly children: ReactNode }) {
  return (
    <fieldset className="field-group">
      <legend className="small soft">{name}</legend>
      {children}
    </fieldset>
  )
}

const overfills = [
  { value: 'none', words: 'none' },
  { value: 'mobile', words: 'as of a mobile liquid' },
  { value: 'viscous', words: 'as of a viscous liquid' },
] as const

function Overfill() {
  const { setOverfill } = usePageActions()
  const chosen = usePage((state) => state.formula.batch?.overfill ?? 'none')
  return (
    <label className="boxed-field">
      <span className="small">excess in each container</span>
      <select
        className="boxed-input"
        value={chosen}
        onChange={({ currentTarget: { value } }) => {
          const choice = overfills.find((one) => one.value === value)
          if (choice) setOverfill(choice.value)
        }}
      >
        {overfills.map(({ value, words }) => (
          <option key={value} value={value}>
            {words}
          </option>
        ))}
      </select>
    </label>
  )
}

interface FieldProps {
  readonly id: FieldId
  readonly label: string
  readonly empty: string
}

function BoxedField({ id, label, empty }: FieldProps) {
  const editing = useField(id)
  const refusalId = `refusal-${id}`
  return (
    <label className="boxed-field">
      <span className="small">{label}</span>
      <input
        className="boxed-input"
        value={editing.text}
        placeholder={empty}
        autoComplete="off"
        spellCheck={false}
        aria-invalid={editing.refusal !== null || undefined}
        aria-describedby={editing.refusal === null ? undefined : refusalId}
        onFocus={editing.begin}
        onChange={(event) => editing.change(event.currentTarget.value)}
        onBlur={editing.finish}
        onKeyDown={(event) => {
          if (event.key === 'Escape') editing.restore()
        }}
      />
      {editing.refusal !== null && (
        <span id={refusalId} className="refusal">
          {editing.refusal}
        </span>
      )}
    </label>
  )
}
