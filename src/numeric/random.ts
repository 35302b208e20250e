/** Uniform numbers in (0, 1). */
export type Uniform = () => number

/**
 * A small seeded generator (a 32-bit Weyl sequence with two multiplicative mixing rounds), so that a sampling can
 * be repeated exactly. Not for secrets.
 *
 * @example seededUniform(1)() === seededUniform(1)() → true
 */
export function seededUniform(seed: number): Uniform {
  let state = seed >>> 0
  return () => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = Math.imul(state ^ (state >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 4294967296 + 1.1641532e-10
  }
}

/** Two independent standard normal numbers (Box and Muller) into out[at], out[at + 1]. */
export function normalPair(uniform: Uniform, out: Float64Array, at: number): void {
  const radius = Math.sqrt(-2 * Math.log(uniform()))
  const angle = 2 * Math.PI * uniform()
  out[at] = radius * Math.cos(angle)
  if (at + 1 < out.length) out[at + 1] = radius * Math.sin(angle)
}
