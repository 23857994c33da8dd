import type { LogbookFilterInput } from './schema'

const dayMs = 86_400_000
const startOf = (day: string | undefined): Date | undefined =>
  day ? new Date(`${day}T00:00:00.000Z`) : undefined

/** The filter as the query takes it: days in UTC, the last day whole. */
export function askedOfLogbook(input: LogbookFilterInput) {
  const last = startOf(input.until)
  return {
    who: input.who || undefined,
    personId: input.person ? Number(input.person) : undefined,
    action: input.action || undefined,
    subjectKind: input.kind || undefined,
    subjectId: input.id || undefined,
    address: input.from || undefined,
    since: startOf(input.since),
    until: last ? new Date(last.getTime() + dayMs) : undefined,
  }
}

/** The filter as it stands in an address, without what says nothing: `who=maud&action=invite`. */
export function filterInAddress(input: LogbookFilterInput): string {
  const said = Object.entries(input).filter((entry): entry is [string, string] => Boolean(entry[1]))
  return new URLSearchParams(said).toString()
}
