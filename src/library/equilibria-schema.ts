import * as v from 'valibot'
import { datumSchema } from './schema.ts'

const filledText = v.pipe(v.string(), v.trim(), v.nonEmpty())
const finite = v.pipe(v.number(), v.finite())
const whole = v.pipe(finite, v.integer())
const count = v.pipe(whole, v.minValue(1))
const figure = datumSchema(finite)

export const speciesSchema = v.array(
  v.strictObject({
    id: filledText,
    charge: whole,
    component: filledText,
    count: whole,
    partners: v.exactOptional(v.array(v.strictObject({ component: filledText, count }))),
    molarMass: v.pipe(finite, v.gtValue(0)),
    volume: v.exactOptional(figure),
  }),
)

const thermalShift = {
  enthalpyKilojoulePerMole: figure,
  heatCapacityJoulePerMoleKelvin: v.exactOptional(figure),
}

const pairs = v.array(v.strictObject({ metal: filledText, ligand: filledText }))

export const equilibriaSchemas = {
  acids: v.array(
    v.strictObject({
      component: filledText,
      species: v.pipe(v.array(filledText), v.minLength(2)),
      steps: v.array(v.strictObject({ pKa: figure, ...thermalShift, watersTaken: whole })),
    }),
  ),
  formations: v.array(
    v.strictObject({
      species: filledText,
      from: v.pipe(v.array(v.strictObject({ species: filledText, count })), v.minLength(1)),
      protonsReleased: whole,
      watersReleased: whole,
      logK: figure,
      ...thermalShift,
    }),
  ),
  water: v.strictObject({
    celsiusMin: finite,
    celsiusMax: finite,
    water: v.strictObject({ pKa: figure, ...thermalShift }),
    carbonDioxideSolubility: v.strictObject({ logK: figure, ...thermalShift }),
  }),
  representation: v.strictObject({
    metals: v.array(filledText),
    ligands: v.array(filledText),
    interaction: pairs,
    negligible: pairs,
    unknown: pairs,
  }),
  assumptions: v.strictObject({
    protonatedBaseEnthalpyKilojoulePerMole: figure,
    neutralAcidEnthalpyKilojoulePerMole: figure,
  }),
}
