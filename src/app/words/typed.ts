/** A plain number within bounds as typed, a decimal comma allowed; null for anything else. */
export function typedNumber(text: string, low: number, high: number): number | null {
  const trimmed = text.trim()
  if (!/^\d{1,6}([.,]\d{1,6})?$/.test(trimmed)) return null
  const value = Number(trimmed.replace(',', '.'))
  return value >= low && value <= high ? value : null
}
