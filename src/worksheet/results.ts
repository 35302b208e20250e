import { field, fields } from './sections.ts'
import { decimalText, numberText, percentText, wholeText } from './say.ts'
import type { Evaluation, SolutionAnswer } from '../evaluation/types.ts'
import type { SheetField, SheetSection } from './types.ts'

/** What the finished solution is predicted to be, with the limits for the readings. */
export function resultSection(evaluation: Evaluation): SheetSection {
  const { solution } = evaluation
  if (!solution)
    return fields('What the solution is', [field('No figure is given', 'the formula is blocked')])
  return fields('What the solution is', [
    ...osmotic(evaluation, solution),
    ...acidity(solution),
    ...other(solution),
  ])
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

/** Readings with their limits beside the blanks. */
export function readingSection({ solution }: Evaluation): SheetSection {
  const osmolality = solution
    ? `stop and ask if below ${wholeText(solution.osmolality.low)} or above ${wholeText(solution.osmolality.high)} mOsm/kg`
    : 'no limits: the formula is blocked'
  const pH =
    solution?.pH === undefined || solution.pH === null
      ? 'by monograph or local procedure'
      : `expected ${decimalText(solution.pH, 2)}; limits by monograph or local procedure`
  const reading = (what: string, limit: string) => [
    { text: what },
    { text: limit },
    ...Array.from({ length: 3 }, () => ({ text: '' })),
  ]
  return {
    kind: 'table',
    heading: 'Readings before release',
    columns: [
      { label: 'Test', align: 'start' },
      { label: 'Limit', align: 'start' },
      { label: 'Reading', align: 'start', blank: true },
      { label: 'Passes', align: 'start', blank: true },
      { label: 'Initials', align: 'start', blank: true },
    ],
    rows: [
      reading('Osmolality, mean of three', osmolality),
      reading('pH at ____ °C', pH),
      reading(
        'Clarity and particles, on black and on white',
        'clear, no visible particles, unless the monograph says otherwise',
      ),
      reading('Filter integrity, where filtered', 'by the filter maker’s limit'),
      reading('Containers: filled, rejected, kept as samples', 'reconciles with the batch size'),
    ],
  }
}

/** Each ion per mL, per container. */
export function electrolyteSection(evaluation: Evaluation): SheetSection | null {
  const volume = evaluation.volumeMl
  if (evaluation.electrolytes.length === 0 || volume === null) return null
  return {
    kind: 'table',
    heading: 'Electrolytes',
    columns: [
      { label: 'Ion', align: 'start' },
      { label: 'mmol per mL', align: 'end' },
      { label: 'mEq per mL', align: 'end' },
      { label: 'mmol per container', align: 'end' },
      { label: 'mEq per container', align: 'end' },
    ],
    rows: evaluation.electrolytes.map(({ ion, mmolPerMl, mEqPerMl }) => [
      { text: ion },
      { text: numberText(mmolPerMl, 3) },
      { text: mEqPerMl === null ? 'count in mmol' : numberText(mEqPerMl, 3) },
      { text: numberText(mmolPerMl * volume, 3) },
      { text: mEqPerMl === null ? 'count in mmol' : numberText(mEqPerMl * volume, 3) },
    ]),
  }
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
