import { useEffect, useMemo } from 'react'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { buildWorksheet } from '../../worksheet/build.ts'
import type { DocumentId, Paper, SheetDocument } from '../../worksheet/types.ts'
import { applyPageRules } from './pageRules.ts'
import { Section } from './Section.tsx'
import './sheet.css'

interface Props {
  readonly evaluation: Evaluation
  readonly library: Library
  readonly paper: Paper
  readonly documents: readonly DocumentId[]
}

/** The documents as they are printed: preview and paper are this one component. */
export function SheetPreview({ evaluation, library, paper, documents }: Props) {
  const sheet = useMemo(
    () => buildWorksheet(evaluation, library, paper, documents),
    [evaluation, library, paper, documents],
  )
  useEffect(() => applyPageRules(sheet.paper, sheet.documents), [sheet])
  return sheet.documents.map((one) => (
    <OnPaper
      key={one.id}
      document={one}
      title={sheet.title}
      paper={sheet.paper}
      shutBecause={sheet.shutBecause}
    />
  ))
}

interface PaperProps {
  readonly document: SheetDocument
  readonly title: string
  readonly paper: Paper
  readonly shutBecause: readonly string[]
}

const OnPaper = ({ document: one, title, paper, shutBecause }: PaperProps) => (
  <article
    className="paper-sheet"
    data-paper={paper}
    data-document={one.id}
    aria-label={`${one.name}: ${title}`}
  >
    <header className="paper-head">
      <h3>{title}</h3>
      <p>
        <strong>{one.name}</strong> {one.purpose}
      </p>
    </header>
    {shutBecause.length > 0 && (
      <div className="paper-shut" role="note">
        <strong>STOP. Do not prepare from this sheet.</strong>
        <ul>
          {shutBecause.map((reason) => (
            <li key={reason}>{reason}</li>
          ))}
        </ul>
      </div>
    )}
    {one.sections.map((section) => (
      <Section key={section.heading} section={section} />
    ))}
    <p className="paper-mark">{one.pageMark}</p>
  </article>
)
