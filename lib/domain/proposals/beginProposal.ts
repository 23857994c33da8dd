import type { z } from 'zod'
import { findCallOfKind } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { insertConstraintSet } from '@/db/queries/observations'
import { findPerson } from '@/db/queries/people'
import { insertInvestigator } from '@/db/queries/proposalPeople'
import { findTwin, insertProgramme, insertProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import { formatUtcInstant } from '@/lib/format'
import { findPreset } from '@/lib/science/cosmology'
import { deadlineOf, takesProposals } from '../calls/rules'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { defaultConstraints } from '../observations/defaultConstraints'
import { freeReference } from './freeReference'
import type { beginSchema } from './schema'

export type BeginProposalInput = z.output<typeof beginSchema>

/** Begins a draft in an open call: programme, proposal, its principal investigator and usual conditions. */
export async function beginProposal(ctx: Context, input: BeginProposalInput): Promise<{ reference: string }> {
  return inTransaction(ctx, async (tx) => {
    const { actor } = tx
    if (!actor) throw refuse.notSignedIn()
    const [found, now, person] = await Promise.all([
      findCallOfKind(tx.db, input.kindId),
      databaseNow(tx.db),
      findPerson(tx.db, actor.personId),
    ])
    if (!found || !person) throw refuse.field('kindId', 'This kind of proposal is not on offer.')
    const deadline = deadlineOf(found.call, found.kind, { closesAt: null })
    if (!takesProposals(found.call, deadline, now))
      throw refuse.closed(
        now < deadline
          ? `Call ${found.call.number} is not open.`
          : `Call ${found.call.number} closed at ${formatUtcInstant(deadline)}.`,
      )
    // A double press, or going back and sending the form again, opens the draft just begun.
    const twin = await findTwin(tx.db, { personId: person.id, kindId: input.kindId, title: input.title })
    if (twin) return { reference: twin }

    const reference = await freeReference(tx)
    const programmeId = await insertProgramme(tx.db, { title: input.title, leadPersonId: person.id })
    const preset = findPreset('planck-2018')
    const id = await insertProposal(tx.db, {
      reference,
      programmeId,
      callId: found.call.id,
      callKindId: found.kind.id,
      title: input.title,
      cosmologyId: preset.id,
      cosmologyParameters: preset.parameters,
      createdBy: person.id,
    })
    await insertInvestigator(tx.db, {
      proposalId: id,
      personId: person.id,
      name: person.name,
      email: person.email,
      institute: person.institute_text,
      role: 'pi',
      access: 'edit',
      isStudent: person.career_stage === 'student',
      isSupervisor: false,
      orcid: null,
      position: 1,
      confirmedAt: now,
    })
    await insertConstraintSet(tx.db, id, defaultConstraints)
    await writeLogbook(tx, {
      action: 'proposal.begin',
      subject: { kind: 'proposal', id: reference },
      actingAs: 'investigator',
      after: { title: input.title, call: found.call.number, kind: found.kind.title },
    })
    return { reference }
  })
}
