import { useState } from 'react'
import type { Bench, BenchBalance, BenchMeasure } from '../../formula/types.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import {
  balanceColumns,
  measureColumns,
  newBalance,
  newMeasure,
  withCell,
  type BenchColumn,
  type Device,
} from './benchColumns.ts'

/** Balances and measures of one's own. They stay when a new formula is begun, and are saved with each. */
export function BenchEditor() {
  const bench: Bench = usePage((state) => state.formula.bench) ?? {}
  const { setBench } = usePageActions()
  const balances = bench.balances ?? []
  const measures = bench.measures ?? []
  return (
    <details className="bench no-print">
      <summary>
        The bench: {counted(balances.length, 'balance')}, {counted(measures.length, 'measure')} of one’s own
      </summary>
      <Devices
        columns={balanceColumns}
        devices={balances.map((balance): Device => ({ ...balance }))}
        add="Add a balance"
        onAdd={() => setBench({ ...bench, balances: [...balances, newBalance] })}
        onChange={(list) => setBench({ ...bench, balances: list as unknown as readonly BenchBalance[] })}
      />
      <Devices
        columns={measureColumns}
        devices={measures.map((measure): Device => ({ ...measure }))}
        add="Add a measure"
        onAdd={() => setBench({ ...bench, measures: [...measures, newMeasure] })}
        onChange={(list) => setBench({ ...bench, measures: list as unknown as readonly BenchMeasure[] })}
      />
    </details>
  )
}

const counted = (count: number, word: string) =>
  count === 0 ? `no ${word}` : `${count} ${word}${count === 1 ? '' : 's'}`

interface DevicesProps {
  readonly columns: readonly BenchColumn[]
  readonly devices: readonly Device[]
  readonly add: string
  onAdd(): void
  onChange(devices: readonly Device[]): void
}

function Devices({ columns, devices, add, onAdd, onChange }: DevicesProps) {
  return (
    <div className="bench-devices">
      {devices.map((device, index) => (
        // A device has nothing but its place to be known by.
        // oxlint-disable-next-line react/no-array-index-key
        <div className="bench-device" key={index}>
          {columns.map((column) => (
            <DeviceCell
              key={column.field}
              column={column}
              text={String(device[column.field] ?? '')}
              onText={(text) => onChange(devices.with(index, withCell(device, column.field, text)))}
            />
          ))}
          <button
            type="button"
            className="quiet-button"
            aria-label={`Take out ${String(device['name'] ?? '')}`}
            onClick={() => onChange(devices.toSpliced(index, 1))}
          >
            Take out
          </button>
        </div>
      ))}
      <button type="button" className="plain-button" onClick={onAdd}>
        {add}
      </button>
    </div>
  )
}

interface CellProps {
  readonly column: BenchColumn
  readonly text: string
  onText(text: string): void
}

/** Taken when the hand leaves it, so that a half-written size never blocks the page. */
function DeviceCell({ column, text, onText }: CellProps) {
  const [draft, setDraft] = useState<string | null>(null)
  const refusal = column.refusal((draft ?? text).trim())
  const leave = () => {
    if (draft === null || refusal !== null) return
    setDraft(null)
    if (draft.trim() !== text) onText(draft.trim())
  }
  return (
    <label className="boxed-field">
      <span className="small">{column.label}</span>
      {column.choices ? (
        <select className="boxed-input" value={text} onChange={(event) => onText(event.currentTarget.value)}>
          {column.choices.map((choice) => (
            <option key={choice}>{choice}</option>
          ))}
        </select>
      ) : (
        <input
          className="boxed-input"
          value={draft ?? text}
          placeholder={column.empty}
          autoComplete="off"
          spellCheck={false}
          maxLength={60}
          aria-invalid={refusal !== null || undefined}
          onChange={(event) => setDraft(event.currentTarget.value)}
          onBlur={leave}
          onKeyDown={(event) => {
            if (event.key === 'Escape') setDraft(null)
            if (event.key === 'Enter') leave()
          }}
        />
      )}
      {refusal !== null && (
        <span className="refusal">{refusal} Not taken; what stood here before still counts.</span>
      )}
    </label>
  )
}
