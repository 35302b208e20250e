/** Items by their key. Throws when a key stands twice: one of the two would be lost. */
export function keyed<Item>(
  items: readonly Item[],
  keyOf: (item: Item) => string,
): ReadonlyMap<string, Item> {
  const map = new Map<string, Item>()
  for (const item of items) {
    const key = keyOf(item)
    if (map.has(key)) throw new Error(`${key} stands twice in the data`)
    map.set(key, item)
  }
  return map
}
