import { describe, expect, it } from 'vitest'
import { loadConventions } from '../../src/library/conventions.ts'
import { loadSpecies } from '../../src/library/equilibria.ts'
import { countAtoms, molarMassOf } from '../../src/library/formula-mass.ts'
import { ingredientIdOf, loadIngredients } from '../../src/library/ingredients.ts'

const ingredients = loadIngredients()
const species = new Map(loadSpecies().map(({ id, charge }) => [id, charge]))
const speciesMasses = new Map(loadSpecies().map(({ id, molarMass }) => [id, molarMass]))
const { lIso } = loadConventions()

/** Which ingredients break a rule, so that a failure names them all. */
const breaking = (rule: (ingredient: (typeof ingredients)[number]) => boolean) =>
  ingredients.filter((ingredient) => !rule(ingredient)).map((ingredient) => ingredient.id)

describe('the ingredients', () => {
  it('are at least 280', () => {
    expect(ingredients.length).toBeGreaterThanOrEqual(280)
  })

  it('have an id of their own that follows from the generic name', () => {
    expect(new Set(ingredients.map(({ id }) => id)).size).toBe(ingredients.length)
    expect(breaking(({ id, name }) => id === ingredientIdOf(name))).toEqual([])
    expect(ingredientIdOf('Calcium chloride dihydrate')).toBe('calcium-chloride-dihydrate')
  })

  it('keep the spelling of the name in tall-man letters', () => {
    expect(
      breaking(({ name, tallManName }) => !tallManName || tallManName.toLowerCase() === name.toLowerCase()),
    ).toEqual([])
  })

  it('have the molar mass of their molecular formula within 0.05 %', () => {
    const wrong = breaking(({ formula, molarMass }) => {
      if (!formula) return true
      const read = molarMassOf(formula)
      return read.ok && molarMass !== undefined && Math.abs(molarMass.value / read.value - 1) < 5e-4
    })
    expect(wrong).toEqual([])
  })

  it('count the crystal water of the formula', () => {
    const wrong = breaking(({ id, formula, crystalWaters }) => {
      if (!formula || id === 'water-for-injection') return crystalWaters === 0
      const parts = formula.split('·').map((part) => /^(\d+(?:\.\d+)?)?H2O$/.exec(part))
      return parts.reduce((sum, part) => sum + (part ? Number(part[1] ?? 1) : 0), 0) === crystalWaters
    })
    expect(wrong).toEqual([])
  })

  it('have a CAS number with a right check digit', () => {
    const isRight = (cas: string) => {
      const digits = cas.replaceAll('-', '')
      const sum = Array.from(digits.slice(0, -1))
        .toReversed()
        .reduce((total, digit, at) => total + Number(digit) * (at + 1), 0)
      return sum % 10 === Number(digits.at(-1))
    }
    expect(isRight('7647-14-5')).toBe(true)
    expect(isRight('7647-14-6')).toBe(false)
    expect(breaking(({ cas }) => !cas || isRight(cas.value))).toEqual([])
  })

  it('name a family only when a second form is in the library', () => {
    const forms = (wanted: string) => ingredients.filter(({ family }) => family === wanted).length
    expect(breaking(({ family }) => !family || forms(family) > 1)).toEqual([])
  })

  it('have a molar mass wherever particles are counted', () => {
    expect(breaking(({ releases, molarMass }) => !releases || molarMass !== undefined)).toEqual([])
  })
})

