import type { ProposalSection } from '@/lib/paths'

/** One thing that is not as it was in the earlier call. */
export interface CarriedNote {
  section: ProposalSection
  sentence: string
  /** What the author should do about it. */
  todo: string
}
