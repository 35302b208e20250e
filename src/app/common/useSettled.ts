import { useEffect, useState } from 'react'

/** The value once it has stood still for a while; for being read out, which must not happen at every key. */
export function useSettled<T>(value: T, afterMs: number): T {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), afterMs)
    return () => clearTimeout(timer)
  }, [value, afterMs])
  return settled
}
