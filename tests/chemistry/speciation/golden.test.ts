import { describe, expect, it } from 'vitest'
import type { SpeciationSystem } from '../../../src/chemistry/speciation/types.ts'
import { solveWith } from './parts.ts'
import { realParts } from './real.ts'
import { litreOf, rowsOf, totalsOfLitre, totalsOfText } from './recipes.ts'

/*
 * Published pH values against the whole model. Recipes made to a volume are turned into mol per kg of water
 * with the volumes of their own species (recipes.ts). Tables of Sørensen's time (Sørensen, Palitzsch, Walpole,
 * McIlvaine) stand on his scale, which reads about 0.04 below today's.
 */

type Recipe = Parameters<typeof litreOf>[0]

const pHOf = (recipe: Recipe, celsius = 25, share = 1, system: Partial<SpeciationSystem> = {}) =>
  solveWith(realParts, totalsOfLitre(litreOf(recipe), share), undefined, { celsius, ...system }).pH

interface Reading {
  readonly name: string
  readonly found: number
  readonly published: number
}

/** Names of the rows that lie farther than the tolerance. */
const farther = (readings: readonly Reading[], tolerance: number) =>
  readings
    .filter(({ found, published }) => !(Math.abs(found - published) <= tolerance))
    .map(({ name }) => name)

const cell = (row: Readonly<Record<string, string>>, name: string) => {
  const text = row[name]
  if (text === undefined || text === '') throw new Error(`no ${name}`)
  return Number(text)
}

describe('primary standards', () => {
  const standardReadings = (path: string, scale: SpeciationSystem['pHScale'] = 'operational') =>
    rowsOf(path).map((row) => ({
      name: `${row['solution']} at ${row['celsius']}`,
      found: solveWith(realParts, totalsOfText(row['mol_per_kg'] ?? ''), undefined, {
        celsius: cell(row, 'celsius'),
        pHScale: scale,
      }).pH,
      published: cell(row, 'pH'),
    }))

  it('read within 0.04 from 0 to 40 °C', () => {
    const readings = standardReadings('PrimaryPHStandards/standards.csv')
    expect(readings.length).toBe(50)
    expect(farther(readings, 0.04)).toEqual([])
  })

  it('read within 0.04 of the two-decimal table and of the standard at 37 °C', () => {
    expect(farther(standardReadings('PrimaryPHStandards/two-decimals.csv'), 0.04)).toEqual([])
    expect(farther(standardReadings('PhosphateStandard37/standards.csv'), 0.04)).toEqual([])
  })

  /* Why the meter's scale is used and not the model's own hydrogen ion activity: it lies nearer. */
  it('lie nearer on the scale of the meter than on the model’s own', () => {
    const spread = (scale: SpeciationSystem['pHScale']) => {
      const readings = standardReadings('PrimaryPHStandards/standards.csv', scale)
      return Math.sqrt(
        readings.reduce((sum, { found, published }) => sum + (found - published) ** 2, 0) / readings.length,
      )
    }
    expect(spread('operational')).toBeLessThan(0.75 * spread('hydrogen-activity'))
  })
})

