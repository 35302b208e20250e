import { useState, type FormEvent } from 'react'
import { calledExactly } from '../state/search.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { ownStock } from '../state/ownStock.ts'
import { TextField } from './TextField.tsx'

/** A solution of one's own: what it holds in g/L. */
export function StockForm() {
  const library = usePage((state) => state.library)
  const { keepOwnStock, addStockLine } = usePageActions()
  const [name, setName] = useState('')
  const [rows, setRows] = useState([{ name: '', grams: '' }])
  const [fills, setFills] = useState(false)
  const [said, setSaid] = useState('')
  const submit = (event: FormEvent) => {
    event.preventDefault()
    const made = ownStock(name, rows, fills, (text) => calledExactly(library, text)?.id ?? null, library)
    if (!made.ok) return setSaid(made.refusal)
    keepOwnStock(made.stock)
    addStockLine(made.stock)
    setName('')
    setRows([{ name: '', grams: '' }])
    return setSaid(`${made.stock.name} is on your own shelf and in the formula; enter its volume there.`)
  }
  const change = (index: number, part: Partial<(typeof rows)[number]>) =>
    setRows(rows.map((row, place) => (place === index ? { ...row, ...part } : row)))
  return (
    <form aria-labelledby="own-stock" onSubmit={submit}>
      <h3 id="own-stock">Enter a stock solution or vehicle</h3>
      <p className="own-fields">
        <TextField label="Name of the solution" text={name} onChange={setName} wide />
        <label>
          <input
            type="checkbox"
            checked={fills}
            onChange={(event) => setFills(event.currentTarget.checked)}
          />{' '}
          it may fill up to the final volume
        </label>
      </p>
      {rows.map((row, index) => (
        <p key={index} className="own-fields">
          <TextField
            label={`Holds, ${index + 1}`}
            text={row.name}
            onChange={(text) => change(index, { name: text })}
            wide
          />
          <TextField label="g/L" text={row.grams} onChange={(text) => change(index, { grams: text })} />
        </p>
      ))}
      <button
        type="button"
        className="plain-button"
        onClick={() => setRows([...rows, { name: '', grams: '' }])}
      >
        Another ingredient
      </button>{' '}
      <button type="submit" className="plain-button">
        Keep the solution and add it
      </button>{' '}
      <span role="status">{said}</span>
    </form>
  )
}
