import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import { emptyFormula } from '../../../src/formula/document.ts'
import type { Formula, FormulaLine } from '../../../src/formula/types.ts'
import { loadLibrary } from '../../../src/library/library.ts'

const library = loadLibrary()

const formulaOf = (
  lines: readonly (readonly [string, string, Partial<FormulaLine>?])[],
  rest: Partial<Formula> = {},
): Formula => {
  const { target: _none, ...empty } = emptyFormula()
  return {
    ...empty,
    route: 'irrigation',
    finalVolume: '1000 mL',
    lines: lines.map(([ingredient, amount, more], index) => ({
      key: `k${index}`,
      ingredient,
      amount,
      ...more,
    })),
    ...rest,
  }
}
const of = (...lines: (readonly [string, string])[]) => evaluate(formulaOf(lines), library)
const blocking = (evaluation: ReturnType<typeof evaluate>) =>
  evaluation.findings.filter(({ blocks }) => blocks).map(({ code }) => code)

describe('stocks as lines', () => {
  it('a measured volume brings what it holds, whatever way it is written', () => {
    const plain = of(['potassium-chloride', '20 mmol'])
    const mL = (20 * library.ingredients.get('potassium-chloride')!.molarMass!.value) / 149.1
    for (const amount of [`${mL} mL`, '20 mmol', '20 mEq']) {
      const measured = of(['potassium-chloride-2-meq-per-ml-solution', amount])
      expect(blocking(measured)).toEqual([])
      expect(measured.solution?.osmolality.value).toBeCloseTo(plain.solution!.osmolality.value, 2)
      expect(measured.lines[0]?.millilitres).toBeCloseTo(mL, 6)
      expect(measured.lines[0]?.stock?.lineKey).toBe('k0')
    }
  })

  it('23.4 % sodium chloride is 4 mEq/mL (label)', () => {
    const { electrolytes } = of(['sodium-chloride-23-4-percent-solution', '1000 mL'])
    expect(electrolytes.find(({ ion }) => ion === 'Na+')?.mEqPerMl).toBeCloseTo(4, 2)
  })

  it('3 mmol of phosphate from potassium phosphates brings 4.4 mEq of potassium (label)', () => {
    const { electrolytes } = of(['potassium-phosphates-3-mmol-per-ml-solution', '1 mL'])
    const potassium = electrolytes.find(({ ion }) => ion === 'K+')?.mEqPerMl ?? 0
    expect(potassium * 1000).toBeCloseTo(4.4, 1)
  })

  it('5 % dextrose sums to 252 mOsm/L on the hydrous basis and 278 on the anhydrous one (labels)', () => {
    const label = (id: string) => of([id, 'q.s.']).solution?.labelOsmolarityMilliosmPerL ?? 0
    expect(Math.round(label('dextrose-5-percent-solution'))).toBe(252)
    expect(Math.round(label('glucose-5-percent-anhydrous-solution'))).toBe(278)
  })

  it('lactated Ringer sums to its label, 273 mOsm/L', () => {
    const solution = of(['lactated-ringer-solution', 'q.s.']).solution
    expect(Math.round(solution?.labelOsmolarityMilliosmPerL ?? 0)).toBe(273)
  })

  it('a vehicle alone fills the whole volume', () => {
    const evaluation = of(['sodium-chloride-0-9-percent-solution', 'q.s.'])
    expect(evaluation.lines[0]?.millilitres).toBeCloseTo(1000, 5)
    expect(evaluation.lines[0]?.grams).toBeCloseTo(9, 6)
    const alone = of(['sodium-chloride', '9 g'])
    expect(evaluation.solution?.osmolality.value).toBeCloseTo(alone.solution!.osmolality.value, 6)
  })

  it('a solid takes the room of vehicle: 5 % mannitol leaves less than a litre of saline', () => {
    const evaluation = of(['mannitol', '50 g'], ['sodium-chloride-0-9-percent-solution', 'q.s.'])
    const volume = evaluation.lines.find(({ stock }) => stock)?.millilitres ?? 0
    /* Mannitol takes about 0.65 mL for each gram in water. from memory */
    expect(volume).toBeGreaterThan(960)
    expect(volume).toBeLessThan(972)
  })

  it('adjuster and filling vehicle settle together on the target', () => {
    const evaluation = evaluate(
      formulaOf(
        [
          ['pilocarpine-hydrochloride', '1 %'],
          ['sodium-chloride-0-45-percent-solution', 'q.s.'],
          ['mannitol', 'q.s.'],
        ],
        { finalVolume: '100 mL', target: { quantity: 'osmolality', value: '290 mOsm/kg' } },
      ),
      library,
    )
    expect(blocking(evaluation)).toEqual([])
    expect(evaluation.solution?.osmolality.value).toBeCloseTo(290, 3)
  })

  it.each([
    [['benzalkonium-chloride-50-percent-solution', '0.01 %'], 'stock-percent-ambiguous'],
    [['lactated-ringer-solution', '10 mmol'], 'stock-amount-of-several'],
    [['potassium-chloride-2-meq-per-ml-solution', 'q.s.'], 'stock-not-for-filling'],
    [['sodium-chloride-0-9-percent-solution', '1200 mL'], 'stocks-overfill'],
    [['sodium-chloride-0-9-percent-solution', '20 widgets'], 'amount-unreadable'],
  ] as const)('%s is refused: %s', (line, code) => {
    expect(blocking(of([line[0], line[1]]))).toEqual([code])
  })

  it('refuses two vehicles that fill, and one without room', () => {
    expect(
      blocking(of(['sodium-chloride-0-9-percent-solution', 'q.s.'], ['dextrose-5-percent-solution', 'q.s.'])),
    ).toEqual(['several-vehicles-fill'])
    expect(
      blocking(
        of(['sodium-chloride-23-4-percent-solution', '1100 mL'], ['dextrose-5-percent-solution', 'q.s.']),
      ),
    ).toEqual(['no-room-for-vehicle'])
  })

  it('a full measure fits: 1000 mL of a vehicle in 1000 mL', () => {
    expect(blocking(of(['sodium-chloride-0-9-percent-solution', '1000 mL']))).toEqual([])
  })

  it('what a stock holds is seen by the cautions', () => {
    const codes = evaluate(
      formulaOf([['bacteriostatic-sodium-chloride-0-9-percent-solution', 'q.s.']], { route: 'intrathecal' }),
      library,
    ).findings
    expect(
      codes.some(
        ({ severity, ingredients }) => severity === 'stop' && ingredients.includes('benzyl-alcohol'),
      ),
    ).toBe(true)
  })

  it("a stock of one's own enters the totals; one that holds an unknown is named", () => {
    const own = {
      id: 'own-zinc-stock',
      name: 'Own zinc stock',
      synonyms: [],
      use: 'concentrate',
      contains: [
        {
          ingredient: 'zinc-sulfate-heptahydrate',
          gramsPerLitre: {
            value: 4.4,
            unit: 'g/L',
            kind: 'estimate',
            source: 'project',
            confidence: 'low',
            fromMemory: false,
          },
        },
      ],
    } as const
    const evaluation = evaluate(formulaOf([['own-zinc-stock', '10 mL']], { stocks: [own] }), library)
    expect(evaluation.lines[0]?.grams).toBeCloseTo(0.044, 9)
    const strange = { ...own, contains: [{ ...own.contains[0], ingredient: 'unobtainium' }] }
    expect(
      blocking(evaluate(formulaOf([['own-zinc-stock', '10 mL']], { stocks: [strange] }), library)),
    ).toEqual(['stock-ingredient-unknown'])
  })
})
