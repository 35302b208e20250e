import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { apply, type Command } from '../../src/formula/commands.ts'
import { emptyFormula, readFormulaText, writeFormula } from '../../src/formula/document.ts'
import { routeIds, type Formula } from '../../src/formula/types.ts'
import { full, ownRecord } from './samples.ts'

const keys = fc.constantFrom('a', 'b', 'c', 'd', 'e')
const index = fc.integer({ min: -1, max: 6 })
const text = fc.string({ maxLength: 20 })
const optional = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined })
const ingredient = fc.oneof(text, fc.constant(ownRecord))

const fieldCommand = fc.oneof(
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constantFrom('title', 'finalVolume'),
    value: optional(text),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constantFrom('temperature', 'balance', 'vehicle', 'notes'),
    value: optional(text),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constant('route'),
    value: fc.constantFrom(...routeIds),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constant('pH'),
    value: optional(fc.double({ min: 0, max: 14, noNaN: true })),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constant('target'),
    value: optional(
      fc.record({ quantity: fc.constantFrom('osmolality', 'effective-osmolality'), value: text }),
    ),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constant('order'),
    value: optional(fc.record({ lot: text })),
  }),
  fc.record({
    kind: fc.constant('set-field'),
    field: fc.constant('batch'),
    value: optional(fc.record({ units: fc.integer({ min: 1, max: 9 }) })),
  }),
)

const lineCommand = fc.oneof(
  fc.record({
    kind: fc.constant('add-line'),
    line: fc.record({ key: keys, ingredient, amount: text }),
    index,
  }),
  fc.record({ kind: fc.constant('remove-line'), key: keys }),
  fc.record({ kind: fc.constant('move-line'), key: keys, to: index }),
  fc.record({ kind: fc.constant('set-amount'), key: keys, amount: text }),
  fc.record({ kind: fc.constant('set-ingredient'), key: keys, ingredient }),
  fc.record({
    kind: fc.constant('set-line-field'),
    key: keys,
    field: fc.constantFrom('cap', 'note'),
    value: optional(text),
  }),
  fc.record({
    kind: fc.constant('set-line-field'),
    key: keys,
    field: fc.constant('share'),
    value: optional(fc.double({ min: 0.01, max: 9, noNaN: true })),
  }),
)

const command = fc.oneof(
  { arbitrary: lineCommand, weight: 6 },
  { arbitrary: fieldCommand, weight: 3 },
  {
    arbitrary: fc.constantFrom(full, emptyFormula()).map((formula) => ({ kind: 'replace-all', formula })),
    weight: 1,
  },
) as fc.Arbitrary<Command>

const frozen = (formula: Formula): Formula => {
  const freeze = (value: unknown): void => {
    if (typeof value !== 'object' || value === null) return
    Object.freeze(value)
    Object.values(value).forEach(freeze)
  }
  const copy = structuredClone(formula)
  freeze(copy)
  return copy
}

describe('commands', () => {
  it('are undone to the byte, one by one and all together', () => {
    fc.assert(
      fc.property(fc.array(command, { maxLength: 30 }), (commands) => {
        const start = frozen(full)
        const undo: { inverse: Command; before: string }[] = []
        let formula = start
        for (const each of commands) {
          const { formula: next, inverse } = apply(formula, each)
          undo.push({ inverse, before: writeFormula(formula) })
          formula = frozen(next)
        }
        for (const { inverse, before } of undo.toReversed()) {
          formula = apply(formula, inverse).formula
          expect(writeFormula(formula)).toBe(before)
        }
        expect(formula).toEqual(start)
      }),
      { numRuns: 200 },
    )
  })

  it('are done again to the byte by undoing the undoing', () => {
    fc.assert(
      fc.property(fc.array(command, { maxLength: 10 }), command, (before, last) => {
        const start = before.reduce((formula, each) => apply(formula, each).formula, full)
        const done = apply(start, last)
        const undone = apply(done.formula, done.inverse)
        expect(writeFormula(apply(undone.formula, undone.inverse).formula)).toBe(writeFormula(done.formula))
      }),
      { numRuns: 200 },
    )
  })

  it('leave a document that can be read from its file, with keys that differ', () => {
    fc.assert(
      fc.property(fc.array(command, { maxLength: 30 }), (commands) => {
        const formula = commands.reduce((reached, each) => apply(reached, each).formula, full)
        expect(new Set(formula.lines.map(({ key }) => key)).size).toBe(formula.lines.length)
        expect(readFormulaText(writeFormula(formula))).toMatchObject({ ok: true, notices: [] })
      }),
      { numRuns: 200 },
    )
  })
})

