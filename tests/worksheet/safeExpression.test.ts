import { readdirSync, readFileSync } from 'node:fs'
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { routeIds, type Formula } from '../../src/formula/types.ts'
import { buildWorksheet } from '../../src/worksheet/build.ts'
import { loadDevices } from '../../src/library/devices.ts'
import { documentIds } from '../../src/worksheet/types.ts'
import { tellFinding } from '../../src/worksheet/tell.ts'
import { formulaOfOrdinary, ordinary } from '../evaluation/cautions/ordinary.ts'
import { formulaOf, library, line, type WrittenLine } from '../evaluation/formulas.ts'
import { expressionRules, violationsIn } from './expressionRules.ts'
import { printed } from './printed.ts'

const sheetOf = (formula: Formula) => buildWorksheet(evaluate(formula, library), library, 'A4', documentIds)
const violationsOf = (formula: Formula) => violationsIn(printed(sheetOf(formula)))

const folder = new URL('../../data/demos/', import.meta.url)
const demos = readdirSync(folder).map(
  (name) => [name, JSON.parse(readFileSync(new URL(name, folder), 'utf8')) as Formula] as const,
)

describe('the rules of safe expression', () => {
  it.each([
    ['no trailing zero', '10.0 mg', '10 mg'],
    ['no trailing zero', 'pH 7.40', 'pH 7.4'],
    ['no naked decimal point', 'give .5 mg', 'give 0.5 mg'],
    ['no micro sign', '5 µg', '5 mcg'],
    ['no micro sign', '5 ug', '5 mcg'],
    ['no exponent', '1e-5 g', '10 mcg'],
    ['thousands are marked', '10000 mcg', '10,000 mcg'],
    ['a space before the unit', '10mg', '10 mg'],
    ['no abbreviation of the error-prone list', '10 U of it', '10 units of it'],
    ['no abbreviation of the error-prone list', 'MgSO4 4 g', 'magnesium sulfate 4 g'],
    ['no abbreviation of the error-prone list', '5 cc', '5 mL'],
    ['no hole', 'at {strength} %', 'at 5 %'],
  ])('%s: “%s” is caught, “%s” is not', (rule, wrong, right) => {
    const broken = (text: string) => violationsIn([{ at: '', text }]).map((each) => each.rule)
    expect(expressionRules.map(({ name }) => name)).toContain(rule)
    expect(broken(wrong)).toContain(rule)
    expect(broken(right)).toEqual([])
  })
})

describe('every text of a sheet', () => {
  it.each(demos)('of the demo %s', (_, formula) => {
    expect(violationsOf(formula)).toEqual([])
    expect(printed(sheetOf(formula)).length).toBeGreaterThan(100)
  })

  it.each(ordinary.map((each) => [each.name, each] as const))('of %s', (_, each) => {
    expect(violationsOf(formulaOfOrdinary(each))).toEqual([])
  })
})

const ids = [...library.ingredients.keys()].toSorted()

interface Writing {
  readonly figure: fc.Arbitrary<string>
  readonly unit: readonly string[]
  readonly space: readonly string[]
  readonly finalVolume: readonly string[]
  readonly balance: readonly string[]
  readonly excess: readonly string[]
  readonly dose: readonly string[]
  readonly target: string
}

const careful: Writing = {
  figure: fc.oneof(
    fc.integer({ min: 1, max: 999 }).map(String),
    fc.integer({ min: 1, max: 4000 }).map((hundredths) => String(hundredths / 100)),
  ),
  unit: ['%', 'mg/mL', 'mmol/L', 'mg', 'mcg', 'mcg/mL', 'mEq'],
  space: [' '],
  finalVolume: ['10 mL', '100 mL', '0.5 L', '3 L'],
  balance: ['0.1 mg', '1 mg', '10 mg'],
  excess: ['5 mL', '500 mL'],
  dose: ['0.5 mL', '20 mL'],
  target: '290 mOsm/kg',
}

