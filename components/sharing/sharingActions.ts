import type { FormAction } from '@/components/forms/actionFormTypes'
import type { ActionResult } from '@/lib/actions/result'
import type { shareRuleSchema } from '@/lib/domain/sharing/schema'
import type { z } from 'zod'

interface MergedKey {
  callId: number
  listId: number
  version: number
}

export type SaveShareRule = FormAction<z.input<typeof shareRuleSchema>, void>

/** The deeds of the meeting of the panels, handed down from its page; the office has none of them. */
export interface MeetingOfPanels {
  together: (input: { callId: number }) => Promise<ActionResult<void>>
  move: FormAction<MergedKey & { proposalId: number; place: string; reason: string }, void>
  freeze: (input: MergedKey) => Promise<ActionResult<void>>
}
