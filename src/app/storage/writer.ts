/**
 * Writes the latest state one after the other: while a write runs, only the newest of the waiting states is kept.
 * Nothing is delayed, so at most the state in flight is missing when the page is killed.
 */
export function latestWriter<T>(
  write: (state: T) => Promise<void>,
  onWritten: (state: T) => void,
  onRefused: (error: unknown) => void,
) {
  let waiting: { readonly state: T } | null = null
  let running: Promise<void> | null = null

  const run = async () => {
    while (waiting) {
      const { state } = waiting
      waiting = null
      try {
        await write(state)
        onWritten(state)
      } catch (error) {
        onRefused(error)
      }
    }
    running = null
  }
  return {
    put(state: T) {
      waiting = { state }
      running ??= run()
    },
    /** Resolves when nothing is left to write. */
    settled: () => running ?? Promise.resolve(),
  }
}
