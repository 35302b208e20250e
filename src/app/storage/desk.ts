/** Who may write the sheet that is kept: one window at a time. */
export interface Desk {
  /** Calls back with true when this window holds the desk, false when another one does or has taken it. */
  sit(onSeat: (seated: boolean) => void): void
  /** Takes the desk from the other window, because a person said so. */
  take(): void
}

const name = 'evenwater sheet'

/**
 * A desk kept by the browser's lock manager: it is freed when a window closes, even when it dies. Where there
 * is no lock manager every window has its own desk.
 */
export function browserDesk(locks: LockManager | undefined): Desk {
  let tell: (seated: boolean) => void = () => undefined
  const hold = () => {
    tell(true)
    return new Promise<never>(() => undefined)
  }
  const queue = () => {
    tell(false)
    void locks?.request(name, hold).catch(queue)
  }
  return {
    sit(onSeat) {
      tell = onSeat
      if (!locks) onSeat(true)
      else {
        locks.request(name, { ifAvailable: true }, (lock) => (lock ? hold() : queue())).catch(queue)
      }
    },
    take() {
      void locks?.request(name, { steal: true }, hold).catch(queue)
    },
  }
}
