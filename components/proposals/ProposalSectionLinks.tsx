'use client'

import { usePathname } from 'next/navigation'
import { SectionLinks } from '@/components/layout/SectionLinks'
import { paths } from '@/lib/paths'
import { sectionNames, sectionOrder } from './sectionNames'

/** The sections of a proposal, on every page below its home; its outcome among them once there is one. */
export function ProposalSectionLinks({ reference, isDecided }: { reference: string; isDecided: boolean }) {
  const home = paths.proposal(reference)
  if (usePathname() === home) return null
  const links = sectionOrder.map((section) => ({
    href: paths.proposalSection(reference, section),
    label: sectionNames[section],
  }))
  if (isDecided) links.unshift({ href: paths.proposalOutcome(reference), label: 'Outcome' })
  return (
    <SectionLinks
      links={links}
      all={{ href: home, label: 'All sections' }}
      label="Sections of the proposal"
    />
  )
}
