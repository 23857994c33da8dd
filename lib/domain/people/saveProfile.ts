import type { z } from 'zod'
import { findPerson, updateProfile } from '@/db/queries/people'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import type { profileSchema } from './schema'
import { sortName } from './sortName'

/** Saves the own profile; a save from another window in between is answered with what it holds now. */
export async function saveProfile(
  ctx: ActingContext,
  input: z.output<typeof profileSchema>,
): Promise<{ version: number }> {
  return inTransaction(ctx, async (tx) => {
    const before = await findPerson(tx.db, tx.actor.personId)
    if (!before) throw refuse.notFound('account')
    const saved = await updateProfile(tx.db, before.id, input.version, {
      name: input.name,
      sortName: sortName(input.name),
      institute: input.institute,
      orcid: input.orcid || null,
      careerStage: input.careerStage || null,
      timeZone: input.timeZone,
    })
    if (!saved)
      throw refuse.stale({
        changedBy: 'You, in another window,',
        changedAt: new Date().toISOString(),
        version: before.version,
        theirs: { name: before.name, institute: before.institute_text, orcid: before.orcid ?? '' },
      })
    await writeLogbook(tx, {
      action: 'save-profile',
      subject: { kind: 'person', id: before.id },
      actingAs: 'investigator',
    })
    return { version: input.version + 1 }
  })
}
