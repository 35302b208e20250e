import { alligate, dilute } from '../../evaluation/stocks/dilution.ts'
import { significant, volumeToMeasure } from '../words/figures.ts'
import { typedNumber } from '../words/typed.ts'

const strength = (text: string) => typedNumber(text, 0, 100_000)

/** What to measure, in one sentence; empty while something is still to be typed. */
export function dilutionSentence(strong: string, weak: string, wanted: string, volume: string): string {
  if ([strong, wanted, volume].some((text) => text.trim() === '')) return ''
  const [first, goal, millilitres] = [
    strength(strong),
    strength(wanted),
    typedNumber(volume, 0.001, 1_000_000),
  ]
  const second = weak.trim() === '' ? 0 : strength(weak)
  if (first === null || goal === null || millilitres === null || second === null)
    return 'Write every strength and the volume as a plain number.'
  if (second === 0) {
    const found = dilute(first, goal, millilitres)
    if (found.status === 'refused')
      return found.because === 'stock is weaker'
        ? 'The stock is weaker than the wanted strength; no dilution makes it stronger.'
        : 'Strengths and volume have to be above zero.'
    return `Measure ${volumeToMeasure(found.stockMl)} of the stock and make up to ${volumeToMeasure(millilitres)} with water (${significant(found.fold, 4)}-fold).`
  }
  const parts = alligate([first, second], goal)
  if (parts.status === 'refused') return 'The wanted strength does not lie between the two stocks.'
  const [a = 0, b = 0] = parts.parts
  const sum = a + b
  return `Mix ${volumeToMeasure((millilitres * a) / sum)} of the first and ${volumeToMeasure((millilitres * b) / sum)} of the second: parts ${significant(a, 4)} to ${significant(b, 4)}, as if volumes added.`
}