describe('phosphate', () => {
  const vehicle = rowsOf('OphthalmicLaboratoryManual2019/phosphate-vehicle.csv')
  const phosphates = (row: Readonly<Record<string, string>>): Recipe => ({
    sodiumDihydrogenPhosphate: ((8.0 / 119.977) * cell(row, 'acid_stock_mL')) / 100,
    disodiumHydrogenPhosphate: ((9.47 / 141.957) * cell(row, 'base_stock_mL')) / 100,
  })

  it('Sørensen vehicle: the phosphates alone, within 0.10 at every row', () => {
    const readings = vehicle.map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf(phosphates(row)),
      published: cell(row, 'pH'),
    }))
    expect(readings.length).toBe(10)
    expect(farther(readings, 0.1)).toEqual([])
  })

  /*
   * With the sodium chloride of the isotonic recipe the pH falls by 0.08, but the printed pH is that of the
   * phosphates alone, rounded to 0.1 (70 + 30: 6.468 printed as 6.5; 90 + 10: 5.906 as 5.9).
   * Exceptions: 5.9 read as 5.80, 6.5 as 6.39.
   */
  it('Sørensen vehicle with its sodium chloride, within 0.10 but for two rows', () => {
    const readings = vehicle.map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({ ...phosphates(row), sodiumChloride: cell(row, 'sodium_chloride_g_per_100mL') / 5.8443 }),
      published: cell(row, 'pH'),
    }))
    expect(['5.9', '6.5']).toEqual(expect.arrayContaining(farther(readings, 0.1)))
    expect(farther(readings, 0.12)).toEqual([])
  })

  it('Sørensen, M/15 at 20 °C, within 0.10 at every row', () => {
    const readings = rowsOf('SorensenPhosphate/geigy.csv').map((row) => {
      const base = cell(row, 'base_mL_per_100mL') / 100
      const found = pHOf(
        { potassiumDihydrogenPhosphate: (1 - base) / 15, disodiumHydrogenPhosphate: base / 15 },
        20,
      )
      return { name: row['pH_20C'] ?? '', found, published: cell(row, 'pH_20C') }
    })
    expect(readings.length).toBe(12)
    expect(farther(readings, 0.1)).toEqual([])
  })

  it('pharmacopoeial phosphate within 0.10 at every row', () => {
    const readings = rowsOf('UspReagentBuffers/phosphate.csv').map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({
        potassiumDihydrogenPhosphate: 0.05,
        sodiumHydroxide: cell(row, 'sodium_hydroxide_0.2M_mL') / 1000,
      }),
      published: cell(row, 'pH'),
    }))
    expect(readings.length).toBe(12)
    expect(farther(readings, 0.1)).toEqual([])
  })

  /* The text is silent on the hydrate; only the dihydrate gives 3.2. As anhydrous salt it would read 3.28. */
  it('pharmacopoeial phosphate pH 3.2', () => {
    const acid = (2.5 / 97.994) * 0.1
    const weighed = (molarMass: number) =>
      pHOf({ sodiumDihydrogenPhosphate: (4 / molarMass) * 0.9, phosphoricAcid: acid })
    expect(Math.abs(weighed(156.01) - 3.2)).toBeLessThanOrEqual(0.02)
    expect(Math.abs(weighed(119.977) - 3.28)).toBeLessThanOrEqual(0.02)
  })

  /*
   * The usual recipe is called pH 7.4 and holds an unlisted acid. A dilute-solution formula gives 7.59 for it,
   * this model 7.53: sodium chloride at 0.14 mol/L lowers the pH more than that formula says.
   */
  it('phosphate-buffered saline as weighed lies above 7.4', () => {
    const found = pHOf({
      sodiumChloride: 8 / 58.443,
      potassiumChloride: 0.2 / 74.551,
      disodiumHydrogenPhosphate: 1.44 / 141.957,
      potassiumDihydrogenPhosphate: 0.24 / 136.084,
    })
    expect(found).toBeGreaterThan(7.5)
    expect(Math.abs(found - 7.59)).toBeLessThanOrEqual(0.1)
  })
})

describe('borate', () => {
  const vehicle = rowsOf('OphthalmicLaboratoryManual2019/borate-vehicle.csv')
  const borates = (row: Readonly<Record<string, string>>): Recipe => ({
    boricAcid: cell(row, 'boric_acid_g_per_L') / 61.833,
    borax: cell(row, 'borax_g_per_L') / 381.37,
  })
  const readings = (column: string, isSalted: boolean) =>
    vehicle.map((row) => ({
      name: row[column] ?? '',
      found: pHOf({
        ...borates(row),
        ...(isSalted ? { sodiumChloride: cell(row, 'sodium_chloride_g_per_L') / 58.443 } : {}),
      }),
      published: cell(row, column),
    }))

  /* Rows 1, 3, 5 … took part in the fit of one constant, the triborate's; rows 2, 4, 6 … are the check. */
  it.each([
    ['the isotonic recipe against the printed pH', 'pH_printed', true],
    ['the isotonic recipe against two decimals', 'pH_two_decimals', true],
    ['the borates alone against the printed pH', 'pH_printed', false],
    ['the borates alone against two decimals', 'pH_two_decimals', false],
  ])('Palitzsch, %s: within 0.10 at every row', (_name, column, isSalted) => {
    const all = readings(column, isSalted)
    expect(all.length).toBe(14)
    expect(
      farther(
        all.filter((_, index) => index % 2 === 1),
        0.1,
      ),
    ).toEqual([])
    expect(farther(all, 0.1)).toEqual([])
  })

  it('pharmacopoeial alkaline borate within 0.10 at every row', () => {
    const found = rowsOf('UspReagentBuffers/alkaline-borate.csv').map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({
        boricAcid: 0.05,
        potassiumChloride: 0.05,
        sodiumHydroxide: cell(row, 'sodium_hydroxide_0.2M_mL') / 1000,
      }),
      published: cell(row, 'pH'),
    }))
    expect(found.length).toBe(11)
    expect(farther(found, 0.1)).toEqual([])
  })

  it('dilution raises the pH of the vehicle from 7.35 to 7.95', () => {
    const recipe = { boricAcid: 11.16 / 61.833, borax: 1.91 / 381.37, sodiumChloride: 2.7 / 58.443 }
    const found = [1, 0.5, 0.25, 0.1].map((share) => pHOf(recipe, 25, share))
    for (const [index, published] of [7.35, 7.7, 7.87, 7.95].entries()) {
      expect(Math.abs((found[index] ?? NaN) - published)).toBeLessThanOrEqual(0.05)
    }
  })

  /* Recalled table; carbon dioxide kept in. */
  it('Gifford vehicle within 0.10 at every row', () => {
    const found = rowsOf('GiffordVehicle/gifford.csv').map((row) => {
      const alkaline = cell(row, 'alkaline_stock_mL')
      const share = 30 / (30 + alkaline)
      const recipe = {
        boricAcid: (12.4 / 61.833) * share,
        potassiumChloride: (7.4 / 74.551) * share,
        sodiumCarbonate: (21.2 / 105.988) * (1 - share),
      }
      return { name: row['pH_remembered'] ?? '', found: pHOf(recipe), published: cell(row, 'pH_remembered') }
    })
    expect(found.length).toBe(12)
    expect(farther(found, 0.1)).toEqual([])
  })
})

