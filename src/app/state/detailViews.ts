import { osmoticCurve, type CurveAt } from '../../evaluation/osmoticCurve.ts'
import type { FormulaLine } from '../../formula/types.ts'
import { moietiesOf, shelfForms } from '../../library/forms.ts'
import type { Library } from '../../library/library.ts'
import { cautionsAbout } from '../../library/speaks.ts'
import type { Datum, Ingredient } from '../../library/types.ts'
import { significant } from '../words/figures.ts'

/* Everything the page tells about one line's ingredient. */

export interface DatumRow {
  readonly name: string
  readonly value: string
  readonly standing: string
  readonly others: string
}

export interface DetailView {
  readonly name: string
  readonly facts: readonly string[]
  /** What the amount can mean; the article itself first. */
  readonly meanings: readonly { readonly value: string; readonly words: string }[]
  /** Articles that could be weighed instead. */
  readonly forms: readonly { readonly value: string; readonly words: string }[]
  readonly data: readonly DatumRow[]
  readonly cautions: readonly { readonly severity: string; readonly text: string }[]
  readonly notes: readonly string[]
  readonly isOwn: boolean
}

const mostCautions = 40

export function detailView(ingredient: Ingredient, library: Library, isOwn: boolean): DetailView {
  const nameOf = (id: string) => library.ingredients.get(id)?.name ?? id
  const forms = shelfForms(ingredient.id, library.moieties)
  return {
    name: ingredient.name,
    facts: factsOf(ingredient),
    meanings: [
      { value: '', words: `${ingredient.name} as it is weighed` },
      ...moietiesOf(ingredient.id, library.moieties).map(({ id, name }) => ({
        value: id,
        words: `as ${name}`,
      })),
      ...forms.filter((id) => id !== ingredient.id).map((id) => ({ value: id, words: `as ${nameOf(id)}` })),
    ],
    forms: forms.map((id) => ({ value: id, words: nameOf(id) })),
    data: dataOf(ingredient, library),
    cautions: cautionsAbout(ingredient, library.cautions)
      .slice(0, mostCautions)
      .map(({ severity, message }) => ({
        severity,
        text: message.replaceAll(/\{(\w+)(:\w+)?\}/g, (_, name: string) =>
          name === 'ingredient' ? ingredient.name : name === 'other' ? 'the other ingredient' : '…',
        ),
      })),
    notes: ingredient.notes ?? [],
    isOwn,
  }
}

function factsOf(ingredient: Ingredient): readonly string[] {
  const { synonyms, roles, releases, usualStrength, routeNotes, handling, cas } = ingredient
  return [
    ...(synonyms.length > 0 ? [`Also called ${synonyms.join(', ')}.`] : []),
    ...(cas ? [`CAS ${cas.value}.`] : []),
    ...(roles.length > 0 ? [`Used as ${roles.join(', ')}.`] : []),
    ...(releases && releases.length > 0
      ? [`Gives in water ${releases.map(({ species, count }) => `${count} ${species}`).join(', ')}.`]
      : []),
    ...(usualStrength ? [`Usual strength: ${usualStrength}.`] : []),
    ...(routeNotes ? [`${routeNotes}.`] : []),
    ...(handling ? [`Handling: ${handling}.`] : []),
  ]
}

function dataOf(ingredient: Ingredient, library: Library): readonly DatumRow[] {
  const row = (name: string, datum: Datum | undefined): readonly DatumRow[] =>
    datum ? [rowOf(name, datum, library)] : []
  return [
    ...row('molar mass', ingredient.molarMass),
    ...ingredient.sodiumChlorideEquivalents.flatMap(({ atPercent, e }) =>
      row(`sodium chloride equivalent at ${significant(atPercent, 3)} %`, e),
    ),
    ...row('iso-osmotic strength', ingredient.isoOsmoticPercent),
    ...row('freezing-point depression of 1 %', ingredient.freezingPointDepression1Percent),
    ...(ingredient.measuredOsmolality ?? []).flatMap(({ atPercent, osmolality }) =>
      row(`measured osmolality at ${significant(atPercent, 3)} %`, osmolality),
    ),
    ...row('measured i', ingredient.measuredI),
    ...(ingredient.ownIonisation ?? []).flatMap(({ pKa }, index) => row(`pKa ${index + 1}`, pKa)),
    ...row('held back by a red cell, share', ingredient.reflection),
    ...row('haemolysis at the iso-osmotic strength', ingredient.haemolysisPercent),
    ...row('volume taken', ingredient.displacement),
    ...row('density', ingredient.density),
    ...row('mass share of the article', ingredient.article?.massFraction),
    ...row('density of the article', ingredient.article?.density),
  ]
}

function rowOf(name: string, datum: Datum, library: Library): DatumRow {
  const unit = datum.unit === '1' ? '' : ` ${datum.unit}`
  const spread = datum.uncertainty === undefined ? '' : ` ± ${significant(datum.uncertainty, 2)}`
  const source = library.sources.get(datum.source)?.title ?? datum.source
  const memory = datum.fromMemory ? ', from memory' : ''
  return {
    name,
    value: `${significant(datum.value, 5)}${spread}${unit}`,
    standing: `${datum.kind}, confidence ${datum.confidence}${memory}: ${source}${datum.note ? ` (${datum.note})` : ''}`,
    others: (datum.alternatives ?? [])
      .map(
        ({ value, source: other, fromMemory }) =>
          `${significant(value, 5)} (${library.sources.get(other)?.title ?? other}${fromMemory ? ', from memory' : ''})`,
      )
      .join('; '),
  }
}

export interface CurveView {
  readonly points: readonly CurveAt[]
  readonly text: string
}

export function curveView(ingredient: Ingredient, library: Library): CurveView {
  const points = osmoticCurve(ingredient, library)
  return {
    points,
    text: points
      .map(({ percent, milliosmPerKg }) => `${percent} %: ${significant(milliosmPerKg, 3)} mOsm/kg`)
      .join('; '),
  }
}

/** The ingredient of a line; null for a stock or a name that is not known. */
export const ingredientOf = ({ ingredient }: FormulaLine, library: Library): Ingredient | null =>
  typeof ingredient === 'string' ? (library.ingredients.get(ingredient) ?? null) : ingredient
