import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import { contentOf, ordinaryContent } from '../../../src/evaluation/forms/certificate.ts'
import { emptyFormula } from '../../../src/formula/document.ts'
import type { Certificate, FormulaLine } from '../../../src/formula/types.ts'
import { formFactor, shelfForms } from '../../../src/library/forms.ts'
import { loadLibrary } from '../../../src/library/library.ts'

const library = loadLibrary()
const ingredient = (id: string) => library.ingredients.get(id)!
const factor = (article: string, orderedAs: string) =>
  formFactor(ingredient(article), orderedAs, library.ingredients, library.moieties)?.factor

const evaluated = (line: Omit<FormulaLine, 'key'>, balance?: string) => {
  const { target: _none, ...empty } = emptyFormula()
  return evaluate(
    { ...empty, route: 'irrigation', lines: [{ key: 'k', ...line }], ...(balance ? { balance } : {}) },
    library,
  )
}

describe('form factors', () => {
  /* Molar masses of the pharmacopoeial monographs, the quotient of two of them; common practice. */
  it.each([
    ['lidocaine-hydrochloride-monohydrate', 'lidocaine-base', 288.81 / 234.34],
    ['epinephrine-bitartrate', 'epinephrine-base', 333.29 / 183.2],
    ['timolol-maleate', 'timolol-base', 432.49 / 316.42],
    ['fentanyl-citrate', 'fentanyl-base', 528.59 / 336.47],
    ['atropine-sulfate-monohydrate', 'atropine-base', 694.83 / (2 * 289.37)],
    ['sodium-phosphate-dibasic-dodecahydrate', 'dibasic-sodium-phosphate', 358.14 / 141.96],
    ['sodium-phosphate-dibasic-heptahydrate', 'sodium-phosphate-dibasic-dodecahydrate', 268.07 / 358.14],
    ['zinc-sulfate-heptahydrate', 'zinc-element', 287.5 / 65.38],
  ])('%s for %s', (article, orderedAs, expected) => {
    expect(factor(article, orderedAs)! / expected).toBeCloseTo(1, 3)
  })

  it('labels: timolol 0.5 % is 6.83 mg/mL of the maleate; fentanyl 50 mcg is 78.5 mcg of the citrate', () => {
    const timolol = evaluated({ ingredient: 'timolol-maleate', amount: '0.5 %', orderedAs: 'timolol-base' })
    expect(timolol.lines[0]!.grams! * 10).toBeCloseTo(6.83, 2)
    const fentanyl = evaluated({
      ingredient: 'fentanyl-citrate',
      amount: '50 mcg',
      orderedAs: 'fentanyl-base',
    })
    expect(fentanyl.lines[0]!.grams! * 1e6).toBeCloseTo(78.5, 0)
  })

  it('calcium gluconate: 0.465 mEq in 100 mg as anhydrous (the label), 0.446 as the monohydrate that is weighed', () => {
    const milliequivalents = (orderedAs?: string) =>
      evaluated({
        ingredient: 'calcium-gluconate-monohydrate',
        amount: '100 mg/mL',
        ...(orderedAs ? { orderedAs } : {}),
      }).electrolytes.find(({ ion }) => ion === 'Ca+2')!.mEqPerMl!
    expect(milliequivalents('calcium-gluconate')).toBeCloseTo(0.465, 3)
    expect(milliequivalents()).toBeCloseTo(0.446, 3)
  })

  it('moles count the ordered part: 1 mmol of atropine base is half a millimole of the sulfate', () => {
    const line = evaluated({
      ingredient: 'atropine-sulfate-monohydrate',
      amount: '1 mmol',
      orderedAs: 'atropine-base',
    })
    expect(line.lines[0]!.millimoles).toBeCloseTo(0.5, 9)
  })

  it('another shelf form keeps the dose: same osmolality from any hydrate', () => {
    const readings = shelfForms('sodium-phosphate-dibasic-heptahydrate', library.moieties).map(
      (id) =>
        evaluated({ ingredient: id, amount: '1.5 %', orderedAs: 'sodium-phosphate-dibasic-heptahydrate' })
          .solution!.osmolality.value,
    )
    expect(readings.length).toBe(4)
    for (const reading of readings) expect(reading).toBeCloseTo(readings[0]!, 6)
  })

  it('refuses a form that the article does not hold', () => {
    const evaluation = evaluated({
      ingredient: 'timolol-maleate',
      amount: '0.5 %',
      orderedAs: 'zinc-element',
    })
    expect(evaluation.findings.find(({ blocks }) => blocks)?.code).toBe('ordered-form-unknown')
  })

  it('knows every ingredient it names, and weighs no less of a salt than of its base', () => {
    for (const moiety of library.moieties) {
      for (const { ingredient: id } of moiety.forms) {
        expect(library.ingredients.has(id), id).toBe(true)
        expect(factor(id, moiety.id), `${id} for ${moiety.id}`).toBeGreaterThan(0.999)
      }
    }
  })
})

