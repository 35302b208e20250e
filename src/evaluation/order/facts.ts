import type { SubstanceFacts } from '../../quantity/resolveAmount.ts'
import type { ReadLine } from '../lowering.ts'
import type { Ingredient } from '../../library/types.ts'

/** What unit arithmetic needs of an ingredient. A millilitre of an article holds its share of the substance. */
export function factsOf(
  ingredient: Ingredient,
  solutionDensityGPerMl?: number,
  { ordered, certified }: Pick<ReadLine, 'ordered' | 'certified'> = {},
): SubstanceFacts {
  const { molarMass, percentBasis, state, density, article, releases } = ingredient
  return {
    molarMass: ordered?.orderedMolarMass ?? molarMass?.value,
    percentBasis,
    isLiquid: state === 'liquid',
    densityGPerMl: article ? article.density.value * article.massFraction.value : density?.value,
    equivalentsPerMole: releases
      ? releases.reduce((sum, { charge, count }) => sum + Math.max(0, charge) * count, 0) /
        (ordered?.unitsPerArticle ?? 1)
      : null,
    solutionDensityGPerMl,
    unitsPerGram: certified?.unitsPerGram,
  }
}
