import { saturationOf } from '../../chemistry/saturation.ts'
import type { Library } from '../../library/library.ts'
import type { IntrinsicSolubility, Solid } from '../../library/solids.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'

const tenth = (value: number) => Math.round(value * 10) / 10

/** Below saturation by less than this is worth a note; in powers of ten. */
const near = 0.3
/** A border of pH closer than this is worth a note. */
const nearPH = 0.5

/**
 * Solids that the solution is or is nearly saturated with at 25 °C, one remark for those of the same ions. Absence of a
 * remark is no word of safety.
 */
export function saturationRemarks({ plan, state, read }: RemarkContext): Finding[] {
  if (!state || state.states['25'].pH === null) return []
  const { library } = plan
  const groups = new Map<string, { solid: Solid; index: number }[]>()
  for (const solid of library.solids) {
    const saturation = saturationOf(solid, state.states['25'])
    if (!saturation || saturation.index <= -near) continue
    const kind = componentsOf(solid, library).toSorted().join(' ')
    groups.set(kind, [...(groups.get(kind) ?? []), { solid, index: saturation.index }])
  }
  return [...groups.values()].map((group) => {
    const above = group.filter(({ index }) => index > 0)
    const told = above.length > 0 ? above : group
    const ions = new Set(told.flatMap(({ solid }) => componentsOf(solid, library)))
    const bringing = read.filter(({ ingredient }) =>
      (ingredient.releases ?? []).some(({ species }) => ions.has(componentOf(species, library))),
    )
    const most = Math.max(...told.map(({ index }) => index))
    return findingOf(library, above.length > 0 ? 'solid-supersaturated' : 'solid-near-saturation', {
      values: {
        solid: told.map(({ solid }) => `${solid.name} (${solid.formula})`).join(', '),
        ...(above.length > 0 ? { index: tenth(most) } : { below: tenth(-most) }),
      },
      ingredients: bringing.map(({ ingredient }) => ingredient.id),
      lineKeys: bringing.map(({ key }) => key),
    })
  })
}

const componentOf = (species: string, library: Library): string =>
  library.species.get(species)?.component ?? species

const componentsOf = ({ ions }: Solid, library: Library): readonly string[] =>
  ions.map(({ species }) => componentOf(species, library))

/** Weak acids and bases whose uncharged form water may not hold at this pH. */
export function freeFormRemarks(context: RemarkContext): Finding[] {
  const { plan, solution } = context
  const { pH } = solution
  if (pH === null) return []
  return plan.library.intrinsicSolubilities.flatMap((entry) => {
    const found = amountOf(entry, context)
    if (!found || found.molPerLitre === 0) return []
    const soluble = entry.gramsPerLitre.value / entry.molarMass.value
    const excess = found.molPerLitre / soluble - 1
    if (excess <= 0) return []
    const isBase = entry.kind === 'base'
    const border = isBase ? found.pKa - Math.log10(excess) : found.pKa + Math.log10(excess)
    const beyond = isBase ? pH - border : border - pH
    if (beyond < -nearPH) return []
    const share = 1 / (1 + 10 ** (isBase ? found.pKa - pH : pH - found.pKa))
    const values = {
      name: entry.name,
      border: tenth(border),
      side: isBase ? 'below' : 'above',
      uncharged: found.molPerLitre * share * entry.molarMass.value * 1000,
      solubility: entry.gramsPerLitre.value * 1000,
    }
    return [
      findingOf(plan.library, beyond > 0 ? 'free-form-above-solubility' : 'free-form-near-solubility', {
        values,
        ingredients: found.ingredients,
        lineKeys: found.keys,
      }),
    ]
  })
}

interface Found {
  readonly molPerLitre: number
  readonly pKa: number
  readonly ingredients: readonly string[]
  readonly keys: readonly string[]
}

/** What the lines bring of an acid or base in all its forms, with its pKa at 25 °C and zero ionic strength. */
function amountOf({ ions }: IntrinsicSolubility, { plan, lines }: RemarkContext): Found | null {
  const { library, setting } = plan
  let pKa: number | null = null
  let millimoles = 0
  const bringing = lines.filter((line) => {
    const { ingredient } = line
    const released = (ingredient.releases ?? []).filter(({ species }) => ions.includes(species))
    if (released.length === 0 || line.millimoles === null) return false
    millimoles += line.millimoles * released.reduce((sum, { count }) => sum + count, 0)
    const family = library.equilibria.acids.find(({ species }) => species.some((id) => ions.includes(id)))
    pKa ??= ingredient.ownIonisation?.[0]?.pKa.value ?? family?.steps[0]?.pKa.value ?? null
    return true
  })
  if (pKa === null) return null
  return {
    molPerLitre: millimoles / setting.volumeMl,
    pKa,
    ingredients: bringing.map(({ ingredient }) => ingredient.id),
    keys: bringing.map(({ key }) => key),
  }
}
