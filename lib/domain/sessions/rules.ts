import type { Role } from '../actor'

const staff: readonly Role[] = ['office', 'chair', 'instrument-scientist']
const minutes = 60_000
const hours = 3_600_000

/** How long a session may lie idle and last in all: shorter for those who see others' proposals. */
export function sessionLimits(roles: readonly Role[]): { idleMs: number; lifeSeconds: number } {
  return roles.some((role) => staff.includes(role))
    ? { idleMs: 30 * minutes, lifeSeconds: 12 * 3600 }
    : { idleMs: 8 * hours, lifeSeconds: 7 * 24 * 3600 }
}

/** The last use is written at most once a minute. */
export function isDueForTouch(lastSeenAt: Date, now: Date): boolean {
  return now.getTime() - lastSeenAt.getTime() > minutes
}
