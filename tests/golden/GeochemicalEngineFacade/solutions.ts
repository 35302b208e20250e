import { movableMixture, solveSolution } from '../../../src/chemistry/solution.ts'
import type { ElectrolyteParameters } from '../../../src/library/electrolytes.ts'
import { library, substance } from '../support/salts.ts'

/** The form of each total of the other engine that is put in; the charge left over is hydrogen or hydroxide ion. */
const forms: Readonly<Record<string, string>> = {
  Na: 'Na+',
  K: 'K+',
  Li: 'Li+',
  Mg: 'Mg+2',
  Ca: 'Ca+2',
  Sr: 'Sr+2',
  Zn: 'Zn+2',
  Cl: 'Cl-',
  Br: 'Br-',
  Nit: 'NO3-',
  Flu: 'F-',
  Iod: 'I-',
  Thio: 'S2O3-2',
  'S(6)': 'SO4-2',
  'C(4)': 'HCO3-',
  B: 'B(OH)3',
  P: 'H2PO4-',
  Acetate: 'Acetate-',
  Benz: 'Benzoate-',
  Cit: 'Citrate-3',
  Tris: 'Tris',
  Amm: 'NH4+',
}

export interface Engine {
  readonly label: string
  readonly celsius: number
  readonly totals: string
  readonly phi: number
  readonly waterActivity: number
  readonly pH: number
}

export interface Ours {
  readonly phi: number
  readonly waterActivity: number
  readonly pH: number | null
}

/** The solution of these totals, mol per kg of water, through the whole chemistry, with the parameters given. */
export function solvedAs(
  { label, celsius, totals }: Engine,
  electrolytes: ElectrolyteParameters,
  equilibria = library.equilibria,
): Ours {
  /* Compiled systems are kept by the species map: another one for other parameters. */
  const parts = { ...library, electrolytes, equilibria, species: new Map(library.species) }
  const composition = {
    volumeLitres: 1,
    pH: 'solve',
    temperatureCelsius: celsius,
    dissolved: [
      {
        key: label,
        ingredient: substance(label, speciesOf(totals)),
        amount: { kind: 'per-water', molPerKg: 1 },
      },
    ],
  } as const
  const temperature = celsius === 0 ? 'freezing' : '25'
  const result = solveSolution(composition, parts, { temperatures: [temperature], uncertainty: false })
  if (result.status === 'refused') throw new Error(`${label}: ${JSON.stringify(result.problems)}`)
  const state = result.state.states[temperature]
  if (state.celsius === celsius)
    return { phi: state.osmoticCoefficient, waterActivity: state.waterActivity, pH: state.pH }
  /* A solution of more than 0.5 osmol/kg is carried on to its own freezing point: it is asked at 0 °C itself. */
  const cold = movableMixture(composition, parts)
  if (!cold) throw new Error(`${label}: no answer at 0 °C`)
  const { osmolalityOsmPerKg, pool, speciated } = cold.mixture
  return {
    phi: osmolalityOsmPerKg / pool.sumOfMolalities,
    waterActivity: Math.exp(-0.0180153 * osmolalityOsmPerKg),
    pH: speciated.pH,
  }
}

function speciesOf(totals: string): Readonly<Record<string, number>> {
  const species: Record<string, number> = {}
  let charge = 0
  for (const part of totals.split(';')) {
    const [total = '', amount] = part.split('=')
    const id = forms[total]
    const record = id === undefined ? undefined : library.species.get(id)
    if (!record) throw new Error(`No form is named for ${total}`)
    species[record.id] = Number(amount)
    charge += record.charge * Number(amount)
  }
  if (Math.abs(charge) > 1e-12) species[charge > 0 ? 'OH-' : 'H+'] = Math.abs(charge)
  return species
}
