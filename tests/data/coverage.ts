import { loadLibrary } from '../../src/library/library.ts'
import type { Confidence, Ingredient } from '../../src/library/types.ts'
import { dataFiles, objectsIn } from './files.ts'

/* Prints what the data cover: how many ingredients have which figure, and how sure the figures are. */

const library = loadLibrary()
const ingredients = [...library.ingredients.values()]
const { species } = library

const has: Readonly<Record<string, (ingredient: Ingredient) => boolean>> = {
  'CAS number': ({ cas }) => cas !== undefined,
  'molecular formula and molar mass': ({ formula, molarMass }) => Boolean(formula && molarMass),
  'species released in water': ({ releases }) => releases !== undefined,
  '  all of them species of the library': ({ releases }) =>
    releases?.every(({ species: name }) => species.has(name)) ?? false,
  'ionic class': ({ electrolyteClass }) => electrolyteClass !== undefined,
  'pKa of its own ion': ({ ownIonisation }) => ownIonisation !== undefined,
  'E at 1 %': ({ sodiumChlorideEquivalents: points }) => points.some(({ atPercent }) => atPercent === 1),
  'E at two concentrations or more': ({ sodiumChlorideEquivalents: points }) => points.length > 1,
  'iso-osmotic concentration': ({ isoOsmoticPercent }) => isoOsmoticPercent !== undefined,
  'freezing-point depression at 1 %': ({ freezingPointDepression1Percent: k }) => k !== undefined,
  'E, freezing point or species of the library': (ingredient) =>
    ingredient.sodiumChlorideEquivalents.length > 0 ||
    ingredient.freezingPointDepression1Percent !== undefined ||
    (ingredient.releases?.every(({ species: name }) => species.has(name)) ?? false),
  'haemolysis at the iso-osmotic concentration': ({ haemolysisPercent }) => haemolysisPercent !== undefined,
  'reflection at the red cell': ({ reflection }) => reflection !== undefined,
  'displacement in mL/g': ({ displacement }) => displacement !== undefined,
  'density (of the liquids)': ({ density, article }) => density !== undefined || article !== undefined,
  'usual strength': ({ usualStrength }) => usualStrength !== undefined,
  'tall-man name': ({ tallManName }) => tallManName !== undefined,
  'another form in the library': ({ family }) => family !== undefined,
}

const row = (label: string, ...cells: readonly (string | number)[]) =>
  console.log(label.padEnd(48), ...cells.map((cell) => String(cell).padStart(8)))

console.log(`Library ${library.version}`)
row('ingredients', ingredients.length)
for (const [label, test] of Object.entries(has)) row(`  ${label}`, ingredients.filter(test).length)
row('species', species.size)

interface Tally {
  readonly byConfidence: Record<Confidence, number>
  recalled: number
  all: number
}

function tallies(): ReadonlyMap<string, Tally> {
  const bySource = new Map<string, Tally>()
  for (const { content } of dataFiles()) {
    for (const { object } of objectsIn(content)) {
      const { source, confidence, fromMemory } = object
      if (typeof source !== 'string' || !('value' in object)) continue
      const tally = bySource.get(source) ?? {
        byConfidence: { high: 0, medium: 0, low: 0 },
        recalled: 0,
        all: 0,
      }
      if (confidence === 'high' || confidence === 'medium' || confidence === 'low') {
        tally.byConfidence[confidence] += 1
      }
      if (fromMemory === true) tally.recalled += 1
      tally.all += 1
      bySource.set(source, tally)
    }
  }
  return bySource
}

const bySource = [...tallies()].toSorted(([, a], [, b]) => b.all - a.all)
console.log()
row('values by source', 'all', 'high', 'medium', 'low', 'recalled')
for (const [source, { all, byConfidence, recalled }] of bySource) {
  row(`  ${source}`, all, byConfidence.high, byConfidence.medium, byConfidence.low, recalled)
}
const sum = (count: (tally: Tally) => number) =>
  bySource.reduce((total, [, tally]) => total + count(tally), 0)
row(
  'all values',
  sum(({ all }) => all),
  sum(({ byConfidence }) => byConfidence.high),
  sum(({ byConfidence }) => byConfidence.medium),
  sum(({ byConfidence }) => byConfidence.low),
  sum(({ recalled }) => recalled),
)
