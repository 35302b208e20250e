import type { AmountUnit } from '../../library/conditions.ts'
import type { CautionContext, CautionPatient } from './context.ts'
import type { Need } from './outcome.ts'
import { asShown } from './shown.ts'

/** What one millilitre holds, in the units that the rules count in; null where it is not known. */
export interface PerMillilitre {
  readonly milligrams: number | null
  readonly millimoles: number | null
  readonly milliequivalents: number | null
}

/** What is not known and would have to be. */
export interface Missing {
  readonly needs: readonly Need[]
}

type Amount = number | Missing

interface Scale {
  readonly of: keyof PerMillilitre
  /** Units in one milligram, millimole or milliequivalent per mL. */
  readonly factor: number
  /** Further factors that hang on the dose or the patient. */
  readonly times?: (patient: CautionPatient) => Amount
}

const doseVolume = ({ doseVolumeMl }: CautionPatient): Amount => doseVolumeMl ?? { needs: ['dose volume'] }
const hourly = ({ infusionRateMlPerH }: CautionPatient): Amount =>
  infusionRateMlPerH ?? { needs: ['infusion rate'] }

/** mL in a day: a running infusion goes on for 24 h; where only a dose is known it is given at least once. */
function daily(patient: CautionPatient): Amount {
  const { infusionRateMlPerH, doseVolumeMl } = patient
  if (infusionRateMlPerH === undefined) return doseVolume(patient)
  return Math.max(24 * infusionRateMlPerH, doseVolumeMl ?? 0)
}

const perKilogram =
  (volume: (patient: CautionPatient) => Amount) =>
  (patient: CautionPatient): Amount => {
    const millilitres = volume(patient)
    const { weightKg } = patient
    if (typeof millilitres === 'number' && weightKg !== undefined) return millilitres / weightKg
    const ofVolume = typeof millilitres === 'number' ? [] : millilitres.needs
    return { needs: weightKg === undefined ? ['weight', ...ofVolume] : ofVolume }
  }

const scales: Readonly<Record<AmountUnit, Scale>> = {
  '% w/v': { of: 'milligrams', factor: 0.1 },
  'mg/mL': { of: 'milligrams', factor: 1 },
  'mcg/mL': { of: 'milligrams', factor: 1000 },
  'mmol/L': { of: 'millimoles', factor: 1000 },
  'mmol/mL': { of: 'millimoles', factor: 1 },
  'mEq/L': { of: 'milliequivalents', factor: 1000 },
  'mcg per dose': { of: 'milligrams', factor: 1000, times: doseVolume },
  'mg per dose': { of: 'milligrams', factor: 1, times: doseVolume },
  'mg/kg per dose': { of: 'milligrams', factor: 1, times: perKilogram(doseVolume) },
  'mmol per dose': { of: 'millimoles', factor: 1, times: doseVolume },
  'mg/min': { of: 'milligrams', factor: 1 / 60, times: hourly },
  'mmol/h': { of: 'millimoles', factor: 1, times: hourly },
  'mg/day': { of: 'milligrams', factor: 1, times: daily },
  'mmol/day': { of: 'millimoles', factor: 1, times: daily },
  'mg/kg/day': { of: 'milligrams', factor: 1, times: perKilogram(daily) },
  'mcg/kg/day': { of: 'milligrams', factor: 1000, times: perKilogram(daily) },
}

/** An amount in the unit of the rule, rounded as it is shown; or what is missing for it. */
export function amountIn(
  unit: AmountUnit,
  perMillilitre: PerMillilitre,
  { patient }: CautionContext,
): Amount {
  const { of, factor, times = () => 1 } = scales[unit]
  const content = perMillilitre[of]
  if (content === null) return { needs: ['strength'] }
  const multiple = times(patient)
  return typeof multiple === 'number' ? asShown(content * factor * multiple, { significant: 4 }) : multiple
}
