import type { Amount, Read } from './amount.ts'
import { accept, refuse } from './refusal.ts'

/** What has to be known of a substance to turn an amount of it into grams and moles. */
export interface SubstanceFacts {
  /** g/mol, with crystal water. */
  readonly molarMass?: number | undefined
  /** What a bare "%" or a ratio means for it. */
  readonly percentBasis: 'w/v' | 'v/v'
  readonly isLiquid: boolean
  /** g/mL of the pure liquid. */
  readonly densityGPerMl?: number | undefined
  /** Total positive charge of one formula unit: CaCl2 2, NaCl 1; null or 0 for a neutral substance. */
  readonly equivalentsPerMole: number | null
  /** Units of biological activity in a gram of the pure substance, from the certificate of the lot. */
  readonly unitsPerGram?: number | undefined
  /** g/mL of the finished solution, which a "% w/w" needs. */
  readonly solutionDensityGPerMl?: number | undefined
}

/** The amount in the whole volume; a part is absent where a fact it needs is absent. */
export interface ResolvedAmount {
  readonly grams?: number
  readonly mmol?: number
  /** Moles per kilogram of water: grams follow when the water is known. */
  readonly molPerKg?: number
  readonly millilitres?: number
}

const needMolarMass = () =>
  refuse(
    'molar-mass-missing',
    'The molar mass of this substance is not known, so moles and equivalents of it cannot be weighed.',
    'Write a mass or a percentage, or give its molar mass.',
  )

function fromGrams(grams: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  const { molarMass, densityGPerMl, isLiquid } = facts
  return accept({
    grams,
    ...(molarMass ? { mmol: (grams / molarMass) * 1000 } : {}),
    ...(isLiquid && densityGPerMl ? { millilitres: grams / densityGPerMl } : {}),
  })
}

function fromMillilitres(millilitres: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (!facts.isLiquid) {
    return refuse(
      'volume-of-a-solid',
      'This substance is a solid and is not measured by volume.',
      'Write a mass or a percentage weight in volume.',
    )
  }
  if (!facts.densityGPerMl) {
    return refuse(
      'density-missing',
      'The density of this liquid is not known, so its volume cannot be turned into a mass.',
      'Write the mass, or give its density in g/mL.',
    )
  }
  const resolved = fromGrams(millilitres * facts.densityGPerMl, facts)
  return resolved.ok ? accept({ ...resolved.value, millilitres }) : resolved
}

function fromMillimoles(mmol: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (!facts.molarMass) return needMolarMass()
  const resolved = fromGrams((mmol * facts.molarMass) / 1000, facts)
  return resolved.ok ? accept({ ...resolved.value, mmol }) : resolved
}

function fromEquivalents(milliequivalents: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (!facts.equivalentsPerMole) {
    return refuse(
      'equivalents-of-a-neutral-solute',
      'This substance carries no charge, so it has no milliequivalents.',
      'Write millimoles or a mass.',
    )
  }
  return fromMillimoles(milliequivalents / facts.equivalentsPerMole, facts)
}

function fromUnits(units: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (!facts.unitsPerGram) {
    return refuse(
      'biological-units',
      'Units of biological activity cannot be turned into a mass without the potency of the lot.',
      'Enter the units per mg of the certificate with the line, or write the mass.',
    )
  }
  return fromGrams(units / facts.unitsPerGram, facts)
}

function fromVolumeFraction(fraction: number, volumeMl: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (fraction > 1) {
    return refuse('more-than-the-whole', 'More than 100 % v/v does not fit.', 'Write at most 100 % v/v.')
  }
  return fromMillilitres(fraction * volumeMl, facts)
}

function fromMassFraction(fraction: number, volumeMl: number, facts: SubstanceFacts): Read<ResolvedAmount> {
  if (fraction > 1) {
    return refuse('more-than-the-whole', 'More than 100 % w/w does not fit.', 'Write at most 100 % w/w.')
  }
  if (!facts.solutionDensityGPerMl) {
    return refuse(
      'solution-density-missing',
      'A mass per mass needs the density of the finished solution.',
      'Write a percentage weight in volume (% w/v) or a mass.',
    )
  }
  return fromGrams(fraction * volumeMl * facts.solutionDensityGPerMl, facts)
}

/**
 * Turns an amount into grams, millimoles and millilitres in the whole volume: unit arithmetic and nothing else.
 * g = mmol · M / 1000; mmol = mEq / (positive charge per formula unit); g = mL · density. Refusals:
 * quantity-sufficient-without-size, volume-missing, molar-mass-missing, volume-of-a-solid, density-missing,
 * equivalents-of-a-neutral-solute, biological-units, more-than-the-whole, solution-density-missing.
 * @example resolveAmount({ kind: 'equivalents', value: 20, text: '20 mEq' }, calciumChlorideDihydrate, 1000) → { ok: true, value: { grams: 1.47014, mmol: 10 } }
 */
export function resolveAmount(amount: Amount, facts: SubstanceFacts, volumeMl: number): Read<ResolvedAmount> {
  if (!Number.isFinite(volumeMl) || volumeMl <= 0) {
    return refuse(
      'volume-missing',
      'The final volume is not known.',
      'Write the final volume, such as 100 mL.',
    )
  }
  const { value } = amount
  const isByVolume = facts.percentBasis === 'v/v'
  const byBasis = (fraction: number) =>
    isByVolume ? fromVolumeFraction(fraction, volumeMl, facts) : fromGrams(fraction * volumeMl, facts)
  switch (amount.kind) {
    case 'quantity-sufficient':
      return refuse(
        'quantity-sufficient-without-size',
        '“q.s.” has no size of its own.',
        'Let it be sized to the target.',
      )
    case 'mass':
      return fromGrams(value, facts)
    case 'volume':
      return fromMillilitres(value, facts)
    case 'moles':
      return fromMillimoles(value, facts)
    case 'equivalents':
      return fromEquivalents(value, facts)
    case 'mass-per-volume':
      return fromGrams(value * volumeMl, facts)
    case 'volume-per-volume':
      return fromVolumeFraction(value, volumeMl, facts)
    case 'mass-per-mass':
      return fromMassFraction(value, volumeMl, facts)
    case 'moles-per-volume':
      return fromMillimoles(value * volumeMl, facts)
    case 'equivalents-per-volume':
      return fromEquivalents(value * volumeMl, facts)
    case 'moles-per-water-mass':
      return facts.molarMass ? accept({ molPerKg: value }) : needMolarMass()
    case 'units':
      return fromUnits(value, facts)
    case 'units-per-volume':
      return fromUnits(value * volumeMl, facts)
    case 'percent':
      return byBasis(value / 100)
    case 'ratio':
      return byBasis(value)
  }
}
