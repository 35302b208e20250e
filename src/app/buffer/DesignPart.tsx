import { useMemo, useState } from 'react'
import type { Evaluation } from '../../evaluation/types.ts'
import type { BufferSystem, BufferWay } from '../../library/buffers.ts'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { designView, wayWords, type DesignView } from '../state/bufferViews.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { typedNumber } from '../words/typed.ts'
import { NumberField } from './NumberField.tsx'
import { SizeFields, sizeOf, usualSize } from './SizeFields.tsx'

const middle = ({ pHLow, pHHigh }: BufferSystem) => (Math.round(((pHLow + pHHigh) / 2) * 10) / 10).toString()

/** What was chosen and typed, and the design that follows from it. */
function useDesign(evaluation: Evaluation) {
  const library = usePage((state) => state.library)
  const systems = library.bufferSystems
  const [systemId, setSystem] = useState('phosphate-sodium')
  const system = systems.find(({ id }) => id === systemId) ?? systems[0]!
  const [chosenWay, setWay] = useState<BufferWay>('two-forms')
  const [acidForm, setAcidForm] = useState('')
  const [baseForm, setBaseForm] = useState('')
  const [pHText, setPH] = useState(String(evaluation.formula.pH ?? middle(system)))
  const [sizes, setSizes] = useState(usualSize)
  const way = system.ways.includes(chosenWay) ? chosenWay : (system.ways[0] ?? 'two-forms')
  const pH = typedNumber(pHText, 0, 14)
  const size = useMemo(() => sizeOf(sizes), [sizes])
  const view = useMemo(() => {
    if (pH === null || size === null) return null
    const forms = {
      ...(system.acidForms.includes(acidForm) ? { acidForm } : {}),
      ...(system.baseForms.includes(baseForm) ? { baseForm } : {}),
    }
    return designView(evaluation, { system, way, pH, size, ...forms }, library)
  }, [evaluation, system, way, acidForm, baseForm, pH, size, library])
  const set = { setSystem, setWay, setAcidForm, setBaseForm, setPH, setSizes }
  return { systems, system, way, acidForm, baseForm, pHText, pH, sizes, view, ...set }
}

/** One buffer, chosen in all its parts. */
export function DesignPart({ evaluation }: { readonly evaluation: Evaluation }) {
  const { putLines } = usePageActions()
  const wish = useDesign(evaluation)
  const { system, way, view } = wish
  return (
    <section aria-labelledby="design">
      <h3 id="design">Design a buffer</h3>
      <p className="buffer-wish">
        <InlineChoice
          label="Buffer system"
          value={system.id}
          choices={wish.systems.map(({ id, name }) => ({ value: id, words: name }))}
          onChoose={wish.setSystem}
        />{' '}
        from{' '}
        <InlineChoice<BufferWay>
          label="Made from"
          value={way}
          choices={system.ways.map((value) => ({ value, words: wayWords[value] }))}
          onChoose={wish.setWay}
        />
        <FormChoice
          words="acid form"
          ids={way === 'base-with-acid' ? [] : system.acidForms}
          chosen={wish.acidForm}
          onChoose={wish.setAcidForm}
        />
        <FormChoice
          words="base form"
          ids={way === 'acid-with-base' ? [] : system.baseForms}
          chosen={wish.baseForm}
          onChoose={wish.setBaseForm}
        />
      </p>
      <p className="buffer-wish">
        <NumberField
          label="pH"
          text={wish.pHText}
          valid={wish.pH !== null}
          help="Write a pH from 0 to 14."
          onChange={wish.setPH}
        />{' '}
        <SizeFields sizes={wish.sizes} onChange={wish.setSizes} />
      </p>
      <p className="small soft">{system.note}</p>
      {view && <Designed view={view} />}
      {view?.formula && (
        <button type="button" className="plain-button" onClick={() => view.formula && putLines(view.formula)}>
          Put it into the formula
        </button>
      )}
    </section>
  )
}

interface FormChoiceProps {
  readonly words: string
  readonly ids: readonly string[]
  readonly chosen: string
  onChoose(id: string): void
}

/** Which hydrate or salt lies on the shelf; nothing to choose where there is one. */
function FormChoice({ words, ids, chosen, onChoose }: FormChoiceProps) {
  const library = usePage((state) => state.library)
  if (ids.length < 2) return null
  return (
    <>
      , {words}{' '}
      <InlineChoice
        label={`Shelf: ${words}`}
        value={ids.includes(chosen) ? chosen : (ids[0] ?? '')}
        choices={ids.map((id) => ({ value: id, words: library.ingredients.get(id)?.name ?? id }))}
        onChoose={onChoose}
      />
    </>
  )
}

function Designed({ view }: { readonly view: DesignView }) {
  return (
    <div role="status">
      {view.parts.length > 0 && (
        <table className="plain-table" aria-label="The buffer in the final volume">
          <thead>
            <tr>
              <th scope="col">ingredient</th>
              <th scope="col">mass</th>
              <th scope="col">strength</th>
            </tr>
          </thead>
          <tbody>
            {view.parts.map((part) => (
              <tr key={part.name}>
                <th scope="row">{part.name}</th>
                <td>
                  {part.mass} {part.volume !== '' && <span className="soft">{part.volume}</span>}
                </td>
                <td>{part.strength}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {view.sentences.map((sentence) => (
        <p key={sentence}>{sentence}</p>
      ))}
    </div>
  )
}
