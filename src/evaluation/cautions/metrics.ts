import type { Metric } from '../../library/conditions.ts'
import type { CautionContext } from './context.ts'
import type { Need } from './outcome.ts'
import { asShown, type Shown } from './shown.ts'

interface Reading {
  readonly of: (context: CautionContext) => number | null | undefined
  readonly shown: Shown
  readonly need: Need
}

const whole = { decimals: 0 }
const fourDigits = { significant: 4 }

/**
 * Labels and limits of the trade count the ideal sum, tissue meets the solved figure; the higher of the two that are
 * known is held against a limit.
 */
function osmolarityOf({ solution }: CautionContext): number | null {
  const known = [solution?.osmolarity, solution?.labelOsmolarity].filter((value) => typeof value === 'number')
  return known.length > 0 ? Math.max(...known) : null
}

/** Grams of all lines in 100 mL; null while one of them is not known. */
function totalSolutes({ lines }: CautionContext): number | null {
  let sum = 0
  for (const { ingredient, concentrations } of lines) {
    if (ingredient.tags.includes('vehicle')) continue
    if (concentrations.percentWV === null) return null
    sum += concentrations.percentWV
  }
  return sum
}

const daysPerYear = 365.25

const readings: Readonly<Record<Metric, Reading>> = {
  osmolality: { of: ({ solution }) => solution?.osmolality, shown: whole, need: 'osmolality' },
  'effective-osmolality': {
    of: ({ solution }) => solution?.effectiveOsmolality,
    shown: whole,
    need: 'osmolality',
  },
  osmolarity: { of: osmolarityOf, shown: whole, need: 'osmolarity' },
  'sodium-chloride-equivalent': {
    of: ({ solution }) => solution?.sodiumChlorideEquivalentPercent,
    shown: { decimals: 3 },
    need: 'sodium chloride equivalent',
  },
  /* A pH that was ordered holds while the formula is blocked. */
  pH: {
    of: ({ solution, formula }) => (solution ? solution.pH : formula.pH),
    shown: { decimals: 2 },
    need: 'pH',
  },
  'buffer-capacity': {
    of: ({ solution }) => solution?.bufferCapacity(),
    shown: { significant: 2 },
    need: 'buffer capacity',
  },
  'total-solutes': { of: totalSolutes, shown: fourDigits, need: 'strength' },
  'final-volume': { of: ({ volumeMl }) => volumeMl, shown: fourDigits, need: 'final volume' },
  age: { of: ({ patient }) => patient.ageYears, shown: fourDigits, need: 'age' },
  weight: { of: ({ patient }) => patient.weightKg, shown: fourDigits, need: 'weight' },
  'dose-volume': { of: ({ patient }) => patient.doseVolumeMl, shown: fourDigits, need: 'dose volume' },
  'infusion-rate': {
    of: ({ patient }) => patient.infusionRateMlPerH,
    shown: fourDigits,
    need: 'infusion rate',
  },
}

/** A figure as it is shown, in the unit of the rule; or what is missing for it. */
export function readMetric(context: CautionContext, metric: Metric, unit: string): number | { need: Need } {
  const { of, shown, need } = readings[metric]
  const value = of(context)
  if (value === null || value === undefined) return { need }
  return metric === 'age' && unit === 'days' ? asShown(value * daysPerYear, whole) : asShown(value, shown)
}
