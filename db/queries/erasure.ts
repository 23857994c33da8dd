import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface InTheWay {
  /** References of proposals the person leads that nobody has decided on. */
  leads: string[]
  /** Reviews in hand. */
  reviews: number
  /** Roles in force besides the investigator's. */
  roles: number
}

const count = async (rows: Promise<{ n: string | number }[]>) => Number((await rows)[0]?.n ?? 0)

/** What a person must have laid down before they can be erased. */
export async function inTheWayOfErasure(db: Database, id: number): Promise<InTheWay> {
  const leads = await db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .where({ 'q.person_id': id, 'q.role': 'pi' })
    .whereIn('p.state', ['submitted', 'under-review'])
    .orderBy('p.reference')
    .select('p.reference')
  const reviews = await count(
    db('assignments')
      .where({ person_id: id })
      .whereNull('withdrawn_at')
      .whereNull('finished_at')
      .count<{ n: string }[]>({ n: '*' }),
  )
  const roles = await count(
    db('role_grants')
      .where({ person_id: id })
      .whereNot({ role: 'investigator' })
      .whereNull('revoked_at')
      .andWhere((q) => q.whereNull('until_at').orWhere('until_at', '>', utcNow(db)))
      .count<{ n: string }[]>({ n: '*' }),
  )
  return { leads: leads.map((row) => row.reference), reviews, roles }
}

export interface Kept {
  sentProposals: number
  reviews: number
  assessments: number
  fees: number
  deeds: number
}

/** What stays of a person after erasure, in numbers. */
export async function keptAfterErasure(db: Database, id: number): Promise<Kept> {
  const n = { n: '*' } as const
  const [sentProposals, reviews, assessments, fees, deeds] = await Promise.all([
    count(
      db('proposal_version_people as q')
        .join('proposal_versions as v', 'v.id', 'q.proposal_version_id')
        .where('q.person_id', id)
        .countDistinct<{ n: string }[]>('v.proposal_id as n'),
    ),
    count(db('assignments').where({ person_id: id }).count<{ n: string }[]>(n)),
    count(db('assessments').where({ assessed_by: id }).count<{ n: string }[]>(n)),
    count(
      db('proposal_people as q')
        .join('fees as f', 'f.proposal_id', 'q.proposal_id')
        .where('q.person_id', id)
        .count<{ n: string }[]>(n),
    ),
    count(db('logbook').where({ person_id: id }).count<{ n: string }[]>(n)),
  ])
  return { sentProposals, reviews, assessments, fees, deeds }
}

const nobody = 'Erased person'

/** Drafts the person leads are put away, and their name goes from every draft. */
async function leaveDrafts(db: Database, id: number): Promise<void> {
  const never = db('proposal_versions').select('proposal_id')
  const rows = await db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .where('q.person_id', id)
    .whereNotIn('p.id', never)
    .select('q.id', 'q.role', 'p.id as proposalId', 'p.state')
  const led = rows.filter((row) => row.role === 'pi')
  await db('proposals')
    .whereIn(
      'id',
      led.filter((row) => row.state === 'draft').map((row) => row.proposalId),
    )
    .update({ state: 'withdrawn', withdrawn_at: utcNow(db), withdrawn_reason: 'Whoever led it was erased.' })
  await db('proposal_people')
    .whereIn(
      'id',
      led.map((row) => row.id),
    )
    .update({ name: nobody, institute: '' })
  await db('proposal_people')
    .whereIn(
      'id',
      rows.filter((row) => row.role !== 'pi').map((row) => row.id),
    )
    .delete()
}

/** Letters keep that they went, and lose to whom and what they said. */
async function blankLetters(db: Database, id: number, email: string, blankEmail: string): Promise<void> {
  const theirs = () => db('outbox').where((q) => q.where({ person_id: id }).orWhere({ to_email: email }))
  await theirs().whereIn('state', ['queued', 'parked', 'bounced']).update({ state: 'cancelled' })
  await theirs().update({
    dedupe_key: db.raw('REPLACE(dedupe_key, ?, ?)', [
      email.toLowerCase(),
      `erased-${id}`,
    ]) as unknown as string,
    to_email: blankEmail,
    to_name: nobody,
    subject: 'To an erased person',
    text_body: '',
    html_body: '',
    last_error: null,
  })
}

/** Blanks all that speaks of a person and need not be kept. */
export async function erasePersonRows(db: Database, id: number, email: string): Promise<void> {
  const blankEmail = `erased-${id}@erased.invalid`
  await leaveDrafts(db, id)
  await blankLetters(db, id, email, blankEmail)
  for (const table of ['sessions', 'email_tokens', 'demographics', 'expertise'] as const)
    await db(table).where({ person_id: id }).delete()
  await db('invitations').where({ email }).update({ email: blankEmail, name: nobody })
  await db('invitations')
    .where({ email: blankEmail })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ withdrawn_at: utcNow(db) })
  await db('proposal_people').where({ person_id: id }).update({ email: blankEmail, orcid: null })
  await db('review_texts')
    .where({ audience: 'private' })
    .whereIn('assignment_id', db('assignments').where({ person_id: id }).select('id'))
    .update({ body: '' })
  await db('role_grants')
    .where({ person_id: id })
    .whereNull('revoked_at')
    .update({ revoked_at: utcNow(db) })
  await db('people')
    .where({ id })
    .update({
      email: blankEmail,
      name: nobody,
      sort_name: nobody,
      institute_id: null,
      institute_text: '',
      orcid: null,
      orcid_verified_at: null,
      career_stage: null,
      time_zone: 'UTC',
      password_hash: null,
      email_confirmed_at: null,
      address_failed_at: null,
      address_failed_why: null,
      disabled_at: utcNow(db),
      erased_at: utcNow(db),
      version: db.raw('version + 1') as unknown as number,
    })
}

/** Keeps, or takes back, that a person asked to be erased; false when it stood so already. */
export async function setErasureAsked(db: Database, id: number, isAsked: boolean): Promise<boolean> {
  const changed = await db('people')
    .where({ id })
    .modify((q) => (isAsked ? q.whereNull('erasure_asked_at') : q.whereNotNull('erasure_asked_at')))
    .update({ erasure_asked_at: isAsked ? utcNow(db) : null })
  return changed === 1
}

/** Accounts that were merged into one, those merged into them included. */
export async function mergedInto(db: Database, id: number): Promise<{ id: number; email: string }[]> {
  const found: { id: number; email: string }[] = []
  let from = [id]
  while (from.length > 0) {
    const next = await db('people')
      .whereIn('merged_into_id', from)
      .whereNull('erased_at')
      .select('id', 'email')
    found.push(...next)
    from = next.map((row) => row.id)
  }
  return found
}
