import { useId } from 'react'

interface Props {
  readonly label: string
  readonly unit?: string
  /** The words before the field say it already. */
  readonly quiet?: boolean
  readonly text: string
  readonly valid: boolean
  /** How to write it, shown while it cannot be read. */
  readonly help: string
  onChange(text: string): void
}

/** A number typed into a small field, refused in words where it cannot be read. */
export function NumberField({ label, unit, quiet = false, text, valid, help, onChange }: Props) {
  const id = useId()
  return (
    <span className="number-field">
      <label htmlFor={id} className={quiet ? 'unseen' : undefined}>
        {label}
      </label>{' '}
      <input
        id={id}
        className="inline-input"
        inputMode="decimal"
        autoComplete="off"
        size={6}
        value={text}
        aria-invalid={!valid || undefined}
        aria-describedby={valid ? undefined : `${id}-help`}
        onChange={(event) => onChange(event.currentTarget.value)}
      />
      {unit !== undefined && ` ${unit}`}
      {!valid && (
        <span id={`${id}-help`} className="refusal small">
          {' '}
          {help}
        </span>
      )}
    </span>
  )
}
