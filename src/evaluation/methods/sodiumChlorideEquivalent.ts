import {
  percentOf,
  type AdditiveMethod,
  type Contribution,
  type MethodContext,
  type MethodLine,
} from './common.ts'
import { equivalentAt, isFromMemory, type EquivalentReading } from './equivalentAt.ts'
import { datumFigure, figure } from './figures.ts'
import type { Figure } from '../types.ts'

/**
 * Σ c·E: every solute counts as so much sodium chloride, E read at its own concentration in the solution. The
 * osmolality is that of the sodium chloride solution of the summed strength.
 */
export const sodiumChlorideEquivalentMethod: AdditiveMethod = {
  id: 'sodium-chloride-equivalent',
  unit: '% w/v NaCl',
  sumName: 'sodium chloride equivalent',
  contribution,
  osmolality: (sum, { scale }) => scale.osmolalityOf(sum),
  closing: (sum, { scale }) => [
    {
      key: 'osmolality',
      rule: 'osmolality of sodium chloride of that strength, at freezing',
      inputs: [figure('NaCl', sum, '% w/v')],
      result: figure('osmolality', scale.osmolalityOf(sum), 'mOsm/kg'),
    },
  ],
  targetOnScale: (target, { scale, conventions }) => {
    if (target.quantity === 'osmolality') return scale.percentOf(target.value)
    if (target.quantity === 'sodium-chloride-equivalent') return target.value
    return (
      (target.value / conventions.isotonicDepressionKelvin.value) *
      conventions.isotonicSodiumChloridePercent.value
    )
  },
  isotonic: ({ conventions }) => conventions.isotonicSodiumChloridePercent.value,
}

function contribution(line: MethodLine, context: MethodContext): Contribution {
  const percent = percentOf(line, context)
  const reading = equivalentAt(line.ingredient.sodiumChlorideEquivalents, percent)
  if (!reading) return { status: 'missing', code: 'missing-equivalent' }
  return {
    status: 'known',
    value: percent * reading.e,
    reason: reading.side === 'above' ? 'differs-equivalent-beyond-table' : 'differs-equivalent',
    outsideTable: isFarOutside(reading, percent, context),
    fromMemory: isFromMemory(reading),
    step: {
      key: line.key,
      subject: line.ingredient.name,
      rule: 'c·E',
      inputs: [figure('c', percent, '% w/v'), equivalentFigure(reading)],
      result: figure('NaCl', percent * reading.e, '% w/v'),
    },
  }
}

/** An equivalent that was read from the end of its table for a much stronger solution. */
function isFarOutside(reading: EquivalentReading, percent: number, { conventions }: MethodContext): boolean {
  const [nearest] = reading.from
  if (reading.side !== 'above' || !nearest || nearest.e.uncertainty === 0) return false
  return percent > nearest.atPercent * (1 + conventions.nearReadingFraction.value)
}

function equivalentFigure(reading: EquivalentReading): Figure {
  const [first, second] = reading.from
  if (!first) return figure('E', reading.e, 'g NaCl/g')
  const at = second ? `between ${first.atPercent} and ${second.atPercent} %` : `at ${first.atPercent} %`
  const figureOfFirst = datumFigure(`E (${at})`, first.e)
  return { ...figureOfFirst, value: reading.e, fromMemory: isFromMemory(reading) }
}
