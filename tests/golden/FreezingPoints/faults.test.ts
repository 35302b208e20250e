import { describe, expect, it } from 'vitest'
import { freezingDepression, osmolalityAtDepression } from '../../../src/chemistry/activity/freezing.ts'
import { solveSolution } from '../../../src/chemistry/solution.ts'
import { rowsOf } from '../support/rows.ts'
import { library, particles, solute } from '../support/salts.ts'
import content from './named.json'

const formulas: Readonly<Record<string, string>> = content.formulas
const rows = rowsOf(new URL('rows.csv', import.meta.url)).map((row) => ({
  name: formulas[row['solute'] ?? ''] ?? '',
  molality: Number(row['molality']),
  depression: Number(row['depression']),
}))

/** Osmotic coefficients that the table itself means, by rising strength; `printed` moves them by half a last digit. */
function printedPhi(name: string, printed = 0): readonly { readonly m: number; readonly phi: number }[] {
  return rows
    .filter((row) => row.name === name)
    .map(({ molality, depression }) => ({
      m: molality,
      phi: osmolalityAtDepression(depression + printed * 0.005) / (particles(name) * molality),
    }))
}

/** Fall of φ per mol/kg from each row to the next. */
function falls(name: string): readonly number[] {
  const phi = printedPhi(name)
  return phi.slice(1).map((row, index) => {
    const before = phi[index]!
    return (before.phi - row.phi) / (row.m - before.m)
  })
}

/* What the table says against itself, or against chemistry that owes nothing to this program. */
describe('rows of the freezing-point table that cannot be', () => {
  it('glycerol 1 %: φ of a molecule goes to 1, this one lies at 0.9 where the stronger rows lie above 1', () => {
    const [dilute, ...stronger] = printedPhi('glycerol', 1)
    expect(dilute?.phi).toBeLessThan(0.91)
    for (const { phi } of stronger) expect(phi).toBeGreaterThan(1)
  })

  it('lactic acid: no single constant of pairing gives the missing particles at 1 and at 10 %', () => {
    /* φ·m = free + pairs and m = free + 2 pairs; the dissociation at 1 % would need more pairs still. */
    const constant = ({ m, phi }: { readonly m: number; readonly phi: number }) => {
      const pairs = m * (1 - phi)
      return pairs / (m - 2 * pairs) ** 2
    }
    const [weakest] = printedPhi('lactic acid', 1)
    const strongest = printedPhi('lactic acid').at(-1)
    expect(constant(weakest!) / constant(strongest!)).toBeGreaterThan(4)
  })

  it('lactic acid 1 %: the trade’s own depression of a 1 % solution is a fifth greater', () => {
    const trade = library.ingredients.get('lactic-acid')?.freezingPointDepression1Percent?.value
    expect(trade).toBe(0.23)
    expect(rows.find(({ name }) => name === 'lactic acid')?.depression).toBe(0.19)
  })

  it('sodium carbonate 3 %: φ falls eight times as fast before the row as behind it, sulfates at most twice', () => {
    const ratio = (name: string) => {
      const [before = NaN, behind = NaN] = falls(name)
      return before / behind
    }
    expect(ratio('Na2CO3')).toBeGreaterThan(8)
    for (const salt of ['Na2SO4', 'K2SO4']) expect(ratio(salt)).toBeLessThan(2)
  })

  it('monosodium phosphate 10 %: φ falls ever faster, where potassium’s and both at 25 °C fall ever slower', () => {
    const [before = NaN, behind = NaN] = falls('NaH2PO4')
    const [least] = [-1, 1].map((printed) => {
      const [, middle, strong] = printedPhi('NaH2PO4', printed)
      return (middle!.phi - strong!.phi) / (strong!.m - middle!.m)
    })
    expect(behind).toBeGreaterThan(1.4 * before)
    expect(least).toBeGreaterThan(before)
    const [potassiumBefore = NaN, potassiumBehind = NaN] = falls('KH2PO4')
    expect(potassiumBehind).toBeLessThan(potassiumBefore)
    /* Measured at 25 °C: 0.864 at 0.3 and 0.780 at 1 mol/kg. */
    expect((0.864 - 0.78) / 0.7).toBeLessThan(before)
  })

  it('sodium sulfate 6 %: more salt than 100 g of water keep dissolved at 0 °C beside the decahydrate', () => {
    /* 4.76 g at 0 °C, from memory; less still at −1.6 °C. */
    const grams = (100 * 6) / 94
    expect(grams).toBeGreaterThan(1.3 * 4.76)
  })
})

describe('trisodium phosphate', () => {
  const coefficient = (at25: number) => ({ at25, perK: 0, perK2: 0 })
  /* Pitzer and Mayorga 1973, from memory; three later compilations have the same. */
  const older = { beta0: coefficient(0.17813), beta1: coefficient(3.85133), cphi: coefficient(-0.05154) }

  function misses(isOlder: boolean): number {
    const key = 'Na+|PO4-3'
    const own = library.electrolytes.binary.get(key)
    if (!own) throw new Error(`${key} has no parameters`)
    const binary = new Map([...library.electrolytes.binary, [key, isOlder ? { ...own, ...older } : own]])
    const electrolytes = { ...library.electrolytes, binary }
    const parts = { ...library, species: new Map(library.species), electrolytes }
    return rows
      .filter(({ name }) => name === 'Na3PO4')
      .filter(({ molality, depression }) => {
        const amount = { kind: 'per-water', molPerKg: molality } as const
        const dissolved = [{ key: 'salt', ingredient: solute('Na3PO4'), amount }]
        const composition = { volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved } as const
        const result = solveSolution(composition, parts, { temperatures: ['freezing'], uncertainty: false })
        if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
        const ours = freezingDepression(result.state.states.freezing.osmolalityOsmPerKg)
        return Math.abs(ours - depression) > 0.006 + 0.01 * depression
      }).length
  }

  it('no published set of the phosphate ion meets all three rows: one meets one, the other two', () => {
    expect(misses(false)).toBe(2)
    expect(misses(true)).toBe(1)
  })

  it('is less hydrolysed when cold, which the model counts', () => {
    const amount = { kind: 'per-water', molPerKg: 0.093 } as const
    const dissolved = [{ key: 'salt', ingredient: solute('Na3PO4'), amount }]
    const result = solveSolution({ volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved }, library)
    if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
    const { freezing, '25': warm } = result.state.states
    expect(freezing.species['OH-']! / 0.093).toBeCloseTo(0.12, 2)
    expect(warm.species['OH-']! / 0.093).toBeCloseTo(0.23, 2)
  })
})
