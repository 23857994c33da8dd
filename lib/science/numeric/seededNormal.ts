/**
 * Normal deviates of mean 0 and deviation 1 in an order fixed by the seed: uniform numbers by a 32-bit mixing
 * generator (Steele, Lea & Flood 2014, splitmix), turned by Box & Muller 1958. For repeatable error estimates only.
 */
export function seededNormal(seed: number): () => number {
  let state = seed >>> 0
  const uniform = (): number => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = Math.imul(state ^ (state >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32
  }
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
}
