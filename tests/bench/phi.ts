import { compileActivityModel } from '../../src/chemistry/activity/model.ts'
import { loadLibrary } from '../../src/library/library.ts'

/** A balanced infusion, mol per kg of water: ten ions. */
const molalities: Readonly<Record<string, number>> = {
  'Na+': 0.14,
  'K+': 0.005,
  'Mg+2': 0.0015,
  'Ca+2': 0.0025,
  'NH4+': 0.001,
  'Cl-': 0.108,
  'SO4-2': 0.0015,
  'HCO3-': 0.022,
  'Acetate-': 0.02,
  'H2PO4-': 0.001,
}

export interface TenIons {
  /** Osmolality of the ten ions at this many times their usual strength, osmol per kg. */
  readonly osmolality: (strength: number) => number
  /** ln γ of all ten; answers that of sodium. */
  readonly lnGamma: (strength: number) => number
}

/**
 * The bare model on ten ions at 0 °C: what every larger figure of the benchmark is a multiple of. Every pair, mixing
 * and Debye–Hückel term is reckoned from molalities that are new in each call.
 */
export function tenIons(): TenIons {
  const { species, electrolytes } = loadLibrary()
  const ions = Object.keys(molalities).flatMap((id) => species.get(id) ?? [])
  const model = compileActivityModel(ions, electrolytes, 0)
  const usual = Float64Array.from(ions, ({ id }) => molalities[id] ?? 0)
  const m = new Float64Array(usual.length)
  const out = new Float64Array(usual.length)
  const take = (strength: number) => {
    for (let at = 0; at < m.length; at += 1) m[at] = (usual[at] as number) * strength
  }
  return {
    osmolality(strength) {
      take(strength)
      return model.osmolality(m)
    },
    lnGamma(strength) {
      take(strength)
      model.lnGamma(m, out)
      return out[0] ?? Number.NaN
    },
  }
}
