import type { Stock } from '../../library/stocks.ts'
import type { Ingredient } from '../../library/types.ts'
import type { PageStore } from '../state/store.ts'
import { mostRecent, readOwn, type OwnContent, type OwnStore } from '../storage/ownShelf.ts'

export interface OwnActions {
  keepOwnIngredient(ingredient: Ingredient): void
  keepOwnStock(stock: Stock): void
  dropOwn(id: string): void
  /** What was just added stands first among the recent. */
  noteUse(id: string): void
  /** The shelf of one's own as the text of a file. */
  exportOwn(): string
  importOwn(text: string): void
}

/** What a file holds: the shelf, not the habits. */
const kept = ({ ingredients, stocks }: OwnContent) => ({ ingredients, stocks })

const format = 'evenwater.own-shelf'

/** What can be done to the shelf of one's own; a refused write is said, since the next visit would not find it. */
export function ownActions(page: PageStore, store: OwnStore): OwnActions {
  const change = (own: OwnContent) => {
    page.setState({ own })
    store.write(own).catch(() => {
      page.setState({
        notice: 'This browser keeps nothing: export your own shelf as a file before you close the page.',
      })
    })
  }
  const without = <Item extends { readonly id: string }>(items: readonly Item[], id: string) =>
    items.filter((item) => item.id !== id)
  return {
    keepOwnIngredient(ingredient) {
      const { own } = page.getState()
      change({ ...own, ingredients: [...without(own.ingredients, ingredient.id), ingredient] })
    },
    keepOwnStock(stock) {
      const { own } = page.getState()
      change({ ...own, stocks: [...without(own.stocks, stock.id), stock] })
    },
    dropOwn(id) {
      const { own } = page.getState()
      change({ ...own, ingredients: without(own.ingredients, id), stocks: without(own.stocks, id) })
    },
    noteUse(id) {
      const { own } = page.getState()
      const recent = [id, ...own.recent.filter((other) => other !== id)].slice(0, mostRecent)
      page.setState({ own: { ...own, recent } })
      // Losing the list of the recent costs nothing, so a refused write is not worth a notice.
      store.write({ ...own, recent }).catch(() => undefined)
    },
    exportOwn: () => `${JSON.stringify({ format, version: 1, ...kept(page.getState().own) }, null, 2)}\n`,
    importOwn(text) {
      page.setState({ notice: taken(text, page, change) })
    },
  }
}

/** Takes what a file holds into the shelf and says what became of it. */
function taken(text: string, page: PageStore, change: (own: OwnContent) => void): string {
  let value: unknown
  try {
    value = JSON.parse(text)
  } catch {
    return 'The file is not a shelf of one’s own: it is not JSON.'
  }
  if ((value as { format?: unknown } | null)?.format !== format)
    return 'The file is not a shelf of one’s own.'
  const { content, unreadable } = readOwn(value)
  const { own } = page.getState()
  const incoming = new Set([...content.ingredients, ...content.stocks].map(({ id }) => id))
  change({
    ...own,
    ingredients: [...own.ingredients.filter(({ id }) => !incoming.has(id)), ...content.ingredients],
    stocks: [...own.stocks.filter(({ id }) => !incoming.has(id)), ...content.stocks],
  })
  const count = content.ingredients.length + content.stocks.length
  return unreadable === 0
    ? `${count} taken into your own shelf.`
    : `${count} taken into your own shelf; ${unreadable} could not be read and were left out.`
}
