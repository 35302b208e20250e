import { useId, useRef, type KeyboardEvent } from 'react'
import './inline.css'

export interface TextEditing {
  readonly text: string
  /** Why the text is not taken and how to write it; shown once the hand has left the field. */
  readonly refusal: string | null
  begin(): void
  change(text: string): void
  finish(): void
  restore(): void
}

interface Props {
  readonly label: string
  readonly editing: TextEditing
  readonly empty: string
  readonly className?: string
  readonly inputMode?: 'text' | 'decimal' | 'numeric'
  /** Where the refusal is written: beside the field, or by the caller elsewhere under this id. */
  readonly refusalId?: string
}

/** A piece of running text that is edited where it stands. */
export function InlineText({ label, editing, empty, className, inputMode, refusalId }: Props) {
  const input = useRef<HTMLInputElement>(null)
  const ownRefusal = useId()
  const { text, refusal } = editing
  const keys = (event: KeyboardEvent) => {
    if (event.key === 'Escape') {
      editing.restore()
      requestAnimationFrame(() => input.current?.select())
    } else if (event.key === 'Enter') {
      editing.finish()
      input.current?.select()
    }
  }
  return (
    <span className={`inline-text ${className ?? ''}`}>
      <input
        ref={input}
        className="inline-input"
        aria-label={label}
        aria-invalid={refusal !== null || undefined}
        aria-describedby={refusal === null ? undefined : (refusalId ?? ownRefusal)}
        value={text}
        placeholder={empty}
        size={Math.max(text.length || empty.length, 3)}
        inputMode={inputMode}
        autoComplete="off"
        spellCheck={false}
        onFocus={(event) => {
          editing.begin()
          event.currentTarget.select()
        }}
        onChange={(event) => editing.change(event.currentTarget.value)}
        onBlur={() => editing.finish()}
        onKeyDown={keys}
      />
      {refusal !== null && refusalId === undefined && (
        <span id={ownRefusal} className="refusal inline-refusal">
          {refusal}
        </span>
      )}
    </span>
  )
}
