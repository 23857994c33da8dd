import type { ReactNode } from 'react'
import { ProposalSectionLinks } from '@/components/proposals/ProposalSectionLinks'
import { ProposalStrip } from '@/components/proposals/ProposalStrip'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { isOutcome } from '@/lib/domain/decisions/rules'
import { proposalOf } from './proposalOf'

/** Request strip and section links around every page of a proposal. */
export default async function ProposalLayout({
  children,
  params,
}: {
  children: ReactNode
  params: Promise<{ reference: string }>
}) {
  await openPage('/proposals/[reference]')
  const read = await orNotFound(proposalOf((await params).reference))
  return (
    <>
      <ProposalStrip read={read} />
      <ProposalSectionLinks reference={read.contents.reference} isDecided={isOutcome(read.contents.state)} />
      {children}
    </>
  )
}
