import type { Caution } from './cautions.ts'
import type { Selector } from './conditions.ts'
import type { Ingredient } from './types.ts'

/** Whether a selector names this ingredient by id, tag, role or what it gives; not by "whatever it is". */
function names(selector: Selector, ingredient: Ingredient): boolean {
  const { ids = [], tags = [], roles = [], releases = [], except } = selector
  if (except && names(except, ingredient)) return false
  return (
    ids.includes(ingredient.id) ||
    tags.some((tag) => ingredient.tags.includes(tag)) ||
    roles.some((role) => ingredient.roles.includes(role)) ||
    releases.some((species) => ingredient.releases?.some((released) => released.species === species))
  )
}

/** Every selector inside a condition. */
function* selectorsIn(condition: unknown): Generator<Selector> {
  if (Array.isArray(condition)) {
    for (const part of condition) yield* selectorsIn(part)
  } else if (typeof condition === 'object' && condition !== null) {
    for (const [key, part] of Object.entries(condition)) {
      if (key === 'line') yield part as Selector
      else yield* selectorsIn(part)
    }
  }
}

/** Cautions that can speak of an ingredient, the loudest first. */
export function cautionsAbout(ingredient: Ingredient, cautions: readonly Caution[]): readonly Caution[] {
  const rank = { stop: 0, warn: 1, note: 2 }
  return cautions
    .filter(({ when }) => [...selectorsIn(when)].some((selector) => names(selector, ingredient)))
    .toSorted((a, b) => rank[a.severity] - rank[b.severity])
}
