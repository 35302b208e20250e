import { lazy, Suspense, useMemo, useState } from 'react'
import type { Evaluation } from '../../evaluation/types.ts'
import { acidityView, titreView, type AcidityView } from '../state/bufferViews.ts'
import { usePage } from '../state/context.tsx'
import { typedNumber } from '../words/typed.ts'
import { NumberField } from './NumberField.tsx'

const AcidityCharts = lazy(() => import('./AcidityCharts.tsx'))

/** What the formula itself does: capacity, dilution, the way to another pH. */
export function AcidityPart({ evaluation }: { readonly evaluation: Evaluation }) {
  const library = usePage((state) => state.library)
  const view = useMemo(() => acidityView(evaluation, library), [evaluation, library])
  const [drawn, setDrawn] = useState(false)
  if (!view) {
    return (
      <p className="soft">
        The pH of this formula cannot be foretold: the acid or base strength of an ingredient is not known.
        Read it in the finished solution.
      </p>
    )
  }
  return (
    <section aria-labelledby="acidity">
      <h3 id="acidity">What it does with acid and base</h3>
      <p>{view.sentence}</p>
      <p>
        Buffer capacity {view.capacity}
        {view.shares !== '' && <span className="soft">, {view.shares}</span>}. {view.air}
      </p>
      <Dilutions view={view} />
      <Titre evaluation={evaluation} />
      <details onToggle={(event) => setDrawn(event.currentTarget.open)}>
        <summary>Charts: titration, species, temperature</summary>
        {drawn && (
          <Suspense fallback={<p className="soft small">Drawing…</p>}>
            <AcidityCharts evaluation={evaluation} components={view.components} />
          </Suspense>
        )}
      </details>
    </section>
  )
}

function Dilutions({ view }: { readonly view: AcidityView }) {
  return (
    <table className="plain-table" aria-label="pH on dilution">
      <thead>
        <tr>
          <th scope="col">diluted</th>
          <th scope="col">pH in water</th>
          <th scope="col">pH in 0.9 % sodium chloride</th>
        </tr>
      </thead>
      <tbody>
        {view.dilutions.map(({ name, water, saline }) => (
          <tr key={name}>
            <th scope="row">{name}</th>
            <td>{water}</td>
            <td>{saline}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}

function Titre({ evaluation }: { readonly evaluation: Evaluation }) {
  const library = usePage((state) => state.library)
  const [pHText, setPHText] = useState(String(evaluation.formula.pH ?? 7))
  const [molarText, setMolarText] = useState('0.1')
  const pH = typedNumber(pHText, 0, 14)
  const molar = typedNumber(molarText, 0.001, 12)
  const view = useMemo(
    () => (pH === null || molar === null ? null : titreView(evaluation, pH, molar, library)),
    [evaluation, pH, molar, library],
  )
  return (
    <div>
      <p>
        <NumberField
          label="Bring it to pH"
          text={pHText}
          valid={pH !== null}
          help="Write a pH from 0 to 14."
          onChange={setPHText}
        />{' '}
        <NumberField
          label="with acid or base of"
          unit="mol/L"
          text={molarText}
          valid={molar !== null}
          help="Write a strength from 0.001 to 12."
          onChange={setMolarText}
        />
      </p>
      {view && <p role="status">{view.sentence}</p>}
      {view && view.steps.length > 0 && (
        <table className="plain-table" aria-label="pH along the titre">
          <thead>
            <tr>
              <th scope="col">of the titre</th>
              <th scope="col">volume</th>
              <th scope="col">pH</th>
            </tr>
          </thead>
          <tbody>
            {view.steps.map((step) => (
              <tr key={step.share}>
                <th scope="row">{step.share}</th>
                <td>{step.volume}</td>
                <td>{step.pH}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </div>
  )
}
