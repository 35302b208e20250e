import type { Equilibria, Formation, IonisationStep } from '../../../src/library/equilibria.ts'

/** log K of the other engine's tables where this program's are other ones on purpose. */
const logK: Readonly<Record<string, number>> = { 'B3O3(OH)4-': -7.528, 'B4O5(OH)4-2': -16.134, MgCO3: 2.928 }
const pKa: Readonly<Record<string, number>> = { borate: 9.239, sulfate: 1.988 }

const carriedAsInteraction: ReadonlySet<string> = new Set(['CaCO3', 'CaAcetate+'])

/** This program's equilibria with the other engine's constants and without the pairs that it carries as interaction. */
export function engineEquilibria(own: Equilibria): Equilibria {
  return {
    ...own,
    formations: own.formations.filter(({ species }) => !carriedAsInteraction.has(species)).map(withLogK),
    acids: own.acids.map((family) => {
      const value = pKa[family.component]
      return value === undefined
        ? family
        : { ...family, steps: family.steps.map((step) => withPKa(step, value)) }
    }),
    representation: {
      ...own.representation,
      negligible: [
        ...own.representation.negligible,
        { metal: 'Ca+2', ligand: 'carbonate' },
        { metal: 'Ca+2', ligand: 'acetate' },
      ],
    },
  }
}

function withLogK(formation: Formation): Formation {
  const value = logK[formation.species]
  return value === undefined ? formation : { ...formation, logK: { ...formation.logK, value } }
}

const withPKa = (step: IonisationStep, value: number): IonisationStep => ({
  ...step,
  pKa: { ...step.pKa, value },
})
