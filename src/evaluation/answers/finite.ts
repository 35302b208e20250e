/* Data of the library and what was typed: read and checked elsewhere. */
const notReckoned = new Set(['ingredient', 'amount', 'formula', 'state'])

/** Path of the first reckoned number in a result that is not finite; null when all are. */
export const nonFinitePath = (value: unknown): string | null => (allFinite(value) ? null : pathIn(value))

function allFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value)
  if (typeof value !== 'object' || value === null) return true
  if (Array.isArray(value)) return value.every(allFinite)
  for (const key in value) {
    const part: unknown = value[key as keyof typeof value]
    if (typeof part !== 'string' && !notReckoned.has(key) && !allFinite(part)) return false
  }
  return true
}

/** Walked only where something is wrong. */
function pathIn(value: unknown): string {
  if (typeof value !== 'object' || value === null) return ''
  const [key, part] =
    Object.entries(value).find(([name, inner]) => !notReckoned.has(name) && !allFinite(inner)) ?? []
  if (key === undefined) return ''
  const rest = pathIn(part)
  return rest === '' ? key : `${key}.${rest}`
}
