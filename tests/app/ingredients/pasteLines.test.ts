import { array, assert, constantFrom, oneof, property, string, tuple } from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isTable, readPastedTable } from '../../../src/app/ingredients/pasteLines.ts'
import { readAmount } from '../../../src/quantity/readAmount.ts'

const linesOf = (text: string) => readPastedTable(text).lines
const amountUnder = (heading: string, cell: string) => linesOf(`Name\t${heading}\nUrea\t${cell}`)[0]?.amount

describe('rows pasted from a spreadsheet', () => {
  it('are told from the text of one cell', () => {
    expect(isTable('2 * 0.25 g')).toBe(false)
    expect(isTable('10 mg\n')).toBe(false)
    expect(isTable('Sodium chloride\t0.9 %')).toBe(true)
    expect(isTable('a\r\nb')).toBe(true)
  })

  it('give name and amount as they stood, without the heading row and empty rows', () => {
    expect(linesOf('Ingredient\tAmount\r\nPilocarpine HCl\t1 %\r\n\r\nSalt\tq.s.\r\n')).toEqual([
      { name: 'Pilocarpine HCl', amount: '1 %' },
      { name: 'Salt', amount: 'q.s.' },
    ])
    expect(linesOf('Ingredient\nMannitol\n')).toEqual([{ name: 'Mannitol', amount: '' }])
  })

  it('without headings join amount and unit that stood in two columns', () => {
    expect(linesOf('Glycerin\t2.6\t%')).toEqual([{ name: 'Glycerin', amount: '2.6 %' }])
  })

  it('leave a missing amount empty and never make one up', () => {
    expect(linesOf('Mannitol\nUrea\t')).toEqual([
      { name: 'Mannitol', amount: '' },
      { name: 'Urea', amount: '' },
    ])
  })

  it('are bounded', () => {
    expect(linesOf('a\t1 g\n'.repeat(5000))).toHaveLength(1000)
    expect(linesOf(`${'x'.repeat(20_000)}\t1 g`)[0]?.name).toHaveLength(10_000)
    expect(readPastedTable(`a\t${'x'.repeat(1_100_000)}`).leftOut).toEqual([
      'what came after a million characters',
    ])
  })

  it('never break, whatever was copied', () => {
    const cell = oneof(string(), constantFrom('Name', 'Amount (mg)', '"', '""', 'Unit', '%', '5'))
    const separator = constantFrom('\t', ';', ',', '\n', '\r\n')
    assert(
      property(array(tuple(cell, separator), { maxLength: 40 }), (cells) => {
        const table = readPastedTable(cells.flat().join(''))
        expect(table.lines.every(({ name, amount }) => !/[\n\t]/.test(name + amount))).toBe(true)
      }),
      { numRuns: 500 },
    )
  })
})

/** Thirty rows: as many amounts of different writing as there are, one of them q.s. */
const thirty = Array.from({ length: 30 }, (_, index) => ({
  name: `Substance ${index + 1}`,
  number: index === 29 ? 'q.s.' : `${index + 1}.5`,
  unit: index === 29 ? '' : (['mg', 'g', 'mL', 'mmol', '%'][index % 5] ?? ''),
}))
const asLines = thirty.map(({ name, number, unit }) => ({ name, amount: `${number} ${unit}`.trim() }))

describe('thirty rows', () => {
  it('with the unit in the cell of the amount', () => {
    const text = ['Substance\tQuantity', ...asLines.map(({ name, amount }) => `${name}\t${amount}`)].join(
      '\n',
    )
    expect(readPastedTable(text)).toEqual({ lines: asLines, leftOut: [] })
  })

  it('with unit, number and name in columns of their own and in another order', () => {
    const rows = thirty.map(
      ({ name, number, unit }, index) => `${index + 1}\t${unit}\t${number}\t“x”\t${name}`,
    )
    const text = [
      'No.\tUnit\tQty\tLot\tRaw\tIngredient name',
      ...rows.map((row) => row.replace('“x”', 'L7\traw')),
    ]
    const table = readPastedTable(text.join('\r\n'))
    expect(table.lines).toEqual(asLines)
    expect(table.leftOut).toEqual(['the column “No.”', 'the column “Lot”', 'the column “Raw”'])
  })

  it('with the unit in the heading, a title above and semicolons between', () => {
    const rows = thirty.map(({ name, number }) => `"${name}";${number}`)
    const text = ['Batch plan;', 'Component;Strength (% w/v)', ...rows].join('\n')
    const table = readPastedTable(text)
    expect(table.lines).toEqual(
      thirty.map(({ name, number }) => ({ name, amount: number === 'q.s.' ? number : `${number} % w/v` })),
    )
    expect(table.leftOut).toEqual(['the row “Batch plan”'])
    expect(table.lines.every(({ amount }) => readAmount(amount).ok)).toBe(true)
  })
})

describe('headings', () => {
  it.each([
    ['Amount (mg)', '5', '5 mg'],
    ['Conc. [mg/mL]', '0.5', '0.5 mg/mL'],
    ['Quantity, g', '1.2', '1.2 g'],
    ['mmol/L', '12', '12 mmol/L'],
    ['Strength, % w/v', '0.9', '0.9 % w/v'],
    ['Strength (% w/v)', '0.9%', '0.9 % w/v'],
    ['Amount needed', '5 mg', '5 mg'],
    ['Amount per 100 mL (mg)', '50', '50 mg per 100 mL'],
    ['Amount per 100 mL', '50 mg', '50 mg per 100 mL'],
    ['Amount (mg)', '2 x 250', '2 x 250 mg'],
    ['Amount (mg)', '5 mg', '5 mg'],
    ['Amount (mg)', 'q.s.', 'q.s.'],
  ])('“%s” makes of “%s” “%s”', (heading, cell, amount) => {
    expect(amountUnder(heading, cell)).toBe(amount)
    expect(readAmount(amount).ok).toBe(true)
  })

  it.each([
    ['Amount (g)', '5 mg', 'a unit against the heading'],
    ['Amount per batch (mg)', '5', 'amounts of something that is not known here'],
    ['Amount in 100 mL', '50 mg', 'a basis that is not spelled out'],
    ['Dose (mg/kg)', '5', 'a dose for a body'],
    ['Amount (%)', '0,9', 'a comma that may be a decimal mark or one of thousands'],
    ['Amount (mg)', '1,250', 'a comma that may be a mark of thousands'],
    ['Amount (mg)', '1-2', 'a range'],
    ['Amount', '5', 'no unit anywhere'],
  ])('“%s” over “%s” stays in doubt: %s', (heading, cell) => {
    const amount = amountUnder(heading, cell) ?? ''
    expect(amount).toContain(cell)
    expect(readAmount(amount).ok).toBe(false)
  })

  it('with two columns of amounts take the one that is filled and never choose between two', () => {
    const text = 'Name\tAmount (mg)\tStrength (%)\nUrea\t5\t\nMannitol\t\t4\nGlycerin\t5\t4'
    const amounts = linesOf(text).map(({ amount }) => amount)
    expect(amounts).toEqual(['5 mg', '4 %', '5 mg | 4 %'])
    expect(readAmount('5 mg | 4 %').ok).toBe(false)
  })

  it('keep a cell with a break in it in one line', () => {
    expect(linesOf('Amount\tName\n5 mg\t"Sodium\nchloride ""pure"""')).toEqual([
      { name: 'Sodium chloride "pure"', amount: '5 mg' },
    ])
  })
})
