import { beforeEach, describe, expect, it } from 'vitest'
import { barredFrom, barredPairs } from '@/lib/domain/conflicts/barredPairs'
import { declareInterests } from '@/lib/domain/conflicts/declareInterests'
import { readInterests } from '@/lib/domain/conflicts/readInterests'
import type { DeclaredKind } from '@/lib/domain/conflicts/types'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'
import { makeClosedCall, type ClosedCall } from '../../support/closedCall'
import { useRolledBackDatabase } from '../../support/database'
import { makePerson } from '../../support/scenario/people'

const db = useRolledBackDatabase()
let call: ClosedCall

beforeEach(async () => {
  call = await makeClosedCall(db())
})

const declare = async (names: Record<string, DeclaredKind> = {}) => {
  const ctx = call.as(call.reviewers[0])
  const view = await readInterests(ctx, call.callSlug)
  return declareInterests(ctx, {
    callSlug: call.callSlug,
    wentThrough: true,
    names: view.names.flatMap(({ key, name }) => {
      const kind = names[name]
      return kind ? [{ key, kind }] : []
    }),
  })
}

describe('the list of names', () => {
  it('holds every investigator once and nothing of the proposals', async () => {
    const view = await readInterests(call.as(call.reviewers[0]), call.callSlug)
    expect(view.names.map(({ name }) => name)).toEqual(['Odo Pellering', 'Maren Sollvik'])
    const text = JSON.stringify(view)
    for (const secret of [call.reference, call.reviewNumber, 'Broad lines', '@', '"proposalId'])
      expect(text).not.toContain(secret)
  })

  it('is closed to other roles and while the call is open', async () => {
    await expect(readInterests(call.as(call.stranger), call.callSlug)).rejects.toMatchObject({
      kind: 'not-found',
    })
    await db()('calls')
      .where({ id: call.callId })
      .update({ closes_at: new Date(Date.now() + 3600_000), grace_until: new Date(Date.now() + 7200_000) })
    await expect(readInterests(call.as(call.reviewers[0]), call.callSlug)).rejects.toMatchObject({
      kind: 'closed',
    })
  })
})

