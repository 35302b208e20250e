import { expressMass, expressNumber, expressVolume } from '../quantity/express.ts'
import type { Library } from '../library/library.ts'
import type { Finding } from '../evaluation/types.ts'

export interface Told {
  readonly message: string
  readonly wayOut: string
}

/** A finding in words: those of data/findings or data/cautions, filled with its values. */
export function tellFinding(finding: Finding, library: Library): Told {
  const text = library.findings.get(finding.code)
  if (!text) return { message: finding.code, wayOut: '' }
  return { message: fill(text.message, finding.values), wayOut: fill(text.wayOut, finding.values) }
}

/** The words of a bare code: why a method differs, or what it lacks. */
export function tellCode(code: string, library: Library, values: Finding['values'] = {}): string {
  const text = library.findings.get(code)
  return text ? fill(text.message, values) : code
}

const digits = { significant: 4 }

/**
 * Puts values into `{name}`, numbers to four digits; `{name:mass}` in g, mg or mcg, `{name:volume}` in mL,
 * `{name:whole}` without decimals. A name without a value stays as it is.
 *
 * @example fill('{grams:mass} of {total:whole}', { grams: 0.0005, total: 289.6 }) → '500 mcg of 290'
 */
export function fill(template: string, values: Finding['values']): string {
  return template.replaceAll(/\{(\w+)(?::(\w+))?\}/g, (whole, name: string, form?: string) => {
    const value = values[name]
    if (value === undefined) return whole
    return typeof value === 'number' ? numberAs(value, form) : value
  })
}

function numberAs(value: number, form: string | undefined): string {
  if (form === 'mass') return expressMass(value, digits)
  if (form === 'volume') return expressVolume(value, digits)
  if (form === 'whole') return expressNumber(value, { decimals: 0 })
  return expressNumber(value, digits)
}
