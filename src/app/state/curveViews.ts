import { acidityCurves } from '../../evaluation/buffers/acidity.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { decimals, significant } from '../words/figures.ts'

export interface AcidityCurvesView {
  readonly titration: readonly { readonly added: number; readonly pH: number; readonly capacity: number }[]
  /** Half width of the titration and the marks on its axis, mmol/L. */
  readonly reach: number
  readonly ticks: number[]
  readonly temperature: readonly { readonly celsius: number; readonly pH: number }[]
  /** pH and, by species, its share in %. */
  readonly species: readonly Readonly<Record<string, number>>[]
  readonly speciesNames: readonly string[]
  readonly titrationText: string
  readonly temperatureText: string
  readonly speciesText: string
}

/** A species that never carries this share of its component is not drawn, %. */
const drawnShare = 2

export function acidityCurvesView(
  evaluation: Evaluation,
  component: string | null,
  library: Library,
): AcidityCurvesView | null {
  const curves = acidityCurves(evaluation, component, library)
  if (!curves) return null
  const titration = curves.titration.map(({ millimolesPerLitre, pH, capacityMolPerLitrePerPH }) => ({
    added: millimolesPerLitre,
    pH,
    capacity: capacityMolPerLitrePerPH * 1000,
  }))
  const reach = Math.max(...titration.map(({ added }) => Math.abs(added)))
  const names = [...new Set(curves.species.flatMap(({ shares }) => Object.keys(shares)))]
  const speciesNames = names.filter((name) =>
    curves.species.some(({ shares }) => (shares[name] ?? 0) * 100 >= drawnShare),
  )
  const species = curves.species.map(({ pH, shares }) => ({
    pH,
    ...Object.fromEntries(speciesNames.map((name) => [name, (shares[name] ?? 0) * 100])),
  }))
  return {
    titration,
    reach,
    ticks: [-reach, -reach / 2, 0, reach / 2, reach],
    temperature: curves.temperature,
    species,
    speciesNames,
    titrationText: titration
      .filter((_, index) => index % 4 === 0)
      .map(({ added, pH }) => `${significant(added, 3)} mmol/L gives pH ${decimals(pH, 2)}`)
      .join('; '),
    temperatureText: curves.temperature
      .map(({ celsius, pH }) => `${celsius} °C: pH ${decimals(pH, 2)}`)
      .join('; '),
    speciesText: curves.species
      .filter((_, index) => index % 8 === 0)
      .map(({ pH, shares }) => {
        const [most] = Object.entries(shares).toSorted(([, a], [, b]) => b - a)
        return `pH ${decimals(pH, 1)}: mostly ${most?.[0] ?? 'nothing'}`
      })
      .join('; '),
  }
}
