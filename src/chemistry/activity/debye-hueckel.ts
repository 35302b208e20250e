/* Slope of the Debye–Hückel limiting law for the osmotic coefficient, from the density of water (Kell 1975) and its
   dielectric constant (Bradley and Pitzer 1979) at 1 atm. */

const avogadro = 6.02214076e23
const charge = 1.602176634e-19
const boltzmann = 1.380649e-23
const vacuum = 8.8541878128e-12

/** kg/m³, 0 to 100 °C. Kell 1975. @example waterDensity(25) → 997.045 */
export function waterDensity(celsius: number): number {
  const t = celsius
  const above =
    999.83952 +
    t * (16.945176 + t * (-7.9870401e-3 + t * (-46.170461e-6 + t * (105.56302e-9 - t * 280.54253e-12))))
  return above / (1 + 16.87985e-3 * t)
}

/** Relative permittivity of water at 1 atm. Bradley and Pitzer 1979. @example permittivity(25) → 78.38 */
export function permittivity(celsius: number): number {
  const kelvin = celsius + 273.15
  const atThousandBar = 342.79 * Math.exp(kelvin * (-5.0866e-3 + kelvin * 9.469e-7))
  const c = -2.0525 + 3115.9 / (kelvin - 182.89)
  const b = -8032.5 + 4.2142e6 / kelvin + 2.1417 * kelvin
  return atThousandBar + c * Math.log((b + 1.01325) / (b + 1000))
}

/** A_φ, kg^½ mol^-½, 0 to 60 °C. @example debyeHueckelSlope(25) → 0.3914 */
export function debyeHueckelSlope(celsius: number): number {
  const kelvin = celsius + 273.15
  const bjerrum = (charge * charge) / (4 * Math.PI * vacuum * permittivity(celsius) * boltzmann * kelvin)
  return (Math.sqrt(2 * Math.PI * avogadro * waterDensity(celsius)) * bjerrum ** 1.5) / 3
}
