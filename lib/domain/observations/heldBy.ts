import type { ProposalContents } from '../proposals/types'
import type { Claim } from './clashes'

type Said = Pick<ProposalContents, 'targets' | 'observations' | 'modes'>

/** What a proposal asks for, observation by observation; without a position there is nothing to compare. */
export function claimsOf({ targets, observations }: Said): (Claim & { observationId: number })[] {
  const places = new Map(targets.map(({ id, raDeg, decDeg }) => [id, { raDeg, decDeg }]))
  return observations.flatMap(({ id, targetId, modeId, askedSeconds }) => {
    const { raDeg = null, decDeg = null } = places.get(targetId) ?? {}
    if (raDeg === null || decDeg === null) return []
    return [{ observationId: id, raDeg, decDeg, modeId, seconds: askedSeconds }]
  })
}

/** What an awarded proposal holds: its requests, cut where an instrument was given less than was asked of it. */
export function heldBy(sent: Said, given: readonly { instrumentId: number; seconds: number }[]): Claim[] {
  const instrumentOf = new Map(sent.modes.map(({ modeId, instrument }) => [modeId, instrument.id]))
  const askedOf = (instrumentId: number) =>
    sent.observations
      .filter(({ modeId }) => instrumentOf.get(modeId) === instrumentId)
      .reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
  const share = new Map(
    given.map(({ instrumentId, seconds }) => {
      const asked = askedOf(instrumentId)
      return [instrumentId, asked > 0 ? Math.min(1, seconds / asked) : 0]
    }),
  )
  return claimsOf(sent).map(({ raDeg, decDeg, modeId, seconds }) => ({
    raDeg,
    decDeg,
    modeId,
    seconds: seconds * (share.get(instrumentOf.get(modeId) ?? -1) ?? 0),
  }))
}
