/** Numbers in [0, 1) from a seed: the same seed, the same numbers (Weyl sequence with an integer mix). */
export function seededUniform(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = state
    mixed = Math.imul(mixed ^ (mixed >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 4294967296
  }
}

/** Standard normal deviates from a seed, by the polar method of Marsaglia & Bray (1964). */
export function seededNormal(seed: number): () => number {
  const uniform = seededUniform(seed)
  let spare: number | null = null
  return () => {
    if (spare !== null) {
      const kept = spare
      spare = null
      return kept
    }
    for (;;) {
      const x = 2 * uniform() - 1
      const y = 2 * uniform() - 1
      const s = x * x + y * y
      if (s === 0 || s >= 1) continue
      const scale = Math.sqrt((-2 * Math.log(s)) / s)
      spare = y * scale
      return x * scale
    }
  }
}
