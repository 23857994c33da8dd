import type { RecordVersion } from './types'

/** A record as an overview shows it: the version in force, and one that is to come. */
export interface HeldRecord<Facts> {
  slug: string
  name: string
  now: RecordVersion<Facts>
  next: RecordVersion<Facts> | null
  /** First evening it is no longer there; null while it stays. */
  retiredFrom: string | null
}

/**
 * The version in force on a date, the highest whose first evening has begun, and the newest still to come.
 * Versions are given the newest first; null when none has begun.
 */
export function heldRecord<Facts>(
  owner: { slug: string; name: string },
  versions: readonly RecordVersion<Facts>[],
  onDate: string,
  retiredFrom: string | null = null,
): HeldRecord<Facts> | null {
  const now = versions.find(({ validFrom }) => validFrom <= onDate)
  if (!now) return null
  const newest = versions[0]
  const next = newest && newest.recordVersion > now.recordVersion ? newest : null
  return { slug: owner.slug, name: owner.name, now, next, retiredFrom }
}
