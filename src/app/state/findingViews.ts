import type { Evaluation, Finding, Severity } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import type { Source } from '../../library/types.ts'
import { tellFinding } from '../../worksheet/tell.ts'
import { cellId } from './cells.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'

export interface FindingView {
  readonly key: string
  readonly code: string
  readonly severity: Severity
  readonly word: string
  readonly message: string
  readonly wayOut: string
  /** By whose word, and how well founded. */
  readonly standing: string
  /** Recalled: marked as such wherever it is shown. */
  readonly fromMemory: boolean
  readonly blocks: boolean
  readonly lineKeys: readonly string[]
  /** The reason in writing with which a person went past it. */
  readonly accepted: string | null
}

const words: Readonly<Record<Severity, string>> = { stop: 'Stop', warn: 'Warn', note: 'Note' }

export const findingViews = viewOf(
  (state) => [currentEvaluation(state), state.library, state.typing] as const,
  (evaluation, library, typing): readonly FindingView[] =>
    (evaluation?.findings ?? [])
      .filter((finding) => !isUnderTheHand(finding, typing))
      .map((finding, index) => viewOfFinding(finding, index, evaluation, library)),
)

/** An amount that is just being written blocks, but is not held against the writer before the hand has left. */
const isUnderTheHand = ({ blocks, lineKeys }: Finding, typing: string | null) =>
  blocks && lineKeys.some((key) => cellId({ kind: 'amount', key }) === typing)

function viewOfFinding(
  finding: Finding,
  index: number,
  evaluation: Evaluation | null,
  library: Library,
): FindingView {
  const { message, wayOut } = tellFinding(finding, library)
  const source = library.sources.get(finding.source)
  return {
    key: `${finding.code} ${finding.lineKeys.join(' ')} ${index}`,
    code: finding.code,
    severity: finding.severity,
    word: words[finding.severity],
    message,
    wayOut,
    standing: standingOf(source, finding),
    fromMemory: source?.kind === 'from-memory',
    blocks: finding.blocks,
    lineKeys: finding.lineKeys,
    accepted:
      evaluation?.formula.acknowledgements?.find((accepted) => accepted.code === finding.code)?.reason ??
      null,
  }
}

/** What recalls or works out by itself has no title to cite. */
function standingOf(source: Source | undefined, { source: key, evidence }: Finding): string {
  if (source?.kind === 'from-memory') return 'from memory'
  if (source?.kind === 'project') return 'worked out here'
  const title = source?.kind === 'common-practice' ? 'common practice' : (source?.title ?? key)
  return evidence === undefined || evidence === title ? title : `${title}; ${evidence}`
}

/** Findings of one kind told together. */
export interface FindingGroup {
  readonly first: FindingView
  readonly told: readonly { readonly key: string; readonly message: string; readonly wayOut: string }[]
}

const gravity: readonly Severity[] = ['stop', 'warn', 'note']

export const findingGroups = viewOf(
  (state) => [findingViews(state)] as const,
  (views): readonly FindingGroup[] => {
    const byCode = new Map<string, readonly FindingView[]>()
    for (const view of views) {
      const kind = `${view.severity} ${view.code}`
      byCode.set(kind, [...(byCode.get(kind) ?? []), view])
    }
    return [...byCode.values()]
      .flatMap((told) => (told[0] ? [{ first: told[0], told }] : []))
      .toSorted((one, other) => gravity.indexOf(one.first.severity) - gravity.indexOf(other.first.severity))
  },
)
