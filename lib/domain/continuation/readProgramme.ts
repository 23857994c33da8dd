import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { othersOfProgramme, type ProgrammeProposal } from '@/db/queries/programmes'
import { findProposal } from '@/db/queries/proposals'
import type { ActingContext } from '../context'
import { investigatorRow, isOpenForWriting } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { carriedNotes } from './carriedNotes'
import type { CarriedNote } from './types'

export interface ProgrammeLine extends ProgrammeProposal {
  /** Time awarded for certain; null where nothing was. */
  awardedSeconds: number | null
}

export interface ProgrammeView {
  /** The other proposals of the programme that name the reader, newest call first. */
  others: ProgrammeLine[]
  /** Call and reference this one was carried on from; null for one begun anew. */
  continues: { callNumber: number } | null
  /** What is not as it was there; nothing once it has been sent. */
  notes: CarriedNote[]
}

const nothing: ProgrammeView = { others: [], continues: null, notes: [] }

/**
 * What a proposal owes its programme, for members who have agreed; to the office and to those asked only now it says
 * nothing. An earlier proposal is listed for those it names, no further. The caller has checked the right to read.
 */
export async function readProgramme(ctx: ActingContext, contents: ProposalContents): Promise<ProgrammeView> {
  const own = investigatorRow(ctx.actor, contents)
  const row = await findProposal(ctx.db, contents.id)
  if (!row || !own?.confirmedAt) return nothing
  const others = await othersOfProgramme(ctx.db, {
    programmeId: row.programme_id,
    exceptId: row.id,
    person: { id: ctx.actor.personId, email: ctx.actor.email },
  })
  const awarded = others.filter(({ state }) => state === 'awarded').map(({ id }) => id)
  const decisions = await standingDecisions(ctx.db, awarded)
  const known = awarded.filter((id) => decisions.get(id)?.released_at)
  const awards = await standingAwards(ctx.db, known)
  const old = row.continues_id === null ? null : await readContents(ctx.db, row.continues_id)
  return {
    others: others.map((line) => {
      const given = awards.filter(({ proposalId, isReserve }) => proposalId === line.id && !isReserve)
      const seconds = given.reduce((sum, award) => sum + award.seconds, 0)
      return { ...line, awardedSeconds: known.includes(line.id) ? seconds : null }
    }),
    continues: old && { callNumber: old.call.number },
    notes: old && isOpenForWriting(contents) ? carriedNotes(old, contents) : [],
  }
}
