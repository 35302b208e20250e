/** The reflected polynomial x³² + x²⁶ + … of the 32-bit cyclic redundancy check. */
const polynomial = 0xedb88320

const table = Uint32Array.from({ length: 256 }, (_, byte) => {
  let value = byte
  for (let bit = 0; bit < 8; bit += 1) value = value & 1 ? (value >>> 1) ^ polynomial : value >>> 1
  return value
})

/**
 * The 32-bit cyclic redundancy check in eight hexadecimal digits.
 * @example checksumOf(bytes of '123456789') → 'cbf43926'
 */
export function checksumOf(bytes: Uint8Array): string {
  let value = 0xffffffff
  for (const byte of bytes) value = (value >>> 8) ^ (table[(value ^ byte) & 0xff] ?? 0)
  return ((value ^ 0xffffffff) >>> 0).toString(16).padStart(8, '0')
}
