import type { Compiled } from './compiled.ts'

/** The coefficients of a compiled set as flat arrays, for the loops that run thousands of times. */
export interface Flat {
  readonly charges: Float64Array
  readonly magnitudes: Float64Array
  readonly pairs: {
    readonly cation: Int32Array
    readonly anion: Int32Array
    readonly beta0: Float64Array
    readonly beta1: Float64Array
    readonly beta2: Float64Array
    readonly alpha1: Int32Array
    readonly alpha2: Int32Array
    readonly c: Float64Array
  }
  /** The few different α of all pairs. */
  readonly alphas: Float64Array
  readonly likes: {
    readonly first: Int32Array
    readonly second: Int32Array
    readonly theta: Float64Array
    /** Index of the pair of unlike charges, -1 for equal ones. */
    readonly mixing: Int32Array
    readonly psiStart: Int32Array
  }
  readonly psiThird: Int32Array
  readonly psiValue: Float64Array
  readonly mixings: Mixings
  readonly neutrals: {
    readonly neutral: Int32Array
    readonly other: Int32Array
    readonly lambda: Float64Array
  }
  readonly triples: {
    readonly neutral: Int32Array
    readonly cation: Int32Array
    readonly anion: Int32Array
    readonly zeta: Float64Array
  }
}

/** The few different pairs of unlike charges. J is asked once for each different product of two charges. */
export interface Mixings {
  /** z·z′ that J is asked for. */
  readonly products: Float64Array
  /** Of each pair, the places in `products` of z·z′, z·z and z′·z′. */
  readonly cross: Int32Array
  readonly first: Int32Array
  readonly second: Int32Array
}

/** Lays the coefficients out once. */
export function flatten(compiled: Compiled): Flat {
  const { pairs, neutrals, triples } = compiled
  const alphas = [...new Set(pairs.flatMap(({ alpha1, alpha2 }) => [alpha1, alpha2]))]
  return {
    charges: compiled.charges,
    magnitudes: compiled.charges.map(Math.abs),
    pairs: {
      cation: Int32Array.from(pairs, ({ cation }) => cation),
      anion: Int32Array.from(pairs, ({ anion }) => anion),
      beta0: Float64Array.from(pairs, ({ beta0 }) => beta0),
      beta1: Float64Array.from(pairs, ({ beta1 }) => beta1),
      beta2: Float64Array.from(pairs, ({ beta2 }) => beta2),
      alpha1: Int32Array.from(pairs, ({ alpha1 }) => alphas.indexOf(alpha1)),
      alpha2: Int32Array.from(pairs, ({ alpha2 }) => alphas.indexOf(alpha2)),
      c: Float64Array.from(pairs, ({ c }) => c),
    },
    alphas: Float64Array.from(alphas),
    ...flattenLikes(compiled),
    neutrals: {
      neutral: Int32Array.from(neutrals, ({ neutral }) => neutral),
      other: Int32Array.from(neutrals, ({ other }) => other),
      lambda: Float64Array.from(neutrals, ({ lambda }) => lambda),
    },
    triples: {
      neutral: Int32Array.from(triples, ({ neutral }) => neutral),
      cation: Int32Array.from(triples, ({ cation }) => cation),
      anion: Int32Array.from(triples, ({ anion }) => anion),
      zeta: Float64Array.from(triples, ({ zeta }) => zeta),
    },
  }
}

function flattenLikes(compiled: Compiled): Pick<Flat, 'likes' | 'psiThird' | 'psiValue' | 'mixings'> {
  // A pair of equal charges without parameters adds nothing.
  const likes = compiled.likes.filter(({ theta, charges, psi }) => theta !== 0 || charges || psi.length > 0)
  const keys = [...new Set(likes.flatMap(({ charges }) => (charges ? [keyOf(charges)] : [])))]
  const starts = [0]
  for (const { psi } of likes) starts.push((starts.at(-1) ?? 0) + psi.length)
  return {
    likes: {
      first: Int32Array.from(likes, ({ first }) => first),
      second: Int32Array.from(likes, ({ second }) => second),
      theta: Float64Array.from(likes, ({ theta }) => theta),
      mixing: Int32Array.from(likes, ({ charges }) => (charges ? keys.indexOf(keyOf(charges)) : -1)),
      psiStart: Int32Array.from(starts),
    },
    psiThird: Int32Array.from(likes.flatMap(({ psi }) => psi.map(([third]) => third))),
    psiValue: Float64Array.from(likes.flatMap(({ psi }) => psi.map(([, value]) => value))),
    mixings: mixingsOf(keys.map((key) => key.split(' ').map(Number))),
  }
}

const keyOf = (charges: readonly [number, number]) => `${Math.min(...charges)} ${Math.max(...charges)}`

function mixingsOf(pairs: readonly (readonly number[])[]): Mixings {
  const products = [...new Set(pairs.flatMap(([p = 0, q = 0]) => [p * q, p * p, q * q]))]
  const placeOf = (of: (p: number, q: number) => number) =>
    Int32Array.from(pairs, ([p = 0, q = 0]) => products.indexOf(of(p, q)))
  return {
    products: Float64Array.from(products),
    cross: placeOf((p, q) => p * q),
    first: placeOf((p) => p * p),
    second: placeOf((_, q) => q * q),
  }
}
