import { useId, useLayoutEffect, useRef, useState } from 'react'
import type { Sentence } from '../state/axisView.ts'
import { useWidth } from '../common/useWidth.ts'
import { HeldByCells, ShareLabels, Shares, Ticks, Target, ToleratedSpan, Total } from './AxisDrawing.tsx'
import { axisLayout, type AxisContent } from './model.ts'
import './axis.css'

interface Props {
  readonly content: AxisContent
  /** What the hatched span is called, and by whose word. */
  readonly spanLabel: string
  /** The same content in sentences; read out in place of the drawing and shown under it. */
  readonly sentences: readonly Sentence[]
  readonly writeValue: (value: number) => string
}

/** The one picture of the page: shares laid end to end against what the route tolerates. */
export function OsmolalityAxis({ content, spanLabel, sentences, writeValue }: Props) {
  const [frame, width] = useWidth<HTMLDivElement>(960)
  const caption = useId()
  const layout = axisLayout(content, width, writeValue)
  const [figure, height] = useKeptHeight(content.total !== null)
  const drawing = { content, layout, width, writeValue }
  return (
    <figure ref={figure} className="axis-figure" style={{ minHeight: height }}>
      <div ref={frame} className="axis-frame">
        <svg width={width} height={layout.height} role="img" aria-labelledby={caption} className="axis">
          <ToleratedSpan {...drawing} label={spanLabel} />
          <Shares {...drawing} />
          <HeldByCells {...drawing} />
          <Ticks {...drawing} />
          <Target {...drawing} />
          <ShareLabels {...drawing} />
          <Total {...drawing} />
        </svg>
      </div>
      <figcaption id={caption} className="axis-caption">
        {sentences.map((sentence) => (
          <span key={sentence.text} className={sentence.spokenOnly ? 'unseen' : undefined}>
            {sentence.text}{' '}
          </span>
        ))}
      </figcaption>
    </figure>
  )
}

/** While there is nothing to draw the figure keeps the height it had, so that the cell being typed in stays put. */
function useKeptHeight(isDrawn: boolean) {
  const figure = useRef<HTMLElement>(null)
  const [height, setHeight] = useState(0)
  useLayoutEffect(() => {
    if (!isDrawn || !figure.current) return undefined
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setHeight(entry.contentRect.height)
    })
    observer.observe(figure.current)
    return () => observer.disconnect()
  }, [isDrawn])
  return [figure, isDrawn ? 0 : height] as const
}