const careless: Writing = {
  figure: fc.oneof(
    fc.integer({ min: 1000, max: 40_000 }).map(String),
    fc.integer({ min: 1, max: 4000 }).map((hundredths) => (hundredths / 100).toFixed(2)),
    fc.integer({ min: 1, max: 999 }).map((thousandths) => `.${String(thousandths).padStart(3, '0')}`),
  ),
  unit: [...careful.unit, 'µg', 'ug'],
  space: ['', ' '],
  finalVolume: ['10.0 mL', '1000 mL', '.5 L', '3000mL'],
  balance: ['.1 mg', '1.0 mg'],
  excess: ['5.0 mL', '1500 mL'],
  dose: ['.5 mL', '20.0 mL'],
  target: '290.0 mOsm/kg',
}

const anyLine = ({ figure, unit, space }: Writing): fc.Arbitrary<WrittenLine> =>
  fc
    .tuple(fc.constantFrom(...ids), figure, fc.constantFrom(...space), fc.constantFrom(...unit))
    .map(([ingredient, ...amount]) => line(ingredient, amount.join('')))

const anyFormula = (writing: Writing): fc.Arbitrary<Formula> =>
  fc
    .record({
      lines: fc.uniqueArray(anyLine(writing), {
        minLength: 1,
        maxLength: 5,
        selector: ({ ingredient }) => ingredient,
      }),
      adjusted: fc.boolean(),
      route: fc.constantFrom(...routeIds),
      finalVolume: fc.constantFrom(...writing.finalVolume),
      balance: fc.constantFrom(...writing.balance),
      pH: fc.constantFrom(undefined, 4, 5.5, 7, 8.2),
      units: fc.constantFrom(1, 12, 2500),
      excess: fc.constantFrom(...writing.excess),
      ageYears: fc.constantFrom(0.05, 8, 40),
      weightKg: fc.constantFrom(1.5, 25, 70),
      doseVolume: fc.constantFrom(...writing.dose),
    })
    .map(({ lines, adjusted, pH, units, excess, ageYears, weightKg, doseVolume, ...rest }) => {
      const others = lines.filter(({ ingredient }) => ingredient !== 'sodium-chloride')
      return formulaOf(adjusted ? [...others, line('sodium-chloride', 'q.s.')] : lines, {
        ...rest,
        target: { quantity: 'osmolality', value: writing.target },
        batch: { units, excess },
        patient: { ageYears, weightKg, doseVolume },
        ...(pH === undefined ? {} : { pH }),
      })
    })

const allSafe = (writing: Writing) =>
  fc.assert(
    fc.property(anyFormula(writing), (formula) => {
      expect(violationsOf(formula)).toEqual([])
    }),
    { numRuns: 150 },
  )

const findingTexts = (formula: Formula) =>
  evaluate(formula, library).findings.map((finding) => ({
    at: finding.code,
    text: Object.values(tellFinding(finding, library)).join(' '),
  }))

describe('a made-up formula', () => {
  it('is printed in safe expression', () => {
    allSafe(careful)
  }, 120_000)

  it('written carelessly has its findings told in safe expression', () => {
    fc.assert(
      fc.property(anyFormula(careless), (formula) => {
        expect(violationsIn(findingTexts(formula))).toEqual([])
      }),
      { numRuns: 150 },
    )
  }, 120_000)

  it('written carelessly is printed in safe expression', () => {
    allSafe(careless)
  }, 120_000)
})

describe('the names of devices', () => {
  it('are in safe expression', () => {
    expect(violationsIn(loadDevices().map(({ id, name }) => ({ at: id, text: name })))).toEqual([])
  })
})

describe('the words of findings and cautions', () => {
  it('are in safe expression before any value is filled in', () => {
    const words = [...library.findings.values()].map(({ code, message, wayOut }) => ({
      at: code,
      text: `${message} ${wayOut}`.replaceAll(/\{\w+(:\w+)?\}/g, '5'),
    }))
    expect(violationsIn(words)).toEqual([])
    expect(words.length).toBeGreaterThan(300)
  })
})
