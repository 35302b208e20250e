import type { SpeciesRecord } from '../../library/types.ts'
import type { Reaction } from './network.ts'

/* Which species hang together, as flat arrays. Built once, read in every solve. */

/** Components bound to one another by complexes, or to themselves by polymers: solved together. */
export interface Cluster {
  /** Indices into the components. */
  readonly components: Int32Array
  /** Indices into the species. */
  readonly species: Int32Array
  /** Where each species' entries in `members` and `counts` begin; one more at the end. */
  readonly starts: Int32Array
  /** Index into the cluster's components. */
  readonly members: Int32Array
  readonly counts: Float64Array
}

export interface Layout {
  readonly species: readonly SpeciesRecord[]
  readonly components: readonly string[]
  readonly charges: Float64Array
  readonly hydrogen: number
  readonly hydroxide: number
  readonly chloride: number
  readonly acidAnion: number
  readonly baseCation: number
  readonly lnK: Float64Array
  readonly protons: Int32Array
  readonly waters: Float64Array
  /** Species index of each component that is a single species without reactions, or -1. */
  readonly inert: Int32Array
  /** Component and its species, all holding it once: a closed form. */
  readonly families: readonly { readonly component: number; readonly species: Int32Array }[]
  readonly clusters: readonly Cluster[]
  /** Species that the pH alone decides: H+, OH-, and those held by a gas pressure. */
  readonly free: Int32Array
  /** Species that the pH can change, with hydrogen and hydroxide. */
  readonly variable: Int32Array
}

interface Ends {
  readonly acidAnion: string
  readonly baseCation: string
}

/** Groups of components that share a species. */
function groupsOf(components: readonly string[], reactions: readonly Reaction[]): string[][] {
  const groupOf = new Map(components.map((component) => [component, [component]]))
  for (const { masters } of reactions) {
    const [first, ...others] = masters.keys()
    if (first === undefined) continue
    for (const other of others) {
      const one = groupOf.get(first)
      const two = groupOf.get(other)
      if (!one || !two || one === two) continue
      one.push(...two)
      for (const member of two) groupOf.set(member, one)
    }
  }
  return [...new Set(groupOf.values())].map((group) => group.toSorted())
}

/**
 * Lays the reactions out. `reactions` must hold every species but H+ and OH-; `ends` name the ions of an
 * adjusting acid and base, which must stand among the inert species or in `extra`.
 */
export function layOut(
  components: readonly string[],
  reactions: readonly Reaction[],
  solvent: { readonly hydrogen: SpeciesRecord; readonly hydroxide: SpeciesRecord; readonly lnKw: number },
  extra: readonly SpeciesRecord[],
  ends: Ends,
): Layout {
  const species = [
    solvent.hydrogen,
    solvent.hydroxide,
    ...reactions.map((reaction) => reaction.record),
    ...extra,
  ]
  const indexOf = new Map(species.map((record, index) => [record.id, index]))
  const at = (id: string) => indexOf.get(id) ?? -1
  const lnK = new Float64Array(species.length)
  const protons = new Int32Array(species.length)
  const waters = new Float64Array(species.length)
  lnK[1] = solvent.lnKw
  protons.set([1, -1])
  waters[1] = 1
  for (const [offset, reaction] of reactions.entries()) {
    lnK[offset + 2] = reaction.lnK
    protons[offset + 2] = reaction.protons
    waters[offset + 2] = reaction.waters
  }
  const parts = partition(components, reactions)
  return {
    species,
    components,
    charges: Float64Array.from(species, (record) => record.charge),
    hydrogen: 0,
    hydroxide: 1,
    chloride: at('Cl-'),
    acidAnion: at(ends.acidAnion),
    baseCation: at(ends.baseCation),
    lnK,
    protons,
    waters,
    ...parts,
  }
}

/** Sorts components into inert, closed form and clustered. Species indices count from 2. */
function partition(components: readonly string[], reactions: readonly Reaction[]) {
  const inert = new Int32Array(components.length).fill(-1)
  const families: { component: number; species: Int32Array }[] = []
  const clusters: Cluster[] = []
  const held = reactions.flatMap((reaction, offset) => (reaction.masters.size === 0 ? [offset + 2] : []))
  const free = [0, 1, ...held]
  const variable = [...free]
  for (const group of groupsOf(components, reactions)) {
    const members = reactions.flatMap((reaction, offset) =>
      group.some((component) => reaction.masters.has(component)) ? [offset] : [],
    )
    const component = components.indexOf(group[0] ?? '')
    const isSimple = group.length === 1 && members.every((offset) => mastersHeld(reactions[offset]) === 1)
    if (isSimple && members.length === 1 && reactions[members[0] ?? 0]?.protons === 0) {
      inert[component] = (members[0] ?? 0) + 2
      continue
    }
    const indices = Int32Array.from(members, (offset) => offset + 2)
    variable.push(...indices)
    if (isSimple) families.push({ component, species: indices })
    else clusters.push(clusterOf(components, group, indices, reactions))
  }
  return { inert, families, clusters, free: Int32Array.from(free), variable: Int32Array.from(variable) }
}

function clusterOf(
  components: readonly string[],
  group: readonly string[],
  species: Int32Array,
  reactions: readonly Reaction[],
): Cluster {
  const starts = [0]
  const members: number[] = []
  const counts: number[] = []
  for (const index of species) {
    const masters = reactions[index - 2]?.masters
    for (const [place, name] of group.entries()) {
      const count = masters?.get(name)
      if (count === undefined) continue
      members.push(place)
      counts.push(count)
    }
    starts.push(members.length)
  }
  return {
    components: Int32Array.from(group, (name) => components.indexOf(name)),
    species,
    starts: Int32Array.from(starts),
    members: Int32Array.from(members),
    counts: Float64Array.from(counts),
  }
}

const mastersHeld = (reaction: Reaction | undefined) =>
  [...(reaction?.masters.values() ?? [])].reduce((sum, count) => sum + count, 0)
