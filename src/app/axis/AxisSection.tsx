import { usePage } from '../state/context.tsx'
import { axisView } from '../state/axisView.ts'
import { wholeNumber } from '../words/figures.ts'
import { OsmolalityAxis } from './OsmolalityAxis.tsx'

export function AxisSection() {
  const { content, spanLabel, sentences } = usePage(axisView)
  return (
    <section className="section no-print" aria-labelledby="axis">
      <h2 id="axis">On the osmolality axis, mOsm/kg</h2>
      <OsmolalityAxis
        content={content}
        spanLabel={spanLabel}
        sentences={sentences}
        writeValue={wholeNumber}
      />
    </section>
  )
}
