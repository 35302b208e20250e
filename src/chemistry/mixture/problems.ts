import { loadEstimates } from '../../library/estimates.ts'
import type { Speciated } from '../speciation/types.ts'
import type { ChemistryProblem } from '../types.ts'
import type { Water } from '../water/water.ts'
import { unknownAcidity } from './acidity.ts'
import type { Solute } from './solutes.ts'
import type { ReadySystem } from './system.ts'
import type { Mixture } from './thermal.ts'

/** A pair is worth a word when it carries at least this part of all pairs. */
const noticeable = 0.05

/** Everything about the answer that makes it less sure, by name. */
export function problemsOf(
  solutes: readonly Solute[],
  mixture: Mixture,
  system: ReadySystem,
  water: Water,
  implied: Speciated | null,
  pHKnown: boolean,
): readonly ChemistryProblem[] {
  return [
    ...mixture.speciated.remarks.map((remark) => problem(remark.code, remark.values, [])),
    ...impliedProblem(implied),
    ...(pHKnown ? [] : [problem('ph-not-predictable', {}, unknownAcidity(solutes))]),
    ...solutes.flatMap(curveProblem),
    ...pairProblems(mixture, system, solutes),
    ...volumeProblem(solutes, water),
  ]
}

const problem = (
  code: string,
  values: ChemistryProblem['values'],
  about: readonly Solute[],
): ChemistryProblem => ({
  code,
  values:
    about.length > 0
      ? { ...values, ingredient: about.map(({ ingredient }) => ingredient.name).join(', ') }
      : values,
  keys: about.map(({ key }) => key),
  fatal: false,
})

function impliedProblem(implied: Speciated | null): readonly ChemistryProblem[] {
  if (!implied) return []
  const { impliedAcidMolPerKg: acid, impliedBaseMolPerKg: base } = implied
  const amount = Math.max(acid, base) * 1000
  // A tenth of a millimole is what carbon dioxide of the air does to a pH.
  if (amount < 0.1) return []
  const [kind, counterIon] = acid > base ? ['acid', 'chloride'] : ['base', 'sodium']
  return [
    problem(
      'implied-ph-adjuster',
      { millimolesPerKg: Number(amount.toPrecision(3)), kind: kind ?? '', counterIon: counterIon ?? '' },
      [],
    ),
  ]
}

function curveProblem(solute: Solute): readonly ChemistryProblem[] {
  if (solute.kind !== 'table') return []
  if (solute.basis === 'class-estimate') return [problem('class-estimate-used', {}, [solute])]
  if (solute.basis === 'bounded') return [problem('osmotic-effect-bounded', {}, [solute])]
  const last = solute.table.points.at(-1)
  return last && Math.log(solute.molality) > last.ln + 0.7 ? [problem('table-left', {}, [solute])] : []
}

const pairCodes = {
  missing: 'missing-interaction-pair',
  'beyond-range': 'beyond-molality-range',
  'low-quality': 'low-quality-pair',
  'stand-in': 'stand-in-pair',
} as const

function pairProblems(
  { pool }: Mixture,
  { activity }: ReadySystem,
  solutes: readonly Solute[],
): readonly ChemistryProblem[] {
  if (!pool.isPresent || solutes.every(({ kind }) => kind !== 'pool')) return []
  return activity
    .remarks(pool.molalities)
    .filter(({ weight }) => weight >= noticeable)
    .map(({ cation, anion, kind, maximumMolality }) =>
      problem(pairCodes[kind], { cation, anion, ...(maximumMolality ? { maximumMolality } : {}) }, []),
    )
}

function volumeProblem(solutes: readonly Solute[], water: Water): readonly ChemistryProblem[] {
  const uncertain = water.relativeUncertainty - loadEstimates().waterOfVolume.value
  const about = solutes.filter(({ key }) => water.estimatedKeys.includes(key))
  return uncertain > 0.003 && about.length > 0 ? [problem('volume-estimated', {}, about)] : []
}
