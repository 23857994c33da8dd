'use client'

import { usePathname } from 'next/navigation'
import { SectionLinks } from '@/components/layout/SectionLinks'
import { paths } from '@/lib/paths'
import { sectionNames, sectionOrder } from './sectionNames'

/** The sections of a proposal, on every page below its home. */
export function ProposalSectionLinks({ reference }: { reference: string }) {
  const home = paths.proposal(reference)
  if (usePathname() === home) return null
  const links = sectionOrder.map((section) => ({
    href: paths.proposalSection(reference, section),
    label: sectionNames[section],
  }))
  return (
    <SectionLinks
      links={links}
      all={{ href: home, label: 'All sections' }}
      label="Sections of the proposal"
    />
  )
}
