import type { Formula, FormulaLine } from './types.ts'

type FieldName = Exclude<keyof Formula, 'format' | 'version' | 'lines'>
const neverAbsent: ReadonlySet<FieldName> = new Set<FieldName>(['title', 'route', 'finalVolume'])

/** Sets one field of the document; undefined takes an optional one out. */
interface SetField<Field extends FieldName> {
  readonly kind: 'set-field'
  readonly field: Field
  readonly value: Formula[Field] | undefined
}

type LineFieldName = 'share' | 'cap' | 'note' | 'orderedAs' | 'certificate'

interface SetLineField<Field extends LineFieldName> {
  readonly kind: 'set-line-field'
  readonly key: string
  readonly field: Field
  readonly value: FormulaLine[Field] | undefined
}

/** Everything that can be done to a document. Keys of lines are made by the caller. */
export type Command =
  | { readonly kind: 'add-line'; readonly line: FormulaLine; readonly index: number }
  | { readonly kind: 'remove-line'; readonly key: string }
  | { readonly kind: 'move-line'; readonly key: string; readonly to: number }
  | { readonly kind: 'set-amount'; readonly key: string; readonly amount: string }
  | { readonly kind: 'set-ingredient'; readonly key: string; readonly ingredient: FormulaLine['ingredient'] }
  | { readonly kind: 'replace-all'; readonly formula: Formula }
  | { readonly [Field in LineFieldName]: SetLineField<Field> }[LineFieldName]
  | { readonly [Field in FieldName]: SetField<Field> }[FieldName]

export interface Applied {
  readonly formula: Formula
  /** Applied to `formula`, it gives back the document as it was. */
  readonly inverse: Command
}

/** For a command that finds nothing to do: the document itself, the same object. */
const untouched = (formula: Formula): Applied => ({ formula, inverse: { kind: 'replace-all', formula } })

const place = ({ lines }: Formula, key: string) => lines.findIndex((line) => line.key === key)

const isPlace = (index: number, most: number) => Number.isInteger(index) && index >= 0 && index <= most

function addLine(formula: Formula, line: FormulaLine, index: number): Applied {
  if (!isPlace(index, formula.lines.length) || place(formula, line.key) >= 0) return untouched(formula)
  return {
    formula: { ...formula, lines: formula.lines.toSpliced(index, 0, line) },
    inverse: { kind: 'remove-line', key: line.key },
  }
}

function removeLine(formula: Formula, key: string): Applied {
  const index = place(formula, key)
  const line = formula.lines[index]
  if (!line) return untouched(formula)
  return {
    formula: { ...formula, lines: formula.lines.toSpliced(index, 1) },
    inverse: { kind: 'add-line', line, index },
  }
}

function moveLine(formula: Formula, key: string, to: number): Applied {
  const from = place(formula, key)
  const line = formula.lines[from]
  if (!line || !isPlace(to, formula.lines.length - 1)) return untouched(formula)
  return {
    formula: { ...formula, lines: formula.lines.toSpliced(from, 1).toSpliced(to, 0, line) },
    inverse: { kind: 'move-line', key, to: from },
  }
}

function changeLine(
  formula: Formula,
  key: string,
  change: (line: FormulaLine) => FormulaLine,
  inverse: (line: FormulaLine) => Command,
): Applied {
  const index = place(formula, key)
  const line = formula.lines[index]
  if (!line) return untouched(formula)
  return { formula: { ...formula, lines: formula.lines.with(index, change(line)) }, inverse: inverse(line) }
}

/** A copy with the field set, or without it. */
function withField<T extends object, Field extends keyof T>(whole: T, field: Field, value: unknown): T {
  const { [field]: _old, ...rest } = whole
  return (value === undefined ? rest : { ...whole, [field]: value }) as T
}

function setField(formula: Formula, { field, value }: SetField<FieldName>): Applied {
  if (value === undefined && neverAbsent.has(field)) return untouched(formula)
  return {
    formula: withField(formula, field, value),
    inverse: { kind: 'set-field', field, value: formula[field] } as Command,
  }
}

/**
 * Does a command and says how to undo it. A command that finds nothing to do (a key that no line has, a key
 * that a line has already, a place outside of the list, a required field taken out) answers the same object.
 * @example apply(emptyFormula(), { kind: 'set-field', field: 'pH', value: 6.8 }).inverse → { kind: 'set-field', field: 'pH', value: undefined }
 */
export function apply(formula: Formula, command: Command): Applied {
  switch (command.kind) {
    case 'add-line':
      return addLine(formula, command.line, command.index)
    case 'remove-line':
      return removeLine(formula, command.key)
    case 'move-line':
      return moveLine(formula, command.key, command.to)
    case 'set-amount': {
      const { key, amount } = command
      return changeLine(
        formula,
        key,
        (line) => ({ ...line, amount }),
        (line) => ({ kind: 'set-amount', key, amount: line.amount }),
      )
    }
    case 'set-ingredient': {
      const { key, ingredient } = command
      return changeLine(
        formula,
        key,
        (line) => ({ ...line, ingredient }),
        (line) => ({ kind: 'set-ingredient', key, ingredient: line.ingredient }),
      )
    }
    case 'set-line-field': {
      const { key, field, value } = command
      return changeLine(
        formula,
        key,
        (line) => withField(line, field, value),
        (line) => ({ kind: 'set-line-field', key, field, value: line[field] }) as Command,
      )
    }
    case 'replace-all':
      return { formula: command.formula, inverse: { kind: 'replace-all', formula } }
    case 'set-field':
      return setField(formula, command)
  }
}
