import { describe, expect, it } from 'vitest'
import { answer } from '../../src/worksheet/answer.ts'
import { evaluated, library, line } from '../evaluation/formulas.ts'

interface Printed {
  readonly status: string
  readonly solution: Readonly<Record<string, unknown>>
  readonly methods: readonly Readonly<Record<string, unknown>>[]
  readonly lines: readonly Readonly<Record<string, unknown>>[]
  readonly findings: readonly Readonly<Record<string, unknown>>[]
}

const printed = (...asked: Parameters<typeof evaluated>) =>
  JSON.parse(JSON.stringify(answer(evaluated(...asked), library))) as Printed

const solutionKeys = [
  'osmolality_mOsm_per_kg',
  'osmolality_low_mOsm_per_kg',
  'osmolality_high_mOsm_per_kg',
  'osmolality_by_temperature',
  'osmolarity_mOsm_per_L',
  'effective_osmolality_mOsm_per_kg',
  'freezing_point_depression_K',
  'sodium_chloride_equivalent_percent',
  'osmotic_coefficient',
  'water_activity',
  'label_osmolarity_mOsm_per_L',
  'ionic_strength_mol_per_kg',
  'pH',
  'pH_by_temperature',
  'density_g_per_mL',
  'water_kg_per_L',
]
const methodKeys = ['method', 'osmolality_mOsm_per_kg', 'adjuster_g', 'isotonic_volume_mL']
const lineKeys = [
  'ingredient',
  'grams',
  'mmol',
  'particles_formal',
  'particles_counted',
  'share_of_particles_percent',
  'osmolality_share_mOsm_per_kg',
]
const findingKeys = ['code', 'severity', 'message', 'ingredients', 'source']

describe('the printed answer', () => {
  const lines = [line('pilocarpine-hydrochloride', '1 %'), line('sodium-chloride', 'q.s.')]
  const target = { quantity: 'osmolality', value: '290 mOsm/kg' } as const

  it('carries every key of the contract when there is an answer', () => {
    const result = printed(lines, { target, pH: 5 })
    expect(result.status).toBe('ok')
    for (const key of solutionKeys) expect(result.solution[key], key).not.toBeUndefined()
    expect(result.methods.map(({ method }) => method)).toEqual([
      'sodium-chloride-equivalent',
      'freezing-point',
      'l-iso',
      'vant-hoff',
      'electrolyte',
    ])
    for (const method of result.methods)
      expect(Object.keys(method)).toEqual(expect.arrayContaining(methodKeys))
    for (const row of result.lines) expect(Object.keys(row)).toEqual(expect.arrayContaining(lineKeys))
    for (const finding of result.findings)
      expect(Object.keys(finding)).toEqual(expect.arrayContaining(findingKeys))
    expect(result.solution['osmolality_mOsm_per_kg']).toBeCloseTo(290, 6)
  })

  it('carries the same keys with null when blocked, and no number for what is missing', () => {
    const result = printed([...lines, line('no-such-thing', '1 %')], { target })
    expect(result.status).toBe('blocked')
    const numbers = JSON.stringify(result.solution).match(/\d+(?=[,}])/g)
    expect(numbers).toBeNull()
    for (const key of solutionKeys) expect(Object.keys(result.solution)).toContain(key)
    expect(result.methods.every((method) => method['osmolality_mOsm_per_kg'] === null)).toBe(true)
    expect(result.lines.map(({ ingredient }) => ingredient)).toEqual([
      'pilocarpine-hydrochloride',
      'sodium-chloride',
      'no-such-thing',
    ])
    expect(result.lines[1]?.['grams']).toBeNull()
    expect(result.findings[0]).toMatchObject({ severity: 'stop', ingredients: ['no-such-thing'] })
  })
})
