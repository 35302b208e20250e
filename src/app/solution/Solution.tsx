import { usePage } from '../state/context.tsx'
import { solutionView, type HeadlineView } from '../state/solutionView.ts'
import { Electrolytes } from './Electrolytes.tsx'
import { Sampling } from './Sampling.tsx'
import './solution.css'

/** What the solution is: the two numbers that are not the same thing, then everything else. */
export function Solution() {
  const view = usePage(solutionView)
  return (
    <section aria-labelledby="solution">
      <h2 id="solution">What the solution is</h2>
      {view.blocked !== null && <p className="blocked">{view.blocked}</p>}
      <div className="headlines">
        <Headline view={view.total} />
        <Headline view={view.effective} />
      </div>
      <dl className="figures">
        {view.rows.map((row) => (
          <div key={row.label} className="figures-row">
            <dt>
              {row.label}
              {row.note !== '' && <span className="small soft"> {row.note}</span>}
            </dt>
            <dd>{row.value ?? <NoFigure />}</dd>
          </div>
        ))}
      </dl>
      {view.cells !== '' && <p className="solution-sentence">{view.cells}</p>}
      {view.dominated !== '' && <p className="solution-sentence soft small">{view.dominated}</p>}
      <Sampling />
      <Electrolytes />
    </section>
  )
}

function Headline({ view }: { readonly view: HeadlineView }) {
  return (
    <p className="headline">
      <span className="headline-name small soft">{view.name}</span>
      <span className="headline-number">
        {view.value ?? <NoFigure />}
        {view.value !== null && <span className="headline-unit"> mOsm/kg</span>}
      </span>
      {view.interval !== '' && <span className="headline-interval">{view.interval}</span>}
      <span className="small soft">{view.meaning}</span>
    </p>
  )
}

function NoFigure() {
  return (
    <span className="no-figure">
      —<span className="unseen"> no figure</span>
    </span>
  )
}
