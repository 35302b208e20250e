import type { SolutionState, SoluteShare } from '../../chemistry/types.ts'
import type { Lowered, ReadLine } from '../lowering.ts'
import { formalParticles } from '../methods/vantHoff.ts'
import { reflectionOf } from '../model.ts'
import type { LineAnswer } from '../types.ts'

/** A line with its masses; the osmotic part is empty until a solution is solved. */
export function bareLine(line: ReadLine, lowered: Lowered | undefined): LineAnswer {
  const { ingredient } = line
  const grams = lowered?.grams ?? null
  const molarMass = ingredient.molarMass?.value
  return {
    key: line.key,
    ingredient,
    amount: line.amount,
    isAdjuster: line.part === 'adjuster',
    gramsExact: lowered?.gramsExact ?? null,
    grams,
    articleGrams: lowered?.articleGrams ?? null,
    millilitres: lowered?.millilitres ?? null,
    millimoles: grams === null || molarMass === undefined ? null : (grams / molarMass) * 1000,
    particlesFormal: formalParticles(ingredient),
    particlesCounted: null,
    effectiveI: null,
    shareOfParticlesPercent: null,
    shareFormalPercent: null,
    osmolalityShareMilliosmPerKg: null,
    effectiveOsmolalityShareMilliosmPerKg: null,
    belowLeastWeighable: lowered?.belowLeastWeighable ?? false,
    ...(line.stock ? { stock: line.stock } : {}),
    ...(line.ordered ? { ordered: line.ordered } : {}),
    ...(line.certified ? { certified: line.certified } : {}),
  }
}

/**
 * Fills in what each solute does in the solved solution. Shares of the reading sum to it; a share of the formal
 * count is taken of formal counts, or of the apparent one where a solute has no formula.
 */
export function withShares(
  lines: readonly LineAnswer[],
  state: SolutionState,
  readingMilliosmPerKg: number,
): readonly LineAnswer[] {
  const shares = new Map(state.shares.map((share) => [share.key, share]))
  const counted = sum(state.shares, countedOf)
  const formal = sum(
    state.shares,
    (share) => share.molality * (share.particlesFormal ?? share.particlesCounted),
  )
  const osmoles = sum(state.shares, ({ osmolalityOsmPerKg }) => osmolalityOsmPerKg)
  return lines.map((line) => {
    const share = shares.get(line.key)
    if (!share) return line.grams === 0 ? { ...line, ...nothing } : line
    const part = (share.osmolalityOsmPerKg / osmoles) * readingMilliosmPerKg
    return {
      ...line,
      particlesFormal: share.particlesFormal,
      // Without a molar mass the count would be per gram, which nobody reads as particles.
      particlesCounted: line.ingredient.molarMass ? share.particlesCounted : null,
      effectiveI: line.ingredient.molarMass ? share.effectiveI : null,
      shareOfParticlesPercent: (countedOf(share) / counted) * 100,
      shareFormalPercent:
        share.particlesFormal === null ? null : ((share.molality * share.particlesFormal) / formal) * 100,
      osmolalityShareMilliosmPerKg: part,
      effectiveOsmolalityShareMilliosmPerKg: part * reflectionOf(share),
    }
  })
}

/* Sized to nothing: the line is there and does nothing. */
const nothing = {
  shareOfParticlesPercent: 0,
  osmolalityShareMilliosmPerKg: 0,
  effectiveOsmolalityShareMilliosmPerKg: 0,
}

const countedOf = ({ molality, particlesCounted }: SoluteShare) => molality * particlesCounted

const sum = (shares: readonly SoluteShare[], of: (share: SoluteShare) => number) =>
  shares.reduce((total, share) => total + of(share), 0)
