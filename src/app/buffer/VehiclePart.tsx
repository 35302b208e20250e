import { useState } from 'react'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { usePage, usePageActions } from '../state/context.tsx'
import { vehicleView, withVehicle } from '../state/vehicleViews.ts'

/** Published buffers as starting points, with their source and the pH they are said to have. */
export function VehiclePart() {
  const library = usePage((state) => state.library)
  const formula = usePage((state) => state.formula)
  const { putLines } = usePageActions()
  const [id, setId] = useState(library.vehicles[0]?.id ?? '')
  const vehicle = library.vehicles.find((candidate) => candidate.id === id)
  if (!vehicle) return null
  const view = vehicleView(vehicle, library)
  return (
    <section aria-labelledby="vehicles">
      <h3 id="vehicles">Start from a published buffer</h3>
      <p className="buffer-wish">
        <InlineChoice
          label="Published buffer"
          value={id}
          choices={library.vehicles.map(({ id: value, title }) => ({ value, words: title }))}
          onChoose={setId}
        />
      </p>
      <ul className="plain-list">
        {view.parts.map(({ name, strength }) => (
          <li key={name}>
            {strength} {name}
          </li>
        ))}
      </ul>
      <p className="small">
        {view.source} {view.modelled}
      </p>
      {view.note !== '' && <p className="small soft">{view.note}</p>}
      <button type="button" className="plain-button" onClick={() => putLines(withVehicle(formula, vehicle))}>
        Add it to the formula
      </button>
    </section>
  )
}
