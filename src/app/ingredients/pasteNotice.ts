import { readAmount } from '../../quantity/readAmount.ts'
import type { Library } from '../../library/library.ts'
import { calledExactly } from '../state/search.ts'
import { joined } from '../words/join.ts'
import type { PastedTable } from './pasteLines.ts'

/** What became of a pasted table, in words: how many lines, how many of them in doubt, what was left out. */
export function pasteNotice({ lines, leftOut }: PastedTable, library: Library): string {
  const doubtful = lines.filter(
    ({ name, amount }) => calledExactly(library, name) === null || !readAmount(amount).ok,
  ).length
  const sentences = [`Pasted: ${lines.length === 1 ? '1 line' : `${lines.length} lines`}.`]
  if (doubtful > 0) {
    const [are, stand] = doubtful === 1 ? ['is', 'it stood'] : ['are', 'they stood']
    sentences.push(`${doubtful} ${are} in doubt, kept as ${stand} and marked.`)
  }
  if (leftOut.length > 0) sentences.push(`Left out: ${joined(leftOut)}.`)
  return sentences.join(' ')
}
