import type { SpeciesRecord } from '../../library/types.ts'

/** Which components the species of a system hold, as flat arrays. */
export interface Ties {
  /** Where each species' entries begin; one more at the end. */
  readonly starts: Int32Array
  /** Index into `components`. */
  readonly component: Int32Array
  /** Units of the component in one of the species. */
  readonly count: Float64Array
  readonly components: readonly string[]
  readonly componentAt: ReadonlyMap<string, number>
  /** Of H+ and OH-; -1 where there is none. */
  readonly proton: number
  readonly speciesAt: ReadonlyMap<string, number>
}

const held = ({ component, count, partners = [] }: SpeciesRecord) => [{ component, count }, ...partners]

export function tiesOf(species: readonly SpeciesRecord[]): Ties {
  const entries = species.map(held)
  const components = [...new Set(entries.flatMap((parts) => parts.map(({ component }) => component)))]
  const componentAt = new Map(components.map((component, index) => [component, index]))
  const starts = [0]
  for (const parts of entries) starts.push((starts.at(-1) ?? 0) + parts.length)
  const all = entries.flat()
  return {
    starts: Int32Array.from(starts),
    component: Int32Array.from(all, ({ component }) => componentAt.get(component) ?? -1),
    count: Float64Array.from(all, ({ count }) => count),
    components,
    componentAt,
    proton: componentAt.get('proton') ?? -1,
    speciesAt: new Map(species.map(({ id }, index) => [id, index])),
  }
}

/** mol per kg of water of each component, over all its species. */
export function componentTotals(molalities: Float64Array, { starts, component, count, components }: Ties) {
  const totals = new Float64Array(components.length)
  for (let species = 0; species < molalities.length; species += 1) {
    for (let at = starts[species]!; at < starts[species + 1]!; at += 1) {
      totals[component[at]!]! += count[at]! * molalities[species]!
    }
  }
  return totals
}
