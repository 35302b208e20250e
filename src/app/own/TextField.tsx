import { useId } from 'react'

interface Props {
  readonly label: string
  readonly text: string
  readonly wide?: boolean
  onChange(text: string): void
}

export function TextField({ label, text, wide = false, onChange }: Props) {
  const id = useId()
  return (
    <span className="text-field">
      <label htmlFor={id}>{label}</label>{' '}
      <input
        id={id}
        className="inline-input"
        size={wide ? 24 : 7}
        autoComplete="off"
        value={text}
        onChange={(event) => onChange(event.currentTarget.value)}
      />
    </span>
  )
}