describe('what an ingredient gives in water', () => {
  it('is electroneutral', () => {
    const net = (releases: readonly { count: number; charge: number }[]) =>
      releases.reduce((sum, { count, charge }) => sum + count * charge, 0)
    expect(breaking(({ releases }) => !releases || net(releases) === 0)).toEqual([])
  })

  it('is a species of the library with its charge, or an ion of its own whose name ends in its charge', () => {
    const wrong = ingredients.flatMap(({ id, releases = [] }) =>
      releases
        .filter(({ species: name, charge }) => {
          const known = species.get(name)
          if (known !== undefined) return known !== charge
          const [, sign, size = ''] = /([+-])(\d?)$/.exec(name) ?? []
          const written = sign ? Number(`${sign}${size || 1}`) : 0
          return written !== charge || /^[A-Z][a-z]?\d*[+-]/.test(name)
        })
        .map(({ species: name }) => `${id}: ${name}`),
    )
    expect(wrong).toEqual([])
  })

  it('has the same own ionisation in every salt of one drug', () => {
    const bySpecies = new Map<string, Set<string>>()
    for (const { ionisingSpecies, ownIonisation } of ingredients) {
      if (!ionisingSpecies) continue
      const ladder = (ownIonisation ?? []).map(({ acidCharge, pKa }) => `${acidCharge}:${pKa.value}`).join()
      const seen = bySpecies.get(ionisingSpecies) ?? new Set()
      bySpecies.set(ionisingSpecies, seen.add(ladder))
    }
    expect([...bySpecies].filter(([, seen]) => seen.size > 1)).toEqual([])
  })

  it('has ionisation steps that go down by one charge and up in pKa, and meet the species it releases', () => {
    const wrong = breaking(({ ownIonisation, ionisingSpecies, releases = [] }) => {
      if (!ownIonisation) return ionisingSpecies === undefined
      const released = releases.find(({ species: name }) => name === ionisingSpecies)
      if (!released || species.has(released.species)) return false
      const charges = ownIonisation.map(({ acidCharge }) => acidCharge)
      const highest = charges[0] ?? Number.NaN
      const inOrder = charges.every((charge, index) => charge === highest - index)
      const rising = ownIonisation.every(
        (step, index) => step.pKa.value > (ownIonisation[index - 1]?.pKa.value ?? -9),
      )
      return inOrder && rising && released.charge <= highest && released.charge >= highest - charges.length
    })
    expect(wrong).toEqual([])
  })

  it('weighs with its water as much as the formula unit, where every species is in the library', () => {
    const water = 18.015
    const wrong = ingredients.flatMap(({ id, molarMass, releases, crystalWaters, waterReleased }) => {
      const masses = releases?.map(
        ({ species: name, count }) => count * (speciesMasses.get(name) ?? Number.NaN),
      )
      const sum = masses?.reduce((total, mass) => total + mass, (waterReleased ?? crystalWaters) * water)
      if (!molarMass || !masses || masses.length === 0 || Number.isNaN(sum)) return []
      return Math.abs((sum ?? 0) / molarMass.value - 1) < 5e-4 ? [] : [`${id}: ${sum} for ${molarMass.value}`]
    })
    expect(wrong).toEqual([])
  })

  it('holds no more of an element than the formula', () => {
    const elementOf = {
      'Na+': 'Na',
      'K+': 'K',
      'Cl-': 'Cl',
      'Br-': 'Br',
      'SO4-2': 'S',
      'H2PO4-': 'P',
      'NO3-': 'N',
    }
    const wrong = ingredients.flatMap(({ id, formula, releases }) => {
      const atoms = formula ? countAtoms(formula) : undefined
      if (!releases || !atoms?.ok) return []
      return Object.entries(elementOf)
        .filter(([ion, element]) => {
          const given = releases.find(({ species: name }) => name === ion)?.count
          return given !== undefined && given > (atoms.value.get(element) ?? 0)
        })
        .map(([ion]) => `${id}: ${ion}`)
    })
    expect(wrong).toEqual([])
  })
})

describe('sodium chloride equivalents', () => {
  it('stand in order of concentration, each once', () => {
    const wrong = breaking(({ sodiumChlorideEquivalents: points }) =>
      points.every(({ atPercent }, index) => atPercent > (points[index - 1]?.atPercent ?? 0)),
    )
    expect(wrong).toEqual([])
  })

  it('lie within 25 % of 17·L_iso/M at 1 %, or a note says why not', () => {
    const unexplained = breaking(({ electrolyteClass, molarMass, sodiumChlorideEquivalents }) => {
      const atOne = sodiumChlorideEquivalents.find(({ atPercent }) => atPercent === 1)
      if (!electrolyteClass || !molarMass || !atOne) return true
      const expected = (17 * lIso[electrolyteClass].value) / molarMass.value
      return Math.abs(atOne.e.value / expected - 1) <= 0.25 || (atOne.e.note ?? '').length > 30
    })
    expect(unexplained).toEqual([])
  })

  it('agree with the freezing point (E = ΔTf / 0.58) within 0.02 and 20 %, or a note says why not', () => {
    const unexplained = breaking(
      ({ freezingPointDepression1Percent: depression, sodiumChlorideEquivalents }) => {
        const atOne = sodiumChlorideEquivalents.find(({ atPercent }) => atPercent === 1)
        if (!depression || !atOne) return true
        const difference = Math.abs(depression.value / 0.58 - atOne.e.value)
        return difference < 0.02 || difference < 0.2 * atOne.e.value || (atOne.e.note ?? '').length > 30
      },
    )
    expect(unexplained).toEqual([])
  })

  it('hold every rival value inside three standard uncertainties', () => {
    const outside = ingredients.flatMap(({ id, sodiumChlorideEquivalents }) =>
      sodiumChlorideEquivalents
        .filter(({ e }) => {
          const rivals = (e.alternatives ?? []).filter(({ note }) => !note?.startsWith('As tabulated for'))
          return rivals.some(({ value }) => Math.abs(value - e.value) > 3 * (e.uncertainty ?? 0) + 1e-9)
        })
        .map(({ atPercent }) => `${id} at ${atPercent} %`),
    )
    expect(outside).toEqual([])
  })

  it('say why one was chosen where sources differ', () => {
    const silent = ingredients.flatMap(({ id, sodiumChlorideEquivalents }) =>
      sodiumChlorideEquivalents
        .filter(({ e }) => (e.alternatives ?? []).some(({ value }) => value !== e.value) && !e.note)
        .map(({ atPercent }) => `${id} at ${atPercent} %`),
    )
    expect(silent).toEqual([])
  })
})

describe('red cells', () => {
  it('are passed by what destroys them at the iso-osmotic concentration, acids and alkalis apart', () => {
    const wrong = breaking(({ haemolysisPercent, reflection }) => {
      if (!haemolysisPercent || !reflection) return true
      const note = reflection.note ?? ''
      if (note.includes('fixes the cells')) return reflection.value === 0
      const stays = haemolysisPercent.value < 30 || note.includes('comes from its pH')
      return stays ? reflection.value >= 0.5 : reflection.value < 0.5
    })
    expect(wrong).toEqual([])
  })

  it('have an uncertainty with every reflection that is inferred', () => {
    expect(breaking(({ reflection }) => !reflection || (reflection.uncertainty ?? 0) > 0)).toEqual([])
  })
})
