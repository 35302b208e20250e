import type * as Brand from './brand.ts'

/* The one place where a bare number becomes a quantity. Nothing is converted or checked here. */

export const grams = (value: number) => value as Brand.Grams
export const millilitres = (value: number) => value as Brand.Millilitres
export const millimoles = (value: number) => value as Brand.Millimoles
export const milliequivalents = (value: number) => value as Brand.Milliequivalents
export const molesPerKilogram = (value: number) => value as Brand.MolesPerKilogram
export const millimolesPerLitre = (value: number) => value as Brand.MillimolesPerLitre
export const gramsPerMole = (value: number) => value as Brand.GramsPerMole
export const gramsPerMillilitre = (value: number) => value as Brand.GramsPerMillilitre
export const milliosmolesPerKilogram = (value: number) => value as Brand.MilliosmolesPerKilogram
export const milliosmolesPerLitre = (value: number) => value as Brand.MilliosmolesPerLitre
export const kilogramsPerLitre = (value: number) => value as Brand.KilogramsPerLitre
export const kelvinDifference = (value: number) => value as Brand.KelvinDifference
export const degreesCelsius = (value: number) => value as Brand.DegreesCelsius
export const percentWeightInVolume = (value: number) => value as Brand.PercentWeightInVolume
export const percent = (value: number) => value as Brand.Percent
export const fraction = (value: number) => value as Brand.Fraction
export const pH = (value: number) => value as Brand.PH
