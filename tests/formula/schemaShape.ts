import { definitionOf, type JsonSchema } from './jsonSchema.ts'

/** What the program's own schema says at one place, in the words of JSON Schema. */
export type Shape = Readonly<Record<string, unknown>>

/** The parts of a valibot schema that are walked. */
export interface ProgramSchema {
  readonly type: string
  readonly entries?: Readonly<Record<string, ProgramSchema>>
  readonly item?: ProgramSchema
  readonly wrapped?: ProgramSchema
  readonly options?: readonly unknown[]
  readonly literal?: unknown
  readonly pipe?: readonly (ProgramSchema & { readonly requirement?: unknown })[]
}

const actionsOf = (
  schema: ProgramSchema,
): readonly (ProgramSchema & { readonly requirement?: unknown })[] => {
  const [first, ...rest] = schema.pipe ?? []
  return first ? [...actionsOf(first), ...rest] : []
}

function actionShape(action: ProgramSchema & { readonly requirement?: unknown }, isList: boolean): Shape {
  const { type, requirement } = action
  switch (type) {
    case 'max_length':
      return isList ? { maxItems: requirement } : { maxLength: requirement }
    case 'min_length':
      return isList ? { minItems: requirement } : { minLength: requirement }
    case 'non_empty':
      return { minLength: 1 }
    case 'trim':
      return { pattern: '\\S' }
    case 'regex':
      return { pattern: (requirement as RegExp).source }
    case 'min_value':
      return { minimum: requirement }
    case 'max_value':
      return { maximum: requirement }
    case 'gt_value':
      return { exclusiveMinimum: requirement }
    case 'integer':
      return { type: 'integer' }
    case 'finite':
      return {}
    default:
      throw new Error(`The action ${type} is not compared.`)
  }
}

const isOptional = (schema: ProgramSchema) => schema.type === 'exact_optional'

function ownShape(schema: ProgramSchema): Shape {
  const { type, entries = {}, item, options = [], literal } = schema
  switch (type) {
    case 'string':
    case 'number':
    case 'boolean':
      return { type }
    case 'literal':
      return { const: literal }
    case 'picklist':
      return { enum: options }
    case 'union':
      return { anyOf: options.map((option) => programShape(option as ProgramSchema)) }
    case 'array':
      return { type: 'array', items: item ? programShape(item) : {} }
    case 'object':
    case 'strict_object':
      return {
        type: 'object',
        required: Object.keys(entries).filter((key) => !isOptional(entries[key] as ProgramSchema)),
        properties: Object.fromEntries(
          Object.entries(entries).map(([key, part]) => [key, programShape(part)]),
        ),
        ...(type === 'strict_object' ? { additionalProperties: false } : {}),
      }
    default:
      throw new Error(`The schema ${type} is not compared.`)
  }
}

export function programShape(schema: ProgramSchema): Shape {
  if (schema.wrapped) return programShape(schema.wrapped)
  const actions = actionsOf(schema).map((action) => actionShape(action, schema.type === 'array'))
  return Object.assign({}, ownShape(schema), ...actions) as Shape
}

/** The published schema without its words and with every reference replaced by what it refers to. */
export function publishedShape(root: JsonSchema, schema: unknown): unknown {
  if (Array.isArray(schema)) return schema.map((element) => publishedShape(root, element))
  if (typeof schema !== 'object' || schema === null) return schema
  const { $ref, ...rest } = schema as JsonSchema
  if ($ref !== undefined) return publishedShape(root, { ...rest, ...definitionOf(root, $ref) })
  return Object.fromEntries(
    Object.entries(rest)
      .filter(([keyword]) => !['$schema', '$defs', 'title', 'description'].includes(keyword))
      .map(([keyword, value]) => [
        keyword,
        keyword === 'properties'
          ? Object.fromEntries(
              Object.entries(value as JsonSchema).map(([key, part]) => [key, publishedShape(root, part)]),
            )
          : publishedShape(root, value),
      ]),
  )
}
