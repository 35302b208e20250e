import type { Read } from './amount.ts'

export const accept = <T>(value: T): Read<T> => ({ ok: true, value })

export const refuse = (code: string, message: string, wayOut: string): Read<never> => ({
  ok: false,
  refusal: { code, message, wayOut },
})

const longestQuoted = 40

/** Typed text for use in a message: clipped, and what cannot be seen is named. */
export function quote(text: string): string {
  const seen = text.replace(/[\p{Cc}\p{Cf}\p{Cs}\p{Co}\p{Cn}]/gu, (character) => {
    const point = character.codePointAt(0) ?? 0
    return `U+${point.toString(16).toUpperCase().padStart(4, '0')}`
  })
  return `“${seen.length > longestQuoted ? `${seen.slice(0, longestQuoted)}…` : seen}”`
}
