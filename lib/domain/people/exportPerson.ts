import { databaseNow } from '@/db/queries/clock'
import { findPerson } from '@/db/queries/people'
import * as held from '@/db/queries/personData'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { withoutSecrets } from '../outbox/withoutSecrets'
import { mayExportPerson } from './policy'

const account = 'To sign in, to be written to, and to find interests.'
const panel = 'To run the panel’s work and to defend its decisions.'

const sections = [
  ['account', account, held.accountData],
  ['answersGivenFreely', 'Counted without names, if you gave any.', held.answersGiven],
  ['roles', 'To know what you may see and do.', held.rolesData],
  ['seatsOnPanels', panel, held.seatsData],
  ['proposalsThatNameYou', 'You, or someone who named you, wrote them.', held.proposalsData],
  ['namesOnSentVersions', 'A sent version stays as it was sent.', held.sentNamesData],
  ['reviews', panel, held.reviewsData],
  ['scores', panel, held.scoresData],
  ['wordsOfReviews', panel, held.reviewTextsData],
  ['interestsYouDeclared', 'So that you are not asked to judge them.', held.interestsData],
  ['whatYouSaidYouKnow', 'To find readers for proposals.', held.expertiseData],
  ['assessments', 'They decide on the time a proposal needs.', held.assessmentsData],
  ['waiversAsked', 'They belong to the accounts.', held.waiversData],
  ['lettersToYou', 'To show what was told, and when.', held.lettersData],
  ['browsersSignedIn', 'To sign you out, and to notice strangers.', held.sessionsData],
  ['whatYouDid', 'The logbook: who did what, when and from where.', held.deedsData],
] as const

const plain = (row: Record<string, unknown>) =>
  Object.fromEntries(
    Object.entries(row).map(([name, value]) => [
      name,
      typeof value === 'string' ? withoutSecrets(value) : value,
    ]),
  )

export interface PersonFile {
  fileName: string
  text: string
}

/** All that is held about a person, as one JSON file; for the person and for the office. That it was made is logged. */
export async function exportPerson(ctx: ActingContext, input: { personId: number }): Promise<PersonFile> {
  authorize(mayExportPerson(ctx.actor, input.personId))
  return inTransaction(ctx, async (tx) => {
    const person = await findPerson(tx.db, input.personId)
    if (!person) throw refuse.notFound('account')
    const at = await databaseNow(tx.db)
    const parts: Record<string, unknown> = {}
    for (const [title, why, read] of sections)
      parts[title] = { why, rows: (await read(tx.db, person.id)).map(plain) }
    await writeLogbook(tx, {
      action: 'person.export',
      subject: { kind: 'person', id: person.id },
      actingAs: tx.actor.personId === person.id ? 'investigator' : 'office',
    })
    const head = { of: 'Noctuary, Quillon Ridge Observatory', madeAt: at.toISOString(), times: 'UTC' }
    return {
      fileName: `personal-data-${person.id}-${at.toISOString().slice(0, 10)}.json`,
      text: `${JSON.stringify({ ...head, ...parts }, null, 2)}\n`,
    }
  })
}
