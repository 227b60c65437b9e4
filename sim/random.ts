/**
 * Uniform numbers in [0, 1) from a seed: the same sequence on every engine.
 * Two rounds of a 32-bit multiply-xorshift mixer over a Weyl sequence.
 */
export function uniformFrom(seed: number): () => number {
  let weyl = (seed ^ 0x9e3779b9) >>> 0
  return () => {
    weyl = (weyl + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(weyl ^ (weyl >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 4294967296
  }
}
