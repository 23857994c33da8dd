export type VerdictShape = 'clear' | 'touching' | 'past'

const barEnds: Record<VerdictShape, number> = { clear: 6, touching: 12, past: 16 }

/** A bar against its limit tick, in a 16 by 12 box: clear of it, just over it, well past it. */
export function verdictGlyphPath(shape: VerdictShape): string {
  return `M9 0H10.5V12H9ZM0 4H${barEnds[shape]}V8H0Z`
}
