import type { Worksheet } from '../../src/worksheet/types.ts'

/** A printed text and where it stands. */
export interface Printed {
  readonly at: string
  readonly text: string
}

/* What the sheet is built of and does not show, and where a source is named by its own title. */
const unprinted = new Set(['kind', 'code', 'align', 'severity', 'paper', 'room', 'id', 'key'])

/** Every string of a sheet or of a part of it, wherever it stands. */
export function printedIn(part: unknown, at = ''): readonly Printed[] {
  if (typeof part === 'string') return [{ at, text: part }]
  if (typeof part !== 'object' || part === null) return []
  return Object.entries(part).flatMap(([name, value]) =>
    unprinted.has(name) ? [] : printedIn(value, `${at}/${name}`),
  )
}

/** Every string that the documents show, under the heading that it stands under. */
export const printed = ({ documents, ...head }: Worksheet): readonly Printed[] => [
  ...printedIn(head),
  ...documents.flatMap(({ sections, ...rest }) => [
    ...printedIn(rest, rest.name),
    ...sections.flatMap((section) => printedIn(section, section.heading)),
  ]),
]
