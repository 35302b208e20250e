import type { BinaryRow, ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { SpeciesRecord } from '../../library/types.ts'
import { atCelsius } from './temperature.ts'

/** Cation–anion pair with its coefficients at the temperature. */
export interface PairTerm {
  readonly cation: number
  readonly anion: number
  readonly beta0: number
  readonly beta1: number
  readonly beta2: number
  readonly alpha1: number
  readonly alpha2: number
  /** C = Cφ / (2 √|z₊z₋|). */
  readonly c: number
  /** Ions of each kind in one formula unit of the salt. */
  readonly perUnit: { readonly cation: number; readonly anion: number }
  readonly row: BinaryRow
}

/** Molality of the salt whose ions these would be, the more plentiful ion counting. */
export const saltMolality = ({ cation, anion, perUnit }: PairTerm, m: Float64Array): number =>
  Math.max((m[cation] ?? 0) / perUnit.cation, (m[anion] ?? 0) / perUnit.anion)

export interface LikeTerm {
  readonly first: number
  readonly second: number
  readonly theta: number
  /** Charges where they differ, for the electrostatic part; else null. */
  readonly charges: readonly [number, number] | null
  /** Ternary coefficients by index of the third ion. */
  readonly psi: readonly (readonly [number, number])[]
}

export interface NeutralTerm {
  readonly neutral: number
  readonly other: number
  readonly lambda: number
}

export interface TripleTerm {
  readonly neutral: number
  readonly cation: number
  readonly anion: number
  readonly zeta: number
}

export interface Compiled {
  readonly charges: Float64Array
  readonly pairs: readonly PairTerm[]
  readonly likes: readonly LikeTerm[]
  readonly neutrals: readonly NeutralTerm[]
  readonly triples: readonly TripleTerm[]
  /** Cation and anion of each pair without parameters. */
  readonly missing: readonly (readonly [number, number])[]
}

interface Context {
  readonly ids: readonly string[]
  readonly charges: readonly number[]
  readonly cations: readonly number[]
  readonly anions: readonly number[]
  readonly molecules: readonly number[]
  readonly parameters: ElectrolyteParameters
  readonly celsius: number
}

const idAt = ({ ids }: Context, index: number) => ids[index] ?? ''
const chargeAt = ({ charges }: Context, index: number) => charges[index] ?? 0

/** Picks the coefficients that this set of species needs, at one temperature. */
export function compile(
  species: readonly SpeciesRecord[],
  parameters: ElectrolyteParameters,
  celsius: number,
): Compiled {
  const charges = species.map(({ charge }) => charge)
  const where = (test: (charge: number) => boolean) =>
    charges.flatMap((charge, index) => (test(charge) ? [index] : []))
  const context: Context = {
    ids: species.map(({ id }) => id),
    charges,
    cations: where((charge) => charge > 0),
    anions: where((charge) => charge < 0),
    molecules: where((charge) => charge === 0),
    parameters,
    celsius,
  }
  return {
    charges: Float64Array.from(charges),
    ...pairTerms(context),
    likes: [
      ...likeTerms(context.cations, context.anions, context),
      ...likeTerms(context.anions, context.cations, context),
    ],
    neutrals: neutralTerms(context),
    triples: tripleTerms(context),
  }
}

function pairTerms(context: Context): Pick<Compiled, 'pairs' | 'missing'> {
  const pairs: PairTerm[] = []
  const missing: (readonly [number, number])[] = []
  for (const cation of context.cations) {
    for (const anion of context.anions) {
      const row = context.parameters.binary.get(`${idAt(context, cation)}|${idAt(context, anion)}`)
      if (row) pairs.push(pairTerm(cation, anion, row, context))
      else missing.push([cation, anion])
    }
  }
  return { pairs, missing }
}

function pairTerm(cation: number, anion: number, row: BinaryRow, context: Context): PairTerm {
  const at = context.celsius
  return {
    cation,
    anion,
    beta0: atCelsius(row.beta0, at),
    beta1: atCelsius(row.beta1, at),
    beta2: atCelsius(row.beta2, at),
    alpha1: row.alpha1,
    alpha2: row.alpha2,
    c: atCelsius(row.cphi, at) / (2 * Math.sqrt(-chargeAt(context, cation) * chargeAt(context, anion))),
    perUnit: formulaUnit(chargeAt(context, cation), -chargeAt(context, anion)),
    row,
  }
}

function formulaUnit(cationCharge: number, anionCharge: number): PairTerm['perUnit'] {
  let [common, rest] = [cationCharge, anionCharge]
  while (rest !== 0) [common, rest] = [rest, common % rest]
  return { cation: anionCharge / common, anion: cationCharge / common }
}

function likeTerms(
  group: readonly number[],
  others: readonly number[],
  context: Context,
): readonly LikeTerm[] {
  return group.flatMap((first, place) =>
    group.slice(place + 1).map((second) => likeTerm(first, second, others, context)),
  )
}

function likeTerm(first: number, second: number, others: readonly number[], context: Context): LikeTerm {
  const { parameters, celsius } = context
  const key = [idAt(context, first), idAt(context, second)].toSorted().join('|')
  const theta = parameters.theta.get(key)
  const [z, y] = [Math.abs(chargeAt(context, first)), Math.abs(chargeAt(context, second))]
  return {
    first,
    second,
    theta: theta ? atCelsius(theta, celsius) : 0,
    charges: z === y ? null : [z, y],
    psi: others.flatMap((third) => {
      const psi = parameters.psi.get(`${key}|${idAt(context, third)}`)
      return psi ? [[third, atCelsius(psi, celsius)] as const] : []
    }),
  }
}

function neutralTerms(context: Context): readonly NeutralTerm[] {
  return context.molecules.flatMap((neutral) =>
    context.ids.flatMap((id, other) => {
      const lambda = context.parameters.lambda.get(`${idAt(context, neutral)}|${id}`)
      const once = chargeAt(context, other) !== 0 || other >= neutral
      return lambda && once ? [{ neutral, other, lambda: atCelsius(lambda, context.celsius) }] : []
    }),
  )
}

function tripleTerms(context: Context): readonly TripleTerm[] {
  return context.molecules.flatMap((neutral) =>
    context.cations.flatMap((cation) =>
      context.anions.flatMap((anion) => {
        const key = [neutral, cation, anion].map((index) => idAt(context, index)).join('|')
        const zeta = context.parameters.zeta.get(key)
        return zeta ? [{ neutral, cation, anion, zeta: atCelsius(zeta, context.celsius) }] : []
      }),
    ),
  )
}
