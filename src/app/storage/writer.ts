/**
 * Hands every state to the storage at once, without waiting for the one before: the storage keeps the order, and
 * at most the state in flight is missing when the page is killed.
 */
export function promptWriter<T>(
  write: (state: T) => Promise<void>,
  onWritten: (state: T) => void,
  onRefused: (error: unknown) => void,
) {
  let newest = 0
  let written: Promise<void> = Promise.resolve()

  /** Only the newest state says how things stand; an older refusal may be mended already. */
  const attempt = async (state: T, order: number) => {
    try {
      await write(state)
      if (order === newest) onWritten(state)
    } catch (error) {
      if (order === newest) onRefused(error)
    }
  }
  return {
    put(state: T) {
      newest += 1
      const attempted = attempt(state, newest)
      written = written.then(() => attempted)
    },
    /** Resolves when nothing is left to write. */
    settled: () => written,
  }
}
