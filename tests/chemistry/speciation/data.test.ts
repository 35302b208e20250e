import { describe, expect, it } from 'vitest'
import { equilibria, species } from './parts.ts'
import { electrolytes } from './real.ts'

const records = new Map(species.map((record) => [record.id, record]))
const recordOf = (id: string) => {
  const record = records.get(id)
  if (!record) throw new Error(id)
  return record
}

/** Charge as the id writes it: "HPO4-2", "Na+". */
function writtenCharge(id: string): number {
  const written = /([+-])(\d*)$/.exec(id)
  if (!written) return 0
  return Number(written[2] || '1') * (written[1] === '+' ? 1 : -1)
}

describe('species', () => {
  it('carry the charge that their id writes', () => {
    const other = species.filter((record) => record.charge !== writtenCharge(record.id))
    expect(other.map((record) => record.id)).toEqual([])
  })

  it('a complex names the metal as partner and the ligand as component', () => {
    for (const formation of equilibria.formations) {
      const record = recordOf(formation.species)
      const counts = new Map<string, number>()
      for (const part of formation.from) {
        const component = recordOf(part.species).component
        counts.set(component, (counts.get(component) ?? 0) + part.count)
      }
      const held = [{ component: record.component, count: record.count }, ...(record.partners ?? [])]
      expect(new Map(held.map((part) => [part.component, part.count]))).toEqual(counts)
    }
  })
})

describe('equilibria', () => {
  it('lose one charge at each step of a family', () => {
    for (const family of equilibria.acids) {
      const charges = family.species.map((id) => recordOf(id).charge)
      expect(charges).toEqual(charges.map((_, index) => (charges[0] ?? 0) - index))
      for (const id of family.species) expect(recordOf(id).component).toBe(family.component)
    }
  })

  it('conserve charge in every formation', () => {
    for (const formation of equilibria.formations) {
      const before = formation.from.reduce((sum, part) => sum + part.count * recordOf(part.species).charge, 0)
      expect(recordOf(formation.species).charge + formation.protonsReleased).toBe(before)
    }
  })

  it('carry each bond of a metal by a complex or by an interaction parameter, never by both', () => {
    const both = equilibria.formations.flatMap(({ species: id, from }) => {
      const ids = from.map((part) => part.species)
      const cation = ids.find((part) => recordOf(part).charge > 0)
      const anion = ids.find((part) => recordOf(part).charge < 0)
      return cation && anion && electrolytes.binary.has(`${cation}|${anion}`) ? [id] : []
    })
    expect(both).toEqual([])
  })

  it('name as carried by interaction only bonds whose parameters are there', () => {
    const missing = equilibria.representation.interaction.filter(
      ({ metal, ligand }) =>
        !species.some(
          (record) => record.component === ligand && electrolytes.binary.has(`${metal}|${record.id}`),
        ),
    )
    expect(missing).toEqual([])
  })
})
