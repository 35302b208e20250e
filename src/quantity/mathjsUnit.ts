import { createUnitClass, type Unit } from 'mathjs'

declare module 'mathjs' {
  /** Exported by the package, missing in its types: the class `Unit` over the arithmetic it is given. */
  export const createUnitClass: (
    arithmetic: Readonly<Record<string, unknown>>,
  ) => new (value: number, unit: string) => Unit
}

const refused = (what: string) => () => {
  throw new Error(`Units of the trade are plain numbers; ${what} was asked for.`)
}

/*
 * The library's units over plain numbers. Its usual arithmetic brings matrices, fractions, complex and big numbers
 * along, four fifths of its size, and no unit of the trade needs them: where one is asked for, it is refused.
 */
const UnitOfMathjs = createUnitClass({
  config: { number: 'number', predictable: false },
  addScalar: (a: number, b: number) => a + b,
  subtractScalar: (a: number, b: number) => a - b,
  multiplyScalar: (a: number, b: number) => a * b,
  divideScalar: (a: number, b: number) => a / b,
  pow: (base: number, exponent: number) => base ** exponent,
  abs: Math.abs,
  fix: Math.trunc,
  round: Math.round,
  equal: (a: number, b: number) => a === b,
  isNumeric: (value: unknown) => typeof value === 'number',
  format: String,
  number: Number,
  // The table of units holds a reactive power and temperatures that need these when it is made.
  Complex: { I: Number.NaN },
  Fraction: class {
    readonly value = Number.NaN
  },
  BigNumber: refused('a number of arbitrary precision'),
})

/** A value with one of the library's units, such as (1, 'mg'). Throws for a unit it does not know. */
export const unitOfMathjs = (value: number, name: string): Unit => new UnitOfMathjs(value, name)
