/** An object of parsed JSON, nothing known about it yet. */
export type PlainObject = Readonly<Record<string, unknown>>

export const isPlainObject = (value: unknown): value is PlainObject =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