describe('carboxylates', () => {
  /*
   * The table stands on Sørensen's scale, 0.04 below today's, and the model lies 0.03 to 0.06 above it
   * throughout. Exception: 4.6 (102 mL acid, 98 mL acetate) read as 4.661; its neighbours, printed to one
   * decimal for round volumes, are 0.055 and 0.049 off.
   */
  it('Walpole acetate within 0.06 but for one row', () => {
    const readings = rowsOf('Walpole1914/acetate.csv').map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({
        aceticAcid: cell(row, 'acetic_acid_0.1M_mL') / 2000,
        sodiumAcetate: cell(row, 'sodium_acetate_0.1M_mL') / 2000,
      }),
      published: cell(row, 'pH'),
    }))
    expect(readings.length).toBe(11)
    expect(['4.6']).toEqual(expect.arrayContaining(farther(readings, 0.06)))
    expect(farther(readings, 0.065)).toEqual([])
  })

  it('pharmacopoeial acetate within 0.10 at every row', () => {
    const readings = rowsOf('UspReagentBuffers/acetate.csv').map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({
        sodiumAcetate: cell(row, 'sodium_acetate_trihydrate_g') / 136.08,
        aceticAcid: (2 * cell(row, 'acetic_acid_2N_mL')) / 1000,
      }),
      published: cell(row, 'pH'),
    }))
    expect(readings.length).toBe(10)
    expect(farther(readings, 0.1)).toEqual([])
  })

  /* Ionic strength reaches 0.6 here, where dilute-solution formulas err by 0.2; that is the trap of this table. */
  it('McIlvaine within 0.20 at every row', () => {
    const readings = rowsOf('McIlvaine1921/citrate-phosphate.csv').map((row) => ({
      name: row['pH'] ?? '',
      found: pHOf({
        disodiumHydrogenPhosphate: (0.2 * cell(row, 'disodium_phosphate_0.2M_mL')) / 20,
        citricAcid: (0.1 * cell(row, 'citric_acid_0.1M_mL')) / 20,
      }),
      published: cell(row, 'pH'),
    }))
    expect(readings.length).toBe(16)
    expect(farther(readings, 0.2)).toEqual([])
  })

  /*
   * Gomori's citrate table disagrees with every other source by 0.2 to 0.45: its first row is 3.0 where the
   * model reads 2.62 and McIlvaine's table supports the model. The table is wrong or its citric acid was not
   * 0.1 M; it is kept as a warning, not as a check.
   */
  it('Gomori lies 0.15 to 0.45 above the model throughout', () => {
    for (const row of rowsOf('Gomori1955/citrate.csv')) {
      const found = pHOf({
        citricAcid: cell(row, 'citric_acid_0.1M_mL') / 1000,
        trisodiumCitrate: cell(row, 'trisodium_citrate_0.1M_mL') / 1000,
      })
      expect(cell(row, 'pH') - found).toBeGreaterThan(0.15)
      expect(cell(row, 'pH') - found).toBeLessThan(0.45)
    }
  })
})

describe('nitrogen bases', () => {
  it('tromethamine 50 mM with 40.5 mM acid reads 8.12, 7.52 and 7.20 at 5, 25 and 37 °C', () => {
    for (const [celsius, published] of [
      [5, 8.12],
      [25, 7.52],
      [37, 7.2],
    ] as const) {
      const found = pHOf({ tromethamine: 0.05, hydrochloricAcid: 0.0405 }, celsius)
      expect(Math.abs(found - published)).toBeLessThanOrEqual(0.05)
    }
  })

  /* 6.42, 6.07 and 5.87 by a formula with no interaction at all; the ionic strength adds 0.05. */
  it('half-neutralised histidine 20 mM falls by 0.55 from 5 to 37 °C', () => {
    const [cold, room, body] = [5, 25, 37].map(
      (celsius) => solveWith(realParts, { histidine: 0.02, 'Cl-': 0.01 }, undefined, { celsius }).pH,
    )
    expect(Math.abs((room ?? NaN) - 6.07)).toBeLessThanOrEqual(0.06)
    expect((cold ?? NaN) - (body ?? NaN)).toBeCloseTo(6.42 - 5.87, 1)
  })
})
