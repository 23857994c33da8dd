import type { OfferedBlock } from '@/db/queries/panel'

/** Telescope to seconds on offer, in the order of the telescopes. */
export function offeredByTelescope(blocks: readonly OfferedBlock[]): Map<number, number> {
  const offered = new Map<number, number>()
  for (const { telescopeId, seconds } of blocks)
    offered.set(telescopeId, (offered.get(telescopeId) ?? 0) + seconds)
  return offered
}
