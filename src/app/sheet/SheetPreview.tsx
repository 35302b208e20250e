import { useEffect, useMemo } from 'react'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { buildWorksheet } from '../../worksheet/build.ts'
import type { Paper } from '../../worksheet/types.ts'
import { applyPageRules } from './pageRules.ts'
import { Section } from './Section.tsx'
import './sheet.css'

interface Props {
  readonly evaluation: Evaluation
  readonly library: Library
  readonly paper: Paper
}

/** The sheet as it is printed: preview and paper are this one component. */
export function SheetPreview({ evaluation, library, paper }: Props) {
  const sheet = useMemo(() => buildWorksheet(evaluation, library, paper), [evaluation, library, paper])
  useEffect(() => applyPageRules(sheet.paper, sheet.pageMark), [sheet.paper, sheet.pageMark])
  const shut = sheet.shutBecause.length > 0
  return (
    <article className="paper-sheet" data-paper={sheet.paper} aria-label={`Worksheet: ${sheet.title}`}>
      <header className="paper-head">
        <h3>{sheet.title}</h3>
        <p>Compounding worksheet: not a label, not a release</p>
      </header>
      {shut && (
        <div className="paper-shut" role="note">
          <strong>STOP. Do not prepare from this sheet.</strong>
          <ul>
            {sheet.shutBecause.map((reason) => (
              <li key={reason}>{reason}</li>
            ))}
          </ul>
        </div>
      )}
      {sheet.sections.map((section) => (
        <Section key={section.heading} section={section} />
      ))}
      <p className="paper-mark">{sheet.pageMark}</p>
    </article>
  )
}
