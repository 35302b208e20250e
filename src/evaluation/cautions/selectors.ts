import type { Selector } from '../../library/conditions.ts'
import type { Ingredient } from '../../library/types.ts'
import type { CautionLine } from './context.ts'

const shares = (wanted: readonly string[] | undefined, has: readonly string[]) =>
  wanted?.some((item) => has.includes(item)) ?? false

const isCalled = ({ name, synonyms }: Ingredient, words: readonly string[]) =>
  [name, ...synonyms].some((text) => words.some((word) => text.toLowerCase().includes(word)))

/** Whether an ingredient is one of those that are meant. */
export function isSelected(ingredient: Ingredient, selector: Selector): boolean {
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
export const selected = (lines: readonly CautionLine[], selector: Selector): readonly CautionLine[] =>
  lines.filter(({ ingredient }) => isSelected(ingredient, selector))
