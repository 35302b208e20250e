import { lazy, Suspense, useDeferredValue } from 'react'
import { Swatch } from '../axis/Patterns.tsx'
import { usePage } from '../state/context.tsx'
import { particleViews, type ParticleView } from '../state/particleViews.ts'
import './charts.css'

const ParticleChart = lazy(() => import('./ParticleChart.tsx'))

/** Which ingredient brings the particles: as the label counts them, and as they are found in the water. */
export function ParticleSection() {
  const shares = useDeferredValue(usePage(particleViews))
  return (
    <section className="section no-print" aria-labelledby="particles">
      <h2 id="particles">Share of all particles</h2>
      {shares.length === 0 ? (
        <p className="soft">No particles to count.</p>
      ) : (
        <>
          <p className="chart-key small" aria-hidden="true">
            <span className="key-formal" /> formal: every ion that the formula unit can give
            <br />
            <span className="key-counted" /> counted: after association and pairing
          </p>
          <div className="particle-chart" aria-hidden="true">
            <Suspense fallback={<p className="soft small">Drawing…</p>}>
              <ParticleChart shares={shares} />
            </Suspense>
          </div>
          <ParticleTable shares={shares} />
        </>
      )}
    </section>
  )
}

function ParticleTable({ shares }: { readonly shares: readonly ParticleView[] }) {
  return (
    <details>
      <summary className="small">The same in figures</summary>
      <table className="particle-table" aria-label="Share of all particles, formal and counted">
        <thead>
          <tr>
            <th scope="col">ingredient</th>
            <th scope="col">formal</th>
            <th scope="col">counted</th>
          </tr>
        </thead>
        <tbody>
          {shares.map((share) => (
            <tr key={share.key}>
              <th scope="row">
                <Swatch order={share.order} /> {share.name}
              </th>
              <td>{share.formalText}</td>
              <td>{share.countedText}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  )
}
