import type { Bench, BenchBalance, BenchMeasure, Formula } from '../../formula/types.ts'
import { loadDeviceData } from '../../library/devices.ts'
import type { Library } from '../../library/library.ts'
import type { Read } from '../../quantity/amount.ts'
import { readMass, readReadability, readVolume } from '../../quantity/readMeasure.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import { ownMeasure, type Measure } from './measures.ts'
import { scaleOf, type Scale } from './scales.ts'

export interface ReadBench {
  readonly scales: readonly Scale[]
  /** Measures of one's own; empty: volumes are not rounded. */
  readonly measures: readonly Measure[]
  readonly findings: readonly Finding[]
}

type Reader = <T>(part: string, text: string | undefined, read: (text: string) => Read<T>) => T | null

/** The balances and measures that a formula names, `balance` among them as one without a name. */
export function readBench(formula: Formula, readabilityG: number | null, library: Library): ReadBench {
  const findings: Finding[] = []
  const readerOf =
    (device: string): Reader =>
    (part, text, read) => {
      if (text === undefined) return null
      const result = read(text)
      if (result.ok) return result.value
      const { message, wayOut } = result.refusal
      const values = { device, part, text, reason: message, instead: wayOut }
      findings.push(findingOf(library, 'bench-unreadable', { values, blocks: true }))
      return null
    }
  const bench: Bench = formula.bench ?? {}
  const plain = readabilityG === null ? [] : [plainScale(readabilityG)]
  const scales = (bench.balances ?? []).flatMap((own) => ownScale(own, readerOf(own.name)))
  const measures = (bench.measures ?? []).flatMap((own) => {
    const measure = readMeasure(own, readerOf(own.name))
    if (measure === 'unknown-tolerance') {
      findings.push(findingOf(library, 'measure-without-tolerance', { values: { device: own.name } }))
    }
    return measure === null || measure === 'unknown-tolerance' ? [] : [measure]
  })
  return { scales: [...plain, ...scales], measures, findings }
}

const nothing = { repeatabilityG: null, sensitivityG: null, allowedErrorPercent: null, capacityG: null }

const plainScale = (readabilityG: number): Scale =>
  scaleOf({ name: '', readabilityG, ...nothing }, loadDeviceData().rules)

function ownScale(own: BenchBalance, read: Reader): readonly Scale[] {
  const readabilityG = read('readability', own.readability, readReadability)
  const data = {
    name: own.name || 'balance',
    repeatabilityG: read('repeatability', own.repeatability, readMass),
    sensitivityG: read('sensitivity', own.sensitivity, readMass),
    allowedErrorPercent: own.allowedErrorPercent ?? null,
    capacityG: read('capacity', own.capacity, readMass),
  }
  return readabilityG === null ? [] : [scaleOf({ ...data, readabilityG }, loadDeviceData().rules)]
}

function readMeasure(own: BenchMeasure, read: Reader): Measure | 'unknown-tolerance' | null {
  const capacityMl = read('capacity', own.capacity, readVolume)
  const graduationMl = read('graduation', own.graduation, readVolume)
  const toleranceMl = read('tolerance', own.tolerance, readVolume)
  if (capacityMl === null) return null
  const { name, kind } = own
  const data = { name, kind, capacityMl, graduationMl, toleranceMl }
  return ownMeasure(data, loadDeviceData()) ?? 'unknown-tolerance'
}
