import type { Library } from '../library/library.ts'
import type { FormulaLine } from '../formula/types.ts'
import type {
  AdjusterAnswer,
  Evaluation,
  Finding,
  MethodAnswer,
  SolutionAnswer,
} from '../evaluation/types.ts'
import { methodIds } from '../evaluation/types.ts'
import { groupLines, summed, type LineGroup } from '../evaluation/stocks/group.ts'
import type { StockShare } from '../evaluation/stocks/stock.ts'
import { tellFinding } from './tell.ts'

/* The JSON that the command line prints: the keys of the published contract, and additions after them. */

type Value = number | string | boolean | null | readonly Value[] | { readonly [key: string]: Value }
export type ContractAnswer = Readonly<Record<string, Value>>

/** An evaluation as the contract's JSON; what is missing is null, never a number in its place. */
export function answer(evaluation: Evaluation, library: Library): ContractAnswer {
  return {
    status: evaluation.status,
    solution: solutionAnswer(evaluation.solution),
    methods: methodIds.map((id) => methodAnswer(id, evaluation)),
    lines: evaluation.formula.lines.map((line) => lineAnswer(line, evaluation)),
    findings: evaluation.findings.map((finding) => findingAnswer(finding, library)),
    title: evaluation.formula.title,
    headline: evaluation.status === 'ok' ? evaluation.headline : null,
    adjuster: evaluation.adjuster && adjusterAnswer(evaluation.adjuster),
    electrolytes: evaluation.electrolytes.map(({ ion, mmolPerMl, mEqPerMl }) => ({
      ion,
      mmol_per_mL: mmolPerMl,
      mEq_per_mL: mEqPerMl,
    })),
    uncertainty: evaluation.uncertainty.slice(0, 8).map(({ key, input, osmolalityMilliosmPerKg }) => ({
      ingredient: ingredientOf(key, evaluation),
      input,
      osmolality_mOsm_per_kg: osmolalityMilliosmPerKg,
    })),
    library: evaluation.libraryVersion,
  }
}

const solutionAnswer = (solution: SolutionAnswer | null): Value => ({
  osmolality_mOsm_per_kg: solution?.osmolality.value ?? null,
  osmolality_low_mOsm_per_kg: solution?.osmolality.low ?? null,
  osmolality_high_mOsm_per_kg: solution?.osmolality.high ?? null,
  osmolality_by_temperature: {
    '25': solution?.osmolality25 ?? null,
    '37': solution?.osmolality37 ?? null,
  },
  osmolarity_mOsm_per_L: solution?.osmolarityMilliosmPerL ?? null,
  effective_osmolality_mOsm_per_kg: solution?.effectiveOsmolality.value ?? null,
  freezing_point_depression_K: solution?.freezingPointDepressionK ?? null,
  sodium_chloride_equivalent_percent: solution?.sodiumChlorideEquivalentPercent ?? null,
  osmotic_coefficient: solution?.osmoticCoefficient ?? null,
  water_activity: solution?.waterActivity ?? null,
  label_osmolarity_mOsm_per_L: solution?.labelOsmolarityMilliosmPerL ?? null,
  ionic_strength_mol_per_kg: solution?.ionicStrength ?? null,
  pH: solution?.pH ?? null,
  pH_by_temperature: {
    '5': solution?.pH5 ?? null,
    '25': solution?.pH25 ?? null,
    '37': solution?.pH37 ?? null,
  },
  density_g_per_mL: solution?.densityGPerMl ?? null,
  water_kg_per_L: solution?.waterKgPerL ?? null,
  effective_osmolality_low_mOsm_per_kg: solution?.effectiveOsmolality.low ?? null,
  effective_osmolality_high_mOsm_per_kg: solution?.effectiveOsmolality.high ?? null,
  conventional_freezing_point_depression_K: solution?.conventionalDepressionK ?? null,
  osmotic_pressure_37_kPa: solution?.osmoticPressureKPa37 ?? null,
  red_cell_relative_volume: solution?.redCellRelativeVolume ?? null,
  pH_is_solved: solution?.pHIsSolved ?? null,
})

