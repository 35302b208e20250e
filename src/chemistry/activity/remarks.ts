import { saltMolality, type Compiled } from './compiled.ts'

export interface PairRemark {
  readonly cation: string
  readonly anion: string
  readonly kind: 'missing' | 'beyond-range' | 'low-quality' | 'stand-in'
  /** Its part of all pairs, 0 to 1. */
  readonly weight: number
  readonly maximumMolality: number | null
}

/** Pairs that make the model less sure, with how much they weigh. A pair may be named for two reasons. */
export function pairRemarks(
  m: Float64Array,
  { pairs, missing, charges }: Compiled,
  ids: readonly string[],
): readonly PairRemark[] {
  const weigh = (cation: number, anion: number) =>
    Math.abs((m[cation] ?? 0) * (m[anion] ?? 0) * (charges[cation] ?? 0) * (charges[anion] ?? 0))
  const total =
    pairs.reduce((sum, { cation, anion }) => sum + weigh(cation, anion), 0) +
      missing.reduce((sum, [cation, anion]) => sum + weigh(cation, anion), 0) || 1
  const remark = (
    cation: number,
    anion: number,
    kind: PairRemark['kind'],
    maximumMolality: number | null,
  ): PairRemark => ({
    cation: ids[cation] ?? '',
    anion: ids[anion] ?? '',
    kind,
    weight: weigh(cation, anion) / total,
    maximumMolality,
  })
  return [
    ...missing.map(([cation, anion]) => remark(cation, anion, 'missing', null)),
    ...pairs
      .filter((pair) => saltMolality(pair, m) > pair.row.maximumMolality)
      .map(({ cation, anion, row }) => remark(cation, anion, 'beyond-range', row.maximumMolality)),
    ...pairs.flatMap(({ cation, anion, row: { quality } }) =>
      quality ? [remark(cation, anion, quality === 'low' ? 'low-quality' : 'stand-in', null)] : [],
    ),
  ]
}
