import './inline.css'

interface Choice<T extends string> {
  readonly value: T
  readonly words: string
}

interface Props<T extends string> {
  readonly label: string
  readonly value: T
  readonly choices: readonly Choice<T>[]
  onChoose(value: T): void
}

/** One of a few fixed phrases in running text. */
export function InlineChoice<T extends string>({ label, value, choices, onChoose }: Props<T>) {
  return (
    <select
      className="inline-choice"
      aria-label={label}
      value={value}
      onChange={(event) => {
        const chosen = choices.find((choice) => choice.value === event.currentTarget.value)
        if (chosen) onChoose(chosen.value)
      }}
    >
      {choices.map((choice) => (
        <option key={choice.value} value={choice.value}>
          {choice.words}
        </option>
      ))}
    </select>
  )
}
