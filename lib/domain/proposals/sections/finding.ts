import type { ProposalSection } from '@/lib/paths'

/** One thing a section still lacks or has wrong, and where it is mended. */
export interface Missing {
  section: ProposalSection
  sentence: string
  href: string
  /** Name of the field or row, where one is to blame. */
  field: string | null
}

/** What the rules of one section find. */
export interface Finding {
  /** Something has been entered. */
  begun: boolean
  /** What stands there, in a few words. */
  detail: string
  missing: Missing[]
  /** Something is wrong, not merely absent. */
  wrong?: boolean
  /** Done without the author saying so. */
  settled?: boolean
  /** Nothing can be said before this section has its part. */
  waitsFor?: ProposalSection
}
