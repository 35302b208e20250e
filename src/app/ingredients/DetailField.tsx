import { useState } from 'react'
import { typedNumber } from '../words/typed.ts'

interface Common {
  readonly label: string
  readonly wide?: boolean
}
type Props = Common &
  (
    | {
        readonly value: number | undefined
        readonly low: number
        readonly high: number
        onNumber(value: number | undefined): void
      }
    | { readonly value: string | undefined; onText(value: string | undefined): void }
  )

/** A small field that takes over when the hand leaves it; a number that cannot be read stays in sight and is refused. */
export function DetailField(props: Props) {
  const { label, wide = false, value } = props
  const [typed, setTyped] = useState<string | null>(null)
  const [refused, setRefused] = useState(false)
  const take = () => {
    if (typed === null) return
    const text = typed.trim()
    if ('onText' in props) props.onText(text === '' ? undefined : text.slice(0, 500))
    else if (text === '') props.onNumber(undefined)
    else {
      const number = typedNumber(text, props.low, props.high)
      if (number === null) {
        setRefused(true)
        return
      }
      props.onNumber(number)
    }
    setRefused(false)
    setTyped(null)
  }
  return (
    <>
      <input
        className="inline-input"
        aria-label={label}
        aria-invalid={refused || undefined}
        size={wide ? 30 : 7}
        value={typed ?? String(value ?? '')}
        placeholder="—"
        autoComplete="off"
        onChange={(event) => setTyped(event.currentTarget.value)}
        onBlur={take}
        onKeyDown={(event) => {
          if (event.key === 'Enter') take()
          if (event.key === 'Escape') {
            setTyped(null)
            setRefused(false)
          }
          event.stopPropagation()
        }}
      />
      {refused && 'low' in props && (
        <span className="refusal small" role="alert">
          {' '}
          Write a number from {props.low} to {props.high}.
        </span>
      )}
    </>
  )
}
