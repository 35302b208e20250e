declare const unitOf: unique symbol

/** A number that carries its unit in its type. Only `mint.ts` may make one. */
export type Scalar<Unit extends string> = number & { readonly [unitOf]: Unit }

export type Grams = Scalar<'g'>
export type Millilitres = Scalar<'mL'>
export type Millimoles = Scalar<'mmol'>
export type Milliequivalents = Scalar<'mEq'>
export type MolesPerKilogram = Scalar<'mol/kg'>
export type MillimolesPerLitre = Scalar<'mmol/L'>
export type GramsPerMole = Scalar<'g/mol'>
export type GramsPerMillilitre = Scalar<'g/mL'>
export type MilliosmolesPerKilogram = Scalar<'mOsm/kg'>
export type MilliosmolesPerLitre = Scalar<'mOsm/L'>
export type KilogramsPerLitre = Scalar<'kg/L'>
export type KelvinDifference = Scalar<'K'>
export type DegreesCelsius = Scalar<'°C'>
/** Percent weight in volume: grams in 100 mL. */
export type PercentWeightInVolume = Scalar<'% w/v'>
export type Percent = Scalar<'%'>
/** A pure number between 0 and 1. */
export type Fraction = Scalar<'1'>
export type PH = Scalar<'pH'>
