import { z } from 'zod'
import { declaredKinds } from '../conflicts/types'
import { panelKeySchema, rowKey } from '../panels/schema'

const why = {
  kind: z.string().pipe(z.enum(declaredKinds, 'Say which kind of interest it is.')),
  reason: z.string().trim().min(3, 'Say in a few words why.').max(200, 'At most 200 characters.'),
}

/** A reviewer leaves what they were given to read. */
export const leaveReviewSchema = z.object({ assignmentId: rowKey, ...why })
export type LeaveReviewInput = z.output<typeof leaveReviewSchema>

/** A member leaves what lies on the panel's table. */
export const leaveTableSchema = panelKeySchema.extend({ proposalId: rowKey, ...why })
export type LeaveTableInput = z.output<typeof leaveTableSchema>