describe('certificates', () => {
  const weighed = (id: string, certificate: Certificate, amount = '1 g') =>
    evaluated({ ingredient: id, amount, certificate }).lines[0]!.articleGrams!

  it('as is: 98 % content weighs 1 / 0.98', () => {
    expect(weighed('mannitol', { assayPercent: 98 })).toBeCloseTo(1 / 0.98, 9)
  })

  it('anhydrous basis of an article named with its crystal water: the docstring case', () => {
    const content = contentOf(ingredient('citric-acid-monohydrate'), {
      assayPercent: 99.5,
      assayBasis: 'anhydrous',
      waterPercent: 8.6,
    })
    expect(content).toBeCloseTo((0.995 * 0.914 * 210.14) / 192.12, 3)
  })

  it('a perfect hydrate with a perfect certificate weighs its name', () => {
    const water = ((100 * 18.0153) / 210.138) * 1
    expect(
      contentOf(ingredient('citric-acid-monohydrate'), {
        assayPercent: 100,
        assayBasis: 'anhydrous',
        waterPercent: water,
      }),
    ).toBeCloseTo(1, 5)
  })

  it('an effloresced hydrate holds more than its name: less of it is weighed', () => {
    const certificate = { assayPercent: 100, assayBasis: 'dried', waterPercent: 40 } as const
    expect(weighed('sodium-phosphate-dibasic-heptahydrate', certificate)).toBeLessThan(0.95)
  })

  it('the osmolality is that of the substance, whatever the lot holds', () => {
    const plain = evaluated({ ingredient: 'mannitol', amount: '5 %' })
    const lot = evaluated({ ingredient: 'mannitol', amount: '5 %', certificate: { assayPercent: 97 } })
    expect(lot.solution!.osmolality.value).toBeCloseTo(plain.solution!.osmolality.value, 9)
  })

  it('rounds what lies on the balance and evaluates what it holds', () => {
    const line = evaluated(
      { ingredient: 'mannitol', amount: '1 g', certificate: { assayPercent: 98 } },
      '10 mg',
    ).lines[0]!
    expect(line.articleGrams).toBeCloseTo(1.02, 12)
    expect(line.grams).toBeCloseTo(1.02 * 0.98, 12)
  })

  it.each([
    [ordinaryContent.low, null],
    [ordinaryContent.low - 0.1, 'certificate-unusual'],
    [ordinaryContent.high, null],
    [ordinaryContent.high + 0.1, 'certificate-unusual'],
    [115, 'certificate-unusual'],
    [115.1, 'certificate-impossible'],
    [0, 'certificate-impossible'],
  ] as const)('an assay of %s %%: %s', (assayPercent, code) => {
    const codes = evaluated({
      ingredient: 'mannitol',
      amount: '1 g',
      certificate: { assayPercent },
    }).findings.map((finding) => finding.code)
    const told = codes.filter((each) => each.startsWith('certificate'))
    expect(told).toEqual(code === null ? [] : [code])
  })

  it('asks for the water where the basis needs it', () => {
    const certificate = { assayPercent: 99, assayBasis: 'anhydrous' } as const
    const codes = evaluated({ ingredient: 'mannitol', amount: '1 g', certificate }).findings.map(
      ({ code }) => code,
    )
    expect(codes).toContain('certificate-without-water')
  })

  it('turns units into mass by the potency of the lot, and refuses them without', () => {
    const line = { ingredient: 'polymyxin-b-sulfate', amount: '10000 units/mL' }
    const without = evaluated(line)
    expect(without.findings.find(({ blocks }) => blocks)?.code).toBe('amount-unusable')
    const lot = evaluated({ ...line, certificate: { unitsPerMg: 8000 } })
    expect(lot.lines[0]!.grams).toBeCloseTo((10_000 * 100) / 8000 / 1000, 9)
  })
})
