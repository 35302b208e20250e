import { SheetSection } from '../batch/SheetSection.tsx'
import { BufferSection } from '../buffer/BufferSection.tsx'
import { ParticleSection } from '../charts/ParticleSection.tsx'
import { Findings } from '../findings/Findings.tsx'
import { Methods } from '../solution/Methods.tsx'
import { Solution } from '../solution/Solution.tsx'
import { Guarded } from './Guarded.tsx'

export { AxisSection } from '../axis/AxisSection.tsx'

/** What follows from the order and its lines; loaded together with the calculating part. */
export function Answers() {
  return (
    <>
      <div className="section answers no-print">
        <Guarded what="The account of the solution">
          <Solution />
        </Guarded>
        <div>
          <Guarded what="The comparison of methods">
            <Methods />
          </Guarded>
          <Guarded what="The chart of particles">
            <ParticleSection />
          </Guarded>
        </div>
      </div>
      <Guarded what="The account of acid, base and buffer">
        <BufferSection />
      </Guarded>
      <section className="section no-print" aria-labelledby="watch">
        <h2 id="watch">What to watch</h2>
        <Guarded what="The list of what to watch">
          <Findings />
        </Guarded>
      </section>
      <Guarded what="The sheet">
        <SheetSection />
      </Guarded>
    </>
  )
}
