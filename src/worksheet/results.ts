import { readVolume } from '../quantity/readMeasure.ts'
import { field, fields, wide } from './sections.ts'
import { decimalText, numberText, percentText, volumeText, wholeText } from './say.ts'
import type { Evaluation, SolutionAnswer } from '../evaluation/types.ts'
import type { SheetField, SheetSection } from './types.ts'

/** What the finished solution is predicted to be; the record of a batch has the short of it. */
export function resultSection(evaluation: Evaluation, length: 'short' | 'full'): SheetSection {
  const { solution } = evaluation
  if (!solution)
    return fields('What the solution is', [field('No figure is given', 'the formula is blocked')])
  if (length === 'short') return fields('What the solution is', shortened(evaluation, solution))
  return fields('What the solution is', [
    ...osmotic(evaluation, solution),
    ...acidity(solution),
    ...other(solution),
  ])
}

function shortened(evaluation: Evaluation, solution: SolutionAnswer): readonly SheetField[] {
  const { osmolality, effectiveOsmolality, labelOsmolarityMilliosmPerL } = solution
  const error = evaluation.weighingPlan?.preparationMilliosmPerKg ?? null
  return [
    wide(
      'Osmolality',
      `${wholeText(osmolality.value)} mOsm/kg (${wholeText(osmolality.low)} to ${wholeText(osmolality.high)}), as a freezing-point osmometer reads it; ${basis[evaluation.headline]}`,
    ),
    field('Effective (held by cells)', `${wholeText(effectiveOsmolality.value)} mOsm/kg`),
    field('Label osmolarity', withUnit(wholeText, labelOsmolarityMilliosmPerL, 'mOsm per L')),
    field('Weighing, filling (standard)', withUnit(digits(2), error, 'mOsm/kg')),
    field('Density', withUnit(digits(4), solution.densityGPerMl, 'g per mL')),
  ]
}

const basis = {
  electrolyte: 'ion-interaction model',
  'sodium-chloride-equivalent': 'sum of sodium chloride equivalents; the model could not be used',
} as const

function osmotic(evaluation: Evaluation, solution: SolutionAnswer): readonly SheetField[] {
  const { osmolality, effectiveOsmolality } = solution
  const label = solution.labelOsmolarityMilliosmPerL
  return [
    field(
      'Osmolality, as a freezing-point osmometer reads it',
      `${wholeText(osmolality.value)} mOsm/kg (${wholeText(osmolality.low)} to ${wholeText(osmolality.high)}); ${basis[evaluation.headline]}`,
    ),
    field('Effective osmolality (held by cells)', `${wholeText(effectiveOsmolality.value)} mOsm/kg`),
    field('Freezing-point depression', `${numberText(solution.freezingPointDepressionK, 3)} K`),
    field('Sodium chloride equivalent', `${numberText(solution.sodiumChlorideEquivalentPercent, 3)} % w/v`),
    field('Label osmolarity (ideal sum)', withUnit(wholeText, label, 'mOsm per L')),
    field('Osmolarity', withUnit(wholeText, solution.osmolarityMilliosmPerL, 'mOsm per L')),
  ]
}

const digits = (significant: number) => (value: number) => numberText(value, significant)
const withUnit = (say: (value: number) => string, value: number | null, unit: string) =>
  value === null ? 'not known' : `${say(value)} ${unit}`

function acidity(solution: SolutionAnswer): readonly SheetField[] {
  if (solution.pH === null) return [field('pH', 'not predicted for this composition')]
  const at = [
    ['5', solution.pH5],
    ['25', solution.pH25],
    ['37', solution.pH37],
  ] as const
  const drift = at.flatMap(([celsius, pH]) => (pH === null ? [] : [`${decimalText(pH, 2)} at ${celsius} °C`]))
  const kind = solution.pHIsSolved ? 'predicted' : 'as ordered'
  return [
    field('pH', `${decimalText(solution.pH, 2)} (${kind})${drift.length > 0 ? `: ${drift.join(', ')}` : ''}`),
  ]
}

function other(solution: SolutionAnswer): readonly SheetField[] {
  return [
    field('Ionic strength', withUnit(digits(3), solution.ionicStrength, 'mol per kg water')),
    field('Density', withUnit(digits(4), solution.densityGPerMl, 'g per mL')),
  ]
}

/** Each ion per mL, per container. */
export function electrolyteSection(evaluation: Evaluation): SheetSection | null {
  const volume = evaluation.volumeMl
  if (evaluation.electrolytes.length === 0 || volume === null) return null
  const doseMl = doseOf(evaluation)
  return {
    kind: 'table',
    heading: 'Electrolytes',
    columns: [
      { label: 'Ion', align: 'start' },
      { label: 'mmol per mL', align: 'end' },
      { label: 'mEq per mL', align: 'end' },
      { label: 'mmol per container', align: 'end' },
      { label: 'mEq per container', align: 'end' },
      ...(doseMl === null
        ? []
        : ([
            { label: `mmol per dose of ${volumeText(doseMl)}`, align: 'end' },
            { label: 'mEq per dose', align: 'end' },
          ] as const)),
    ],
    rows: evaluation.electrolytes.map(({ ion, mmolPerMl, mEqPerMl }) => [
      { text: ion },
      { text: numberText(mmolPerMl, 3) },
      { text: mEqPerMl === null ? 'count in mmol' : numberText(mEqPerMl, 3) },
      { text: numberText(mmolPerMl * volume, 3) },
      { text: mEqPerMl === null ? 'count in mmol' : numberText(mEqPerMl * volume, 3) },
      ...(doseMl === null
        ? []
        : [
            { text: numberText(mmolPerMl * doseMl, 3) },
            { text: mEqPerMl === null ? 'count in mmol' : numberText(mEqPerMl * doseMl, 3) },
          ]),
    ]),
  }
}

/** Volume of one dose, mL, where the order tells it. */
function doseOf({ formula }: Evaluation): number | null {
  const read = formula.patient?.doseVolume === undefined ? null : readVolume(formula.patient.doseVolume)
  return read?.ok ? read.value : null
}

/** Who supplies the particles, and what of it cells can hold. */
export function contributionSection(evaluation: Evaluation): SheetSection | null {
  if (!evaluation.solution) return null
  return {
    kind: 'table',
    heading: 'Where the osmolality comes from',
    columns: [
      { label: 'Ingredient', align: 'start' },
      { label: 'mmol', align: 'end' },
      { label: 'Particles each, formal', align: 'end' },
      { label: 'Particles each, counted', align: 'end' },
      { label: 'Of all particles', align: 'end' },
      { label: 'mOsm/kg', align: 'end' },
      { label: 'held by cells', align: 'end' },
    ],
    rows: evaluation.lines.map((line) => [
      { text: line.ingredient.tallManName ?? line.ingredient.name },
      { text: known(line.millimoles, 4) },
      { text: known(line.particlesFormal, 2) },
      { text: known(line.particlesCounted, 3) },
      {
        text: line.shareOfParticlesPercent === null ? 'not known' : percentText(line.shareOfParticlesPercent),
      },
      { text: known(line.osmolalityShareMilliosmPerKg, 3) },
      { text: known(line.effectiveOsmolalityShareMilliosmPerKg, 3) },
    ]),
  }
}

const known = (value: number | null, significant: number) =>
  value === null ? 'not known' : numberText(value, significant)
