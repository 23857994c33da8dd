import type { ProposalSection } from '@/lib/paths'

/** Sections as they stand in the links. */
export const sectionNames: Readonly<Record<ProposalSection, string>> = {
  question: 'Question',
  targets: 'Targets',
  cosmology: 'Cosmology',
  observing: 'Observing',
  feasibility: 'Feasibility',
  people: 'People',
  papers: 'Papers',
  send: 'Send',
}

/** The order in which they are gone through. */
export const sectionOrder: readonly ProposalSection[] = [
  'question',
  'targets',
  'cosmology',
  'observing',
  'feasibility',
  'people',
  'papers',
  'send',
]
