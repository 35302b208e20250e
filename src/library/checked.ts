import * as v from 'valibot'

/** Data of a known shape, or an error that names the file, the place in it and the reason. */
export function checked<const Schema extends v.GenericSchema>(
  schema: Schema,
  content: unknown,
  file: string,
): v.InferOutput<Schema> {
  const result = v.safeParse(schema, content, { abortEarly: true })
  if (result.success) return result.output
  const [issue] = result.issues
  throw new Error(`data/${file}.json, ${v.getDotPath(issue) ?? 'whole file'}: ${issue.message}`)
}
