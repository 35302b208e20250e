import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { nameOf } from './names.ts'
import { massText, numberText, volumeText, wholeText } from './say.ts'
import { blankCells, box, cell, figures, words } from './sections.ts'
import { dissolved } from './strength.ts'
import type { SheetSection } from './types.ts'

/** What a second person works out without seeing the first result. */
export interface Check {
  readonly question: string
  readonly answer: string
}

/** The questions of the checker's page with the answers that stand in the record of the batch. */
export function checksOf(evaluation: Evaluation): readonly Check[] {
  const { batchVolumeMl, batchFactor, solution } = evaluation
  const masses = dissolved(evaluation).flatMap((line) => massCheck(line, batchFactor))
  return [
    ...(batchVolumeMl === null
      ? []
      : [{ question: 'Volume of the batch', answer: volumeText(batchVolumeMl) }]),
    ...masses,
    ...aliquotChecks(evaluation),
    ...equivalentChecks(evaluation),
    ...(solution
      ? [
          {
            question: 'Osmolality by your own method, held against the interval of the record',
            answer: `${wholeText(solution.osmolality.value)} mOsm/kg (${wholeText(solution.osmolality.low)} to ${wholeText(solution.osmolality.high)})`,
          },
        ]
      : []),
  ]
}

/** The adjuster follows from the target: it is asked by the method that is worked by hand. */
function massCheck(line: LineAnswer, factor: number): readonly Check[] {
  if (line.gramsExact === null || line.isAdjuster) return []
  const question = `${nameOf(line)} in the batch, before rounding`
  if (line.millilitres !== null && !line.stock)
    return [{ question, answer: volumeText(line.millilitres * factor, 5) }]
  return [{ question, answer: massText(line.gramsExact * factor, 5) }]
}

const aliquotChecks = ({ aliquots, lines }: Evaluation): readonly Check[] =>
  aliquots.flatMap(({ key, plan }) => {
    const line = lines.find((candidate) => candidate.key === key)
    if (!plan || !line) return []
    const steps = plan.steps.map(({ flaskMl, drawMl }) => `${volumeText(drawMl)} of ${volumeText(flaskMl)}`)
    return [
      {
        question: `${nameOf(line)} to weigh so that ${steps.join(', then ')} hold what the batch needs`,
        answer: massText(plan.weighGrams, 5),
      },
    ]
  })

/** The second route: the textbook sum, which a hand can repeat. */
function equivalentChecks({ methods, lines, batchFactor }: Evaluation): readonly Check[] {
  const method = methods.find(({ method: id }) => id === 'sodium-chloride-equivalent')
  if (!method) return []
  const adjuster = lines.find(({ isAdjuster }) => isAdjuster)
  if (!adjuster) {
    const sum = method.trace.find(({ key }) => key === 'sum')?.result.value ?? null
    if (sum === null) return []
    return [{ question: 'Sum of the sodium chloride equivalents', answer: `${numberText(sum, 3)} % w/v` }]
  }
  const checks: Check[] = []
  if (method.isotonicVolumeMl !== null) {
    checks.push({
      question: 'Volume that the rest of one container makes isotonic, by sodium chloride equivalents',
      answer: volumeText(method.isotonicVolumeMl, 3),
    })
  }
  if (method.adjusterGrams !== null) {
    checks.push({
      question: `${nameOf(adjuster)} for the batch, by sodium chloride equivalents`,
      answer: massText(method.adjusterGrams * batchFactor, 4),
    })
  }
  return checks
}

/** In the record of the batch: both answers beside each other. */
export const checkedSection = (evaluation: Evaluation): SheetSection => ({
  kind: 'table',
  heading: 'Answers to the checker’s page',
  columns: [words('Worked out again'), figures('Answer'), box('Checker’s result', 'much'), box('Agrees')],
  rows: checksOf(evaluation).map(({ question, answer }) => [cell(question), cell(answer), ...blankCells(2)]),
  note: 'The checker works from the checker’s page alone and compares here. Where they do not agree: stop and ask.',
})

/** On the checker's page: the questions alone. */
export const questionSection = (evaluation: Evaluation): SheetSection => ({
  kind: 'table',
  heading: 'To be worked out without the record of the batch',
  columns: [words('Question'), box('Working', 'much'), box('Result with unit', 'much')],
  rows: checksOf(evaluation).map(({ question }) => [cell(question), ...blankCells(2)]),
})
