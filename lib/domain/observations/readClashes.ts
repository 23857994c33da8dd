import { awardedNear, ownNear, type Candidate, type Sought } from '@/db/queries/clashes'
import { standingAwards } from '@/db/queries/decisions'
import { readSnapshot } from '@/db/queries/versions'
import type { ActingContext } from '../context'
import { investigatorRow } from '../proposals/policy'
import type { ProposalContents } from '../proposals/types'
import { clashes, isSamePointing, type Claim } from './clashes'
import { claimsOf, heldBy } from './heldBy'

/** One observation that is held or asked for already. Of others it says the reference of the award and no more. */
export type Clash = { observationId: number } & (
  { kind: 'own'; reference: string; callNumber: number } | { kind: 'awarded'; reference: string }
)

type Asked = Claim & { observationId: number }

function withOwn(asked: readonly Asked[], own: readonly Candidate[]): Clash[] {
  return asked.flatMap(({ observationId, ...claim }) => {
    const hits = own.filter((other) => clashes(claim, other))
    const byReference = new Map(hits.map(({ reference, callNumber }) => [reference, callNumber]))
    return [...byReference].map(([reference, callNumber]): Clash => ({
      observationId,
      kind: 'own',
      reference,
      callNumber,
    }))
  })
}

/** Judged by the version that was awarded and the time it was given, not by what was edited since. */
async function withAwarded(ctx: ActingContext, asked: readonly Asked[], near: readonly Candidate[]) {
  const found = new Map(
    near
      .filter((other) => asked.some((one) => isSamePointing(one, other)))
      .map((one) => [one.proposalId, one]),
  )
  const awards = await standingAwards(ctx.db, [...found.keys()])
  const clashing: Clash[] = []
  for (const { proposalId, reference } of found.values()) {
    const version = await readSnapshot(ctx.db, proposalId)
    if (!version) continue
    const given = awards.filter((award) => award.proposalId === proposalId && !award.isReserve)
    const held = heldBy(version.snapshot.contents, given)
    for (const { observationId, ...claim } of asked)
      if (held.some((other) => clashes(claim, other)))
        clashing.push({ observationId, kind: 'awarded', reference })
  }
  return clashing
}

// A little more than the separation that still counts, degrees.
const marginDeg = 0.002

/**
 * Observations whose position, mode and depth are held or asked for already: in another proposal that names the
 * reader, or in an awarded one. (What one proposal asks for twice is a check of its own.) What others merely ask for is not looked at, so that nobody can learn by trying
 * positions what stands in a proposal that is not decided. The caller has checked the right to read.
 */
export async function readClashes(ctx: ActingContext, contents: ProposalContents): Promise<Clash[]> {
  if (!investigatorRow(ctx.actor, contents)) return []
  const asked = claimsOf(contents)
  if (asked.length === 0) return []
  const declinations = asked.map(({ decDeg }) => decDeg)
  const sought: Sought = {
    proposalId: contents.id,
    callId: contents.call.id,
    modeIds: [...new Set(asked.map(({ modeId }) => modeId))],
    decFromDeg: Math.min(...declinations) - marginDeg,
    decToDeg: Math.max(...declinations) + marginDeg,
  }
  const person = { id: ctx.actor.personId, email: ctx.actor.email }
  const [own, awarded] = await Promise.all([ownNear(ctx.db, sought, person), awardedNear(ctx.db, sought)])
  const ownIds = new Set(own.map(({ proposalId }) => proposalId))
  const others = awarded.filter(({ proposalId }) => !ownIds.has(proposalId))
  return [...withOwn(asked, own), ...(await withAwarded(ctx, asked, others))]
}