describe('one command at a time', () => {
  const order = (formula: Formula) => formula.lines.map(({ key }) => key).join('')
  const added = { key: 'n', ingredient: 'dextrose', amount: '5 %' }

  it('adds, moves and removes lines', () => {
    expect(order(apply(full, { kind: 'add-line', line: added, index: 1 }).formula)).toBe('anbc')
    expect(order(apply(full, { kind: 'add-line', line: added, index: 3 }).formula)).toBe('abcn')
    expect(order(apply(full, { kind: 'move-line', key: 'a', to: 2 }).formula)).toBe('bca')
    expect(order(apply(full, { kind: 'remove-line', key: 'b' }).formula)).toBe('ac')
  })

  it('sets amount, ingredient, fields of a line and fields of the document', () => {
    const done = (command: Command) => apply(full, command).formula
    expect(done({ kind: 'set-amount', key: 'a', amount: '2 %' }).lines[0]?.amount).toBe('2 %')
    expect(done({ kind: 'set-ingredient', key: 'a', ingredient: 'x' }).lines[0]?.ingredient).toBe('x')
    expect(done({ kind: 'set-line-field', key: 'b', field: 'share', value: 3 }).lines[1]?.share).toBe(3)
    expect(
      done({ kind: 'set-line-field', key: 'b', field: 'cap', value: undefined }).lines[1],
    ).not.toHaveProperty('cap')
    expect(done({ kind: 'set-field', field: 'pH', value: 7.4 }).pH).toBe(7.4)
    expect(done({ kind: 'set-field', field: 'pH', value: undefined })).not.toHaveProperty('pH')
    expect(done({ kind: 'replace-all', formula: emptyFormula() })).toEqual(emptyFormula())
  })

  it('says how to undo', () => {
    expect(apply(emptyFormula(), { kind: 'set-field', field: 'pH', value: 6.8 }).inverse).toEqual({
      kind: 'set-field',
      field: 'pH',
      value: undefined,
    })
    expect(apply(full, { kind: 'remove-line', key: 'b' }).inverse).toEqual({
      kind: 'add-line',
      line: full.lines[1],
      index: 1,
    })
  })

  it('does not change the document it is given', () => {
    const before = writeFormula(full)
    apply(full, { kind: 'set-amount', key: 'a', amount: '2 %' })
    apply(full, { kind: 'move-line', key: 'a', to: 2 })
    expect(writeFormula(full)).toBe(before)
  })

  it.each<Command>([
    { kind: 'remove-line', key: 'z' },
    { kind: 'move-line', key: 'z', to: 0 },
    { kind: 'move-line', key: 'a', to: 3 },
    { kind: 'move-line', key: 'a', to: -1 },
    { kind: 'move-line', key: 'a', to: 0.5 },
    { kind: 'set-amount', key: 'z', amount: '1 %' },
    { kind: 'set-ingredient', key: 'z', ingredient: 'x' },
    { kind: 'set-line-field', key: 'z', field: 'note', value: 'x' },
    { kind: 'add-line', line: { ...added, key: 'a' }, index: 0 },
    { kind: 'add-line', line: added, index: 4 },
    { kind: 'add-line', line: added, index: -1 },
    { kind: 'set-field', field: 'title', value: undefined },
    { kind: 'set-field', field: 'route', value: undefined },
    { kind: 'set-field', field: 'finalVolume', value: undefined },
  ])('answers the same object where there is nothing to do: $kind', (command) => {
    const { formula, inverse } = apply(full, command)
    expect(formula).toBe(full)
    expect(apply(formula, inverse).formula).toBe(full)
  })
})
