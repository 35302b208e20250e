import { readFileSync, readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { evaluate } from '../../src/evaluation/evaluate.ts'
import { readFormula } from '../../src/formula/document.ts'
import { buildWorksheet } from '../../src/worksheet/build.ts'
import { readMass } from '../../src/quantity/readMeasure.ts'
import { expressVolume } from '../../src/quantity/express.ts'
import { checksOf } from '../../src/worksheet/checks.ts'
import { documentIds, type DocumentId } from '../../src/worksheet/types.ts'
import { evaluated, library, line } from '../evaluation/formulas.ts'
import { printedIn } from './printed.ts'

const folder = new URL('../../data/demos/', import.meta.url)
const demos = readdirSync(folder).map((name) => {
  const read = readFormula(JSON.parse(readFileSync(new URL(name, folder), 'utf8')))
  if (!read.ok) throw new Error(read.refusal.message)
  return [name, evaluate(read.formula, library)] as const
})

type Evaluated = (typeof demos)[number][1]

const textsOf = (evaluation: Evaluated, id: DocumentId) =>
  printedIn(buildWorksheet(evaluation, library, 'A4', [id]).documents[0]?.sections).map(({ text }) => text)

describe('the checker’s page', () => {
  it.each(demos)('of %s asks every question and holds none of the answers', (_, evaluation) => {
    const page = textsOf(evaluation, 'checker')
    const record = textsOf(evaluation, 'batch')
    /* What was ordered as a whole amount is given and asked; nothing else may stand on both sides. */
    const given = new Set(evaluation.formula.lines.map(({ amount }) => amount))
    given.add(expressVolume(evaluation.volumeMl))
    const checks = checksOf(evaluation)
    expect(checks.length).toBeGreaterThan(2)
    for (const { question, answer } of checks) {
      expect(page).toContain(question)
      expect(record).toContain(answer)
      if (!given.has(answer))
        expect(
          page.filter((text) => text.includes(answer)),
          question,
        ).toEqual([])
    }
  })

  it.each(demos)('of %s shows no mass that is weighed', (_, evaluation) => {
    const page = textsOf(evaluation, 'checker').join(' | ')
    const masses = buildWorksheet(evaluation, library, 'A4', ['batch']).documents[0]?.sections.flatMap(
      (section) =>
        section.kind === 'table' && section.heading.startsWith('Weigh')
          ? section.rows.map((row) => row[3]?.text ?? '').filter((text) => /\d m?c?g$/.test(text))
          : [],
    )
    expect(masses?.length).toBeGreaterThan(0)
    for (const mass of masses ?? []) expect(page).not.toContain(` ${mass} `)
  })
})

describe('the record of a batch', () => {
  it('prints each part of the batch and the extra apart', () => {
    const batch = { units: 20, overfill: 'mobile', holdUp: '8 mL', samples: '20 mL', excess: '5 mL' } as const
    const evaluation = evaluated([line('mannitol', '5 %')], { finalVolume: '10 mL', batch })
    const text = textsOf(evaluation, 'batch').find((one) => one.startsWith('20 containers'))
    for (const part of [
      '10 mL + 0.5 mL excess each',
      '8 mL hold-up',
      '20 mL samples',
      '5 mL extra for losses, apart',
      '= 243 mL',
    ]) {
      expect(text).toContain(part)
    }
  })

  it('sends what is diluted to its aliquot and does not print it as a mass to weigh', () => {
    const evaluation = evaluated([line('atropine-sulfate-monohydrate', '0.01 %')], {
      bench: { balances: [{ name: 'own', readability: '0.1 mg' }] },
    })
    const texts = textsOf(evaluation, 'batch')
    expect(texts).toContain('by aliquot, below')
    expect(texts.some((text) => /\(the aliquot of \d+ mL\)/.test(text))).toBe(true)
    expect(texts.some((text) => /enter with the aliquots and are part of the final volume/.test(text))).toBe(
      true,
    )
  })

  it('gives osmolality and pH readings their limits', () => {
    const texts = textsOf(demos[0]?.[1] ?? evaluated([]), 'batch').join(' | ')
    expect(texts).toMatch(/below \d+ or above \d+ mOsm\/kg: stop and ask/)
    expect(texts).toMatch(/below 4\.5 or above 9: stop and ask/)
    expect(texts).toContain('independent verification')
  })
})

describe('every document', () => {
  it.each(demos)('of %s is marked and has headings of its own', (_, evaluation) => {
    for (const { id, pageMark, sections } of buildWorksheet(evaluation, library, 'A4', documentIds)
      .documents) {
      expect(pageMark).toContain(evaluation.libraryVersion)
      expect(pageMark.includes('batch ____')).toBe(id !== 'master')
      const headings = sections.map(({ heading }) => heading)
      expect(new Set(headings).size).toBe(headings.length)
    }
  })

  it('is shut while the formula is blocked', () => {
    expect(buildWorksheet(evaluated([line('mannitol', '9')]), library, 'A4').shutBecause).not.toEqual([])
  })
})

/** What the table of weighings says each line brings into the batch, in g; from its text alone. */
function massesOnPaper(evaluation: Evaluated): readonly number[] {
  const record = buildWorksheet(evaluation, library, 'A4', ['batch']).documents[0]
  const table = record?.sections.find(({ heading }) => heading.startsWith('Weigh and measure'))
  if (table?.kind !== 'table') throw new Error('no table of weighings')
  return evaluation.lines.map((_, index) => {
    const cell = table.rows[index]?.[3]
    const written = /^holds (.+?);/.exec(cell?.small ?? '')?.[1] ?? cell?.text ?? ''
    const read = readMass(written.replaceAll(',', ''))
    if (!read.ok) throw new Error(`“${written}”: ${read.refusal.message}`)
    return read.value
  })
}

describe('the masses on paper', () => {
  it.each(demos)('of %s, evaluated again, read as printed', (_, evaluation) => {
    const grams = massesOnPaper(evaluation)
    const { balance: _balance, bench: _bench, batch: _batch, target: _target, ...rest } = evaluation.formula
    const lines = rest.lines.map(({ key, ingredient }, index) => ({
      key,
      ingredient,
      amount: `${((grams[index] ?? 0) / evaluation.batchFactor).toFixed(10)} g`,
    }))
    const again = evaluate({ ...rest, lines }, library)
    const whole = (one: Evaluated) => one.solution?.osmolality.value ?? Number.NaN
    expect(again.status).toBe('ok')
    expect(Math.abs(whole(again) / whole(evaluation) - 1)).toBeLessThan(1e-5)
    expect(again.solution?.pH).toBeCloseTo(evaluation.solution?.pH ?? Number.NaN, 3)
  })
})
