import type { ReactNode } from 'react'
import { AxisSection } from '../axis/AxisSection.tsx'
import { Patterns } from '../axis/Patterns.tsx'
import { SheetSection } from '../batch/SheetSection.tsx'
import { ParticleSection } from '../charts/ParticleSection.tsx'
import { Guard } from '../common/Guard.tsx'
import { Findings } from '../findings/Findings.tsx'
import { IngredientTable } from '../ingredients/IngredientTable.tsx'
import { Masthead } from '../menu/Masthead.tsx'
import { Notices } from '../menu/Notices.tsx'
import { Order } from '../order/Order.tsx'
import { Methods } from '../solution/Methods.tsx'
import { Solution } from '../solution/Solution.tsx'
import { usePage } from '../state/context.tsx'
import { useUndoKeys } from './useUndoKeys.ts'
import './page.css'

/** The working sheet, in the order of the work. */
export function Page() {
  useUndoKeys()
  const revision = usePage((state) => state.revision)
  const guarded = (what: string, part: ReactNode) => (
    <Guard what={what} revision={revision}>
      {part}
    </Guard>
  )
  return (
    <div className="page">
      <Patterns />
      <Masthead />
      <Notices />
      <main>
        <section className="section no-print" aria-labelledby="order">
          <h2 id="order">The order</h2>
          <Order />
        </section>
        {guarded('The osmolality axis', <AxisSection />)}
        <section className="section no-print" aria-labelledby="ingredients">
          <h2 id="ingredients">Ingredients</h2>
          <IngredientTable />
        </section>
        <div className="section answers no-print">
          {guarded('The account of the solution', <Solution />)}
          <div>
            {guarded('The comparison of methods', <Methods />)}
            {guarded('The chart of particles', <ParticleSection />)}
          </div>
        </div>
        <section className="section no-print" aria-labelledby="watch">
          <h2 id="watch">What to watch</h2>
          {guarded('The list of what to watch', <Findings />)}
        </section>
        {guarded('The sheet', <SheetSection />)}
      </main>
      <Footer />
    </div>
  )
}

function Footer() {
  return (
    <footer className="footer small soft no-print">
      <p>
        A calculation, not a release: a second person checks every figure independently before anything is
        made. Local policy, the product’s label and the judgement of a licensed practitioner come before what
        stands here.
      </p>
      <p>Nothing leaves this machine: no account, no server, no counting of visits.</p>
    </footer>
  )
}