function methodAnswer(id: MethodAnswer['method'], evaluation: Evaluation): Value {
  const method = evaluation.methods.find((candidate) => candidate.method === id)
  const differsBy = method?.differsBy
  return {
    method: id,
    osmolality_mOsm_per_kg: method?.osmolalityMilliosmPerKg ?? null,
    adjuster_g: method?.adjusterGrams ?? null,
    isotonic_volume_mL: method?.isotonicVolumeMl ?? null,
    differs_by: differsBy
      ? {
          ingredient: ingredientOf(differsBy.key, evaluation),
          osmolality_mOsm_per_kg: differsBy.milliosmPerKg,
          reason: differsBy.reason,
        }
      : null,
    missing: (method?.missing ?? []).map(({ code, key }) => ({
      code,
      ingredient: ingredientOf(key, evaluation),
    })),
  }
}

const ingredientOf = (key: string, { lines }: Evaluation): string | null =>
  lines.find((line) => line.key === key)?.ingredient.id ?? null

/** Every line of the formula in its order; one that could not be read has nothing but its ingredient. */
function lineAnswer({ key, ingredient }: FormulaLine, { lines }: Evaluation): Value {
  const group = groupLines(lines).find((candidate) => candidate.key === key)
  if (group?.stock) return stockAnswer(group, group.stock)
  const line = lines.find((candidate) => candidate.key === key)
  return {
    ingredient: typeof ingredient === 'string' ? ingredient : ingredient.id,
    grams: line?.grams ?? null,
    mmol: line?.millimoles ?? null,
    particles_formal: line?.particlesFormal ?? null,
    particles_counted: line?.particlesCounted ?? null,
    share_of_particles_percent: line?.shareOfParticlesPercent ?? null,
    osmolality_share_mOsm_per_kg: line?.osmolalityShareMilliosmPerKg ?? null,
    grams_exact: line?.gramsExact ?? null,
    article_grams: line?.articleGrams ?? null,
    mL: line?.millilitres ?? null,
    effective_i: line?.effectiveI ?? null,
    effective_osmolality_share_mOsm_per_kg: line?.effectiveOsmolalityShareMilliosmPerKg ?? null,
    ordered_as: line?.ordered?.orderedName ?? null,
    form_factor: line?.ordered?.factor ?? null,
    content_percent: line?.certified ? line.certified.content * 100 : null,
  }
}

/** A line that measures a stock: its totals, and what it brings of each ingredient. */
const stockAnswer = (group: LineGroup, { stock, fills }: StockShare): Value => ({
  ingredient: stock.id,
  grams: summed(group, ({ grams }) => grams),
  mmol: summed(group, ({ millimoles }) => millimoles),
  particles_formal: null,
  particles_counted: null,
  share_of_particles_percent: summed(group, (line) => line.shareOfParticlesPercent),
  osmolality_share_mOsm_per_kg: summed(group, (line) => line.osmolalityShareMilliosmPerKg),
  mL: group.lines[0]?.millilitres ?? null,
  effective_osmolality_share_mOsm_per_kg: summed(group, (line) => line.effectiveOsmolalityShareMilliosmPerKg),
  fills,
  holds: group.lines.map((line) => ({
    ingredient: line.ingredient.id,
    grams: line.grams,
    mmol: line.millimoles,
    osmolality_share_mOsm_per_kg: line.osmolalityShareMilliosmPerKg,
  })),
})

function findingAnswer(finding: Finding, library: Library): Value {
  const { message, wayOut } = tellFinding(finding, library)
  return {
    code: finding.code,
    severity: finding.severity,
    message,
    ingredients: finding.ingredients,
    source: finding.source,
    way_out: wayOut,
    blocks: finding.blocks,
  }
}

const adjusterAnswer = (adjuster: AdjusterAnswer): Value => ({
  status: adjuster.status,
  target: adjuster.target,
  without: adjuster.without,
  largest_fraction_that_fits: adjuster.largestFractionThatFits,
  dilution_to_volume_mL: adjuster.dilutionToVolumeMl,
})
