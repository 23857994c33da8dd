const hourMs = 3_600_000

/** Moments at which whoever owes a fee is reminded: around the deadline of the call, and before the grace ends. */
export const reminderPoints = [
  { name: 'deadline-72h', of: 'closesAt', hours: -72 },
  { name: 'deadline-24h', of: 'closesAt', hours: -24 },
  { name: 'deadline+24h', of: 'closesAt', hours: 24 },
  { name: 'deadline+72h', of: 'closesAt', hours: 72 },
  { name: 'grace-72h', of: 'dueAt', hours: -72 },
  { name: 'grace-24h', of: 'dueAt', hours: -24 },
] as const

export type ReminderName = (typeof reminderPoints)[number]['name']

export interface OwedFeeMoments {
  closesAt: Date
  dueAt: Date
  owedSince: Date
}

/**
 * The reminder to write now: the last moment that has come since the fee is owed. Those before it are passed over,
 * so that a job that stood still writes once; nothing is written once the grace is over.
 */
export function reminderFor(owed: OwedFeeMoments, now: Date): ReminderName | null {
  if (now >= owed.dueAt) return null
  const come = reminderPoints
    .map(({ name, of, hours }) => ({ name, at: owed[of].getTime() + hours * hourMs }))
    .filter(({ at }) => at <= now.getTime() && at > owed.owedSince.getTime())
    .sort((a, b) => a.at - b.at)
  return come.at(-1)?.name ?? null
}
