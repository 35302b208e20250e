/** As much of JSON Schema 2020-12 as the published schema uses; an unknown keyword is an error, not a pass. */
export interface JsonSchema {
  readonly [keyword: string]: unknown
}

type Check = (limit: unknown, value: unknown) => boolean

const isText = (value: unknown): value is string => typeof value === 'string'
const isNumber = (value: unknown): value is number => typeof value === 'number'
export const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

const types: Readonly<Record<string, (value: unknown) => boolean>> = {
  string: isText,
  number: isNumber,
  integer: (value) => Number.isInteger(value),
  boolean: (value) => typeof value === 'boolean',
  array: (value) => Array.isArray(value),
  object: isObject,
}

/* A keyword holds of itself for a value of another type; "type" is what refuses that. */
const simple: Readonly<Record<string, Check>> = {
  $schema: () => true,
  title: () => true,
  description: () => true,
  $defs: () => true,
  type: (name, value) => types[String(name)]?.(value) ?? false,
  const: (expected, value) => value === expected,
  enum: (options, value) => (options as readonly unknown[]).includes(value),
  maxLength: (most, value) => !isText(value) || value.length <= Number(most),
  minLength: (least, value) => !isText(value) || value.length >= Number(least),
  pattern: (source, value) => !isText(value) || new RegExp(String(source)).test(value),
  minimum: (least, value) => !isNumber(value) || value >= Number(least),
  maximum: (most, value) => !isNumber(value) || value <= Number(most),
  exclusiveMinimum: (least, value) => !isNumber(value) || value > Number(least),
  maxItems: (most, value) => !Array.isArray(value) || value.length <= Number(most),
  required: (keys, value) =>
    !isObject(value) || (keys as readonly string[]).every((key) => Object.hasOwn(value, key)),
}

export const definitionOf = (root: JsonSchema, reference: unknown): JsonSchema => {
  const name = /^#\/\$defs\/(\w+)$/.exec(String(reference))?.[1] ?? ''
  const definition = (root.$defs as Record<string, JsonSchema>)[name]
  if (!definition) throw new Error(`There is no definition for ${String(reference)}.`)
  return definition
}

/** Whether a value is what the schema says. */
export function holds(root: JsonSchema, schema: JsonSchema, value: unknown): boolean {
  const properties = (schema.properties ?? {}) as Record<string, JsonSchema>
  return Object.entries(schema).every(([keyword, limit]) => {
    if (keyword === '$ref') return holds(root, definitionOf(root, limit), value)
    if (keyword === 'anyOf') return (limit as JsonSchema[]).some((option) => holds(root, option, value))
    if (keyword === 'items') {
      return !Array.isArray(value) || value.every((element) => holds(root, limit as JsonSchema, element))
    }
    if (keyword === 'properties') {
      return (
        !isObject(value) ||
        Object.entries(properties).every(
          ([key, part]) => !Object.hasOwn(value, key) || holds(root, part, value[key]),
        )
      )
    }
    if (keyword === 'additionalProperties') {
      return !isObject(value) || Object.keys(value).every((key) => Object.hasOwn(properties, key))
    }
    const check = simple[keyword]
    if (!check) throw new Error(`The keyword ${keyword} is not checked.`)
    return check(limit, value)
  })
}
