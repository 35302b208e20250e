import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { aliquotSection } from '../aliquots.ts'
import { attentionSection } from '../attention.ts'
import { checkedSection } from '../checks.ts'
import { orderSection } from '../order.ts'
import { readingSection } from '../readings.ts'
import { recordSection, signOffSection } from '../record.ts'
import { electrolyteSection, resultSection } from '../results.ts'
import { veinRoutes } from '../routes.ts'
import { present } from '../sections.ts'
import { beyondUseSection, verificationSection } from '../standing.ts'
import { stepSection } from '../steps.ts'
import type { SheetSection } from '../types.ts'
import { weighingTable } from '../weighings.ts'

/** The compounding record: this batch, from the order to the release. */
export const batchRecord = (evaluation: Evaluation, library: Library): readonly SheetSection[] =>
  present(
    orderSection(evaluation),
    attentionSection(evaluation, library, 'short'),
    weighingTable(evaluation),
    aliquotSection(evaluation),
    stepSection(evaluation, library, true),
    resultSection(evaluation, 'short'),
    readingSection(evaluation, library, 'record'),
    veinRoutes.has(evaluation.formula.route) ? electrolyteSection(evaluation) : null,
    checkedSection(evaluation),
    recordSection(evaluation),
    signOffSection(),
    beyondUseSection(evaluation),
    verificationSection(evaluation),
  )
