import { readFileSync } from 'node:fs'
import { gatherTotals } from '../../../src/chemistry/speciation/totals.ts'
import type { Totals } from '../../../src/chemistry/speciation/types.ts'
import { species } from './parts.ts'

/* Published recipes are made to a volume; the model counts per kilogram of water. */

const records = new Map(species.map((record) => [record.id, record]))
/** kg per litre of pure water at 25 °C. */
const waterDensity = 0.99705
/** cm³ per gram of a solute whose volume is not listed. */
const typicalDisplacement = 0.6

/** mol per litre of each species as weighed, e.g. { 'Na+': 0.05, 'H2PO4-': 0.05 }. */
export type Litre = Readonly<Record<string, number>>

/** What each weighed substance gives in water, per mole. */
export const salts = {
  sodiumChloride: { 'Na+': 1, 'Cl-': 1 },
  potassiumChloride: { 'K+': 1, 'Cl-': 1 },
  hydrochloricAcid: { 'H+': 1, 'Cl-': 1 },
  sodiumHydroxide: { 'Na+': 1, 'OH-': 1 },
  sodiumDihydrogenPhosphate: { 'Na+': 1, 'H2PO4-': 1 },
  disodiumHydrogenPhosphate: { 'Na+': 2, 'HPO4-2': 1 },
  potassiumDihydrogenPhosphate: { 'K+': 1, 'H2PO4-': 1 },
  phosphoricAcid: { H3PO4: 1 },
  boricAcid: { 'B(OH)3': 1 },
  borax: { 'Na+': 2, 'B(OH)3': 2, 'B(OH)4-': 2 },
  aceticAcid: { HAcetate: 1 },
  sodiumAcetate: { 'Na+': 1, 'Acetate-': 1 },
  citricAcid: { H3Citrate: 1 },
  trisodiumCitrate: { 'Na+': 3, 'Citrate-3': 1 },
  sodiumCarbonate: { 'Na+': 2, 'CO3-2': 1 },
  tromethamine: { Tris: 1 },
} as const

/** mol per litre of species of a mixture of substances given in mol per litre. */
export function litreOf(amounts: Partial<Record<keyof typeof salts, number>>): Litre {
  const litre: Record<string, number> = {}
  for (const [salt, molPerLitre] of Object.entries(amounts)) {
    for (const [id, count] of Object.entries(salts[salt as keyof typeof salts])) {
      litre[id] = (litre[id] ?? 0) + count * molPerLitre
    }
  }
  return litre
}

/** kg of water in a litre of solution: what the solutes' own volumes leave. */
export function waterKgPerLitre(litre: Litre): number {
  let solutes = 0
  for (const [id, molPerLitre] of Object.entries(litre)) {
    const record = records.get(id)
    if (!record) throw new Error(`${id} is no species`)
    solutes += molPerLitre * (record.volume?.value ?? record.molarMass * typicalDisplacement)
  }
  return waterDensity * (1 - solutes / 1000)
}

/** Totals in mol per kg of water, diluted with water to `share` of the strength. */
export function totalsOfLitre(litre: Litre, share = 1): Totals {
  const diluted = Object.fromEntries(Object.entries(litre).map(([id, amount]) => [id, amount * share]))
  const water = waterKgPerLitre(diluted)
  const released = Object.entries(diluted).map(([id, amount]) => ({ species: id, molPerKg: amount / water }))
  const gathered = gatherTotals(released, records)
  if ('status' in gathered || gathered.charge !== 0) throw new Error(JSON.stringify(gathered))
  return gathered.totals
}

/** Rows of a table of this checkout; the first line says where it comes from, the second names the columns. */
export function rowsOf(path: string): readonly Readonly<Record<string, string>>[] {
  const text = readFileSync(new URL(`../../golden/${path}`, import.meta.url), 'utf8')
  const [source, head, ...lines] = text.trim().split('\n')
  if (!source?.startsWith('# ')) throw new Error(`${path} names no source`)
  const names = (head ?? '').split(',')
  return lines.map((line) => {
    const cells = line.split(',')
    if (cells.length !== names.length) throw new Error(`${path}: ${line}`)
    return Object.fromEntries(names.map((name, index) => [name, cells[index] ?? '']))
  })
}

/** "phosphate=0.05;K+=0.025" */
export const totalsOfText = (text: string): Totals =>
  Object.fromEntries(
    text.split(';').map((part) => {
      const [component = '', amount] = part.split('=')
      return [component, Number(amount)]
    }),
  )
