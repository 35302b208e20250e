import { expect, it } from 'vitest'
import { amountText } from '../../../src/evaluation/cautions/words.ts'

it.each([
  ['5.0µg', '5 mcg'],
  ['.5 g', '0.5 g'],
  ['10000 mcg', '10,000 mcg'],
  ['1:1000', '1:1,000'],
  ['33.30 mEq', '33.3 mEq'],
  ['a pinch', 'a pinch'],
])('an amount typed as %s is told as %s', (typed, told) => {
  expect(amountText(typed)).toBe(told)
})
