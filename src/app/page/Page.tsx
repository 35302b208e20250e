import { lazy } from 'react'
import { Patterns } from '../axis/Patterns.tsx'
import { IngredientTable } from '../ingredients/IngredientTable.tsx'
import { Masthead } from '../menu/Masthead.tsx'
import { Notices } from '../menu/Notices.tsx'
import { NewVersion } from '../offline/NewVersion.tsx'
import { OfflineLine } from '../offline/OfflineLine.tsx'
import { OwnSection } from '../own/OwnSection.tsx'
import { Order } from '../order/Order.tsx'
import { ShelfSection } from '../shelf/ShelfSection.tsx'
import { SideBySideSection } from '../sidebyside/SideBySideSection.tsx'
import { Calculated } from './Calculated.tsx'
import { Guarded } from './Guarded.tsx'
import { useUndoKeys } from './useUndoKeys.ts'
import './page.css'

const AxisSection = lazy(async () => ({ default: (await import('./Answers.tsx')).AxisSection }))
const Answers = lazy(async () => ({ default: (await import('./Answers.tsx')).Answers }))

/** The working sheet, in the order of the work. */
export function Page() {
  useUndoKeys()
  return (
    <div className="page">
      <Patterns />
      <Masthead />
      <Notices />
      <NewVersion />
      <main>
        <Guarded what="The shelf">
          <ShelfSection />
        </Guarded>
        <Guarded what="The comparison side by side">
          <SideBySideSection />
        </Guarded>
        <section className="section no-print" aria-labelledby="order">
          <h2 id="order">The order</h2>
          <Order />
        </section>
        <Guarded what="The osmolality axis">
          <Calculated className="awaited-axis no-print">
            <AxisSection />
          </Calculated>
        </Guarded>
        <section className="section no-print" aria-labelledby="ingredients">
          <h2 id="ingredients">Ingredients</h2>
          <IngredientTable />
        </section>
        <Guarded what="The shelf of your own">
          <OwnSection />
        </Guarded>
        <Guarded what="What follows from the order">
          <Calculated className="awaited" isOnPaper>
            <Answers />
          </Calculated>
        </Guarded>
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
      <OfflineLine />
    </footer>
  )
}
