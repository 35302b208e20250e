import { expressMass, expressNumber, expressQuantity, expressVolume } from '../../quantity/express.ts'

/* How many digits the page shows of each kind of figure; the writing itself is the quantity room's. */

export const significant = (value: number, digits: number) => expressNumber(value, { significant: digits })
export const decimals = (value: number, places: number) => expressNumber(value, { decimals: places })
export const wholeNumber = (value: number) => decimals(value, 0)
export const percentOfParticles = (value: number) => expressQuantity(value, '%', { decimals: 1 })
export const volumeToMeasure = (millilitres: number) => expressVolume(millilitres, { significant: 4 })

/** A mass as the balance shows it: it is rounded already, so every digit of it is written. */
export const massToWeigh = (grams: number) => expressMass(grams, { significant: 9 })
/** A mass by a method, to compare. */
export const comparedMass = (grams: number) => expressMass(grams, { significant: 4 })
/** A mass that was not rounded to any balance. */
export const exactMass = (grams: number) => expressMass(grams, { significant: 5 })
