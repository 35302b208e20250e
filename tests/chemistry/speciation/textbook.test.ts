import { describe, expect, it } from 'vitest'
import { bufferCapacity } from '../../../src/chemistry/speciation/capacity.ts'
import { molalityOf } from '../../../src/chemistry/speciation/speciation.ts'
import { withTitrant } from '../../../src/chemistry/speciation/titrate.ts'
import type { BackgroundIon, SpeciationSystem } from '../../../src/chemistry/speciation/types.ts'
import { idealActivity } from './models.ts'
import { compiledOr, partsWith, solvedOr } from './parts.ts'
import { rowsOf } from './recipes.ts'

/*
 * Textbook formulas hold in the limit of ideal activity and of the scale that is -log of the hydrogen ion:
 * there the solver must give their answers. The acid is a made one, so that its pKa is the textbook's.
 */

const parts = partsWith(idealActivity)
const answers = new Map(
  rowsOf('MartinPhysicalPharmacy/henderson-hasselbalch.csv').map((row) => [row['id'], Number(row['answer'])]),
)
const answerOf = (id: string) => answers.get(id) ?? NaN

function acidOf(pKa: number) {
  const acid: BackgroundIon = { id: 'acid', charge: 0, steps: [{ pKa, acidCharge: 0 }] }
  const system: SpeciationSystem = {
    celsius: 25,
    components: ['Na+'],
    background: [acid],
    pHScale: 'hydrogen-activity',
  }
  return compiledOr(system, parts)
}

describe('Henderson–Hasselbalch', () => {
  /*
   * The book leaves hydroxide out of its balance. With it the answer is 10.224, not 10.24; at twenty times the
   * strength hydroxide no longer matters and the book's figure comes out.
   */
  it('W50: borate 0.05 M with boric acid 0.005 M', () => {
    const { pH } = solvedOr(acidOf(9.24), { 'Na+': 0.05, acid: 0.055 })
    expect(Math.abs(pH - answerOf('W50'))).toBeLessThanOrEqual(0.02)
    const strong = solvedOr(acidOf(9.24), { 'Na+': 1, acid: 1.1 })
    expect(Math.abs(strong.pH - answerOf('W50'))).toBeLessThanOrEqual(0.005)
  })

  it('W68: ratio of acetate to acetic acid at pH 5.0', () => {
    const answer = solvedOr(acidOf(4.76), { 'Na+': 0, acid: 0.1 }, { kind: 'pH', pH: 5 })
    const ratio = molalityOf(answer, 'acid (charge -1)') / molalityOf(answer, 'acid')
    expect(Math.abs(ratio - answerOf('W68'))).toBeLessThanOrEqual(0.005)
  })

  it('W69: acetic acid 0.1 M with sodium acetate 0.05 M', () => {
    const { pH } = solvedOr(acidOf(4.76), { 'Na+': 0.05, acid: 0.15 })
    expect(Math.abs(pH - answerOf('W69'))).toBeLessThanOrEqual(0.005)
  })

  it('W73: bicarbonate 20 to 1', () => {
    const { pH } = solvedOr(acidOf(6.1), { 'Na+': 0.2, acid: 0.21 })
    expect(Math.abs(pH - answerOf('W73'))).toBeLessThanOrEqual(0.005)
  })
})

describe('buffer capacity', () => {
  it('W71: greatest for 0.02 M at pH = pKa', () => {
    const compiled = acidOf(4.76)
    const totals = { 'Na+': 0.01, acid: 0.02 }
    const capacity = bufferCapacity(compiled, totals, solvedOr(compiled, totals))
    expect(Math.abs((capacity.byComponent['acid'] ?? NaN) - answerOf('W71'))).toBeLessThanOrEqual(1e-5)
  })

  it('W72: 0.01 mol/L of base over the rise of pH', () => {
    const compiled = acidOf(4.76)
    const totals = { 'Na+': 0.1, acid: 0.2 }
    const before = solvedOr(compiled, totals).pH
    const after = solvedOr(compiled, withTitrant(totals, { 'Na+': 1 }, 0.01)).pH
    expect(Math.abs(after - before - 0.09)).toBeLessThanOrEqual(0.005)
    /* The book rounds the rise to 0.09 before dividing: 0.1111, printed 0.11; unrounded 0.115. */
    expect(Math.abs(0.01 / (after - before) - answerOf('W72'))).toBeLessThanOrEqual(0.006)
  })

  it('of water alone is 2.303 ([H+] + [OH-])', () => {
    const compiled = compiledOr({ celsius: 25, components: ['Na+'], pHScale: 'hydrogen-activity' }, parts)
    const totals = { 'Na+': 0.001 }
    const answer = solvedOr(compiled, totals)
    const ions = molalityOf(answer, 'H+') + molalityOf(answer, 'OH-')
    expect(bufferCapacity(compiled, totals, answer).molPerKgPerPH / (Math.LN10 * ions)).toBeCloseTo(1, 4)
  })
})

describe('simple solutions', () => {
  const plain = compiledOr({ celsius: 25, components: ['Na+', 'Cl-'], pHScale: 'hydrogen-activity' }, parts)
  it.each([
    [{ 'Na+': 0.15, 'Cl-': 0.15 }, 7.0],
    [{ 'Cl-': 0.01 }, 2],
    [{ 'Na+': 0.01 }, 12.0],
  ])('%o', (totals, pH) => {
    expect(solvedOr(plain, totals).pH).toBeCloseTo(pH, 2)
  })
})
