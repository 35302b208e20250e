import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import type { Evaluation } from '../../../src/evaluation/types.ts'
import type { Formula } from '../../../src/formula/types.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { readAmount } from '../../../src/quantity/readAmount.ts'
import { buildWorksheet } from '../../../src/worksheet/build.ts'
import { documentIds } from '../../../src/worksheet/types.ts'
import { evaluated, library, line, solved } from '../formulas.ts'
import { printed } from '../../worksheet/printed.ts'

/* What no finding can say: here the way in which the work is done keeps the failure out. */

const sheetOf = (evaluation: Evaluation) => buildWorksheet(evaluation, library, 'A4', documentIds)
const textsOf = (evaluation: Evaluation) => printed(sheetOf(evaluation)).map(({ text }) => text)
const lineOf = (evaluation: Evaluation, id: string) => {
  const found = evaluation.lines.find(({ ingredient }) => ingredient.id === id)
  if (!found) throw new Error(`no line ${id}`)
  return found
}

describe('print that differs from the screen', () => {
  const drops = [
    line('pilocarpine-hydrochloride', '1 %'),
    line('benzalkonium-chloride', '0.01 %'),
    line('sodium-chloride', 'q.s.'),
  ]
  const rest: Partial<Formula> = {
    pH: 5.5,
    balance: '1 mg',
    target: { quantity: 'osmolality', value: '290 mOsm/kg' },
  }
  const evaluation = evaluated(drops, rest)

  it('is one text from one evaluation', () => {
    const again = sheetOf(evaluate(evaluation.formula, library))
    expect(again).toEqual(sheetOf(evaluation))
  })

  it('prints the osmolality and the masses of the evaluation, and its library on every page', () => {
    const texts = textsOf(evaluation)
    const whole = Math.round(solved(evaluation).osmolality.value)
    expect(texts.some((text) => text.startsWith(`${whole} mOsm/kg`))).toBe(true)
    const sodiumChloride = lineOf(evaluation, 'sodium-chloride').grams ?? NaN
    const masses = texts.flatMap((text) => {
      const read = readAmount(text)
      return read.ok && read.value.kind === 'mass' ? [read.value.value] : []
    })
    expect(masses.some((grams) => Math.abs(grams - sodiumChloride) < 1e-9)).toBe(true)
    const { documents } = sheetOf(evaluation)
    expect(documents).toHaveLength(documentIds.length)
    for (const { pageMark } of documents) expect(pageMark).toContain(evaluation.libraryVersion)
  })

  it('follows when an excipient is changed late', () => {
    const later = evaluated([...drops, line('mannitol', '1 %')], rest)
    const saltOf = (each: Evaluation) => lineOf(each, 'sodium-chloride').grams ?? NaN
    expect(saltOf(later)).toBeLessThan(saltOf(evaluation) - 0.1)
    expect(solved(later).osmolality.value).toBeCloseTo(290, 0)
    expect(textsOf(later)).not.toEqual(textsOf(evaluation))
  })
})

describe('a density or assay that is wrong', () => {
  it('is a mass by the density of the library where the order is by volume', () => {
    const [byVolume, byWeight] = ['20 mL', '20 g'].map((amount) =>
      lineOf(evaluated([line('ethanol', amount)], { route: 'otic' }), 'ethanol'),
    )
    const density = library.ingredients.get('ethanol')?.density?.value ?? NaN
    expect(density).toBeCloseTo(0.789, 2)
    expect(byVolume?.grams).toBeCloseTo(20 * density, 6)
    expect(byWeight?.grams).toBeCloseTo(20, 6)
  })

  it('weighs more of an article that is not pure: 85 % glycerin for the same substance', () => {
    const pure = library.ingredients.get('glycerin')
    if (!pure) throw new Error('no glycerin')
    const dilute: Ingredient = {
      ...pure,
      id: 'glycerin-85-percent',
      name: 'Glycerin 85 percent',
      article: {
        massFraction: {
          value: 0.85,
          unit: 'g/g',
          kind: 'tabulated',
          source: 'common-practice',
          confidence: 'medium',
          fromMemory: true,
        },
        density: {
          value: 1.22,
          unit: 'g/mL',
          kind: 'tabulated',
          source: 'from-memory',
          confidence: 'medium',
          fromMemory: true,
        },
      },
    }
    const evaluation = evaluated([line(dilute, '2.5 g')], { route: 'otic' })
    const [entry] = evaluation.lines
    expect(entry?.grams).toBeCloseTo(2.5, 6)
    expect(entry?.articleGrams).toBeCloseTo(2.5 / 0.85, 6)
    const plain = evaluated([line('glycerin', '2.5 g')], { route: 'otic' })
    expect(solved(evaluation).osmolality.value).toBeCloseTo(solved(plain).osmolality.value, 6)
  })
})

describe('a hydrate that is mixed up', () => {
  it('weighs by the form of the line, and the sheet prints form and molar mass', () => {
    const rest: Partial<Formula> = { route: 'intravenous-peripheral', balance: '1 mg' }
    const forms = ['calcium-chloride-dihydrate', 'calcium-gluconate-monohydrate'] as const
    const [chloride, gluconate] = forms.map((id) =>
      evaluated([line('sodium-chloride', '0.9 %'), line(id, '0.5 mmol')], rest),
    )
    if (!chloride || !gluconate) throw new Error('no evaluations')
    /* 147.01 g/mol and 448.39 g/mol: a gram for a gram is three times the calcium. */
    const ratio = (lineOf(gluconate, forms[1]).grams ?? NaN) / (lineOf(chloride, forms[0]).grams ?? NaN)
    expect(ratio).toBeGreaterThan(3)
    expect(ratio).toBeLessThan(3.1)
    const texts = textsOf(chloride)
    expect(texts).toContain('Calcium chloride dihydrate')
    expect(texts.some((text) => /CaCl2·2H2O, 147\.\d+ g\/mol/.test(text))).toBe(true)
  })
})

describe('borate by one pKa', () => {
  const vehicle = (factor: number) =>
    solved(
      evaluated(
        [line('boric-acid', `${1.15 * factor} %`), line('sodium-borate-decahydrate', `${0.13 * factor} %`)],
        { finalVolume: '1000 mL' },
      ),
    ).pH

  it('is solved with its polyborates: below what pKa 9.24 alone gives, and higher when diluted', () => {
    /* Boron as acid 11.5 g / 61.83 and 2 of the 4 in borax 1.3 g / 381.4; the other 2 as borate. */
    const borate = (2 * 1.3) / 381.4
    const acid = 11.5 / 61.83 + borate
    const simple = 9.24 + Math.log10(borate / acid)
    const [whole, half, tenth] = [vehicle(1), vehicle(0.5), vehicle(0.1)]
    if (!whole || !half || !tenth) throw new Error('no pH')
    expect(simple - whole).toBeGreaterThan(0.3)
    expect(half - whole).toBeGreaterThan(0.2)
    expect(tenth).toBeGreaterThan(half)
  })
})

describe('a base of sodium chloride drawn from a concentrate', () => {
  it('has a second calculation to sign for on the sheet', () => {
    const texts = textsOf(evaluated([line('sodium-chloride', '0.9 %')], { route: 'intravenous-peripheral' }))
    expect(texts.some((text) => /second person/.test(text))).toBe(true)
  })
})
