/**
 * What was made for a key, or makes it. For functions of the key alone: what is kept can never differ from what would
 * be made. A full store is emptied first.
 */
export function keptAs<Key, Value>(store: Map<Key, Value>, most: number, key: Key, make: () => Value): Value {
  const known = store.get(key)
  if (known !== undefined) return known
  const made = make()
  if (store.size >= most) store.clear()
  store.set(key, made)
  return made
}
