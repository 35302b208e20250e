import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { nameOf } from './names.ts'
import { vehicleOf } from './order.ts'
import { eyeRoutes, routeNames, veinRoutes } from './routes.ts'
import { decimalText, numberText, volumeText, wholeText } from './say.ts'
import { dissolved, inactiveLines, strengthLines, strengthText } from './strength.ts'
import type { SheetSection } from './types.ts'

/** Label text for one container, in safe expression. What only the bench or policy knows is a blank. */
export function labelSection(evaluation: Evaluation): SheetSection {
  const { formula, volumeMl } = evaluation
  const lines = volumeMl === null ? [] : labelLines(evaluation, volumeMl)
  return { kind: 'label', heading: 'Label of one container', name: formula.title || 'Name: ____', lines }
}

function labelLines(evaluation: Evaluation, volumeMl: number): readonly string[] {
  const { formula } = evaluation
  const route = routeNames[formula.route]
  return [
    ...strengthLines(evaluation).map((line) => strengthText(line, volumeMl)),
    `${route.charAt(0).toUpperCase()}${route.slice(1)}. ${volumeText(volumeMl)}.`,
    preservativeText(evaluation),
    ...otherIngredients(evaluation),
    ...tonicity(evaluation),
    ...electrolytes(evaluation, volumeMl),
    'Single-dose or multiple-dose: ____   Opened: ____',
    'Storage: ____',
    `Lot: ${formula.order?.lot ?? '____'}   Prepared: ____   Discard after: ____ (date and time)`,
    `For: ${formula.order?.preparedFor ?? '____'}`,
    'Warnings: ____   (shake well, protect from light, irrigation only, fatal by other routes: as it applies)',
    'This is a compounded drug (or local words). Facility and telephone: ____',
  ]
}

const listed = (lines: readonly LineAnswer[]) => lines.map(nameOf).join(', ')

function preservativeText(evaluation: Evaluation): string {
  const preservatives = dissolved(evaluation).filter(({ ingredient }) =>
    ingredient.roles.some((role) => role === 'preservative'),
  )
  return preservatives.length > 0 ? `Preserved with ${listed(preservatives)}.` : 'No preservative.'
}

/** All of them for the eye; elsewhere those that allergy or dose limits ask for are a choice of the pharmacist. */
function otherIngredients(evaluation: Evaluation): readonly string[] {
  const others = inactiveLines(evaluation)
  const names = [...others.map(nameOf), vehicleOf(evaluation)].join(', ')
  return [`Inactive: ${names}.`]
}

function tonicity({ formula, solution }: Evaluation): readonly string[] {
  if (!solution) return []
  const { route } = formula
  const pH = solution.pH
  const asked = eyeRoutes.has(route) && pH !== null && (pH < 6 || pH > 8)
  const osmolarity = solution.labelOsmolarityMilliosmPerL
  if (veinRoutes.has(route)) {
    const vein = route === 'intravenous-central' ? 'central vein' : 'peripheral vein'
    const calculated = osmolarity === null ? 'not known' : `${wholeText(osmolarity)} mOsm per L`
    return [`For a ${vein}. Osmolarity, calculated: ${calculated}.   Rate: ____`]
  }
  return [
    `Osmolality about ${wholeText(solution.osmolality.value)} mOsm/kg.`,
    ...(asked ? [`pH about ${decimalText(pH, 1)}.`] : []),
  ]
}

function electrolytes(evaluation: Evaluation, volumeMl: number): readonly string[] {
  if (!veinRoutes.has(evaluation.formula.route) || evaluation.electrolytes.length === 0) return []
  const each = evaluation.electrolytes.map(({ ion, mmolPerMl, mEqPerMl }) => {
    const milliequivalents = mEqPerMl === null ? '' : ` (${numberText(mEqPerMl * volumeMl, 3)} mEq)`
    return `${ion} ${numberText(mmolPerMl * volumeMl, 3)} mmol${milliequivalents}`
  })
  return [`Electrolytes per ${volumeText(volumeMl)}: ${each.join(', ')}.`]
}
