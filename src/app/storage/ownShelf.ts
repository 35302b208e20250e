import { createStore, get, set, type UseStore } from 'idb-keyval'
import * as v from 'valibot'
import { readIngredient } from '../../library/own-ingredient.ts'
import { stockSchema, type Stock } from '../../library/stocks.ts'
import type { Ingredient } from '../../library/types.ts'

/** Ingredients and solutions of one's own, kept in this browser. */
export interface OwnContent {
  readonly ingredients: readonly Ingredient[]
  readonly stocks: readonly Stock[]
  /** Ids of what was added last, the latest first. */
  readonly recent: readonly string[]
}

export const emptyOwn: OwnContent = { ingredients: [], stocks: [], recent: [] }

export interface OwnStore {
  read(): Promise<OwnContent>
  write(content: OwnContent): Promise<void>
}

const key = 'own'
export const mostRecent = 12

export function browserOwn(): OwnStore {
  let store: UseStore | undefined
  const opened = () => (store ??= createStore('evenwater own', 'own'))
  return {
    read: async () => readOwn(await get<unknown>(key, opened())).content,
    write: async (content) => set(key, content, opened()),
  }
}

const asList = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : [])

/** What a file or the browser holds, record by record; those that cannot be read are counted, not guessed. */
export function readOwn(value: unknown): { readonly content: OwnContent; readonly unreadable: number } {
  const { ingredients, stocks, recent } = (typeof value === 'object' && value !== null ? value : {}) as {
    readonly ingredients?: unknown
    readonly stocks?: unknown
    readonly recent?: unknown
  }
  const read = asList(ingredients).map(readIngredient)
  const solutions = asList(stocks).map((stock) => v.safeParse(stockSchema, stock))
  const content = {
    ingredients: read.flatMap((result) => (result.ok ? [result.value] : [])),
    stocks: solutions.flatMap((result) => (result.success ? [result.output] : [])),
    recent: asList(recent)
      .filter((id) => typeof id === 'string')
      .slice(0, mostRecent),
  }
  const all = read.length + solutions.length
  return { content, unreadable: all - content.ingredients.length - content.stocks.length }
}
