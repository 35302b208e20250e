import { readAmount } from '../../quantity/readAmount.ts'

/** What a column holds, by its own heading. */
export type Heading =
  | { readonly kind: 'name' | 'unit' | 'other' }
  | {
      readonly kind: 'amount'
      /** Unit that the heading gives to bare numbers under it: "mg", "% w/v"; empty when it gives none. */
      readonly unit: string
      /** What the amounts are meant for: "per 100 mL"; empty when nothing is said. */
      readonly per: string
    }

const names =
  /^(ingredients?|names?|substances?|components?|compounds?|chemicals?|materials?|drugs?|solutes?|excipients?)( names?)?$/i
const units = /^(units?( of measure)?|u\.?o\.?m\.?)$/i
const amounts =
  /^(amounts?|quantity|quantities|qty|strength|concentration|conc|content|dose|weight|mass|volume)\b\.?/i
const idle = /\b(as ordered|ordered|needed|required|used|to weigh)\b/gi

/** True for text that makes an amount of a bare number. */
const isUnit = (text: string) => text !== '' && readAmount(`1 ${text}`).ok

/** Reads "Amount", "Qty (mg)", "Conc. [% w/v]", "Amount per 100 mL (mg)", "mg/mL". */
export function headingOf(cell: string): Heading {
  const text = cell.trim()
  if (names.test(text)) return { kind: 'name' }
  if (units.test(text)) return { kind: 'unit' }
  if (isUnit(text)) return { kind: 'amount', unit: text, per: '' }
  if (!amounts.test(text)) return { kind: 'other' }
  const rest = text.replace(amounts, '').replace(idle, '')
  const bracketed = /[([]([^)\]]*)[)\]]/.exec(rest)
  const outside = tidied(bracketed ? rest.replace(bracketed[0], ' ') : rest)
  const inside = tidied(bracketed?.[1] ?? '')
  const whole = tidied(`${inside} ${outside}`)
  if (whole === '' || isUnit(whole)) return { kind: 'amount', unit: whole, per: '' }
  return isUnit(inside)
    ? { kind: 'amount', unit: inside, per: outside }
    : { kind: 'amount', unit: '', per: whole }
}

const tidied = (text: string) =>
  text
    .replace(/^[\s,:;–-]+|[\s,:;–-]+$/g, '')
    .replace(/\s+/g, ' ')
    .replace(/^in (?=\S)/, '')
