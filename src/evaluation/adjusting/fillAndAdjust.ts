import { findingOf } from '../finding.ts'
import type { Lowered } from '../lowering.ts'
import { portionsOf } from '../model.ts'
import { filled, isOverfull } from '../stocks/fill.ts'
import type { Finding } from '../types.ts'
import { adjust, type Adjusted } from './adjust.ts'
import type { Plan } from './plan.ts'

export interface FilledAndAdjusted {
  /** All masses, vehicle and adjuster among them. */
  readonly lowered: readonly Lowered[]
  readonly adjusted: Adjusted | null
  readonly findings: readonly Finding[]
}

const mostRounds = 30
const settledShare = 1e-9

/**
 * The vehicle fills around the solutes and the adjuster is sized on top; each leaves the other less room, so both are
 * repeated until they agree.
 */
export function fillAndAdjust(lowered: readonly Lowered[], plan: Plan): FilledAndAdjusted {
  if (plan.fills.length === 0) {
    const adjusted = adjustedOn(lowered, plan)
    const all = [...lowered, ...(adjusted?.lowered ?? [])]
    return { lowered: all, adjusted, findings: isOverfull(all, plan) ? [about('stocks-overfill', plan)] : [] }
  }
  let adjusted: Adjusted | null = null
  let before = Number.NaN
  for (let round = 0; round < mostRounds; round += 1) {
    const around: readonly Lowered[] = [...lowered, ...(adjusted?.lowered ?? [])]
    const vehicle = filled(around, plan)
    if (!vehicle) return { lowered: around, adjusted, findings: [about('no-room-for-vehicle', plan)] }
    const volume = vehicle[0]?.millilitres ?? 0
    const all = [...around, ...vehicle]
    if (Math.abs(volume - before) <= settledShare * volume) return { lowered: all, adjusted, findings: [] }
    before = volume
    adjusted = adjustedOn([...lowered, ...vehicle], plan)
    if (!adjusted || adjusted.lowered.length === 0) return { lowered: all, adjusted, findings: [] }
  }
  return { lowered, adjusted, findings: [about('vehicle-not-settled', plan)] }
}

function adjustedOn(lowered: readonly Lowered[], plan: Plan): Adjusted | null {
  if (plan.adjusters.length === 0 || !plan.target) return null
  return adjust(portionsOf(plan, lowered), plan.target, plan)
}

function about(code: string, { library, fills, solutes, setting }: Plan): Finding {
  const lines = fills.length > 0 ? fills : solutes.filter(({ stock }) => stock)
  const names = [...new Set(lines.map(({ stock }) => stock?.stock.name ?? ''))]
  return findingOf(library, code, {
    values: { stock: names.join(', '), volume: setting.volumeMl },
    lineKeys: [...new Set(lines.map(({ stock, key }) => stock?.lineKey ?? key))],
    blocks: true,
  })
}
