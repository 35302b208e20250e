/**
 * A short mark of a text's content (FNV-1a, 32 bit, as eight hexadecimal digits): the same data give the
 * same mark on every machine. It tells versions apart; it is no protection against forgery.
 *
 * @example contentMark('a') → 'e40c292c'
 */
export function contentMark(text: string): string {
  let hash = 0x811c9dc5
  for (let index = 0; index < text.length; index++) {
    hash = Math.imul(hash ^ text.charCodeAt(index), 0x01000193)
  }
  return (hash >>> 0).toString(16).padStart(8, '0')
}
