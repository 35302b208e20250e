import { loadLibrary } from '../../../src/library/library.ts'
import type { BinaryRow, Coefficient, ElectrolyteParameters } from '../../../src/library/electrolytes.ts'
import content from './parameters.json'
import weak from './weak.json'

const library = loadLibrary()

/** A figure at 25 and at 0 °C. */
const coefficient = ([at25 = Number.NaN, at0 = Number.NaN]: readonly number[]): Coefficient => ({
  at25,
  perK: (at25 - at0) / 25,
  perK2: 0,
})

const charge = (id: string) => library.species.get(id)?.charge ?? Number.NaN

function keyOf(ions: readonly string[]): string {
  const positive = ions.filter((id) => charge(id) > 0).toSorted()
  const negative = ions.filter((id) => charge(id) < 0).toSorted()
  return (positive.length > 1 ? [...positive, ...negative] : [...negative, ...positive]).join('|')
}

const pairs = (rows: typeof content.binary) =>
  rows.map(({ cation, anion, alpha1, alpha2, beta0, beta1, beta2, cphi }): readonly [string, BinaryRow] => [
    `${cation}|${anion}`,
    {
      cation,
      anion,
      alpha1,
      alpha2,
      beta0: coefficient(beta0),
      beta1: coefficient(beta1),
      beta2: coefficient(beta2),
      cphi: coefficient(cphi),
      maximumMolality: 6,
      relativeUncertainty: 0,
      source: 'the engine’s own',
    },
  ])

const mixing = (rows: readonly { readonly ions: readonly string[]; readonly value: readonly number[] }[]) =>
  new Map(rows.map(({ ions, value }) => [keyOf(ions), coefficient(value)]))

/** The parameters of the other engine, which differ from this program's; `more` pairs stand beside them. */
export const engineParameters = (
  more: Iterable<readonly [string, BinaryRow]> = [],
): ElectrolyteParameters => ({
  binary: new Map([...more, ...pairs(content.binary)]),
  theta: mixing(content.theta),
  psi: mixing(content.psi),
  lambda: new Map(),
  zeta: new Map(),
})

export const { source } = content

/** The same with the engine's own pairs of carbonate, borate and bisulfate, for solutions that are speciated. */
export function speciatedEngineParameters(
  more: Iterable<readonly [string, BinaryRow]> = [],
): ElectrolyteParameters {
  const strong = engineParameters(more)
  const lambda = new Map(weak.lambda.map(({ ions, value }) => [ions.join('|'), coefficient(value)]))
  for (const { ions, value } of weak.lambda) lambda.set(ions.toReversed().join('|'), coefficient(value))
  return {
    binary: new Map([...strong.binary, ...pairs(weak.binary)]),
    theta: new Map([...strong.theta, ...mixing(weak.theta)]),
    psi: new Map([...strong.psi, ...mixing(weak.psi)]),
    lambda,
    zeta: new Map(weak.zeta.map(({ ions, value }) => [ions.join('|'), coefficient(value)])),
  }
}
