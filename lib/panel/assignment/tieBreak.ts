/**
 * A number in [0, 1) that depends on the pair alone (integer mix of Murmur3). Equal affinities would leave the solver
 * with countless answers as good as each other, among which branch and bound loses its way.
 */
export function tieBreak(proposal: number, reviewer: number): number {
  let mixed = Math.imul(proposal, 0x9e3779b1) ^ Math.imul(reviewer, 0x85ebca77)
  mixed = Math.imul(mixed ^ (mixed >>> 16), 0x85ebca6b)
  mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35)
  return ((mixed ^ (mixed >>> 16)) >>> 0) / 4294967296
}
