import type { z } from 'zod'
import { updateDescription } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { changedFields } from './changedFields'
import { descriptionFormOf } from './descriptionForm'
import { namedInvestigator } from './namedInvestigator'
import { openForManaging } from './openProposal'
import type { describeInvestigatorSchema } from './peopleSchema'
import { staleProposal } from './staleProposal'

/**
 * Changes what is said of someone named: institute, ORCID iD, student, supervisor. Refused over a version that is no
 * longer the newest, unless all of it stands there already.
 */
export async function describeInvestigator(
  ctx: Context,
  input: z.output<typeof describeInvestigatorSchema>,
): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForManaging(tx, input.reference)
    const person = namedInvestigator(subject, input.id)
    const { institute, orcid, isStudent, isSupervisor } = person
    const after = {
      institute: input.institute,
      // Of someone who agreed the account speaks.
      orcid: person.confirmedAt ? orcid : input.orcid || null,
      isStudent: input.isStudent,
      isSupervisor: input.isSupervisor,
    }
    const changed = changedFields<Record<string, unknown>>(
      { institute, orcid, isStudent, isSupervisor },
      after,
    )
    if (!changed) return
    if (person.version !== input.version || !(await updateDescription(tx.db, person, after)))
      throw await staleProposal(tx, { ...row, version: person.version }, descriptionFormOf(person), {
        actions: ['people.describe', 'people.agree'],
        name: person.name,
      })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.describe',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { name: person.name, ...changed.before },
      after: { name: person.name, ...changed.after },
    })
  })
}