// Seen to fail with the withdrawal left out: I4 breaks, too; and with the chair's own interests not asked for.
describe('declaring interests', () => {
  it('takes back the assignments it touches, keeps the recusal, and hides the review', async () => {
    const assignmentId = await call.assign(call.reviewers[0])
    const ctx = call.as(call.reviewers[0])
    expect(await readReviewDesk(ctx, assignmentId)).toEqual({ declareFirst: call.callSlug })

    expect(await declare({ 'Odo Pellering': 'collaborator' })).toEqual({
      callSlug: call.callSlug,
      withdrawn: 1,
    })

    expect(await db()('assignments').where({ id: assignmentId }).first()).toMatchObject({
      withdrawn_reason: 'An interest was declared',
    })
    expect(await db()('recusals').where({ assignment_id: assignmentId })).toHaveLength(1)
    expect(await db()('conflicts').where({ proposal_id: call.proposalId })).toMatchObject([
      {
        kind: 'collaborator',
        source: 'declared',
        severity: 'barred',
        note: 'Odo Pellering, Pellering Institute',
      },
    ])
    const logged = await db()('logbook').whereIn('action', ['declareInterests', 'declareInterests.withdraw'])
    expect(logged).toHaveLength(2)
    await expect(readReviewDesk(ctx, assignmentId)).rejects.toMatchObject({ kind: 'not-found' })
    expect(await readReviewLines(ctx)).toEqual([])
  })

  describe('late, after something was assigned', () => {
    const lost = () => db()('outbox').where({ template: 'reader-lost' }).orderBy('id')
    const interested = (personId: number) =>
      db()('conflicts').insert({
        person_id: personId,
        proposal_id: call.proposalId,
        kind: 'family',
        source: 'declared',
        from_at: new Date(Date.now() - 1000),
      })
    const deputy = async () => {
      const person = await makePerson(db(), `${call.tag}d`, 'Zelda Garth', 'chair', {
        callId: call.callId,
        panelId: call.panelId,
      })
      await db()('panel_members').insert({
        panel_id: call.panelId,
        person_id: person.personId,
        seat: 'deputy',
        number: 9,
      })
      return person
    }

    it('is told to the chair by review number: not the interest, nor who stands on the proposal', async () => {
      await call.assign(call.reviewers[0])
      await call.assign(call.reviewers[1])
      await declare({ 'Odo Pellering': 'collaborator' })
      const [letter, ...more] = await lost()
      expect(more).toEqual([])
      expect(letter?.to_email).toBe(call.chair.email)
      const text = `${letter?.subject ?? ''} ${letter?.text_body ?? ''}`
      for (const words of [
        call.reviewNumber,
        call.reviewers[0].name,
        'one reader left',
        '/assignments?panel=',
      ])
        expect(text).toContain(words)
      for (const secret of [call.reference, 'Pellering', 'Sollvik', 'ollaborator', 'Broad lines'])
        expect(text).not.toContain(secret)
    })

    it('is told to the deputy alone where the chair has an interest, too', async () => {
      const second = await deputy()
      await interested(call.chair.personId)
      await call.assign(call.reviewers[0])
      await declare({ 'Odo Pellering': 'rival' })
      expect((await lost()).map(({ to_email }) => to_email)).toEqual([second.email])
    })

    it('is told to nobody whose role has ended, and not at all where nothing was assigned', async () => {
      await db()('role_grants').where({ person_id: call.chair.personId }).update({ revoked_at: new Date() })
      await call.assign(call.reviewers[0])
      await declare({ 'Odo Pellering': 'rival' })
      await declare({ 'Maren Sollvik': 'rival' })
      expect(await lost()).toEqual([])
      await db()('role_grants').where({ person_id: call.chair.personId }).update({ revoked_at: null })
      await declare({ 'Maren Sollvik': 'rival' })
      expect(await lost()).toEqual([])
    })

    it('is not told when the declaration fails', async () => {
      await call.assign(call.reviewers[0])
      const refused = declareInterests(call.as(call.reviewers[0]), {
        callSlug: call.callSlug,
        wentThrough: true,
        names: [{ key: 'n0000000000000000', kind: 'rival' }],
      })
      await expect(refused).rejects.toMatchObject({ kind: 'invalid' })
      expect(await lost()).toEqual([])
    })
  })

  it('says again later what was said before, and adds to it', async () => {
    await declare({ 'Odo Pellering': 'collaborator' })
    await declare({ 'Maren Sollvik': 'rival' })
    const view = await readInterests(call.as(call.reviewers[0]), call.callSlug)
    expect(view.names.map(({ name, declaredAs }) => [name, declaredAs])).toEqual([
      ['Odo Pellering', 'collaborator'],
      ['Maren Sollvik', 'rival'],
    ])
    expect(await db()('interest_declarations').where({ person_id: call.reviewers[0].personId })).toHaveLength(
      1,
    )
  })

  it('finds the own institute by itself, however it is written', async () => {
    await db()('people')
      .where({ id: call.reviewers[0].personId })
      .update({ institute_text: 'SOLLVIK  Institute' })
    const assignmentId = await call.assign(call.reviewers[0])
    expect(await declare()).toMatchObject({ withdrawn: 1 })
    await expect(readReviewDesk(call.as(call.reviewers[0]), assignmentId)).rejects.toMatchObject({
      kind: 'not-found',
    })
  })

  it('refuses a key that is not on the list and changes nothing', async () => {
    const ctx = call.as(call.reviewers[0])
    const unknown = declareInterests(ctx, {
      callSlug: call.callSlug,
      wentThrough: true,
      names: [{ key: 'n0000000000000000', kind: 'rival' }],
    })
    await expect(unknown).rejects.toMatchObject({ kind: 'invalid' })
    expect(await db()('interest_declarations').where({ person_id: ctx.actor.personId })).toEqual([])
  })

  it('asks for a new declaration when a proposal came in after it, late by an exception', async () => {
    const assignmentId = await call.assign(call.reviewers[0])
    await declare()
    await db()('proposal_versions')
      .where({ proposal_id: call.proposalId })
      .update({ arrived_at: new Date(Date.now() + 60_000), committed_at: new Date(Date.now() + 60_000) })
    expect(await readReviewDesk(call.as(call.reviewers[0]), assignmentId)).toEqual({
      declareFirst: call.callSlug,
    })
  })
})

describe('barredPairs', () => {
  it('lists recorded and matched interests of everyone on the panels', async () => {
    await db()('people').where({ id: call.chair.personId }).update({ institute_text: 'Pellering Institute' })
    await declare({ 'Maren Sollvik': 'family' })
    const pairs = await barredPairs(db(), call.callId)
    expect(pairs.map(({ personId, kind, source }) => [personId, kind, source])).toEqual([
      [call.reviewers[0].personId, 'family', 'declared'],
      [call.chair.personId, 'institute', 'matched'],
    ])
  })

  it('knows someone named by address alone once there is an account', async () => {
    const [other] = call.reviewers
    await db()('proposal_people').insert({
      proposal_id: call.proposalId,
      name: 'A. B.',
      email: other.email.toUpperCase(),
      role: 'co-investigator',
      access: 'read',
      position: 9,
    })
    expect(await barredFrom(db(), other.personId, call.callId)).toEqual(new Set([call.proposalId]))
  })

  it('lets an interest go that has ended', async () => {
    await declare({ 'Maren Sollvik': 'family' })
    await db()('conflicts')
      .where({ proposal_id: call.proposalId })
      .update({ until_at: new Date(Date.now() - 1000) })
    expect(await barredPairs(db(), call.callId)).toEqual([])
  })
})
