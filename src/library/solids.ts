import * as v from 'valibot'
import solidsFile from '../../data/equilibria/solids.json'
import solubilitiesFile from '../../data/equilibria/solubilities.json'
import { checked } from './checked.ts'
import { datumSchema } from './schema.ts'
import type { Datum } from './types.ts'

/** Solid + `protonsTaken` H+ = ions + `watersGiven` H2O, constant at 25 °C and zero ionic strength. */
export interface Solid {
  readonly id: string
  readonly name: string
  readonly formula: string
  readonly ions: readonly { readonly species: string; readonly count: number }[]
  readonly protonsTaken: number
  readonly watersGiven: number
  readonly logK: Datum
  /** Absent: unknown, and the constant is used at 25 °C alone. */
  readonly enthalpyKilojoulePerMole?: Datum
}

/** How much of the uncharged form of a weak acid or base water holds. */
export interface IntrinsicSolubility {
  readonly id: string
  readonly name: string
  readonly formula: string
  readonly kind: 'acid' | 'base'
  /** Ions as ingredients release them, and the uncharged form where it is released itself. */
  readonly ions: readonly string[]
  readonly gramsPerLitre: Datum
  readonly molarMass: Datum
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())
const finite = v.pipe(v.number(), v.finite())
const whole = v.pipe(finite, v.integer())
const figure = datumSchema(finite)
const positive = datumSchema(v.pipe(finite, v.gtValue(0)))

const solidsSchema = v.array(
  v.strictObject({
    id: text,
    name: text,
    formula: text,
    ions: v.pipe(
      v.array(v.strictObject({ species: text, count: v.pipe(whole, v.minValue(1)) })),
      v.minLength(1),
    ),
    protonsTaken: whole,
    watersGiven: whole,
    logK: figure,
    enthalpyKilojoulePerMole: v.exactOptional(figure),
  }),
)

const solubilitiesSchema = v.array(
  v.strictObject({
    id: text,
    name: text,
    formula: text,
    kind: v.picklist(['acid', 'base']),
    ions: v.pipe(v.array(text), v.minLength(1)),
    gramsPerLitre: positive,
    molarMass: positive,
  }),
)

export const solidFiles: Readonly<Record<string, unknown>> = {
  solids: solidsFile,
  solubilities: solubilitiesFile,
}

export const loadSolids = (): readonly Solid[] => checked(solidsSchema, solidsFile, 'equilibria/solids')

export const loadIntrinsicSolubilities = (): readonly IntrinsicSolubility[] =>
  checked(solubilitiesSchema, solubilitiesFile, 'equilibria/solubilities')
