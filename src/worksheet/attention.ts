import { sentence } from './say.ts'
import { tellFinding } from './tell.ts'
import type { Library } from '../library/library.ts'
import type { Evaluation, Finding, Severity } from '../evaluation/types.ts'
import type { SheetCaution, SheetSection } from './types.ts'

const order: Readonly<Record<Severity, number>> = { stop: 0, warn: 1, note: 2 }

/** Stops and warnings, stops first, each with what to do; in full with where it comes from. */
export function attentionSection(
  evaluation: Evaluation,
  library: Library,
  length: 'short' | 'full',
): SheetSection {
  const cautions = evaluation.findings
    .filter(({ severity }) => severity !== 'note')
    .toSorted((first, second) => order[first.severity] - order[second.severity])
    .map((finding) => told(finding, evaluation, library))
    .map((caution) => (length === 'short' ? { ...caution, source: '' } : caution))
  return { kind: 'cautions', heading: 'What to watch', cautions }
}

/** Where the stops and warnings come from. */
export function sourceSection(evaluation: Evaluation, library: Library): SheetSection | null {
  const serious = evaluation.findings.filter(({ severity }) => severity !== 'note')
  if (serious.length === 0) return null
  return {
    kind: 'arithmetic',
    heading: 'Sources of what to watch',
    lines: serious.map((finding) => {
      const { text: said, source } = told(finding, evaluation, library)
      return `${said} (${source})`
    }),
  }
}

/** Remarks that stop nobody, in small print behind the work. */
export function noteSection(evaluation: Evaluation, library: Library): SheetSection | null {
  const notes = evaluation.findings.filter(({ severity }) => severity === 'note')
  if (notes.length === 0) return null
  return {
    kind: 'arithmetic',
    heading: 'Notes',
    lines: notes.map((finding) => {
      const { text: said, wayOut, source } = told(finding, evaluation, library)
      return `${said} ${wayOut} (${source})`
    }),
  }
}

function told(finding: Finding, evaluation: Evaluation, library: Library): SheetCaution {
  const { message, wayOut } = tellFinding(finding, library)
  return {
    severity: finding.severity,
    code: finding.code,
    text: sentence(message),
    wayOut: sentence(wayOut),
    source: sourceOf(finding, library),
    acceptedBecause: acceptance(finding, evaluation),
  }
}

function sourceOf(finding: Finding, library: Library): string {
  const source = library.sources.get(finding.source)
  const title = source?.title ?? finding.source
  return finding.evidence ? `${title}; evidence: ${finding.evidence}` : title
}

const acceptance = (finding: Finding, { formula }: Evaluation): string | null =>
  formula.acknowledgements?.find(({ code }) => code === finding.code)?.reason ?? null

/** Why the sheet may not be printed: blocked, or a stop that nobody accepted in writing. */
export function shutReasons(evaluation: Evaluation, library: Library): readonly string[] {
  const open = evaluation.findings.filter(
    (finding) => finding.blocks || (finding.severity === 'stop' && acceptance(finding, evaluation) === null),
  )
  const reasons = open.map((finding) => sentence(tellFinding(finding, library).message))
  if (evaluation.status === 'blocked' && reasons.length === 0) return ['The formula is blocked.']
  return [...new Set(reasons)]
}
