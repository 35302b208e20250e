import { lazy, Suspense, useMemo } from 'react'
import type { Certificate, FormulaLine } from '../../formula/types.ts'
import type { Ingredient } from '../../library/types.ts'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { usePage, usePageActions } from '../state/context.tsx'
import { detailView, ingredientOf, type DetailView } from '../state/detailViews.ts'
import '../common/tables.css'
import { DetailField } from './DetailField.tsx'

const CurveChart = lazy(() => import('./CurveChart.tsx'))

/** Everything about one line: what the order means, which lot, how far it may go, and what is known of it. */
export default function LineDetail({ lineKey }: { readonly lineKey: string }) {
  const library = usePage((state) => state.library)
  const line = usePage((state) => state.formula.lines.find(({ key }) => key === lineKey))
  const ingredient = line ? ingredientOf(line, library) : null
  const view = useMemo(
    () => (ingredient ? detailView(ingredient, library, !library.ingredients.has(ingredient.id)) : null),
    [ingredient, library],
  )
  if (!line) return null
  if (!ingredient || !view) return <StockDetail line={line} />
  return (
    <div className="line-detail">
      {view.isOwn && <p className="small">This ingredient is your own, not from the library.</p>}
      <Forms line={line} view={view} />
      <CertificateFields line={line} ingredient={ingredient} />
      <Sizing line={line} />
      <Known view={view} ingredient={ingredient} />
    </div>
  )
}

function StockDetail({ line }: { readonly line: FormulaLine }) {
  const stock = usePage(
    (state) =>
      state.formula.stocks?.find(({ id }) => id === line.ingredient) ??
      state.library.stocks.get(String(line.ingredient)),
  )
  const library = usePage((state) => state.library)
  if (!stock) return <p className="line-detail soft">Nothing is known of this name.</p>
  return (
    <div className="line-detail">
      <ul className="plain-list">
        {stock.contains.map(({ ingredient, gramsPerLitre }) => (
          <li key={ingredient}>
            {gramsPerLitre.value} g/L {library.ingredients.get(ingredient)?.name ?? ingredient}
            <span className="small soft">
              {' '}
              {library.sources.get(gramsPerLitre.source)?.title ?? gramsPerLitre.source}
              {gramsPerLitre.fromMemory ? ', from memory' : ''}
            </span>
          </li>
        ))}
      </ul>
      {stock.note !== undefined && <p>{stock.note}</p>}
      <p className="small soft">
        Write the volume to measure, or q.s. for a vehicle that fills up to the final volume. The label of the
        bottle in hand decides.
      </p>
    </div>
  )
}

function Forms({ line, view }: { readonly line: FormulaLine; readonly view: DetailView }) {
  const { setLineFields, swapForm } = usePageActions()
  if (view.meanings.length < 2) return null
  return (
    <p>
      The amount means{' '}
      <InlineChoice
        label="The amount means"
        value={line.orderedAs ?? ''}
        choices={view.meanings}
        onChoose={(value) => setLineFields(line.key, { orderedAs: value === '' ? undefined : value })}
      />
      {view.forms.length > 1 && (
        <>
          ; on the shelf lies{' '}
          <InlineChoice
            label="Form on the shelf"
            value={String(line.ingredient)}
            choices={view.forms}
            onChoose={(value) => swapForm(line.key, value)}
          />
        </>
      )}
      .
    </p>
  )
}

const bases = [
  { value: 'as-is', words: 'as it is' },
  { value: 'anhydrous', words: 'anhydrous' },
  { value: 'dried', words: 'dried' },
] as const

/** A change of the certificate; one that says nothing any more is taken away. */
function certificateWith(
  before: Certificate | undefined,
  change: { readonly [Field in keyof Certificate]?: Certificate[Field] | undefined },
): Certificate | undefined {
  const next = Object.fromEntries(
    Object.entries({ ...before, ...change }).filter(([, value]) => value !== undefined && value !== 'as-is'),
  ) as Certificate
  return Object.keys(next).length > 0 ? next : undefined
}

function CertificateFields({
  line,
  ingredient,
}: {
  readonly line: FormulaLine
  readonly ingredient: Ingredient
}) {
  const { setLineFields } = usePageActions()
  const { certificate } = line
  const change = (part: Parameters<typeof certificateWith>[1]) =>
    setLineFields(line.key, { certificate: certificateWith(certificate, part) })
  return (
    <p>
      Certificate of the lot: assay{' '}
      <DetailField
        label={`Assay of ${ingredient.name}`}
        value={certificate?.assayPercent}
        low={0}
        high={1000}
        onNumber={(assayPercent) => change({ assayPercent })}
      />{' '}
      % on the basis{' '}
      <InlineChoice
        label="Basis of the assay"
        value={certificate?.assayBasis ?? 'as-is'}
        choices={bases}
        onChoose={(assayBasis) => change({ assayBasis })}
      />
      ; water or loss on drying{' '}
      <DetailField
        label={`Water in ${ingredient.name}`}
        value={certificate?.waterPercent}
        low={0}
        high={100}
        onNumber={(waterPercent) => change({ waterPercent })}
      />{' '}
      %; potency{' '}
      <DetailField
        label={`Units per mg of ${ingredient.name}`}
        value={certificate?.unitsPerMg}
        low={0.000_001}
        high={1_000_000}
        onNumber={(unitsPerMg) => change({ unitsPerMg })}
      />{' '}
      units/mg.
    </p>
  )
}

/** For a line that is sized: its share and how far it may go. For every line: a note. */
function Sizing({ line }: { readonly line: FormulaLine }) {
  const { setLineFields } = usePageActions()
  const isOpen = /^\s*q/i.test(line.amount)
  return (
    <p>
      {isOpen && (
        <>
          Sized with a share of{' '}
          <DetailField
            label="Share among the q.s. lines"
            value={line.share}
            low={0.001}
            high={1000}
            onNumber={(share) => setLineFields(line.key, { share })}
          />{' '}
          and no further than{' '}
          <DetailField
            label="Largest strength"
            value={line.cap}
            onText={(cap) => setLineFields(line.key, { cap })}
          />
          .{' '}
        </>
      )}
      Note{' '}
      <DetailField
        label="Note to the line"
        value={line.note}
        onText={(note) => setLineFields(line.key, { note })}
        wide
      />
    </p>
  )
}

function Known({ view, ingredient }: { readonly view: DetailView; readonly ingredient: Ingredient }) {
  return (
    <details>
      <summary>What is known of {view.name}</summary>
      {view.facts.map((fact) => (
        <p key={fact} className="small">
          {fact}
        </p>
      ))}
      <table className="plain-table" aria-label={`Data of ${view.name}`}>
        <thead>
          <tr>
            <th scope="col">figure</th>
            <th scope="col">value</th>
            <th scope="col">kind, confidence, source</th>
            <th scope="col">what other sources say</th>
          </tr>
        </thead>
        <tbody>
          {view.data.map((row) => (
            <tr key={row.name}>
              <th scope="row">{row.name}</th>
              <td>{row.value}</td>
              <td>{row.standing}</td>
              <td>{row.others}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {view.notes.map((note) => (
        <p key={note} className="small">
          {note}
        </p>
      ))}
      <Suspense fallback={<p className="soft small">Drawing…</p>}>
        <CurveChart ingredient={ingredient} />
      </Suspense>
      {view.cautions.length > 0 && (
        <>
          <h3>Cautions that can speak of it</h3>
          <ul className="plain-list small">
            {view.cautions.map(({ severity, text }) => (
              <li key={text}>
                {severity}: {text}
              </li>
            ))}
          </ul>
        </>
      )}
    </details>
  )
}
