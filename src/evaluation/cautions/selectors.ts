import type { Selector } from '../../library/conditions.ts'
import type { Ingredient } from '../../library/types.ts'
import type { CautionLine } from './context.ts'

const shares = (wanted: readonly string[] | undefined, has: readonly string[]) =>
  wanted?.some((item) => has.includes(item)) ?? false

const isCalled = ({ name, synonyms }: Ingredient, words: readonly string[]) =>
  [name, ...synonyms].some((text) => words.some((word) => text.toLowerCase().includes(word)))

/* It follows from the two alone, and is asked for every caution and line at every keystroke. */
const known = new WeakMap<Selector, WeakMap<Ingredient, boolean>>()

function answersOf(selector: Selector): WeakMap<Ingredient, boolean> {
  const earlier = known.get(selector)
  if (earlier) return earlier
  const made = new WeakMap<Ingredient, boolean>()
  known.set(selector, made)
  return made
}

function isMeant(ingredient: Ingredient, selector: Selector, answers: WeakMap<Ingredient, boolean>): boolean {
  const earlier = answers.get(ingredient)
  if (earlier !== undefined) return earlier
  const answer = reckoned(ingredient, selector)
  answers.set(ingredient, answer)
  return answer
}

/** Whether an ingredient is one of those that are meant. */
export const isSelected = (ingredient: Ingredient, selector: Selector): boolean =>
  isMeant(ingredient, selector, answersOf(selector))

function reckoned(ingredient: Ingredient, selector: Selector): boolean {
  const { ids, tags, roles, releases, names, everything, hasOtherForms, except } = selector
  const named =
    everything === true ||
    (names !== undefined && isCalled(ingredient, names)) ||
    shares(ids, [ingredient.id]) ||
    shares(tags, ingredient.tags) ||
    shares(roles, ingredient.roles) ||
    shares(
      releases,
      (ingredient.releases ?? []).map(({ species }) => species),
    ) ||
    (hasOtherForms === true && ingredient.family !== undefined)
  return named && !(except && isSelected(ingredient, except))
}

/** The lines that are meant. */
export function selected(lines: readonly CautionLine[], selector: Selector): readonly CautionLine[] {
  const answers = answersOf(selector)
  return lines.filter(({ ingredient }) => isMeant(ingredient, selector, answers))
}
