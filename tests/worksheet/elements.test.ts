import { describe, expect, it } from 'vitest'
import { buildWorksheet } from '../../src/worksheet/build.ts'
import { documentIds, type DocumentId, type SheetSection } from '../../src/worksheet/types.ts'
import { evaluated, library, line } from '../evaluation/formulas.ts'
import { printedIn } from './printed.ts'

type Manner = 'printed' | 'blank' | 'reason'
type Place = readonly [document: DocumentId, heading: RegExp, words: RegExp, manner: Manner]

/*
 * The elements of a master formulation record, a compounding record and a label, in the order of the checklist of
 * the trade, and where each is printed. The words are those of a field, a column, a row or a step.
 */
const elements: readonly (readonly [number: number, element: string, ...places: Place[]])[] = [
  [
    1,
    'name',
    ['batch', /order/, /^Preparation$/, 'printed'],
    ['master', /preparation/, /^Name$/, 'printed'],
    ['label', /Label/, /Demo/, 'printed'],
  ],
  [
    2,
    'strength and dosage form',
    ['batch', /order/, /^Strength$/, 'printed'],
    ['batch', /order/, /^Dosage form$/, 'printed'],
    ['master', /preparation/, /^Strength$/, 'printed'],
    ['label', /Label/, /per 10 mL \(.* per mL\)/, 'printed'],
  ],
  [
    3,
    'route',
    ['batch', /order/, /^Route$/, 'printed'],
    ['master', /preparation/, /^Route$/, 'printed'],
    ['label', /Label/, /^For the eye/, 'printed'],
  ],
  [
    4,
    'every ingredient with its amount',
    ['batch', /Weigh/, /Pilocarpine/, 'printed'],
    ['batch', /Weigh/, /water for injection/, 'printed'],
    ['master', /Ingredients/, /Pilocarpine/, 'printed'],
    ['label', /Label/, /Inactive: .*water for injection/, 'printed'],
  ],
  [
    5,
    'characteristics',
    ['batch', /Weigh/, /C11H16N2O2·HCl, 244/, 'printed'],
    ['master', /Ingredients/, /g\/mol/, 'printed'],
    ['master', /approves/, /Grades/, 'blank'],
  ],
  [
    6,
    'maker, lot, expiry',
    ['batch', /Weigh/, /^Maker, lot, expiry$/, 'blank'],
    ['master', /approves/, /Not in this record/, 'reason'],
  ],
  [
    7,
    'assay',
    ['batch', /Weigh/, /^Assay factor$/, 'blank'],
    ['batch', /Weigh/, /divide by its factor/, 'printed'],
  ],
  [
    8,
    'calculated amounts',
    ['batch', /Weigh/, /^Calculated$/, 'printed'],
    ['master', /Ingredients/, /^In one container$/, 'printed'],
  ],
  [9, 'measured amounts', ['batch', /Weigh/, /^Measured \(slip\)$/, 'blank']],
  [
    10,
    'calculations',
    ['batch', /Answers/, /in the batch, before rounding/, 'printed'],
    ['checker', /worked out/, /^Result with unit$/, 'blank'],
    ['figures', /Arithmetic/, /c·E/, 'printed'],
  ],
  [
    11,
    'equipment',
    ['batch', /Record/, /^Balances/, 'blank'],
    ['batch', /Record/, /^Osmometer/, 'blank'],
    ['master', /approves/, /^Equipment/, 'blank'],
  ],
  [12, 'instructions', ['batch', /Steps/, /Bring to/, 'printed'], ['master', /Steps/, /Bring to/, 'printed']],
  [
    13,
    'pH and tonicity',
    ['batch', /Readings/, /^pH at/, 'blank'],
    ['batch', /Readings/, /below \d+ or above \d+ mOsm\/kg: stop and ask/, 'printed'],
    ['batch', /order/, /^Target$/, 'printed'],
    ['master', /Quality/, /^pH at/, 'printed'],
  ],
  [
    14,
    'sterilisation',
    ['batch', /Record/, /^Filter \(pore/, 'blank'],
    ['batch', /Record/, /^Bubble point$/, 'blank'],
    ['master', /approves/, /^Sterilisation/, 'blank'],
  ],
  [
    15,
    'container and closure',
    ['batch', /order/, /^Container and closure$/, 'blank'],
    ['batch', /order/, /excess each/, 'printed'],
    ['master', /preparation/, /^Container/, 'blank'],
  ],
  [
    16,
    'description',
    ['batch', /Readings/, /^Colour, clarity/, 'blank'],
    ['master', /approves/, /^Appearance/, 'blank'],
  ],
  [
    17,
    'beyond-use date and storage',
    ['batch', /order/, /^Beyond-use date/, 'blank'],
    ['batch', /Beyond-use/, /never by this sheet/, 'reason'],
    ['master', /approves/, /^Beyond-use/, 'blank'],
    ['label', /Label/, /Discard after: ____/, 'blank'],
  ],
  [18, 'reference for stability', ['master', /approves/, /^Reference for stability$/, 'blank']],
  [
    19,
    'quality control, expected',
    ['batch', /Readings/, /^Accepted$/, 'printed'],
    ['master', /Quality/, /^Accepted$/, 'printed'],
  ],
  [
    20,
    'quality control, results',
    ['batch', /Readings/, /^Reading$/, 'blank'],
    ['batch', /Readings/, /^Passes$/, 'blank'],
  ],
  [
    21,
    'internal number',
    ['batch', /order/, /^Lot of this batch$/, 'blank'],
    ['label', /Label/, /^Lot: ____/, 'blank'],
  ],
  [
    22,
    'date and time',
    ['batch', /order/, /^Prepared, date and time$/, 'blank'],
    ['label', /Label/, /Prepared: ____/, 'blank'],
  ],
  [
    23,
    'who made and who checked',
    ['batch', /signatures/, /^Done by$/, 'blank'],
    ['batch', /signatures/, /^Checked by$/, 'blank'],
  ],
  [
    24,
    'total quantity',
    ['batch', /Record/, /^Quantity made/, 'blank'],
    ['batch', /order/, /= \d+(\.\d+)? mL/, 'printed'],
  ],
  [
    25,
    'yield',
    ['batch', /Record/, /^Filled, rejected, yield/, 'blank'],
    ['batch', /Record/, /^of 20 asked$/, 'printed'],
  ],
  [
    26,
    'master record and version',
    ['batch', /order/, /^Master record and version$/, 'blank'],
    ['master', /approves/, /^Record number/, 'blank'],
  ],
  [
    27,
    'labelling requirements',
    ['batch', /Record/, /^Labels made/, 'blank'],
    ['master', /Label/, /Warnings: ____/, 'blank'],
    ['label', /Label/, /shake well/, 'blank'],
  ],
  [
    28,
    'single-dose or multiple-dose',
    ['label', /Label/, /^Single-dose or multiple-dose: ____/, 'blank'],
    ['label', /Label/, /^Preserved with|^No preservative/, 'printed'],
  ],
  [
    29,
    'storage',
    ['batch', /order/, /^Storage$/, 'blank'],
    ['label', /Label/, /^Storage: ____/, 'blank'],
    ['master', /approves/, /storage/, 'blank'],
  ],
  [
    30,
    'warnings',
    ['batch', /watch/, /Isosmotic but not isotonic/, 'printed'],
    ['batch', /signatures/, /^Warnings read$/, 'blank'],
    ['master', /watch/, /Isosmotic/, 'printed'],
  ],
  [31, 'facility', ['label', /Label/, /Facility and telephone: ____/, 'blank']],
  [32, 'compounded drug', ['label', /Label/, /This is a compounded drug \(or local words\)/, 'printed']],
  [33, 'deviations', ['batch', /Record/, /^Deviations/, 'blank']],
  [34, 'line clearance', ['batch', /Record/, /^Line clearance/, 'blank']],
  [35, 'environment', ['batch', /Record/, /^Room, hood/, 'blank']],
  [
    36,
    'endotoxin and bioburden',
    ['batch', /Record/, /^Endotoxin/, 'blank'],
    ['master', /approves/, /^Endotoxin/, 'blank'],
  ],
  [37, 'risk assessment', ['master', /approves/, /^Risk assessment/, 'blank']],
  [38, 'release', ['batch', /signatures/, /^Release, by someone who did not prepare it$/, 'blank']],
  [
    39,
    'recall trace',
    ['batch', /Record/, /^Supplied to/, 'blank'],
    ['batch', /order/, /^Prepared for$/, 'blank'],
  ],
  [
    40,
    'retention',
    ['batch', /Record/, /^Record kept until$/, 'blank'],
    ['master', /approves/, /^Retention/, 'blank'],
  ],
]

const drops = evaluated(
  [
    line('pilocarpine-hydrochloride', '1 %'),
    line('benzalkonium-chloride', '0.01 %'),
    line('sodium-chloride', 'q.s.'),
  ],
  {
    title: 'Demo drops',
    finalVolume: '10 mL',
    target: { quantity: 'osmolality', value: '290 mOsm/kg' },
    pH: 5,
    balance: '0.1 mg',
    batch: { units: 20, overfill: 'mobile', holdUp: '5 mL' },
  },
)

const { documents } = buildWorksheet(drops, library, 'A4', documentIds)

/** Whether words stand in a section as a blank to fill in: an empty field, a box of a table, or a line to write on. */
function isBlank(section: SheetSection, words: RegExp): boolean {
  switch (section.kind) {
    case 'fields':
      return section.fields.some(({ label, value }) => words.test(label) && value === null)
    case 'table':
      return (
        section.columns.some(({ label, blank }) => words.test(label) && blank === true) ||
        section.rows.some(
          ([first]) => words.test(first?.text ?? '') && section.columns.some(({ blank }) => blank),
        )
      )
    case 'label':
      return section.lines.some((text) => words.test(text) && text.includes('____'))
    default:
      return false
  }
}

describe('every element of the records and the label', () => {
  it('has its row', () => {
    expect(elements.map(([number]) => number)).toEqual(Array.from({ length: 40 }, (_, index) => index + 1))
  })

  it.each(elements)('%d %s is printed, a blank, or absent with its reason', (...row) => {
    const places = row.slice(2) as readonly Place[]
    for (const [id, heading, words, manner] of places) {
      const sections =
        documents.find((one) => one.id === id)?.sections.filter((one) => heading.test(one.heading)) ?? []
      const at = `${id} ${String(heading)} ${String(words)}`
      expect(sections.length, at).toBeGreaterThan(0)
      expect(
        printedIn(sections).some(({ text }) => words.test(text)),
        at,
      ).toBe(true)
      if (manner === 'blank')
        expect(
          sections.some((section) => isBlank(section, words)),
          at,
        ).toBe(true)
    }
  })

  it('where a route asks for no sterility the reason stands in its place', () => {
    const nasal = evaluated([line('oxymetazoline-hydrochloride', '0.05 %')], { route: 'nasal' })
    const texts = printedIn(buildWorksheet(nasal, library, 'A4', documentIds).documents).map(
      ({ text }) => text,
    )
    expect(texts.some((text) => text.startsWith('not sterile by its route'))).toBe(true)
    expect(texts.some((text) => text.startsWith('not asked by this route'))).toBe(true)
  })
})
