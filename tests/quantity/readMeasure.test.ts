import { describe, expect, it } from 'vitest'
import type { Read } from '../../src/quantity/amount.ts'
import {
  readMass,
  readReadability,
  readTarget,
  readTemperature,
  readVolume,
  type TargetKind,
} from '../../src/quantity/readMeasure.ts'

const codeOf = (read: Read<number>) => (read.ok ? `read as ${read.value}` : read.refusal.code)

describe('volume, mass and readability', () => {
  it('reads the examples', () => {
    expect(readVolume('1 L')).toEqual({ ok: true, value: 1000 })
    expect(readVolume('2 x 50 mL')).toEqual({ ok: true, value: 100 })
    expect(readMass('2 * 0.25 g')).toEqual({ ok: true, value: 0.5 })
    expect(readReadability('1 mg')).toEqual({ ok: true, value: 0.001 })
    expect(readReadability('0,01 mg', 'decimal-comma')).toEqual({ ok: true, value: 0.00001 })
  })

  it('refuses a unit of another kind and says which kind is meant', () => {
    expect(readVolume('100 g')).toEqual({
      ok: false,
      refusal: {
        code: 'unit-of-the-wrong-kind',
        message: '“100 g” is a mass; a volume is needed.',
        wayOut: 'Write a volume, such as 100 mL.',
      },
    })
    expect(codeOf(readMass('5 mL'))).toBe('unit-of-the-wrong-kind')
    expect(codeOf(readVolume('q.s.'))).toBe('unit-of-the-wrong-kind')
    expect(codeOf(readVolume('100'))).toBe('unit-missing')
    expect(codeOf(readVolume('0 mL'))).toBe('zero')
    expect(codeOf(readVolume(''))).toBe('empty')
    expect(codeOf(readReadability('2 kg'))).toBe('absurd-size')
    expect(codeOf(readReadability('0.1 ng'))).toBe('absurd-size')
  })
})

describe('temperature', () => {
  it.each([
    ['25 °C', 25],
    ['25°C', 25],
    ['37 C', 37],
    ['25 ℃', 25],
    ['298.15 K', 25],
    ['310.15 K', 37],
    ['0 °C', 0],
    ['100 °C', 100],
  ])('reads %s', (text, celsius) => {
    expect(readTemperature(text)).toEqual({ ok: true, value: celsius })
  })

  it.each([
    ['25', 'unit-missing'],
    ['77 °F', 'unit-missing'],
    ['101 °C', 'absurd-size'],
    ['25 K', 'absurd-size'],
    ['-4 °C', 'negative'],
    ['°C', 'malformed-number'],
    ['2 5 °C', 'space-in-number'],
    ['25,5 °C', 'ambiguous-mark'],
    ['', 'unit-missing'],
  ])('refuses “%s”: %s', (text, code) => {
    expect(codeOf(readTemperature(text))).toBe(code)
  })
})

describe('target', () => {
  const taken: readonly (readonly [TargetKind, string, number])[] = [
    ['osmolality', '290 mOsm/kg', 290],
    ['osmolality', '290 mOsmol/kg', 290],
    ['osmolality', '290 mosm per kg water', 290],
    ['osmolality', '0.29 Osm/kg', 290],
    ['effective-osmolality', '308 mOsm/kg', 308],
    ['sodium-chloride-equivalent', '0.9 %', 0.9],
    ['sodium-chloride-equivalent', '0.9 % w/v', 0.9],
    ['freezing-point-depression', '0.52 K', 0.52],
    ['freezing-point-depression', '0.52 °C', 0.52],
  ]
  it.each(taken)('%s: reads %s', (quantity, text, value) => {
    expect(readTarget(quantity, text)).toEqual({ ok: true, value })
  })

  const refused: readonly (readonly [TargetKind, string, string])[] = [
    ['osmolality', '290', 'unit-missing'],
    ['osmolality', '290 mOsm/L', 'unit-of-the-wrong-kind'],
    ['osmolality', '0.9 %', 'unit-of-the-wrong-kind'],
    ['osmolality', '0 mOsm/kg', 'zero'],
    ['osmolality', '290000 mOsm/kg', 'absurd-size'],
    ['osmolality', 'mOsm/kg', 'malformed-number'],
    ['osmolality', '280-300 mOsm/kg', 'minus'],
    ['sodium-chloride-equivalent', '0.9 % w/w', 'unit-of-the-wrong-kind'],
    ['sodium-chloride-equivalent', '90 %', 'absurd-size'],
    ['freezing-point-depression', '-0.52 °C', 'negative'],
    ['freezing-point-depression', '0.52', 'unit-missing'],
    ['freezing-point-depression', '272.6 K', 'absurd-size'],
  ]
  it.each(refused)('%s: refuses %s with %s', (quantity, text, code) => {
    expect(codeOf(readTarget(quantity, text))).toBe(code)
  })
})
