import type { Equilibria } from '../../library/equilibria.ts'
import type { SpeciesRecord } from '../../library/types.ts'
import { lnAcidConstant, lnFormationConstant, lnShift } from './thermal.ts'
import type { BackgroundIon, SpeciationFailure } from './types.ts'

/**
 * One species written as masters + protons + water:
 * a(species) = K · Π a(master)^count · a(H+)^protons · a(water)^waters.
 */
export interface Reaction {
  readonly record: SpeciesRecord
  readonly lnK: number
  readonly protons: number
  readonly waters: number
  /** Components whose master it takes, with the count. */
  readonly masters: ReadonlyMap<string, number>
}

const ln10 = Math.LN10
const indexes = new WeakMap<readonly SpeciesRecord[], ReadonlyMap<string, SpeciesRecord>>()

/** Species by id: made once for each list. */
export function recordsById(species: readonly SpeciesRecord[]): ReadonlyMap<string, SpeciesRecord> {
  const known = indexes.get(species)
  if (known) return known
  const made = new Map(species.map((record) => [record.id, record]))
  indexes.set(species, made)
  return made
}

function familyReactions(
  family: Equilibria['acids'][number],
  records: ReadonlyMap<string, SpeciesRecord>,
  celsius: number,
): Reaction[] {
  const reactions: Reaction[] = []
  const masters = new Map([[family.component, 1]])
  let lnK = 0
  let waters = 0
  for (const [index, id] of family.species.entries()) {
    const step = family.steps[index - 1]
    if (step) {
      lnK += lnAcidConstant(step, celsius)
      waters += step.watersTaken
    }
    const record = records.get(id)
    if (record) reactions.push({ record, lnK, protons: -index, waters, masters })
  }
  return reactions
}

/** A formation in terms of the masters of its parts; null when a part is not there. */
function formationReaction(
  formation: Equilibria['formations'][number],
  record: SpeciesRecord,
  reactions: ReadonlyMap<string, Reaction>,
  celsius: number,
): Reaction | null {
  let lnK = lnFormationConstant(formation, celsius)
  let protons = -formation.protonsReleased
  let waters = -formation.watersReleased
  const masters = new Map<string, number>()
  for (const { species, count } of formation.from) {
    const part = reactions.get(species)
    if (!part) return null
    lnK += count * part.lnK
    protons += count * part.protons
    waters += count * part.waters
    for (const [component, number] of part.masters) {
      masters.set(component, (masters.get(component) ?? 0) + count * number)
    }
  }
  return { record, lnK, protons, waters, masters }
}

/** Every reaction among the given components: single species, acid families, polyborates and complexes. */
export function reactionsAmong(
  components: ReadonlySet<string>,
  species: readonly SpeciesRecord[],
  equilibria: Equilibria,
  celsius: number,
): Reaction[] {
  const records = recordsById(species)
  const found = new Map<string, Reaction>()
  for (const family of equilibria.acids) {
    if (!components.has(family.component)) continue
    for (const reaction of familyReactions(family, records, celsius)) found.set(reaction.record.id, reaction)
  }
  for (const record of species) {
    const isAlone = components.has(record.component) && !record.partners && record.count === 1
    if (!isAlone || found.has(record.id)) continue
    const masters = new Map([[record.component, 1]])
    found.set(record.id, { record, lnK: 0, protons: 0, waters: 0, masters })
  }
  for (const formation of equilibria.formations) {
    const record = records.get(formation.species)
    const reaction = record && formationReaction(formation, record, found, celsius)
    if (reaction) found.set(reaction.record.id, reaction)
  }
  return [...found.values()]
}

/** Name of another charge state of a drug ion: "pilocarpineH+ (charge 0)". */
const stateId = (ion: BackgroundIon, charge: number) =>
  charge === ion.charge ? ion.id : `${ion.id} (charge ${charge})`

/**
 * The charge states of a drug's own ion. Refused when the steps do not follow one another by one charge, or
 * never pass through the charge that the ingredient releases.
 */
export function backgroundReactions(
  ion: BackgroundIon,
  equilibria: Equilibria,
  celsius: number,
): { readonly reactions: readonly Reaction[]; readonly assumesEnthalpy: boolean } | SpeciationFailure {
  const first = ion.steps[0]?.acidCharge ?? ion.charge
  const last = first - ion.steps.length
  const follows = ion.steps.every((step, index) => step.acidCharge === first - index)
  if (!follows || ion.charge > first || ion.charge < last) {
    return { status: 'impossible', code: 'ionisation-steps-broken', values: { ingredient: ion.id } }
  }
  const assumed = equilibria.assumedEnthalpies
  const reactions: Reaction[] = []
  let lnK = 0
  for (let index = 0; index <= ion.steps.length; index++) {
    const step = ion.steps[index - 1]
    if (step) {
      const guess =
        step.acidCharge > 0 && step.pKa > 5
          ? assumed.protonatedBaseEnthalpyKilojoulePerMole
          : assumed.neutralAcidEnthalpyKilojoulePerMole
      lnK += -step.pKa * ln10 + lnShift(step.enthalpyKilojoulePerMole ?? guess.value, 0, celsius)
    }
    const charge = first - index
    const record: SpeciesRecord = {
      id: stateId(ion, charge),
      charge,
      component: ion.id,
      count: 1,
      molarMass: ion.molarMass ?? 0,
    }
    reactions.push({ record, lnK, protons: -index, waters: 0, masters: new Map([[ion.id, 1]]) })
  }
  return { reactions, assumesEnthalpy: ion.steps.some((step) => step.enthalpyKilojoulePerMole === undefined) }
}
