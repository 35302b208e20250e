import { differenceOf, type FieldDifference, type LineDifference } from '../../formula/difference.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import { tellFinding } from '../../worksheet/tell.ts'
import { columnsOf, type Column } from '../sidebyside/columns.ts'
import { resultRows } from '../sidebyside/table.ts'
import { joined } from '../words/join.ts'

/** One thing that is not the same, before and after. */
export interface DifferenceRow {
  readonly key: string
  readonly what: string
  readonly before: string
  readonly after: string
  /** How to read it: "added", "moved from 3 to 1", "the same amount in other words". */
  readonly how: string
}

export interface VersionDifference {
  readonly lines: readonly DifferenceRow[]
  readonly fields: readonly DifferenceRow[]
  readonly results: readonly DifferenceRow[]
  readonly findings: readonly DifferenceRow[]
}

const absent = '—'

/** What has changed from one state of a formula to another, in words. */
export function versionDifference(before: Formula, after: Formula, library: Library): VersionDifference {
  const { lines, fields } = differenceOf(before, after)
  const columns = columnsOf(
    [
      { id: 'before', name: '', formula: before, unreadable: false },
      { id: 'after', name: '', formula: after, unreadable: false },
    ],
    library,
  )
  return {
    lines: lines.map((line, index) => lineRow(line, index, library)),
    fields: fields.map(fieldRow),
    results: changedResults(columns),
    findings: changedFindings(columns, library),
  }
}

function lineRow(line: LineDifference, index: number, library: Library): DifferenceRow {
  const { ingredient, before, after } = line
  const record = typeof ingredient === 'string' ? library.ingredients.get(ingredient) : ingredient
  const what = record ? (record.tallManName ?? record.name) : String(ingredient)
  const amount = (place: LineDifference['before']) =>
    place === null ? absent : place.line.amount.trim() || 'no amount'
  return { key: `${what} ${index}`, what, before: amount(before), after: amount(after), how: howLine(line) }
}

const otherWords = { share: 'its share of the q.s.', cap: 'its largest strength', note: 'its note' } as const

function howLine({ before, after, amount, moved, others }: LineDifference): string {
  if (before === null) return `added as line ${after?.place ?? '?'}`
  if (after === null) return `removed, was line ${before.place}`
  const parts = [
    ...(amount === 'changed' ? ['amount'] : amount === 'rewritten' ? ['the same amount in other words'] : []),
    ...(moved ? [`moved from line ${before.place} to ${after.place}`] : []),
    ...others.map((field) => otherWords[field as keyof typeof otherWords]),
  ]
  return joined(parts)
}

const fieldRow = ({ place, before, after }: FieldDifference): DifferenceRow => ({
  key: place,
  what: place,
  before: before ?? absent,
  after: after ?? absent,
  how: before === null ? 'added' : after === null ? 'removed' : 'changed',
})

const ordered = new Set(['route', 'final volume', 'sized to'])

/** What the calculation says of both; what was ordered is told by the fields. */
const changedResults = (columns: readonly Column[]): readonly DifferenceRow[] =>
  resultRows(columns)
    .filter(({ label }) => !ordered.has(label))
    .flatMap(({ key, label, cells: [before, after] }) => {
      if (!before || !after || (before.text === after.text && before.beneath === after.beneath)) return []
      const written = ({ text, beneath }: typeof before) => (beneath === '' ? text : `${text} (${beneath})`)
      const how = after.mark === 'within' ? 'the intervals overlap' : ''
      return [{ key, what: label, before: written(before), after: written(after), how }]
    })

function changedFindings(columns: readonly Column[], library: Library): readonly DifferenceRow[] {
  const [before, after] = columns.map(({ evaluation, blocked }) => told(evaluation, blocked, library))
  if (!before || !after) return []
  const row = (text: string, was: boolean): DifferenceRow => ({
    key: text,
    what: text,
    before: was ? 'said' : absent,
    after: was ? absent : 'said',
    how: was ? 'no longer' : 'new',
  })
  return [
    ...[...before].filter((text) => !after.has(text)).map((text) => row(text, true)),
    ...[...after].filter((text) => !before.has(text)).map((text) => row(text, false)),
  ]
}

const severityWords = { stop: 'Stop', warn: 'Warn', note: 'Note' } as const

const told = (evaluation: Column['evaluation'], blocked: string | null, library: Library) =>
  new Set([
    ...(blocked === null ? [] : [blocked]),
    ...(evaluation?.findings ?? []).map(
      (finding) => `${severityWords[finding.severity]}: ${tellFinding(finding, library).message}`,
    ),
  ])
