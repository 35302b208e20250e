import { unknownBonds } from './bonds.ts'
import { layOut } from './layout.ts'
import type { Layout } from './layout.ts'
import { backgroundReactions, reactionsAmong, recordsById } from './network.ts'
import type { Reaction } from './network.ts'
import { lnAcidConstant, lnFormationConstant } from './thermal.ts'
import type {
  ActivityCoefficients,
  PHScale,
  SpeciationFailure,
  SpeciationParts,
  SpeciationRemark,
  SpeciationSystem,
} from './types.ts'

/** A system made ready: constants at its temperature, species laid out, activity model compiled. */
export interface Network {
  readonly layout: Layout
  readonly activity: ActivityCoefficients
  readonly debyeHueckelSlope: number
  readonly pHScale: PHScale
  readonly celsius: number
  /** Remarks that hold for every amount. */
  readonly remarks: readonly SpeciationRemark[]
  /** Metal and ligand components whose bond is not known. */
  readonly unknownBonds: readonly { readonly metal: string; readonly ligand: string }[]
}

const impossible = (code: string, values: SpeciationFailure['values']): SpeciationFailure => ({
  status: 'impossible',
  code,
  values,
})

const carbonate = 'carbonate'

/** Holds carbon dioxide at a gas pressure: the component leaves the balances. */
function openToGas(reactions: readonly Reaction[], lnActivity: number): Reaction[] {
  return reactions.map((reaction) => {
    const count = reaction.masters.get(carbonate)
    if (count === undefined) return reaction
    const masters = new Map([...reaction.masters].filter(([component]) => component !== carbonate))
    return { ...reaction, lnK: reaction.lnK + count * lnActivity, masters }
  })
}

/** Charge states of the drugs' own ions, and whether an enthalpy had to be assumed for one. */
function gatherBackground(system: SpeciationSystem, parts: SpeciationParts) {
  const reactions: Reaction[] = []
  const assumed: string[] = []
  for (const ion of [...(system.background ?? [])].toSorted((a, b) => (a.id < b.id ? -1 : 1))) {
    const states = backgroundReactions(ion, parts.equilibria, system.celsius)
    if ('status' in states) return states
    reactions.push(...states.reactions)
    if (states.assumesEnthalpy) assumed.push(ion.id)
  }
  return { reactions, assumed }
}

function gatherReactions(system: SpeciationSystem, parts: SpeciationParts) {
  const components = new Set(system.components)
  components.delete('proton')
  const known = new Set(parts.species.map((record) => record.component))
  const stranger = [...components].find((component) => !known.has(component))
  if (stranger !== undefined) return impossible('species-unknown', { species: stranger })
  const { equilibria } = parts
  let reactions = reactionsAmong(components, parts.species, equilibria, system.celsius)
  const gas = system.carbonDioxide
  if (gas?.kind === 'open' && components.has(carbonate)) {
    const solubility = lnFormationConstant(equilibria.carbonDioxideSolubility, system.celsius)
    reactions = openToGas(reactions, solubility + Math.log(gas.partialPressureAtm))
    components.delete(carbonate)
  }
  const background = gatherBackground(system, parts)
  if ('status' in background) return background
  for (const ion of system.background ?? []) components.add(ion.id)
  return {
    components: [...components].toSorted(),
    reactions: [...reactions, ...background.reactions].toSorted((a, b) =>
      a.record.id < b.record.id ? -1 : 1,
    ),
    assumed: background.assumed,
  }
}

/**
 * Makes a system ready for any amounts at one temperature, or says why it cannot be.
 * Refuses with `temperature-outside-constants`, `species-unknown` or `ionisation-steps-broken`.
 */
export function compileNetwork(
  system: SpeciationSystem,
  parts: SpeciationParts,
): Network | SpeciationFailure {
  const { equilibria } = parts
  if (!(system.celsius >= equilibria.celsiusMin && system.celsius <= equilibria.celsiusMax)) {
    return impossible('temperature-outside-constants', {
      celsius: system.celsius,
      from: equilibria.celsiusMin,
      to: equilibria.celsiusMax,
    })
  }
  const gathered = gatherReactions(system, parts)
  if ('status' in gathered) return gathered
  const { components, reactions, assumed } = gathered
  const records = recordsById(parts.species)
  const adjuster = system.adjuster ?? { acidAnion: 'Cl-', baseCation: 'Na+' }
  const wanted = [...new Set(['Cl-', adjuster.acidAnion, adjuster.baseCation])]
  const present = new Set(reactions.map((reaction) => reaction.record.id))
  const extra = wanted.flatMap((id) => (present.has(id) ? [] : (records.get(id) ?? [])))
  const [hydrogen, hydroxide] = [records.get('H+'), records.get('OH-')]
  const stranger = wanted.find((id) => !records.has(id))
  if (!hydrogen || !hydroxide || stranger !== undefined) {
    return impossible('species-unknown', { species: stranger ?? 'H+' })
  }
  const lnKw = lnAcidConstant(equilibria.water, system.celsius)
  const layout = layOut(components, reactions, { hydrogen, hydroxide, lnKw }, extra, adjuster)
  const isAssumed = assumed.length > 0 && Math.abs(system.celsius - 25) > 1
  return {
    layout,
    activity: parts.activity(layout.species, system.celsius),
    debyeHueckelSlope: parts.debyeHueckelSlope(system.celsius),
    pHScale: system.pHScale ?? 'operational',
    celsius: system.celsius,
    remarks: isAssumed
      ? [{ code: 'ionisation-enthalpy-assumed', values: { ingredients: assumed.join(', ') } }]
      : [],
    unknownBonds: unknownBonds(components, equilibria, parts.species),
  }
}
