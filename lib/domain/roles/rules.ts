/** How a role stands at `now` (the database's clock). */
export function standingOfRole(
  grant: { fromAt: Date; untilAt: Date | null; revokedAt: Date | null },
  now: Date,
): 'holds' | 'to come' | 'over' | 'ended' {
  if (grant.revokedAt) return 'ended'
  if (grant.untilAt && grant.untilAt <= now) return 'over'
  return grant.fromAt > now ? 'to come' : 'holds'
}
