import { useState } from 'react'
import { dilutionSentence } from '../state/dilutionViews.ts'
import { TextField } from './TextField.tsx'

/** One stock and water to a strength, or two stocks to a strength between them. */
export function DilutionForm() {
  const [strong, setStrong] = useState('')
  const [weak, setWeak] = useState('')
  const [wanted, setWanted] = useState('')
  const [volume, setVolume] = useState('100')
  return (
    <section aria-labelledby="dilution">
      <h3 id="dilution">Dilute, or mix two strengths</h3>
      <p className="own-fields">
        <TextField label="Stock" text={strong} onChange={setStrong} />
        <TextField label="second stock, empty for water" text={weak} onChange={setWeak} />
        <TextField label="wanted strength" text={wanted} onChange={setWanted} />
        <TextField label="volume, mL" text={volume} onChange={setVolume} />
      </p>
      <p className="small soft">Strengths in one and the same unit: %, mg/mL, mmol/L.</p>
      <p role="status">{dilutionSentence(strong, weak, wanted, volume)}</p>
    </section>
  )
}
