import { expressMass, expressNumber, expressQuantity, expressVolume } from '../quantity/express.ts'
import type { Figure } from '../evaluation/types.ts'

/* How the sheet says a figure; the safe expression itself is the quantity room's. */

export const numberText = (value: number | null, significant: number) => expressNumber(value, { significant })
export const decimalText = (value: number | null, decimals: number) => expressNumber(value, { decimals })
/** Four significant digits and never more than whole numbers from 100 up: what an osmometer can show. */
export const wholeText = (value: number | null) => expressNumber(value, { decimals: 0 })
export const percentText = (value: number) => `${expressNumber(value, { decimals: 1 })} %`
export const massText = (grams: number | null, significant: number) => expressMass(grams, { significant })
export const volumeText = (millilitres: number | null, significant = 7) =>
  expressVolume(millilitres, { significant })

/** @example figureText({ name: 'E', value: 0.24, unit: 'g/g' }) → '0.24 g/g' */
export const figureText = ({ value, unit }: Figure) =>
  unit ? expressQuantity(value, unit, { significant: 5 }) : expressNumber(value, { significant: 5 })

/** First letter large, full stop at the end: the words of data/findings as a sentence of the sheet. */
export function sentence(words: string): string {
  const trimmed = words.trim()
  if (trimmed === '') return ''
  const start = trimmed.charAt(0).toUpperCase() + trimmed.slice(1)
  return /[.!?]$/.test(start) ? start : `${start}.`
}
