/**
 * Least number of typing errors (a letter wrong, missing, doubled or two swapped) that turn `typed` into a
 * prefix of `word`, or null when it is more than `allowed`.
 *
 * @example distanceOfPrefix('pilocrapine', 'pilocarpine', 2) → 1
 */
export function distanceOfPrefix(typed: string, word: string, allowed: number): number | null {
  if (word.length < typed.length - allowed) return null
  const width = Math.min(word.length, typed.length + allowed)
  let beforeLast: number[] = []
  let last = Array.from({ length: width + 1 }, (_, column) => column)
  for (let row = 1; row <= typed.length; row++) {
    const next = [row]
    for (let column = 1; column <= width; column++) {
      const same = typed[row - 1] === word[column - 1]
      let least = Math.min(
        (last[column - 1] ?? Infinity) + (same ? 0 : 1),
        (last[column] ?? Infinity) + 1,
        (next[column - 1] ?? Infinity) + 1,
      )
      const swapped = typed[row - 1] === word[column - 2] && typed[row - 2] === word[column - 1]
      if (row > 1 && column > 1 && swapped) least = Math.min(least, (beforeLast[column - 2] ?? Infinity) + 1)
      next.push(least)
    }
    if (Math.min(...next) > allowed) return null
    beforeLast = last
    last = next
  }
  const least = Math.min(...last)
  return least <= allowed ? least : null
}
