const partWords: Readonly<Record<string, string>> = {
  title: 'The title',
  route: 'The route',
  finalVolume: 'The final volume',
  target: 'The target',
  pH: 'The pH',
  temperature: 'The temperature',
  lines: 'The list of lines',
  balance: 'The balance',
  bench: 'The bench',
  batch: 'The batch',
  order: 'The order',
  patient: 'The patient',
  vehicle: 'The vehicle',
  notes: 'The text of the notes',
  acknowledgements: 'The list of acknowledgements',
}

/**
 * A place in the document, as the beginning of a sentence.
 * @example placeInWords(['lines', 2, 'amount']) → 'The amount of line 3'
 */
export function placeInWords(path: readonly unknown[]): string {
  const [first, second, ...rest] = path
  if (first === 'lines' && typeof second === 'number') {
    const line = `line ${second + 1}`
    return rest.length === 0 ? `Line ${second + 1}` : `The ${rest.join('.')} of ${line}`
  }
  const whole = partWords[String(first)]
  if (!whole) return 'The formula'
  const inner = [second, ...rest].filter((part) => part !== undefined)
  return inner.length === 0 ? whole : `${whole} (${inner.join('.')})`
}

interface Issue {
  readonly message: string
  readonly expected: string | null
  readonly received: string
}

/** What is wrong there, as the end of that sentence. */
export function issueInWords({ message, expected, received }: Issue): string {
  if (expected === 'never') return 'is not known here'
  if (received === 'undefined') return 'is missing'
  if (!message.startsWith('Invalid')) return message
  return expected ? `has to be ${expected}, not ${received}` : `cannot be ${received}`
}
