import { describe, expect, it } from 'vitest'
import { fill, tellCode, tellFinding } from '../../src/worksheet/tell.ts'
import { evaluated, library, line } from '../evaluation/formulas.ts'

describe('fill', () => {
  it('writes values in the form that is asked for', () => {
    expect(fill('{grams:mass} of {total:whole}', { grams: 0.0005, total: 289.6 })).toBe('500 mcg of 290')
    expect(fill('{v:volume}, {x} and {who}', { v: 1234.5, x: 0.12345, who: 'Urea' })).toBe(
      '1,235 mL, 0.1235 and Urea',
    )
  })

  it('leaves a name without a value as it stands', () => {
    expect(fill('{nobody}', {})).toBe('{nobody}')
  })
})

describe('tellFinding', () => {
  it('leaves no name unfilled in findings that formulas raise', () => {
    const evaluations = [
      evaluated([]),
      evaluated([line('sodium-chlorid', '1 %'), line('mannitol', 'x'), line('urea', '5 mEq')]),
      evaluated([line('urea', '1.6 %'), line('magnesium-sulfate-heptahydrate', '8 %')], { balance: '1 g' }),
      evaluated([line('mannitol', '10 %'), line('sodium-chloride', 'q.s.')], {
        target: { quantity: 'osmolality', value: '290 mOsm/kg' },
      }),
      evaluated([line('urea', 'q.s.')], {
        target: { quantity: 'effective-osmolality', value: '290 mOsm/kg' },
      }),
      evaluated([{ ...line('sodium-chloride', 'q.s.'), cap: '0.1 %' }], {
        target: { quantity: 'osmolality', value: '290 mOsm/kg' },
      }),
      evaluated([line('dibucaine-hydrochloride', '9 %'), line('hypromellose', '0.3 %')]),
    ]
    const told = evaluations.flatMap(({ findings }) =>
      findings.map((finding) => tellFinding(finding, library)),
    )
    expect(told.length).toBeGreaterThan(11)
    for (const { message, wayOut } of told) {
      expect(message).not.toMatch(/[{}]|undefined|NaN/)
      expect(wayOut).not.toMatch(/[{}]|undefined|NaN/)
      expect(wayOut).not.toBe('')
    }
  })

  it('has words for why a method differs', () => {
    expect(tellCode('differs-ideal-count', library)).toMatch(/free and ideal/)
  })
})
