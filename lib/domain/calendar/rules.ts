import type { Call } from '../calls/types'

/** Why the nights of a call stay as they are; null while they can be set. */
export const whyNightsStay = (stage: Call['stage']): string | null =>
  stage === 'archived' ? 'The call is archived: its nights stay as they were.' : null
