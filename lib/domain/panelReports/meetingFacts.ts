import { tableOfPanel } from '@/db/queries/discussion'
import { panelMembers } from '@/db/queries/panel'
import { presenceEvents, tableEvents } from '@/db/queries/panelMeeting'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import type { ReadPanel } from '../panels/openPanel'

export interface MeetingFacts {
  members: {
    name: string
    seat: 'chair' | 'deputy' | 'member'
    /** First noted at the meeting; null when never. */
    from: Date | null
    /** Noted as having left; null while there, or never noted. */
    until: Date | null
  }[]
  /** First and last time a proposal lay on the table; null when none did. */
  discussed: { from: Date; to: Date; proposals: number } | null
  /** Members and proposals kept apart by an interest: never who and what. */
  conflicts: { pairs: number; members: number; proposals: number; declared: number; found: number }
}

/** Who met when, and how many were kept from what, without a word of proposals the reader may not see. */
export async function meetingFacts(ctx: ActingContext, desk: ReadPanel): Promise<MeetingFacts> {
  const members = await panelMembers(ctx.db, desk.panel.id)
  const ids = members.map(({ personId }) => personId)
  const [presence, events, table, barred] = await Promise.all([
    presenceEvents(ctx.db, desk.panel.id),
    tableEvents(ctx.db, desk.panel.id),
    tableOfPanel(ctx.db, desk.panel.id),
    barredPairs(ctx.db, desk.call.id, ids),
  ])
  const numbers = new Set(desk.proposals.map(({ reviewNumber }) => reviewNumber))
  const shown = new Set(desk.proposals.map(({ id }) => id))
  const pairs = barred.filter(({ proposalId }) => shown.has(proposalId))
  const distinct = (of: (pair: (typeof pairs)[number]) => unknown) => new Set(pairs.map(of)).size
  const declared = new Set(
    pairs.filter(({ source }) => source === 'declared').map((one) => `${one.personId}:${one.proposalId}`),
  )
  const all = distinct((one) => `${one.personId}:${one.proposalId}`)
  return {
    members: members
      .map(({ personId, name, seat }) => {
        const own = presence.filter((event) => event.personId === personId)
        const here = own.filter(({ isPresent }) => isPresent)
        const last = own.at(-1)
        const isHere = table.present.has(personId)
        return {
          ...{ name, seat, from: here[0]?.at ?? null },
          until: here.length > 0 && !isHere && last && !last.isPresent ? last.at : null,
        }
      })
      .sort((a, b) => a.name.localeCompare(b.name, 'en')),
    discussed: discussedOf(events, numbers),
    conflicts: {
      pairs: all,
      members: distinct(({ personId }) => personId),
      proposals: distinct(({ proposalId }) => proposalId),
      declared: declared.size,
      found: all - declared.size,
    },
  }
}

/** Times of the proposals the reader sees alone: when another was discussed is not theirs to know. */
function discussedOf(
  events: readonly { at: Date; reviewNumber: string | null }[],
  numbers: ReadonlySet<string>,
): MeetingFacts['discussed'] {
  const spans = events.flatMap((event, index) =>
    event.reviewNumber !== null && numbers.has(event.reviewNumber)
      ? [{ number: event.reviewNumber, from: event.at, to: events[index + 1]?.at ?? event.at }]
      : [],
  )
  const [first] = spans
  const last = spans.at(-1)
  if (!first || !last) return null
  return { from: first.from, to: last.to, proposals: new Set(spans.map(({ number }) => number)).size }
}
