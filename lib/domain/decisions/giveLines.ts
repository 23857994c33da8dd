import { givenByTelescope, insertAward, standingAwards, supersedeAwards } from '@/db/queries/decisions'
import { heldTime, standingChoices } from '@/db/queries/nightTerms'
import { insertHalves } from '@/db/queries/visits'
import { offeredTime } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { PanelDesk } from '../panels/openPanel'
import { offeredByTelescope } from '../rankings/offered'
import { withHalves } from '../visits/withHalves'
import type { GivenLine } from './givenLine'
import { draftDecision } from './draftDecision'
import { outcomeOf, overAwards } from './rules'
import type { WantedLine } from './wantedLines'

/** What is free on each telescope of the call, less what is held back, the proposal's own lines not counted. */
async function leftOnOffer(tx: ActingContext, desk: PanelDesk, proposalId: number) {
  const offered = offeredByTelescope(await offeredTime(tx.db, desk.call.id))
  const given = await givenByTelescope(tx.db, desk.call.id)
  for (const own of await standingAwards(tx.db, [proposalId]))
    if (!own.isReserve) given.set(own.telescopeId, (given.get(own.telescopeId) ?? 0) - own.seconds)
  const held = await heldTime(tx.db, desk.call.id)
  return new Map(
    [...offered].map(([id, seconds]) => [id, seconds - (given.get(id) ?? 0) - (held.get(id)?.seconds ?? 0)]),
  )
}

/** Puts new award lines in the place of a proposal's old ones; refuses, at the line, what was not asked or is not there. */
export async function giveLines(
  tx: ActingContext,
  desk: PanelDesk,
  wanted: readonly WantedLine[],
  given: { proposalId: number; version: number; lines: readonly GivenLine[] },
): Promise<void> {
  const own = wanted.filter((line) => line.proposalId === given.proposalId)
  const asked = given.lines.map((line, index) => {
    const ask = own.find((one) => one.instrumentId === line.instrumentId)
    if (!ask) throw refuse.field(`lines.${index}.hours`, 'This instrument was not asked for.')
    return { ...ask, ...line }
  })
  const lines = await withHalves(tx, desk, given.proposalId, asked)
  const choice = (await standingChoices(tx.db, [given.proposalId])).get(given.proposalId)
  if (choice?.choice === 'never' && lines.some((line) => line.seconds > 0))
    throw refuse.closed(`It is never to be given time: ${choice.reason} Give it back to its rank first.`)
  const wrong = overAwards(lines, await leftOnOffer(tx, desk, given.proposalId))
  if (wrong.size > 0)
    throw refuse.invalid(
      'These hours cannot be given.',
      Object.fromEntries([...wrong].map(([index, sentence]) => [`lines.${index}.hours`, sentence])),
    )
  const decisionId = await draftDecision(tx, desk, given.proposalId, given.version, {
    outcome: outcomeOf(lines),
  })
  await supersedeAwards(tx.db, decisionId)
  for (const [index, line] of lines.entries()) {
    if (line.seconds === 0) continue
    const { instrumentId, seconds, service, conditions, isReserve } = line
    const award = { decisionId, instrumentId, seconds, service, conditions, isReserve }
    const id = await insertAward(tx.db, desk.call.id, award)
    if (id === null)
      throw refuse.field(`lines.${index}.hours`, `This is more than is left on offer on ${line.telescope}.`)
    if (line.halves.length > 0) await insertHalves(tx.db, desk.call.id, id, line.halves)
  }
}
