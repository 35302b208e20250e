import { electrolyteSection } from '../../worksheet/results.ts'
import type { SheetSection } from '../../worksheet/types.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'

type Table = Extract<SheetSection, { kind: 'table' }>

/** The table of ions as it is printed; null while there is none. */
export const electrolyteTable = viewOf(
  (state) => [currentEvaluation(state)] as const,
  (evaluation): Table | null => {
    const section = evaluation?.status === 'ok' ? electrolyteSection(evaluation) : null
    return section?.kind === 'table' ? section : null
  },
)
