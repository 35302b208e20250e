import { isPlainObject } from './plainObject.ts'
import { formulaSchema } from './schema.ts'
import type { Formula } from './types.ts'

/** What is needed of a schema to walk it. */
interface Shape {
  readonly type: string
  readonly entries?: Readonly<Record<string, Shape>>
  readonly item?: Shape
  readonly wrapped?: Shape
  readonly options?: readonly unknown[]
}

/** The part of the schema that an object or a list at this place follows. */
function followed(shape: Shape): Shape {
  if (shape.wrapped) return followed(shape.wrapped)
  if (shape.type !== 'union') return shape
  const options = (shape.options ?? []) as readonly Shape[]
  return options.find((option) => option.entries) ?? shape
}

function arranged(shape: Shape, value: unknown): unknown {
  const { entries, item } = followed(shape)
  if (item && Array.isArray(value)) return value.map((element) => arranged(item, element))
  if (!entries || !isPlainObject(value)) return value
  return Object.fromEntries(
    Object.entries(entries)
      .filter(([key]) => Object.hasOwn(value, key) && value[key] !== undefined)
      .map(([key, part]) => [key, arranged(part, value[key])]),
  )
}

/** The document with its keys in the order of the schema, so that the same document is the same text. */
export const inOrderOfSchema = (formula: Formula): unknown => arranged(formulaSchema, formula)

function unknownKeys(shape: Shape, value: unknown, place: readonly (string | number)[]): string[] {
  const { entries, item } = followed(shape)
  if (item && Array.isArray(value)) {
    return value.flatMap((element, index) => unknownKeys(item, element, [...place, index]))
  }
  if (!entries || !isPlainObject(value)) return []
  return Object.keys(value).flatMap((key) => {
    const part = Object.hasOwn(entries, key) ? entries[key] : undefined
    return part ? unknownKeys(part, value[key], [...place, key]) : [[...place, key].join('.')]
  })
}

/** Places in a document that the schema does not know, such as "lines.0.colour". */
export const unknownPlaces = (content: unknown): readonly string[] => unknownKeys(formulaSchema, content, [])
