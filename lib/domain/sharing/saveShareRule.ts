import { firstFrozenPanel, replaceShareRule, shareRules } from '@/db/queries/shareRules'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { holds } from '../actor'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openCallPanels } from './openCallPanels'
import { mayWriteShareRule } from './policy'
import { whyRuleIsFixed } from './rules'
import type { ShareRuleInput } from './schema'

/** Lays down how the panels of a call share the time, before any of them freezes its ranking. */
export function saveShareRule(ctx: ActingContext, input: ShareRuleInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { call, phase, panels, led } = await openCallPanels(tx, { callId: input.callId })
    authorize(mayWriteShareRule(tx.actor, led.length > 0, input.rule))
    const why = whyRuleIsFixed(phase, panels.length, await firstFrozenPanel(tx.db, call.id))
    if (why) throw refuse.closed(why)
    const given = new Set(input.percents.map(({ panelId }) => panelId))
    const isWhole = given.size === panels.length && panels.every(({ id }) => given.has(id))
    if (input.rule === 'fixed' && (!isWhole || input.percents.length !== panels.length))
      throw refuse.field('rule', 'Give every panel of the call its percent, once.')
    const before = (await shareRules(tx.db, call.id)).find(({ isStanding }) => isStanding)
    await replaceShareRule(tx.db, { ...input, callId: call.id, by: tx.actor.personId })
    await writeLogbook(tx, {
      action: 'call.share-rule',
      subject: { kind: 'call', id: call.number },
      actingAs: holds(tx.actor, 'office') ? 'office' : 'chair',
      before: before ? { rule: before.rule, percents: before.percents } : undefined,
      after: { rule: input.rule, percents: input.percents, reason: input.reason },
    })
  })
}
